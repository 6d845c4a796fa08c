import { StyleSheet, View } from 'react-native';
import { dollarRange, dollars } from '../../shared/money';
import type { QuoteLine, QuoteOption } from '../../shared/quote';
import { countInWords } from '../../shared/units';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/use-breakpoint';
import { DataTable, type Column } from '../ui/data-table';
import { Directory } from '../ui/directory';
import { Disclosure } from '../ui/disclosure';
import { NumberBox } from '../ui/number-box';
import { Text } from '../ui/text';
import { quantityInWords } from './quantity-words';

interface Row extends Pick<QuoteLine, 'lowCents' | 'midCents' | 'highCents'> {
  readonly key: string;
  readonly n: number | null;
  /** null: the total. */
  readonly line: QuoteLine | null;
}

/** The price line by line with the rules behind each; lines add up to the total at low, middle and high alike. */
export function PriceTable({ option }: { readonly option: QuoteOption }) {
  const phone = useBreakpoint() === 'phone';
  const firm = option.lowCents === option.highCents;
  if (phone) return <PriceList option={option} />;
  const rows: Row[] = [
    ...option.lines.map((line, index) => ({ ...line, key: line.id, n: index + 1, line })),
    { ...option, key: 'total', n: null, line: null },
  ];
  const money = (key: 'lowCents' | 'midCents' | 'highCents', title: string): Column<Row> => ({
    key, title, align: 'right',
    cell: (row) => <Text weight={row.line === null || key === 'midCents' ? 800 : 500} style={styles.money}>{row[key] === 0 ? '–' : dollars(row[key])}</Text>,
  });
  return (
    <DataTable
      caption={`Price of ${option.title}, line by line`} rows={rows} rowKey={(row) => row.key}
      columns={[
        { key: 'line', title: 'Line', cell: (row) => <LineCell row={row} /> },
        ...(firm ? [money('midCents', 'Price')] : [money('lowCents', 'Low'), money('midCents', 'Middle'), money('highCents', 'High')]),
      ]}
    />
  );
}

function LineCell({ row: { n, line } }: { readonly row: Row }) {
  if (!line || n === null) return <Text variant="subheading">Total</Text>;
  return (
    <View style={styles.line}>
      <View style={{ paddingTop: 1 }}><NumberBox n={n} /></View>
      <View style={styles.words}>
        <Text weight={700} style={styles.title}>{line.title}</Text>
        {line.note ? <Text variant="fine" weight={500} color="ink2">{line.note}</Text> : null}
        <Rules line={line} />
      </View>
    </View>
  );
}

/** The rules that made a line in the middle case: what, how much of it, at how much. */
function Rules({ line }: { readonly line: QuoteLine }) {
  if (line.rules.length === 0) return null;
  const count = countInWords(line.rules.length, 'rule', 'rules');
  return (
    <Disclosure label={count} spokenLabel={`${count} behind ${line.title}`}>
      <View role="list" aria-label={`Rules behind ${line.title}`} style={{ gap: space[1] }}>
        {line.rules.map((rule, index) => (
          <View key={`${rule.rule}-${index}`} role="listitem">
            <Text variant="fine" weight={700}>{rule.words}</Text>
            <Text variant="fine" weight={500} color="ink2">
              {`${quantityInWords(rule.quantity, rule.unit)} at ${dollars(rule.unitCents)} = ${dollars(rule.cents)} · ${rule.rule}`}
            </Text>
          </View>
        ))}
      </View>
    </Disclosure>
  );
}

const PriceList = ({ option }: { readonly option: QuoteOption }) => (
  <View>
    <Directory
      label={`Price of ${option.title}, line by line`}
      items={option.lines.map((line) => ({
        key: line.id, title: line.title, ...(line.note ? { note: line.note } : {}), details: <Rules line={line} />,
        value: line.highCents === 0 ? '–' : dollarRange(line.lowCents, line.highCents),
      }))}
    />
    <View style={styles.total}>
      <Text variant="subheading">Total</Text>
      <Text variant="subheading">{dollarRange(option.lowCents, option.highCents)}</Text>
    </View>
  </View>
);

const styles = StyleSheet.create({
  line: { flexDirection: 'row', gap: space[2], alignItems: 'flex-start' },
  words: { flex: 1, minWidth: 0 },
  title: { fontSize: 15, lineHeight: 21 },
  money: { fontSize: 15, lineHeight: 21, textAlign: 'right' },
  total: { flexDirection: 'row', justifyContent: 'space-between', gap: space[3], borderTopWidth: 2, paddingTop: space[2] },
});
