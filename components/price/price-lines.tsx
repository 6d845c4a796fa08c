import { View } from 'react-native';
import { dollarRange, dollars } from '../../shared/money';
import type { QuoteOption } from '../../shared/quote';
import { useBreakpoint } from '../theme/use-breakpoint';
import { space } from '../theme/tokens';
import { Card } from '../ui/card';
import { Directory } from '../ui/directory';
import { Disclosure } from '../ui/disclosure';
import { Text } from '../ui/text';

/** What the price covers, line by line, each with its reason. The lines add up to the range, and the sum is shown. */
export function PriceLines({ option }: { readonly option: QuoteOption }) {
  const wide = useBreakpoint() === 'wide';
  return (
    <View style={{ gap: space[3] }}>
      <Text variant="heading" level={2}>What the price covers</Text>
      <Card>
        <Directory
          label="What the price covers"
          columns={wide ? 2 : 1}
          items={option.lines.map((line) => ({
            key: line.id,
            title: line.title,
            ...(line.note ? { note: line.note } : {}),
            value: line.highCents === 0 ? 'Included' : dollarRange(line.lowCents, line.highCents),
            details: <Disclosure label="Why" spokenLabel={`Why: ${line.title}`}><Text variant="note" color="ink2">{line.why}</Text></Disclosure>,
          }))}
        />
        <View style={{ flexDirection: 'row', justifyContent: 'space-between', gap: space[3], borderTopWidth: 2, paddingTop: space[3], marginTop: space[2] }}>
          <Text variant="subheading">{option.lowCents === option.highCents ? 'Total' : 'The lines add up to'}</Text>
          <Text variant="subheading">{dollarRange(option.lowCents, option.highCents)}</Text>
        </View>
        <Text variant="note" color="ink2">{`The deposit of ${dollars(option.depositCents)} comes off this.`}</Text>
      </Card>
    </View>
  );
}
