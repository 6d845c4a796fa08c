import { StyleSheet, View } from 'react-native';
import type { Company } from '../../shared/api/company';
import { dollarRange } from '../../shared/money';
import { Tape } from '../price/tape';
import { border, colors, radius, space } from '../theme/tokens';
import { Text } from '../ui/text';

/** The range that any home starts with, on the tape. Its room is kept while the numbers are on their way. */
export function OpeningRange({ company }: { readonly company: Company | undefined }) {
  return (
    <View dataSet={{ part: 'landing-tape' }} style={styles.card}>
      <View style={styles.line}>
        <Text variant="subheading">{company ? dollarRange(company.openingLowCents, company.openingHighCents) : ' '}</Text>
        <Text variant="note" color="ink2">before you answer</Text>
      </View>
      <Tape lowCents={company?.openingLowCents ?? null} highCents={company?.openingHighCents ?? null} outcome={company ? 'range' : 'too-early'} />
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    backgroundColor: colors.card, borderWidth: border.hair, borderColor: colors.rule, borderRadius: radius.card,
    padding: space[4], paddingBottom: space[2],
  },
  line: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'baseline', gap: space[3] },
});
