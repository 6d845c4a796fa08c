import { View } from 'react-native';
import { dollars } from '../../shared/money';
import type { Narrowing as NarrowingEntry, QuoteDocument, QuoteOption } from '../../shared/quote';
import { fieldsById, steps } from '../../shared/wizard/index';
import { space } from '../theme/tokens';
import { Card } from '../ui/card';
import { CautionBox } from '../ui/caution-box';
import { Directory } from '../ui/directory';
import { Text } from '../ui/text';

/** What could still move the price after it is agreed, and what we do then. */
export function CouldMove({ document, option }: { readonly document: QuoteDocument; readonly option: QuoteOption }) {
  const words = document.outcome === 'firm'
    ? 'Blocking hidden in the wall, or a change that the inspector asks for. We stop and ask you before anything costs more.'
    : `Blocking hidden in the wall, or a change that the inspector asks for. Above ${dollars(option.highCents)} we stop and ask you first.`;
  return <CautionBox level="note" title="What could still move it">{words}</CautionBox>;
}

/** The answers and photos that would make the range smaller, most first, each with the way to it. */
export function Narrowing({ narrowing }: { readonly narrowing: readonly NarrowingEntry[] }) {
  const worth = narrowing.filter((entry) => entry.cents > 0).slice(0, 4);
  if (worth.length === 0) return null;
  return (
    <View style={{ gap: space[3] }}>
      <Text variant="heading" level={2}>What would narrow it</Text>
      <Card>
        <Directory
          label="What would narrow the range"
          items={worth.map((entry) => ({ key: entry.fact, title: entry.title, value: `about ${dollars(entry.cents)}`, href: narrowingHref(entry) }))}
        />
      </Card>
    </View>
  );
}

/** Where an answer is given: its photo slot, or the screen of its field. */
export function narrowingHref(entry: NarrowingEntry): `/quote/${string}` {
  if (entry.photo) return '/quote/photos';
  for (const step of steps) {
    const group = step.groups.find((candidate) => candidate.fields.some((field) => field.id === entry.fact));
    if (group) return `/quote/${step.id}?part=${group.id}`;
  }
  return fieldsById.has(entry.fact) || entry.fact.startsWith('loads') ? '/quote/loads' : '/quote/garage';
}
