import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { border, colors, radius, space } from '../theme/tokens';
import { Text } from '../ui/text';

export interface DeskRow {
  readonly key: string;
  readonly title: string;
  /** Under the title: words, or a control. */
  readonly note?: ReactNode;
  readonly value: string;
  /** What stood here before; struck through, and spoken as "was". */
  readonly before?: string;
}

/** Facts in close rows: name and where it is from at the left, the value at the right, wrapping where it must. */
export function DeskRows({ label, rows }: { readonly label: string; readonly rows: readonly DeskRow[] }) {
  return (
    <View role="list" aria-label={label}>
      {rows.map((row, index) => (
        <View key={row.key} role="listitem" style={[styles.row, index > 0 && styles.ruled, row.before !== undefined && styles.changed]}>
          <View style={styles.name}>
            <Text weight={700} style={styles.text}>{row.title}</Text>
            {typeof row.note === 'string' ? <Text variant="fine" weight={500} color="ink2">{row.note}</Text> : row.note}
          </View>
          <View style={styles.value}>
            {row.before === undefined ? null : (
              <Text weight={500} color="ink2" style={[styles.text, styles.struck]}>
                <Text dataSet={{ unseen: 'yes' }} style={styles.unseen}>was </Text>
                {row.before}
              </Text>
            )}
            <Text weight={800} color={row.before === undefined ? 'ink' : 'copper'} style={styles.text}>{row.value}</Text>
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space[3], alignItems: 'flex-start', paddingVertical: 7, minHeight: 38 },
  ruled: { borderTopWidth: border.hair, borderColor: colors.rule },
  changed: { backgroundColor: colors.copperWash, borderRadius: radius.tag, marginHorizontal: -6, paddingHorizontal: 6 },
  name: { flex: 1, minWidth: 0 },
  value: { maxWidth: '58%', minWidth: 0, alignItems: 'flex-end' },
  text: { fontSize: 15, lineHeight: 21 },
  unseen: { position: 'absolute', width: 1, height: 1, overflow: 'hidden' },
  struck: { textDecorationLine: 'line-through', textAlign: 'right' },
});
