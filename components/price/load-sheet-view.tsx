import { View } from 'react-native';
import type { LoadSheet } from '../../shared/quote';
import { ampsInWords } from '../../shared/units';
import { space } from '../theme/tokens';
import { Directory } from '../ui/directory';
import { LoadGauge } from '../ui/load-gauge';
import { Text } from '../ui/text';

const va = (value: number) => `${Math.round(value).toLocaleString('en-US')}\u00a0VA`;

/** The load calculation line by line, with its method and clauses, as a permit office reads it. */
export function LoadSheetView({ sheet }: { readonly sheet: LoadSheet }) {
  return (
    <View style={{ gap: space[3] }}>
      <LoadGauge serviceAmps={sheet.serviceAmps} homeAmps={sheet.homeAmps} chargerAmps={sheet.chargerAmps} status={sheet.status} known={sheet.known} />
      <Text variant="note" color="ink2">{`${sheet.method}, ${sheet.clause}. Service ${ampsInWords(sheet.serviceAmps)}.${sheet.known ? '' : ' Some of it is typical for a home like yours, until we know.'}`}</Text>
      <Directory label="Load calculation" start={null} items={sheet.lines.map((line, index) => ({ key: `${index}`, title: line.label, note: [line.clause, line.note].filter(Boolean).join(' · '), value: va(line.va) }))} />
    </View>
  );
}
