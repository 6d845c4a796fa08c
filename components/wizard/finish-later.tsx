import type { LucideIcon } from 'lucide-react-native';
import Clock from 'lucide-react-native/icons/clock';
import { useState } from 'react';
import { View } from 'react-native';
import { failureWords, newIdempotencyKey, problemByField } from '../api/client';
import { useFinishLater } from '../api/use-finish-later';
import { dayInWords } from '../../shared/dates';
import { space } from '../theme/tokens';
import { Dialogue } from '../ui/dialogue';
import { Field } from '../ui/field';
import { FieldError } from '../ui/field-notes';
import { Text } from '../ui/text';
import { TextButton } from '../ui/text-button';
import { useWizard } from './wizard-context';

/** "Finish later": asks for the e-mail alone, and mails a link that opens the answers on any device. */
export function FinishLater({ label = 'Finish later', icon = Clock }: { readonly label?: string; readonly icon?: LucideIcon }) {
  const { flush } = useWizard();
  const later = useFinishLater();
  const [open, setOpen] = useState(false);
  const [email, setEmail] = useState('');
  const [key, setKey] = useState(newIdempotencyKey);
  const sent = later.data;
  const wrong = problemByField(later.error).email ?? null;

  const change = (text: string) => {
    setEmail(text);
    setKey(newIdempotencyKey());
    if (later.error) later.reset();
  };
  const send = async () => {
    if (later.isPending) return;
    await flush();
    later.mutate({ email: email.trim(), key });
  };
  const show = () => {
    later.reset();
    setKey(newIdempotencyKey());
    setOpen(true);
  };

  return (
    <>
      <TextButton label={label} icon={icon} onPress={show} />
      <Dialogue
        open={open} onClose={() => setOpen(false)}
        title={sent ? 'Your link is on its way' : `${label}?`}
        safeLabel={sent ? 'Go on here' : 'Keep going'}
        {...(sent ? {} : { act: { label: 'Send me the link', busyLabel: 'Sending', busy: later.isPending, onPress: () => void send() } })}
      >
        {sent ? (
          <View role="status" style={{ gap: space[2] }}>
            <Text>We sent it to {sent.sentTo}. It opens your answers on any device until {dayInWords(sent.openUntil)}.</Text>
            <Text variant="note" color="ink2">Nothing there after a few minutes? Look in the junk folder, or send it again.</Text>
          </View>
        ) : (
          <View style={{ gap: space[3] }}>
            <Text color="ink2">Your answers are kept. We mail you a link that opens them on any device.</Text>
            <Field
              id="later-email" label="E-mail" hint="For this link, nothing else." inputMode="email" autoComplete="email"
              value={email} onChangeText={change} error={wrong} onSubmit={() => void send()}
            />
            {later.error && !wrong ? <FieldError id="later">{failureWords(later.error)}</FieldError> : null}
          </View>
        )}
      </Dialogue>
    </>
  );
}
