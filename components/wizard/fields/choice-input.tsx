import type { ChoiceField } from '../../../shared/wizard/field';
import { UNSURE } from '../../../shared/wizard/index';
import { ChoiceCards } from '../../ui/choice-cards';
import { Select } from '../../ui/select';
import { Text } from '../../ui/text';
import { useWizard } from '../wizard-context';
import type { FieldInputProps } from './field-props';
import { FieldRemark } from './field-remark';

/** One of several, saved at once: cards, or a list that folds away. */
export function ChoiceInput({ field, error, titled, compact, onLeave }: FieldInputProps<ChoiceField>) {
  const { answers, answer } = useWizard();
  const given = answers[field.id];
  const value = typeof given === 'string' ? given : null;
  const common = {
    id: field.id, label: field.label, hideLabel: titled, error, value,
    ...(field.hint ? { hint: field.hint } : {}),
    onChange: (picked: string) => answer(field.id, picked),
    onBlur: () => onLeave(field.id),
  };
  if (compact) {
    return (
      <>
        <Select {...common} choices={listed(field)} />
        {value === UNSURE && field.unsure ? <Text variant="note" color="ink2" role="status">{field.unsure.note}</Text> : null}
        <FieldRemark field={field} />
      </>
    );
  }
  return (
    <>
      <ChoiceCards
        {...common} choices={field.choices}
        {...(field.columns ? { columns: field.columns } : {})}
        {...(field.unsure ? { unsure: field.unsure } : {})}
      />
      <FieldRemark field={field} />
    </>
  );
}

/** The choices as lines of a list: a second line becomes part of the first, "Not sure" comes last. */
const listed = (field: ChoiceField) => [
  ...field.choices.map(({ value, label, note }) => ({ value, label: note ? `${label}, ${note.charAt(0).toLowerCase()}${note.slice(1)}` : label })),
  ...(field.unsure ? [{ value: UNSURE, label: field.unsure.label }] : []),
];
