import { useState } from 'react';
import { Pressable, View } from 'react-native';
import { border, colors, radius, space } from '../theme/tokens';
import { FieldError, Hint } from './field-notes';
import { Label } from './label';
import { Text } from './text';

export interface SelectProps {
  readonly id: string;
  readonly label: string;
  /** The label is only spoken. */
  readonly hideLabel?: boolean;
  readonly hint?: string;
  readonly choices: readonly { readonly value: string; readonly label: string }[];
  readonly value: string | null;
  readonly onChange: (value: string) => void;
  readonly onBlur?: () => void;
  /** Shown while nothing is chosen. */
  readonly placeholder?: string;
  readonly error?: string | null;
  readonly size?: 'normal' | 'desk';
}

/** One of a longer list that folds away. */
export function Select({ id, label, hideLabel = false, hint, choices, value, onChange, placeholder = 'Pick one', error }: SelectProps) {
  const [open, setOpen] = useState(false);
  const chosen = choices.find((choice) => choice.value === value);
  return (
    <View style={{ gap: space[1] }}>
      {hideLabel ? null : <Label id={id} label={label} />}
      {hint ? <Hint id={id}>{hint}</Hint> : null}
      <Pressable role="combobox" aria-label={label} aria-expanded={open} onPress={() => setOpen(!open)}
        style={{ minHeight: 52, borderRadius: radius.field, borderWidth: border.control, borderColor: colors.edge, padding: space[3] }}>
        <Text weight={600}>{chosen?.label ?? placeholder}</Text>
      </Pressable>
      {open ? choices.map((choice) => (
        <Pressable key={choice.value} role="option" aria-selected={choice.value === value} onPress={() => { onChange(choice.value); setOpen(false); }} style={{ padding: space[3] }}>
          <Text>{choice.label}</Text>
        </Pressable>
      )) : null}
      {error ? <FieldError id={id}>{error}</FieldError> : null}
    </View>
  );
}
