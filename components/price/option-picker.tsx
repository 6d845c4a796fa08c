import Car from 'lucide-react-native/icons/car';
import Plug from 'lucide-react-native/icons/plug';
import type { LucideIcon } from 'lucide-react-native';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { dollarRange } from '../../shared/money';
import { panelChangeWords, type QuoteDocument, type QuoteOption } from '../../shared/quote';
import { ampsInWords, kilowattsInWords } from '../../shared/units';
import { useBreakpoint } from '../theme/use-breakpoint';
import { space } from '../theme/tokens';
import { ChoiceCards } from '../ui/choice-cards';
import { Glyph } from '../ui/glyph';
import { Text } from '../ui/text';
import { TextButton } from '../ui/text-button';
import { OptionTable } from './option-table';

/** Two to four ways to do it, compared in what a homeowner cares about. Exactly one is chosen. */
export function OptionPicker({ document, option, onChoose }: { readonly document: QuoteDocument; readonly option: QuoteOption; readonly onChoose: (id: string) => void }) {
  const [asTable, showTable] = useState(false);
  const wide = useBreakpoint() === 'wide';
  return (
    <View style={{ gap: space[3] }}>
      <View style={styles.head}>
        <Text variant="heading" level={2}>Pick one to install</Text>
        {document.options.length > 1 ? <TextButton label={asTable ? 'Compare as cards' : 'Compare in a table'} onPress={() => showTable(!asTable)} /> : null}
      </View>
      {asTable ? (
        <OptionTable options={document.options} />
      ) : (
        <ChoiceCards
          id="option"
          label="Pick one to install"
          hideLabel
          columns={!wide ? 1 : document.options.length === 3 ? 3 : 2}
          layout={wide ? 'tall' : 'row'}
          value={option.id}
          onChange={onChoose}
          choices={document.options.map((entry) => ({
            value: entry.id,
            label: entry.title,
            figure: dollarRange(entry.lowCents, entry.highCents),
            ...(entry.recommended ? { tag: 'Recommended' } : {}),
            details: <OptionFacts option={entry} />,
          }))}
        />
      )}
      <Text color="ink2">{option.because}</Text>
    </View>
  );
}

function OptionFacts({ option }: { readonly option: QuoteOption }) {
  return (
    <View style={{ gap: 2 }}>
      <Text variant="note" color="ink2">{option.subtitle}</Text>
      <Line icon={Plug} words={`${ampsInWords(option.chargingAmps)} · ${kilowattsInWords(option.kw)}`} />
      <Line icon={Car} words={`about ${Math.round(option.milesPerHour)} miles of range an hour`} />
      {option.panelChange === 'none' ? null : <Text variant="note" color="ink2">{panelChangeWords[option.panelChange]}</Text>}
    </View>
  );
}

const Line = ({ icon, words }: { readonly icon: LucideIcon; readonly words: string }) => (
  <View style={styles.line}>
    <Glyph of={icon} size={18} color="ink2" />
    <Text variant="note" color="ink2">{words}</Text>
  </View>
);

const styles = StyleSheet.create({
  head: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center', gap: space[3], flexWrap: 'wrap' },
  line: { flexDirection: 'row', gap: space[2], alignItems: 'center' },
});
