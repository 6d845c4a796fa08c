import { StyleSheet, View } from 'react-native';
import { dollarRange, dollars } from '../../shared/money';
import type { QuoteDocument, QuoteOption } from '../../shared/quote';
import { useBreakpoint } from '../theme/use-breakpoint';
import { space } from '../theme/tokens';
import { ButtonLink } from '../ui/button-link';
import { Dock } from '../ui/dock';
import { Page } from '../ui/page';
import { Text } from '../ui/text';
import { bookHref } from './book-href';
import { DepositCard } from './deposit-card';
import { CouldMove, Narrowing } from './doubts';
import { HowWeKnow } from './how-we-know';
import { OptionPicker } from './option-picker';
import { PriceCard } from './price-card';
import { PriceLines } from './price-lines';
import { RunCard } from './run-card';
import { SendToMe } from './send-to-me';

export interface PriceViewProps {
  readonly document: QuoteDocument;
  readonly option: QuoteOption;
  readonly onChoose: (optionId: string) => void;
}

/** The price as a document: the range first, then what to pick, what it covers, what is still open, and the deposit. */
export function PriceView({ document, option, onChoose }: PriceViewProps) {
  const wide = useBreakpoint() === 'wide';
  const main = (
    <>
      <OptionPicker document={document} option={option} onChoose={onChoose} />
      <PriceLines option={option} />
      <CouldMove document={document} option={option} />
      <Narrowing narrowing={document.narrowing} />
      <HowWeKnow document={document} option={option} />
    </>
  );
  const dock = (
    <Dock
      range={dollarRange(option.lowCents, option.highCents)}
      side={option.title}
      line={<Text variant="note" color="ink2">{`Deposit ${dollars(option.depositCents)}, comes off the bill`}</Text>}
      next={<ButtonLink label={`Book with ${dollars(option.depositCents)}`} href={bookHref(option)} arrow grow />}
    />
  );
  return (
    <Page title="Your price" hidePhone={!wide} header={<SendToMe />} dock={wide ? undefined : dock}>
      <View style={styles.page}>
        <PriceCard document={document} option={option} wide={wide} />
        {wide ? (
          <View style={styles.columns}>
            <View style={styles.main}>{main}</View>
            <View style={styles.side}>
              <RunCard plan={document.plan} option={option} />
              <DepositCard option={option} document={document} />
            </View>
          </View>
        ) : (
          <View style={styles.main}>
            {main}
            <RunCard plan={document.plan} option={option} />
          </View>
        )}
      </View>
    </Page>
  );
}

const styles = StyleSheet.create({
  page: { gap: space[5] },
  columns: { flexDirection: 'row', gap: space[6], alignItems: 'flex-start' },
  main: { flex: 1, minWidth: 0, gap: space[5] },
  side: { width: 340, gap: space[4] },
});
