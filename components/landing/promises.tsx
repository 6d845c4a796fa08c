import Check from 'lucide-react-native/icons/check';
import { View } from 'react-native';
import type { Company } from '../../shared/api/company';
import { space } from '../theme/tokens';
import { Glyph } from '../ui/glyph';
import { Text } from '../ui/text';

const listed = (names: readonly string[]): string => (names.length < 2 ? (names[0] ?? '') : `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`);

/** Where the contractor works, and what comes after the range. */
export function Promises({ company }: { readonly company: Company | undefined }) {
  const lines = [company ? `Licensed in ${listed(company.towns.map((town) => town.name))}` : ' ', 'A range now, a firm price after a photo check'];
  return (
    <View role="list" style={{ gap: space[1] }}>
      {lines.map((line) => (
        <View key={line} role="listitem" style={{ flexDirection: 'row', gap: space[3], alignItems: 'center' }}>
          <Glyph of={Check} size={18} color="ink2" />
          <Text variant="note" color="ink2" style={{ flex: 1, fontSize: 15 }}>{line}</Text>
        </View>
      ))}
    </View>
  );
}
