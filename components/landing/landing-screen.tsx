import { StyleSheet, View } from 'react-native';
import { useCompany } from '../api/use-company';
import { LandingPicturePhone, LandingPictureWide } from '../drawings/landing-picture';
import { colors, radius, space } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { Page } from '../ui/page';
import { Text } from '../ui/text';
import { HowPricesWork } from './how-prices-work';
import { LandingFooter } from './landing-footer';
import { HeaderLinks } from './header-links';
import { OpeningRange } from './opening-range';
import { Promises } from './promises';

/** The first page: what one gets, the range before any answer, and the way in. Its words stand in the static page. */
export function LandingScreen() {
  const company = useCompany().data;
  return (
    <Page title="The price of a home charger, before anyone visits" width="full" header={<HeaderLinks />} footer={<LandingFooter company={company} />}>
      <View dataSet={{ part: 'landing-top' }}>
        <View dataSet={{ part: 'landing-picture' }} style={styles.picture}>
          <View dataSet={{ only: 'phone' }} style={styles.fill}><LandingPicturePhone /></View>
          <View dataSet={{ only: 'tablet-up' }} style={styles.fill}><LandingPictureWide /></View>
        </View>
        <View dataSet={{ part: 'landing-words' }} style={styles.words}>
          <Text variant="display" level={1}>{'Know the price of\na home charger\nbefore anyone visits'}</Text>
          <View dataSet={{ only: 'narrow' }}>
            <Text color="ink2" style={styles.lead}>Seven short steps from the couch. No account, about 6 minutes.</Text>
          </View>
          <View dataSet={{ only: 'wide' }} style={{ maxWidth: 520 }}>
            <Text color="ink2" style={styles.leadWide}>
              Describe your home, car, panel and garage from the couch. See an honest price range narrow as you answer.
              No account, about 6 minutes.
            </Text>
          </View>
          <OpeningRange company={company} />
          <View dataSet={{ part: 'landing-start' }}><ButtonLink href="/quote/home" label="Start with your home" arrow /></View>
          <View dataSet={{ only: 'narrow' }}><Promises company={company} /></View>
        </View>
      </View>
      <HowPricesWork company={company} />
    </Page>
  );
}

const styles = StyleSheet.create({
  picture: { height: 320, overflow: 'hidden', backgroundColor: colors.sage },
  fill: { width: '100%', height: '100%' },
  words: {
    gap: space[4], backgroundColor: colors.paper, borderTopLeftRadius: radius.picture, borderTopRightRadius: radius.picture, marginTop: -24,
    paddingHorizontal: space[4], paddingTop: space[6],
  },
  lead: { fontSize: 17 },
  leadWide: { fontSize: 19, lineHeight: 30 },
});
