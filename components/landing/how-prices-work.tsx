import { StyleSheet, View } from 'react-native';
import type { Company } from '../../shared/api/company';
import { dollars } from '../../shared/money';
import { border, colors, radius, space } from '../theme/tokens';
import { Directory } from '../ui/directory';
import { Plate } from '../ui/plate';
import { Text } from '../ui/text';

/** What each step is for, as the card inside of a panel's door. */
export function HowPricesWork({ company }: { readonly company: Company | undefined }) {
  const deposit = company ? `Pay a ${dollars(company.depositCents)} deposit` : 'Pay a deposit';
  return (
    <View id="how-prices-work" dataSet={{ part: 'landing-more' }} style={styles.section}>
      <View dataSet={{ part: 'landing-card' }} style={styles.card}>
        <View style={{ gap: space[2], paddingBottom: space[2] }}>
          <Plate>Directory</Plate>
          <Text variant="note" weight={700} color="ink2" level={2}>What each step is for</Text>
        </View>
        <Directory
          label="What each step is for"
          columns={3}
          items={[
            { key: 'home', title: 'Describe the home', note: 'Town, house, who owns it' },
            { key: 'panel', title: 'Show the panel', note: 'Door open, photo of the label' },
            { key: 'garage', title: 'Measure the garage', note: 'Panel, charger and car on a 1\u00a0ft grid' },
            { key: 'range', title: 'See your range', note: 'Line by line, with what would narrow it' },
            { key: 'deposit', title: deposit, note: 'Refundable until you pick a day' },
            { key: 'firm', title: 'Get a firm price', note: 'A licensed electrician checks it' },
          ]}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { paddingHorizontal: space[4], paddingTop: space[7], paddingBottom: space[6] },
  card: { backgroundColor: colors.card, borderWidth: border.hair, borderColor: colors.rule, borderRadius: radius.card, padding: space[4] },
});
