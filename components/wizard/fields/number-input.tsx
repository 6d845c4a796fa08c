import type { NumberField } from '../../../shared/wizard/field';
import { UNSURE } from '../../../shared/wizard/index';
import { NumberStepper } from '../../ui/number-stepper';
import { useWizard } from '../wizard-context';
import type { FieldInputProps } from './field-props';

/** How long a number may still change before it is sent, ms. */
const TYPING_MS = 400;

/** A measure. It is sent after a pause; one out of its limits stays on the page until it is mended. */
export function NumberInput({ field, error, onLeave }: FieldInputProps<NumberField>) {
  const { answers, answer, hold } = useWizard();
  const value = answers[field.id];
  const change = (number: number | null) => {
    if (number === null) answer(field.id, null, TYPING_MS);
    else if (field.schema.safeParse(number).success) answer(field.id, number, TYPING_MS);
    else hold(field.id, number);
  };
  const { id, label, unit, min, max, step, start, unsure } = field;
  return (
    <NumberStepper
      id={id} label={label} unit={unit} min={min} max={max} step={step} start={start} error={error}
      {...(field.hint ? { hint: field.hint } : {})}
      {...(field.optional ? { optional: true } : {})}
      {...(unsure
        ? { unsure: { ...unsure, picked: value === UNSURE, onPick: (picked: boolean) => answer(id, picked ? UNSURE : null) } }
        : {})}
      value={typeof value === 'number' ? value : null}
      onChange={change}
      onBlur={() => onLeave(field.id)}
    />
  );
}
