import { dollarRange } from '../../shared/money';
import { panelChangeWords, type QuoteOption } from '../../shared/quote';
import { ampsInWords, kilowattsInWords } from '../../shared/units';
import { DataTable } from '../ui/data-table';
import { Text } from '../ui/text';

const rows: readonly { key: string; title: string; words: (option: QuoteOption) => string }[] = [
  { key: 'price', title: 'Price', words: (option) => dollarRange(option.lowCents, option.highCents) },
  { key: 'night', title: 'Miles a night', words: (option) => `about ${Math.round(option.milesPerNight)}` },
  { key: 'day', title: 'Covers your usual day', words: (option) => (option.coversUsualDay ? 'Yes' : 'No') },
  { key: 'panel', title: 'In the panel', words: (option) => panelChangeWords[option.panelChange] },
  { key: 'rate', title: 'Charging', words: (option) => `${ampsInWords(option.chargingAmps)} charging, ${ampsInWords(option.breakerAmps)} breaker` },
  { key: 'power', title: 'Power', words: (option) => kilowattsInWords(option.kw) },
  { key: 'charger', title: 'Charger', words: (option) => option.subtitle },
];

/** The options side by side: one row a question, one column an option. */
export function OptionTable({ options }: { readonly options: readonly QuoteOption[] }) {
  return (
    <DataTable
      caption="The options compared"
      rows={rows}
      rowKey={(row) => row.key}
      columns={[
        { key: 'what', title: 'What', cell: (row) => <Text variant="note" weight={800}>{row.title}</Text> },
        ...options.map((option) => ({ key: option.id, title: option.recommended ? `${option.title}, recommended` : option.title, cell: (row: (typeof rows)[number]) => <Text variant="note">{row.words(option)}</Text> })),
      ]}
    />
  );
}
