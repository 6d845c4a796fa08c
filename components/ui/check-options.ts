import type { ChoiceGroupProps, ChoiceOption } from './choice-options';

export interface CheckCardsProps extends ChoiceGroupProps {
  /** null: not answered yet; an empty list: none of them. */
  readonly value: readonly string[] | 'unsure' | null;
  readonly onChange: (value: readonly string[] | 'unsure') => void;
  /** The words of "none of these"; without it there is no such card. */
  readonly none?: string;
}

export interface CheckOption {
  readonly key: string;
  readonly option: ChoiceOption;
  readonly chosen: boolean;
  readonly unsure: boolean;
  readonly photo: boolean;
  readonly toggle: () => void;
}

/** The cards of a many-of-many group, what each shows and what pressing it does. */
export function checkOptions({ choices, value, onChange, none, unsure }: CheckCardsProps): readonly CheckOption[] {
  const picked = Array.isArray(value) ? (value as readonly string[]) : [];
  const plain = { unsure: false, photo: false };
  return [
    ...choices.map((option) => ({
      ...plain, option, key: option.value, chosen: picked.includes(option.value),
      toggle: () => onChange(picked.includes(option.value) ? picked.filter((entry) => entry !== option.value) : [...picked, option.value]),
    })),
    ...(none === undefined ? [] : [{ ...plain, key: 'none', option: { value: 'none', label: none }, chosen: Array.isArray(value) && picked.length === 0, toggle: () => onChange([]) }]),
    ...(unsure ? [{ key: 'unsure', option: { value: 'unsure', label: unsure.label }, chosen: value === 'unsure', unsure: true, photo: Boolean(unsure.photo), toggle: () => onChange('unsure') }] : []),
  ];
}
