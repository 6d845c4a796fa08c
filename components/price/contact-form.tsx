import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect, useRef, useState, type ReactNode } from 'react';
import { Controller, useForm, type Control, type DefaultValues } from 'react-hook-form';
import { View } from 'react-native';
import { contactSchema, type Contact } from '../../shared/api/intakes';
import { consent } from '../../shared/consent';
import { failureWords, newIdempotencyKey, problemByField } from '../api/client';
import { space } from '../theme/tokens';
import { afterPress } from '../ui/after-press';
import { Button } from '../ui/button';
import { CautionBox } from '../ui/caution-box';
import { Checkbox } from '../ui/checkbox';
import { CheckCards } from '../ui/check-cards';
import { ErrorSummary } from '../ui/error-summary';
import { Field } from '../ui/field';

const empty: DefaultValues<Contact> = { name: '', email: '', phone: '', street: '', contactWays: ['email'] };
const order = ['name', 'email', 'phone', 'street', 'contactWays', 'consent'] as const;

export interface ContactFormProps {
  readonly submitLabel: string;
  readonly busyLabel: string;
  readonly busy: boolean;
  readonly error: unknown;
  /** The same key while the same details are sent again, so that nothing happens twice. */
  readonly onSubmit: (contact: Contact, key: string) => void;
  readonly children?: ReactNode;
}

const boxes = [
  { name: 'name', label: 'Your name', autoComplete: 'name', maxLength: 100 },
  { name: 'email', label: 'E-mail', hint: 'For the receipt and your own page. Nothing else unless you tick it.', autoComplete: 'email', inputMode: 'email', maxLength: 254 },
  { name: 'phone', label: 'Phone', autoComplete: 'tel', inputMode: 'tel', maxLength: 30, optional: true },
  { name: 'street', label: 'House number and street', autoComplete: 'street-address', maxLength: 200 },
] as const;

/** Name, e-mail, phone if wanted, street and consents: asked when it is needed and no earlier. */
export function ContactForm({ submitLabel, busyLabel, busy, error, onSubmit, children }: ContactFormProps) {
  const { control, handleSubmit, formState, setError } = useForm<Contact>({ defaultValues: empty, resolver: zodResolver(contactSchema), mode: 'onTouched', shouldFocusError: false });
  const [attempt, setAttempt] = useState(0);
  const last = useRef({ details: '', key: '' });

  useEffect(() => {
    for (const [name, message] of Object.entries(problemByField(error))) if (order.some((known) => known === name)) setError(name as keyof Contact, { message });
  }, [error, setError]);

  const problems = order.flatMap((name) => (formState.errors[name]?.message ? [{ field: name, detail: String(formState.errors[name].message) }] : []));
  const send = (contact: Contact) => {
    const details = JSON.stringify(contact);
    if (last.current.details !== details) last.current = { details, key: newIdempotencyKey() };
    onSubmit(contact, last.current.key);
  };
  const submit = () => void handleSubmit(send, () => setAttempt((count) => count + 1))();

  return (
    <View style={{ gap: space[5] }}>
      {attempt > 0 ? <ErrorSummary problems={problems} attempt={attempt} /> : null}
      {boxes.map((box) => <Box key={box.name} control={control} {...box} />)}
      <Controller
        control={control}
        name="contactWays"
        render={({ field, fieldState }) => (
          <CheckCards
            id="contactWays" label="How may we reach you about this job?" columns={3} none="Only by e-mail about the order"
            choices={[{ value: 'email', label: 'E-mail' }, { value: 'text', label: 'Text' }, { value: 'phone', label: 'Call' }]}
            value={field.value} onChange={(ways) => field.onChange(ways)} error={fieldState.error?.message ?? null}
          />
        )}
      />
      <Controller
        control={control}
        name="consent"
        render={({ field, fieldState }) => (
          <Checkbox id="consent" label={consent.label} note={consent.note} checked={field.value === true} onChange={(checked) => field.onChange(checked || undefined)} error={fieldState.error?.message ?? null} />
        )}
      />
      {children}
      {error && problems.length === 0 ? <View role="alert"><CautionBox level="stop">{failureWords(error)}</CautionBox></View> : null}
      <Button label={submitLabel} busy={busy} busyLabel={busyLabel} onPress={submit} grow />
    </View>
  );
}

function Box({ control, name, ...box }: { readonly control: Control<Contact> } & (typeof boxes)[number]) {
  return (
    <Controller
      control={control}
      name={name}
      render={({ field, fieldState }) => <Field id={name} {...box} value={field.value ?? ''} onChangeText={field.onChange} onBlur={() => afterPress(field.onBlur)} error={fieldState.error?.message ?? null} />}
    />
  );
}
