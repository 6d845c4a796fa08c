import { Pressable, View } from 'react-native';
import { space } from '../theme/tokens';
import { CheckMark } from './check-mark';
import { FieldError } from './field-notes';
import { Text } from './text';

export interface CheckboxProps {
  readonly id: string;
  readonly label: string;
  readonly note?: string;
  readonly checked: boolean;
  readonly onChange: (checked: boolean) => void;
  readonly error?: string | null;
}

/** One thing to tick, with its words beside it; for consents. */
export function Checkbox({ id, label, note, checked, onChange, error }: CheckboxProps) {
  return (
    <View style={{ gap: space[1] }}>
      <Pressable role="checkbox" aria-checked={checked} aria-label={label} onPress={() => onChange(!checked)} style={{ flexDirection: 'row', gap: space[3] }}>
        <CheckMark checked={checked} wrong={Boolean(error)} />
        <Text>{label}</Text>
      </Pressable>
      {note ? <Text variant="note" color="ink2">{note}</Text> : null}
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </View>
  );
}
