import CalendarDays from 'lucide-react-native/icons/calendar-days';
import Check from 'lucide-react-native/icons/check';
import Clock from 'lucide-react-native/icons/clock';
import Contrast from 'lucide-react-native/icons/contrast';
import Mail from 'lucide-react-native/icons/mail';
import OctagonAlert from 'lucide-react-native/icons/octagon-alert';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { StyleSheet, View } from 'react-native';
import { colors, radius } from '../theme/tokens';
import { Glyph } from './glyph';
import { Text } from './text';

const LOOKS = {
  'check-photos': { icon: Contrast, ink: 'copper', wash: colors.card },
  waiting: { icon: TriangleAlert, ink: 'warn', wash: colors.warnWash },
  sent: { icon: Mail, ink: 'lake', wash: colors.lakeWash },
  accepted: { icon: Check, ink: 'ok', wash: colors.okWash },
  booked: { icon: CalendarDays, ink: 'ok', wash: colors.okWash },
  visit: { icon: OctagonAlert, ink: 'stop', wash: colors.stopWash },
  quiet: { icon: Clock, ink: 'ink2', wash: colors.well },
  good: { icon: Check, ink: 'ok', wash: colors.okWash },
  look: { icon: TriangleAlert, ink: 'warn', wash: colors.warnWash },
  bad: { icon: OctagonAlert, ink: 'stop', wash: colors.stopWash },
} as const;
export type StatusKind = keyof typeof LOOKS;

/** A state in a glyph and a word: never by color alone, never a button. */
export function StatusTag({ kind, label }: { readonly kind: StatusKind; readonly label: string }) {
  const { icon, ink, wash } = LOOKS[kind];
  return (
    <View style={[styles.tag, { backgroundColor: wash }, kind === 'check-photos' && styles.outlined]}>
      <Glyph of={icon} size={16} color={ink} />
      <Text variant="fine" weight={700} color={ink} numberOfLines={1}>{label}</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  tag: { flexDirection: 'row', alignSelf: 'flex-start', alignItems: 'center', gap: 6, minHeight: 26, paddingHorizontal: 10, borderRadius: radius.tag },
  outlined: { borderWidth: 1.5, borderColor: colors.copper },
});
