import { ChoiceFace } from './choice-face';
import { ChoiceGroup } from './choice-group';
import { checkOptions, type CheckCardsProps } from './check-options';

/** Any of several: real checkboxes inside of labels. "Nothing of these" and "Not sure" each take the others back. */
export function CheckCards(props: CheckCardsProps) {
  const { id, unsure, value } = props;
  return (
    <ChoiceGroup {...props} columns={props.columns ?? 2} remark={unsure && value === 'unsure' ? unsure.note : null}>
      {checkOptions(props).map((entry) => (
        <label key={entry.key} className="ui-choice">
          <input type="checkbox" className="ui-input" name={id} value={entry.key} checked={entry.chosen} onChange={entry.toggle} />
          <ChoiceFace option={entry.option} chosen={entry.chosen} unsure={entry.unsure} photo={entry.photo} />
        </label>
      ))}
    </ChoiceGroup>
  );
}
