import type { LucideIcon } from 'lucide-react-native';
import { Pressable } from 'react-native';
import { space, targetPx, type ColorName, type TextVariant } from '../theme/tokens';
import { Glyph } from './glyph';
import { Text } from './text';

export interface TextButtonProps {
  readonly label: string;
  readonly onPress: () => void;
  readonly icon?: LucideIcon;
  readonly color?: ColorName;
  readonly variant?: TextVariant;
  readonly spokenLabel?: string;
  /** Set when it opens and closes something. */
  readonly expanded?: boolean;
}

/** A button that looks like a link, for small acts on the page ("Finish later"). */
export function TextButton({ label, onPress, icon, color = 'lake', variant = 'subheading', spokenLabel, expanded }: TextButtonProps) {
  return (
    <Pressable
      role="button"
      {...(spokenLabel ? { 'aria-label': spokenLabel } : {})}
      {...(expanded === undefined ? {} : { 'aria-expanded': expanded })}
      onPress={onPress}
      style={({ pressed }) => ({ flexDirection: 'row', alignItems: 'center', gap: space[2], minHeight: targetPx, alignSelf: 'flex-start', opacity: pressed ? 0.7 : 1 })}
    >
      {icon ? <Glyph of={icon} color={color} /> : null}
      <Text variant={variant} color={color} weight={700}>{label}</Text>
    </Pressable>
  );
}
