import type { TextField } from '../../../shared/wizard/field';
import { Field } from '../../ui/field';
import { useWizard } from '../wizard-context';
import type { FieldInputProps } from './field-props';

/** A short text. It is sent as soon as it is complete; a half-typed one stays on the page. */
export function TextInput({ field, error, onLeave, onSubmit }: FieldInputProps<TextField>) {
  const { answers, answer, hold } = useWizard();
  const value = answers[field.id];
  const change = (text: string) => {
    const typed = text.trim();
    if (typed === '') answer(field.id, null);
    else if (field.schema.safeParse(typed).success) answer(field.id, typed);
    else hold(field.id, typed);
  };
  return (
    <Field
      id={field.id} label={field.label} error={error} maxLength={field.maxLength} inputMode={field.inputMode}
      {...(field.hint ? { hint: field.hint } : {})}
      {...(field.autoComplete === 'postal-code' ? { autoComplete: 'postal-code' as const } : {})}
      {...(field.optional ? { optional: true } : {})}
      onSubmit={onSubmit}
      value={typeof value === 'string' ? value : ''}
      onChangeText={change}
      onBlur={() => onLeave(field.id)}
    />
  );
}
