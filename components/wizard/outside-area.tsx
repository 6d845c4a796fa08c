import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { failureWords, newIdempotencyKey, problemByField } from '../api/client';
import { useAskForArea } from '../api/use-ask-for-area';
import { useCompany } from '../api/use-company';
import { border, colors, radius, space } from '../theme/tokens';
import { Button } from '../ui/button';
import { Field } from '../ui/field';
import { FieldError } from '../ui/field-notes';
import { Text } from '../ui/text';

/** For a home outside the area: says so plainly, and keeps the address of who asks to be told. */
export function OutsideArea({ zip }: { zip: string }) {
  const towns = useCompany().data?.towns.map((town) => town.name) ?? [];
  const ask = useAskForArea();
  const [email, setEmail] = useState('');
  const [key, setKey] = useState(newIdempotencyKey);
  const wrong = problemByField(ask.error).email ?? null;

  const change = (text: string) => {
    setEmail(text);
    setKey(newIdempotencyKey());
    if (ask.error) ask.reset();
  };
  const send = () => { if (!ask.isPending) ask.mutate({ zip, email: email.trim(), key }); };

  return (
    <View style={styles.card}>
      <View role="status"><Text variant="heading" level={2}>{`We do not work in ${zip} yet`}</Text></View>
      <Text color="ink2">
        {towns.length > 0 ? `Our crews drive in ${towns.join(' and ')}. ` : ''}Check the five digits, or leave your e-mail and we tell you if that changes.
      </Text>
      {ask.isSuccess ? (
        <Text weight={700} color="ok" role="status">Kept. We write to {email.trim()} once, when we work in {zip}.</Text>
      ) : (
        <>
          <Field
            id="area-email" label="E-mail" hint="For this one message, nothing else." inputMode="email" autoComplete="email"
            value={email} onChangeText={change} error={wrong} onSubmit={send}
          />
          {ask.error && !wrong ? <FieldError id="area">{failureWords(ask.error)}</FieldError> : null}
          <Button label="Tell me if you come here" kind="quiet" busy={ask.isPending} busyLabel="Sending" onPress={send} />
        </>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    gap: space[3], padding: space[4], borderRadius: radius.card, borderWidth: border.hair, borderColor: colors.rule,
    backgroundColor: colors.card,
  },
});
