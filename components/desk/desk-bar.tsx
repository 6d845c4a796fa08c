import { StyleSheet, View } from 'react-native';
import { deskPages, roleWords } from '../../shared/roles';
import type { Session } from '../../shared/api/desk';
import { BrandMark } from '../drawings/brand-mark';
import { colors, space } from '../theme/tokens';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { LeaveButton, type Leave } from './leave-button';

/** The rail of a phone: a bar on top with the pages, who is signed in, and the way out. */
export function DeskBar({ session, leave }: { readonly session: Session; readonly leave: Leave }) {
  return (
    <View role="banner" dataSet={{ surface: 'spruce' }} style={styles.bar}>
      <BrandMark size={32} light />
      <View role="navigation" aria-label="Desk" style={styles.pages}>
        {deskPages.filter((page) => page.roles.includes(session.role)).map((page) => (
          <Link key={page.id} label={page.title} href={page.href} color="paper" />
        ))}
      </View>
      <View style={styles.who}>
        <Text variant="fine" weight={800} color="paper" numberOfLines={1}>{session.name}</Text>
        <Text variant="fine" color="mist" numberOfLines={1}>{roleWords[session.role]}</Text>
      </View>
      <LeaveButton leave={leave} folded />
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row', alignItems: 'center', gap: space[3], minHeight: 60,
    paddingLeft: space[4], paddingRight: space[2], backgroundColor: colors.spruce,
  },
  pages: { flexDirection: 'row', gap: space[4], flexGrow: 1 },
  who: { alignItems: 'flex-end', flexShrink: 1, minWidth: 0 },
});
