import { StyleSheet, View } from 'react-native';
import { space } from '../theme/tokens';
import { Anchor } from './anchor';
import { Card } from './card';
import type { DataTableProps } from './data-table';
import { Text } from './text';

/** The same facts in the same order as the table, one card a row. */
export function DataCards<Row>({ caption, columns, rows, rowKey, rowHref, rowLabel }: DataTableProps<Row>) {
  const shown = columns.filter((column) => !column.wideOnly);
  return (
    <View role="list" aria-label={caption} style={{ gap: space[3] }}>
      {rows.map((row) => {
        const body = shown.map((column, index) => (
          <View key={column.key} style={styles.line}>
            {index > 0 ? <Text variant="fine" color="ink2" style={styles.title}>{column.title}</Text> : null}
            <View style={{ flex: 1 }}>{column.cell(row)}</View>
          </View>
        ));
        return (
          <View key={rowKey(row)} role="listitem">
            <Card>
              {rowHref ? (
                <Anchor href={rowHref(row)} spokenLabel={rowLabel?.(row)} style={() => styles.body}>{body}</Anchor>
              ) : (
                <View style={styles.body}>{body}</View>
              )}
            </Card>
          </View>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  body: { gap: space[2] },
  line: { flexDirection: 'row', gap: space[3], alignItems: 'flex-start' },
  title: { width: 96, paddingTop: 3 },
});
