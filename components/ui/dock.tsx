import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { border, colors, radius, shadow, space } from '../theme/tokens';
import { useLowWindow } from '../theme/use-breakpoint';
import { Text } from './text';

export interface DockProps {
  /** "$1,080 – $3,350"; null while there is none. */
  readonly range?: string | null;
  /** At the right of the range: "likely total", a tag. */
  readonly side?: ReactNode;
  /** Left out on low windows. */
  readonly tape?: ReactNode;
  /** What the last answer did, what would narrow it most. Left out on low windows. */
  readonly line?: ReactNode;
  /** A square button or link. */
  readonly back?: ReactNode;
  readonly next: ReactNode;
}

/** Stays at the window's bottom on phones and tablets. Under 700 px it folds to one line: the range and Next. */
export function Dock({ range = null, side, tape, line, back, next }: DockProps) {
  const low = useLowWindow();
  const words = typeof side === 'string' ? <Text variant="note" weight={700} color="ink2">{side}</Text> : side;
  return (
    <View role="region" aria-label="Price and next step" dataSet={{ part: 'dock' }} style={[styles.dock, low && styles.low]}>
      <View style={[styles.inner, low && styles.oneLine]}>
        {low && back ? back : null}
        {range ? (
          <View style={[styles.head, low && { flexShrink: 1 }]}>
            <Text variant={low ? 'subheading' : 'figure'} style={low ? null : styles.range}>{range}</Text>
            {low ? null : words}
          </View>
        ) : null}
        {low ? null : tape}
        {low ? null : line}
        <View style={[styles.buttons, low && { flexGrow: 1, flexShrink: 1, minWidth: 140 }]}>
          {low ? null : back}
          {next}
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  dock: {
    backgroundColor: colors.card, borderTopLeftRadius: radius.sheet, borderTopRightRadius: radius.sheet, borderTopWidth: border.hair, borderColor: colors.rule,
    boxShadow: shadow.dock, paddingHorizontal: space[4], paddingTop: space[3], paddingBottom: space[4], zIndex: 10,
  },
  low: { paddingTop: space[2], paddingBottom: space[2] },
  inner: { width: '100%', maxWidth: 680, alignSelf: 'center', gap: space[2] },
  oneLine: { flexDirection: 'row', alignItems: 'center', gap: space[3] },
  head: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: space[3] },
  range: { fontSize: 22, lineHeight: 28 },
  buttons: { flexDirection: 'row', gap: space[3] },
});
