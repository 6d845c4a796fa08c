import { StyleSheet, View } from 'react-native';
import type { Company } from '../../shared/api/company';
import { border, colors, space } from '../theme/tokens';
import { Link } from '../ui/link';
import { Text } from '../ui/text';

/** Who stands behind the page, the fine print, and on a demo that all of it is invented. */
export function LandingFooter({ company }: { readonly company: Company | undefined }) {
  return (
    <View role="contentinfo" dataSet={{ part: 'footer' }} style={styles.footer}>
      <View style={styles.links}>
        <Link href="/resume" label="Open a saved job" variant="note" />
        <Link href="/privacy" label="Privacy" variant="note" />
        <Link href="/terms" label="Terms" variant="note" />
      </View>
      <Text variant="note" color="ink2">{company ? `${company.name} · ${company.licence} · ${company.postalAddress}` : ' '}</Text>
      {company?.demo ? <Text variant="note" color="ink2">This is a demonstration: the company, its towns, its people and its prices are invented.</Text> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  footer: { marginHorizontal: space[4], paddingVertical: space[4], gap: space[1], borderTopWidth: border.hair, borderColor: colors.rule },
  links: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space[6] },
});
