import ArrowRight from 'lucide-react-native/icons/arrow-right';
import type { LucideIcon } from 'lucide-react-native';
import { StyleSheet, View, type ViewStyle } from 'react-native';
import { BusyRing } from './busy-ring';
import { border, colors, radius, space, type ColorName } from '../theme/tokens';
import { Glyph } from './glyph';
import { Text } from './text';

export type ButtonKind = 'filled' | 'quiet' | 'stop' | 'back';
export type ButtonSize = 'normal' | 'desk';

export interface ButtonFaceProps {
  readonly label: string;
  readonly kind?: ButtonKind;
  readonly icon?: LucideIcon;
  /** An arrow after the label: only for steps forward. */
  readonly arrow?: boolean;
  readonly size?: ButtonSize;
  /** Words shown in place of the label while busy; the width stays. */
  readonly busyLabel?: string;
  readonly busy?: boolean;
  readonly off?: boolean;
}

const inkOf = (kind: ButtonKind, off: boolean): ColorName => (off ? 'ink2' : kind === 'filled' || kind === 'stop' ? 'white' : 'ink');

/** What is inside of a button or a link that looks like one. */
export function ButtonFace({ label, kind = 'filled', icon, arrow = false, size = 'normal', busy = false, busyLabel = 'Saving', off = false }: ButtonFaceProps) {
  const ink = inkOf(kind, off);
  if (kind === 'back') return icon ? <Glyph of={icon} size={22} color={ink} /> : null;
  const words = { textAlign: 'center', fontSize: size === 'desk' ? 15 : 17, flexShrink: 1 } as const;
  return (
    <>
      <View style={[styles.row, busy && styles.away]}>
        {icon ? <Glyph of={icon} color={ink} /> : null}
        <Text variant="action" color={ink} style={words}>{label}</Text>
        {arrow ? <Glyph of={ArrowRight} color={ink} /> : null}
      </View>
      {busy ? (
        <View style={[StyleSheet.absoluteFill, styles.row]}>
          <BusyRing color={ink} />
          <Text variant="action" color={ink} style={words}>{busyLabel}</Text>
        </View>
      ) : null}
    </>
  );
}

/** The outside of a button in each state. */
export function buttonStyle(kind: ButtonKind, size: ButtonSize, state: { pressed?: boolean; off?: boolean; grow?: boolean }): ViewStyle[] {
  const fill = kind === 'filled' ? { backgroundColor: state.pressed ? colors.copperDeep : colors.copper } : kind === 'stop' ? { backgroundColor: colors.stop } : styles.outline;
  return [
    styles.frame,
    size === 'desk' && styles.desk,
    fill,
    state.pressed && kind !== 'filled' && kind !== 'stop' && { backgroundColor: colors.well },
    state.off && styles.off,
    kind === 'back' && styles.square,
    state.grow && { flexGrow: 1, flexShrink: 1 },
  ].filter((style) => style !== false && style !== undefined) as ViewStyle[];
}

const styles = StyleSheet.create({
  frame: { minHeight: 52, minWidth: 52, borderRadius: radius.button, paddingHorizontal: space[5], paddingVertical: space[2], alignItems: 'center', justifyContent: 'center' },
  desk: { minHeight: 44, minWidth: 44, borderRadius: radius.small, paddingHorizontal: space[4] },
  outline: { backgroundColor: colors.card, borderWidth: border.quiet, borderColor: colors.edge },
  off: { backgroundColor: colors.well, borderWidth: border.quiet, borderColor: colors.edge },
  square: { width: 52, paddingHorizontal: 0 },
  row: { flexDirection: 'row', alignItems: 'center', justifyContent: 'center', gap: space[2] },
  away: { opacity: 0 },
});
