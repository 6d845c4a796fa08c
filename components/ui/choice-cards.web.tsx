import type { ChoiceCardsProps } from './choice-cards';
import { ChoiceFace } from './choice-face';
import { ChoiceGroup } from './choice-group';
import { UNSURE_VALUE } from './choice-options';

/** One of several: real radios inside of labels, so arrows, Space and screen readers work as everywhere. */
export function ChoiceCards({ value, onChange, layout = 'row', ...group }: ChoiceCardsProps) {
  const { id, choices, unsure } = group;
  const unsureValue = unsure?.value ?? UNSURE_VALUE;
  return (
    <ChoiceGroup {...group} role="radiogroup" remark={unsure && value === unsureValue ? unsure.note : null}>
      {choices.map((choice) => (
        <label key={choice.value} className="ui-choice">
          <input type="radio" className="ui-input" name={id} value={choice.value} checked={value === choice.value} onChange={() => onChange(choice.value)} />
          <ChoiceFace option={choice} chosen={value === choice.value} layout={layout} />
        </label>
      ))}
      {unsure ? (
        <label className="ui-choice">
          <input type="radio" className="ui-input" name={id} value={unsureValue} checked={value === unsureValue} onChange={() => onChange(unsureValue)} />
          <ChoiceFace option={{ label: unsure.label }} chosen={value === unsureValue} unsure photo={Boolean(unsure.photo)} />
        </label>
      ) : null}
    </ChoiceGroup>
  );
}
