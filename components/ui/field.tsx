import { useState, type Ref } from 'react';
import { StyleSheet, TextInput, View, type TextInputProps } from 'react-native';
import { border, colors, radius, space, typeStyle } from '../theme/tokens';
import { describedBy, FieldError, Hint } from './field-notes';
import { Label } from './label';
import { Text } from './text';

export interface FieldProps {
  /** The box's own id; the error summary sends focus there. */
  readonly id: string;
  readonly label: string;
  readonly hint?: string;
  readonly value: string;
  readonly onChangeText: (text: string) => void;
  readonly onBlur?: () => void;
  readonly onSubmit?: () => void;
  /** Shown after the field was left, or after Next. */
  readonly error?: string | null;
  readonly optional?: boolean;
  readonly multiline?: boolean;
  readonly readOnly?: boolean;
  /** True for about two seconds after it was saved. */
  readonly saved?: boolean;
  /** Hides what is typed: passwords. */
  readonly secure?: boolean;
  readonly inputMode?: TextInputProps['inputMode'];
  readonly autoComplete?: TextInputProps['autoComplete'];
  readonly maxLength?: number;
  readonly ref?: Ref<TextInput>;
}

/** A labeled text box. The label never moves into it; hint and error are tied to it for screen readers. */
export function Field({
  id, label, hint, value, onChangeText, onBlur, onSubmit, error,
  optional = false, multiline = false, readOnly = false, saved = false, secure = false, ...box
}: FieldProps) {
  const [inside, setInside] = useState(false);
  return (
    <View style={{ gap: space[1] }}>
      <View style={styles.head}>
        <Label id={id} label={label} optional={optional} />
        <Text variant="note" color="ok" role="status">{saved ? 'Saved' : ''}</Text>
      </View>
      {hint ? <Hint id={id}>{hint}</Hint> : null}
      <TextInput
        {...box}
        id={id}
        aria-label={label}
        aria-describedby={describedBy(id, hint, error)}
        aria-invalid={error ? true : undefined}
        aria-required={!optional}
        value={value}
        onChangeText={onChangeText}
        onFocus={() => setInside(true)}
        onBlur={() => { setInside(false); onBlur?.(); }}
        onSubmitEditing={multiline ? undefined : onSubmit}
        multiline={multiline}
        readOnly={readOnly}
        secureTextEntry={secure}
        dataSet={{ control: 'box' }}
        style={[styles.box, typeStyle('body', 600), multiline && styles.tall, inside && styles.inside, error ? styles.wrong : null, readOnly && styles.fixed]}
      />
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  head: { flexDirection: 'row', justifyContent: 'space-between', gap: space[2] },
  box: {
    minHeight: 52, width: '100%', borderRadius: radius.field, borderWidth: border.control, borderColor: colors.edge, backgroundColor: colors.card,
    color: colors.ink, paddingHorizontal: space[4], paddingVertical: space[3],
  },
  tall: { minHeight: 104, textAlignVertical: 'top' },
  inside: { borderColor: colors.ink },
  wrong: { borderColor: colors.stop, borderWidth: border.chosen },
  fixed: { backgroundColor: colors.well, borderColor: colors.well },
});
