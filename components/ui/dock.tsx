import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { border, colors, radius, shadow, space } from '../theme/tokens';
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
  /** Over the dock's upper edge: a toast. */
  readonly above?: ReactNode;
}

/**
 * Stays at the window's bottom on phones and tablets. Under 700 px of height it folds to one line, back, range and Next: by the
 * style sheet (page-styles.ts), so that nothing jumps when scripts arrive or a keyboard comes up.
 */
export function Dock({ range = null, side, tape, line, back, next, above }: DockProps) {
  const words = typeof side === 'string' ? <Text variant="note" weight={700} color="ink2">{side}</Text> : side;
  return (
    <View role="region" aria-label="Price and next step" dataSet={{ part: 'dock' }} style={styles.dock}>
      {above ? <View style={styles.above}>{above}</View> : null}
      <View dataSet={{ part: 'dock-inner' }} style={styles.inner}>
        {range ? (
          <View dataSet={{ part: 'dock-range' }} style={[styles.whole, styles.head]}>
            <Text variant="figure" style={styles.range}>{range}</Text>
            <View dataSet={{ low: 'hide' }}>{words}</View>
          </View>
        ) : null}
        {tape ? <View dataSet={{ low: 'hide' }} style={styles.whole}>{tape}</View> : null}
        {line ? <View dataSet={{ low: 'hide' }} style={styles.whole}>{line}</View> : null}
        {back ? <View dataSet={{ part: 'dock-back' }}>{back}</View> : null}
        <View style={styles.next}>{next}</View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  dock: {
    backgroundColor: colors.card, borderTopLeftRadius: radius.sheet, borderTopRightRadius: radius.sheet, borderTopWidth: border.hair,
    borderColor: colors.rule, boxShadow: shadow.dock, zIndex: 10,
    paddingHorizontal: space[4], paddingTop: space[3], paddingBottom: space[4],
  },
  above: { position: 'absolute', left: 0, right: 0, bottom: '100%', height: 0 },
  inner: { flexDirection: 'row', flexWrap: 'wrap', width: '100%', maxWidth: 680, alignSelf: 'center', rowGap: space[2], columnGap: space[3] },
  whole: { width: '100%' },
  head: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: space[3] },
  range: { fontSize: 22, lineHeight: 28 },
  next: { flexGrow: 1, flexShrink: 1, minWidth: 140 },
});
