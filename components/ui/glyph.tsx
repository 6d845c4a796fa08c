import type { LucideIcon } from 'lucide-react-native';
import { colors, type ColorName } from '../theme/tokens';

export interface GlyphProps {
  /** One icon, imported from its own path (`lucide-react-native/icons/phone`), so that only used ones ship. */
  readonly of: LucideIcon;
  readonly size?: 16 | 18 | 20 | 22 | 24;
  readonly color?: ColorName;
}

/** An ordinary icon beside a word; hidden from screen readers, because the word says it. */
export function Glyph({ of: Icon, size = 20, color = 'ink' }: GlyphProps) {
  return <Icon size={size} color={colors[color]} strokeWidth={size < 18 ? 2.3 : 2} aria-hidden />;
}
