import Minus from 'lucide-react-native/icons/minus';
import Plus from 'lucide-react-native/icons/plus';
import type { LucideIcon } from 'lucide-react-native';
import { useState } from 'react';
import { Pressable, StyleSheet, TextInput, View } from 'react-native';
import { border, colors, radius, space, typeStyle } from '../theme/tokens';
import { Checkbox } from './checkbox';
import { describedBy, FieldError, Hint } from './field-notes';
import { Glyph } from './glyph';
import { Label } from './label';
import { readNumber, stepped, writeNumber } from './read-number';
import { Text } from './text';

export interface NumberStepperProps {
  readonly id: string;
  readonly label: string;
  readonly hint?: string;
  /** As written after the number: "ft", "in.", "steps". */
  readonly unit: string;
  readonly min: number;
  readonly max: number;
  readonly step: number;
  /** What the first press of a sign gives while there is no answer. */
  readonly start: number;
  readonly value: number | null;
  /** Also gets numbers outside of the limits (typed): the caller says what is wrong with them. Null: emptied. */
  readonly onChange: (value: number | null) => void;
  readonly onBlur?: () => void;
  readonly error?: string | null;
  readonly optional?: boolean;
  /** The signs' names: "Closer to the back wall". */
  readonly decreaseLabel?: string;
  readonly increaseLabel?: string;
  /** The value as a screen reader says it: "9 feet from the back wall". */
  readonly spoken?: (value: number) => string;
  readonly unsure?: { readonly label: string; readonly note: string; readonly picked: boolean; readonly onPick: (picked: boolean) => void };
}

/** A number with its unit between two signs. The number is a text box: "9 6", "9.5" and "9 ft 6 in." are all understood. */
export function NumberStepper({
  id, label, hint, unit, min, max, step, start, value, onChange, onBlur, error,
  optional = false, decreaseLabel, increaseLabel, spoken, unsure,
}: NumberStepperProps) {
  // What is being typed; null while the box shows the value.
  const [typed, setTyped] = useState<string | null>(null);
  const unread = typed !== null && typed.trim() !== '' && readNumber(typed, unit) === null;
  const problem = unread ? `Type a number, such as ${writeNumber(start, unit)}` : error;
  const move = (by: number) => { setTyped(null); onChange(value === null ? start : stepped(value, by, step, min, max)); };
  const type = (text: string) => {
    setTyped(text);
    const read = readNumber(text, unit);
    if (read !== null || text.trim() === '') onChange(read);
  };
  const key = (name: string): (() => void) | undefined =>
    ({
      ArrowUp: () => move(1), ArrowDown: () => move(-1), PageUp: () => move(5), PageDown: () => move(-5),
      Home: () => { setTyped(null); onChange(min); }, End: () => { setTyped(null); onChange(max); },
    })[name];
  const edge = value === null ? '' : value >= max ? ', highest' : value <= min ? ', lowest' : '';
  const words = value === null ? undefined : `${spoken?.(value) ?? writeNumber(value, unit)}${edge}`;
  return (
    <View style={{ gap: space[1] }}>
      <Label id={id} label={label} optional={optional} />
      {hint ? <Hint id={id}>{hint}</Hint> : null}
      <View style={styles.row}>
        <View dataSet={{ control: 'frame' }} style={[styles.frame, problem ? styles.wrong : null]}>
          <Sign icon={Minus} label={decreaseLabel ?? `${label}: less`} off={value !== null && value <= min} onStep={(by) => move(-by)} />
          <TextInput
            id={id} role="spinbutton" aria-label={label} aria-valuemin={min} aria-valuemax={max} aria-valuenow={value ?? undefined} aria-valuetext={words}
            aria-describedby={describedBy(id, hint, problem)} aria-invalid={problem ? true : undefined} aria-required={!optional}
            inputMode={unit === 'ft' ? 'text' : 'decimal'} autoComplete="off" selectTextOnFocus
            value={typed ?? (value === null ? '' : writeNumber(value, unit))} placeholder={value === null ? `– ${unit}` : undefined} placeholderTextColor={colors.ink3}
            onChangeText={type} onBlur={() => { if (!unread) setTyped(null); onBlur?.(); }}
            onKeyPress={(event) => { const act = key(event.nativeEvent.key); if (act) { event.preventDefault(); act(); } }}
            dataSet={{ control: 'inner' }} style={[typeStyle('subheading', 700), styles.number]}
          />
          <Sign icon={Plus} label={increaseLabel ?? `${label}: more`} off={value !== null && value >= max} onStep={move} />
        </View>
        {unsure ? <Checkbox id={`${id}-unsure`} label={unsure.label} checked={unsure.picked} onChange={unsure.onPick} /> : null}
      </View>
      {unsure?.picked ? <Text variant="note" color="ink2">{unsure.note}</Text> : null}
      {problem ? <FieldError id={id}>{problem}</FieldError> : null}
    </View>
  );
}

/** One of the two signs; held down it moves five steps. */
function Sign({ icon, label, off, onStep }: { icon: LucideIcon; label: string; off: boolean; onStep: (by: number) => void }) {
  return (
    <Pressable role="button" aria-label={label} aria-disabled={off} onPress={() => { if (!off) onStep(1); }} onLongPress={() => { if (!off) onStep(5); }}
      style={({ pressed }) => [styles.sign, pressed && { backgroundColor: colors.well }]}>
      <Glyph of={icon} size={22} color={off ? 'ink2' : 'copper'} />
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space[4], rowGap: space[1] },
  frame: {
    flexDirection: 'row', flexGrow: 1, flexBasis: 180, maxWidth: 320, height: 50, borderRadius: radius.field, borderWidth: border.control, borderColor: colors.edge,
    backgroundColor: colors.card, overflow: 'hidden',
  },
  wrong: { borderColor: colors.stop, borderWidth: border.chosen },
  number: { flex: 1, minWidth: 0, textAlign: 'center', color: colors.ink, borderLeftWidth: 1, borderRightWidth: 1, borderColor: colors.rule },
  sign: { width: 48, alignItems: 'center', justifyContent: 'center' },
});
