import type { Href } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { border, colors, radius, space } from '../theme/tokens';
import { Anchor } from './anchor';
import { NumberBox } from './number-box';
import { Text } from './text';

export interface DirectoryItem {
  readonly key: string;
  readonly title: string;
  readonly note?: string;
  readonly value?: string;
  /** Makes the whole line a link, named by its words. */
  readonly href?: Href;
  /** changed: copper tint. removed: struck through. */
  readonly tone?: 'changed' | 'removed';
  /** More under the line: a reason, a disclosure. */
  readonly details?: ReactNode;
}

export interface DirectoryProps {
  /** What the list is, for screen readers. */
  readonly label: string;
  readonly items: readonly DirectoryItem[];
  /** Two on wide windows: odd numbers left, even right, so that reading order and panel order agree. */
  readonly columns?: 1 | 2 | 3;
  /** The first number; null: no numbers. */
  readonly start?: number | null;
}

/** Numbered lines as on the card inside of a panel's door: number, name, second line, value. */
export function Directory({ label, items, columns = 1, start = 1 }: DirectoryProps) {
  return (
    <View role="list" aria-label={label} dataSet={{ directory: String(columns) }}>
      {items.map((item, index) => (
        <View key={item.key} role="listitem" dataSet={{ line: index < columns ? 'first' : 'later' }} style={[styles.item, item.href !== undefined && styles.tight, index > 0 && styles.ruled, item.tone === 'changed' && styles.changed]}>
          <Line item={item} n={start === null ? null : start + index} />
          {item.details}
        </View>
      ))}
    </View>
  );
}

function Line({ item, n }: { item: DirectoryItem; n: number | null }) {
  const struck = item.tone === 'removed' ? ({ textDecorationLine: 'line-through' } as const) : null;
  const words = (
    <>
      {n === null ? null : <View aria-hidden style={{ paddingTop: 1 }}><NumberBox n={n} /></View>}
      <View style={styles.words}>
        <Text weight={700} style={struck}>{item.title}</Text>
        {item.note ? <Text variant="note" weight={500} color="ink2">{item.note}</Text> : null}
      </View>
      {item.value ? <Text weight={800} color={item.tone === 'changed' ? 'copper' : 'ink'} style={[styles.value, struck]}>{item.value}</Text> : null}
    </>
  );
  if (!item.href) return <View style={styles.line}>{words}</View>;
  return (
    <Anchor href={item.href} style={({ pressed }) => [styles.line, styles.target, pressed && styles.pressed]}>
      {words}
    </Anchor>
  );
}

const styles = StyleSheet.create({
  item: { paddingVertical: space[2] },
  tight: { paddingVertical: 2 },
  ruled: { borderTopWidth: border.hair, borderColor: colors.rule },
  changed: { backgroundColor: colors.copperWash, borderRadius: radius.tag, paddingHorizontal: space[2], marginHorizontal: -space[2] },
  line: { flexDirection: 'row', gap: space[3], alignItems: 'flex-start', paddingVertical: 2 },
  target: { minHeight: 44, alignItems: 'center' },
  pressed: { opacity: 0.7 },
  words: { flex: 1, minWidth: 0 },
  value: { textAlign: 'right', flexShrink: 0, maxWidth: '60%' },
});
