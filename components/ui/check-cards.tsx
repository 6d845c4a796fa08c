import { Pressable, View } from 'react-native';
import { space } from '../theme/tokens';
import { ChoiceFace } from './choice-face';
import { checkOptions, type CheckCardsProps } from './check-options';
import { FieldError, Hint } from './field-notes';
import { Text } from './text';

export type { CheckCardsProps } from './check-options';

/** Any of several. "Nothing of these" and "Not sure" each take the others back. */
export function CheckCards(props: CheckCardsProps) {
  const { id, label, hideLabel = false, hint, unsure, error, value } = props;
  return (
    <View role="group" aria-label={label} style={{ gap: space[2] }}>
      {hideLabel ? null : <Text variant="note" weight={800}>{label}</Text>}
      {hint ? <Hint id={id}>{hint}</Hint> : null}
      {checkOptions(props).map((entry) => (
        <Pressable key={entry.key} role="checkbox" aria-checked={entry.chosen} aria-label={entry.option.label} onPress={entry.toggle}>
          <ChoiceFace option={entry.option} chosen={entry.chosen} unsure={entry.unsure} photo={entry.photo} />
        </Pressable>
      ))}
      {unsure && value === 'unsure' ? <Text variant="note" color="ink2">{unsure.note}</Text> : null}
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </View>
  );
}
