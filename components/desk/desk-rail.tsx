import { usePathname } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import type { Session } from '../../shared/api/desk';
import { deskPages, roleWords } from '../../shared/roles';
import { useCompany } from '../api/use-company';
import { useLeadCounts } from '../api/use-leads';
import { BrandMark } from '../drawings/brand-mark';
import { border, colors, radius, space } from '../theme/tokens';
import { Text } from '../ui/text';
import { LeaveButton, type Leave } from './leave-button';
import { RailTile } from './rail-tile';

/** The desk's pages as breakers on a bus, who is signed in, and the way out. `folded`: 72 px, numbers alone. */
export function DeskRail({ session, leave, folded }: { readonly session: Session; readonly leave: Leave; readonly folded: boolean }) {
  const company = useCompany().data;
  const counts = useLeadCounts().data;
  const path = usePathname();
  const open = counts?.reduce((sum, { stage, count }) => (stage === 'closed' ? sum : sum + count), 0);
  const initials = session.name.split(/\s+/).map((word) => word.charAt(0)).slice(0, 2).join('');
  return (
    <View role="banner" dataSet={{ part: 'rail', surface: 'spruce' }} style={[styles.rail, folded && styles.folded]}>
      <View style={styles.brand}>
        <BrandMark size={36} light />
        {folded ? null : (
          <View style={styles.words}>
            <Text variant="subheading" color="paper">Tidyrun desk</Text>
            <Text variant="fine" color="mist" numberOfLines={1}>{company?.name ?? ' '}</Text>
          </View>
        )}
      </View>
      <View role="navigation" aria-label="Desk" style={[styles.pages, folded && styles.close]}>
        {folded ? null : <View aria-hidden style={styles.bus} />}
        {deskPages.filter((page) => page.roles.includes(session.role)).map((page, index) => (
          <RailTile
            key={page.id} number={index + 1} title={page.title} href={page.href} count={open}
            current={path.startsWith(page.href)} folded={folded}
          />
        ))}
        {folded ? null : <View aria-hidden style={styles.blank} />}
        {folded ? null : <View aria-hidden style={styles.blank} />}
      </View>
      <View style={styles.foot}>
        <View style={styles.person}>
          <View aria-hidden style={styles.initials}><Text variant="note" weight={800} color="copper">{initials}</Text></View>
          {folded ? null : (
            <View style={styles.words}>
              <Text variant="note" weight={800} color="paper">{session.name}</Text>
              <Text variant="fine" color="mist">{roleWords[session.role]}</Text>
            </View>
          )}
        </View>
        <LeaveButton leave={leave} folded={folded} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  rail: { width: 212, backgroundColor: colors.spruce, paddingTop: space[4], paddingBottom: space[4], gap: space[4] },
  folded: { width: 72 },
  brand: { flexDirection: 'row', alignItems: 'center', gap: 10, paddingHorizontal: 18 },
  words: { flexShrink: 1, minWidth: 0 },
  pages: { gap: space[2], paddingLeft: 14, paddingRight: 48, flexGrow: 1 },
  close: { paddingRight: 14 },
  bus: {
    position: 'absolute', right: 34, top: 8, height: 200, width: 8,
    borderRadius: 4, backgroundColor: colors.live, borderWidth: 1, borderColor: colors.copperDeep,
  },
  blank: { height: 52, borderRadius: radius.small, borderWidth: border.control, borderStyle: 'dashed', borderColor: colors.edgeDark, opacity: 0.6 },
  foot: { gap: space[2], marginHorizontal: 14, paddingTop: space[3], borderTopWidth: border.hair, borderColor: colors.breakerOff },
  person: { flexDirection: 'row', alignItems: 'center', gap: 10 },
  initials: {
    width: 36, height: 36, borderRadius: radius.small, backgroundColor: colors.copperWash, alignItems: 'center', justifyContent: 'center',
  },
});
