import type { ManyField } from '../../../shared/wizard/field';
import { UNSURE } from '../../../shared/wizard/index';
import { CheckCards } from '../../ui/check-cards';
import { useWizard } from '../wizard-context';
import type { FieldInputProps } from './field-props';

/** Any of several, none of them, or not sure; saved at once. */
export function ManyInput({ field, error, titled, onLeave }: FieldInputProps<ManyField>) {
  const { answers, answer } = useWizard();
  const value = answers[field.id];
  return (
    <CheckCards
      id={field.id} label={field.label} hideLabel={titled} choices={field.choices} none={field.none} error={error} columns={2}
      {...(field.hint ? { hint: field.hint } : {})}
      {...(field.unsure ? { unsure: field.unsure } : {})}
      value={value === UNSURE ? UNSURE : Array.isArray(value) ? value.map(String) : null}
      onChange={(picked) => answer(field.id, picked)}
      onBlur={() => onLeave(field.id)}
    />
  );
}
