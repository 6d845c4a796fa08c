import { Pressable, View } from 'react-native';
import { space } from '../theme/tokens';
import { ChoiceFace } from './choice-face';
import { UNSURE_VALUE, type ChoiceGroupProps } from './choice-options';
import { FieldError, Hint } from './field-notes';
import { Text } from './text';

export interface ChoiceCardsProps extends ChoiceGroupProps {
  readonly value: string | null;
  readonly onChange: (value: string) => void;
  readonly layout?: 'row' | 'tall';
}

/** One of several, as breaker handles that lock each other out. "Not sure" comes last and is a choice like any other. */
export function ChoiceCards({ id, label, hideLabel = false, hint, choices, unsure, error, value, onChange, layout = 'row' }: ChoiceCardsProps) {
  const unsureValue = unsure?.value ?? UNSURE_VALUE;
  return (
    <View role="radiogroup" aria-label={label} style={{ gap: space[2] }}>
      {hideLabel ? null : <Text variant="note" weight={800}>{label}</Text>}
      {hint ? <Hint id={id}>{hint}</Hint> : null}
      {choices.map((choice) => (
        <Pressable key={choice.value} role="radio" aria-checked={value === choice.value} aria-label={choice.label} onPress={() => onChange(choice.value)}>
          <ChoiceFace option={choice} chosen={value === choice.value} layout={layout} />
        </Pressable>
      ))}
      {unsure ? (
        <Pressable role="radio" aria-checked={value === unsureValue} aria-label={unsure.label} onPress={() => onChange(unsureValue)}>
          <ChoiceFace option={{ label: unsure.label }} chosen={value === unsureValue} unsure photo={Boolean(unsure.photo)} />
        </Pressable>
      ) : null}
      {unsure && value === unsureValue ? <Text variant="note" color="ink2">{unsure.note}</Text> : null}
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </View>
  );
}
