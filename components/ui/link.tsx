import type { Href } from 'expo-router';
import type { LucideIcon } from 'lucide-react-native';
import ChevronRight from 'lucide-react-native/icons/chevron-right';
import { StyleSheet, View } from 'react-native';
import { border, colors, space, targetPx, type ColorName, type TextVariant } from '../theme/tokens';
import { Anchor } from './anchor';
import { Glyph } from './glyph';
import { Text } from './text';

export interface LinkProps {
  readonly label: string;
  /** A route, or an address such as `tel:` and `mailto:`. */
  readonly href: Href;
  readonly icon?: LucideIcon;
  readonly variant?: TextVariant;
  readonly color?: ColorName;
  /** Needed when the words alone do not tell where it leads ("Change"). */
  readonly spokenLabel?: string;
}

/** A link in words, at least 44 px high. */
export function Link({ label, href, icon, variant = 'subheading', color = 'lake', spokenLabel }: LinkProps) {
  return (
    <Anchor href={href} spokenLabel={spokenLabel} style={({ pressed }) => [styles.link, pressed && styles.pressed]}>
      {icon ? <Glyph of={icon} color={color} /> : null}
      <Text variant={variant} color={color} weight={700} style={styles.words}>{label}</Text>
    </Anchor>
  );
}

export interface RowLinkProps extends Pick<LinkProps, 'label' | 'href' | 'icon'> {
  readonly note?: string;
}

/** A whole row that leads somewhere, with a chevron. */
export function RowLink({ label, href, icon, note }: RowLinkProps) {
  return (
    <Anchor href={href} style={({ pressed }) => [styles.row, pressed && { backgroundColor: colors.well }]}>
      {icon ? <Glyph of={icon} color="ink2" /> : null}
      <View style={{ flex: 1 }}>
        <Text variant="subheading">{label}</Text>
        {note ? <Text variant="note" color="ink2">{note}</Text> : null}
      </View>
      <Glyph of={ChevronRight} color="ink2" />
    </Anchor>
  );
}

const styles = StyleSheet.create({
  link: { flexDirection: 'row', alignItems: 'center', gap: space[2], minHeight: targetPx, alignSelf: 'flex-start', maxWidth: '100%' },
  // A long e-mail address breaks rather than leaving its card.
  words: { flexShrink: 1, minWidth: 0 },
  pressed: { opacity: 0.7 },
  row: { flexDirection: 'row', alignItems: 'center', gap: space[3], minHeight: 60, paddingVertical: space[2], borderTopWidth: border.hair, borderColor: colors.rule },
});
