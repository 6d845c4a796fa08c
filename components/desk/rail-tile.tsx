import { StyleSheet, View } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { Anchor } from '../ui/anchor';
import { Text } from '../ui/text';

export interface RailTileProps {
  readonly number: number;
  readonly title: string;
  readonly href: string;
  /** How many wait there; undefined while it is not known. */
  readonly count: number | undefined;
  readonly current: boolean;
  readonly folded: boolean;
}

/** One page as a breaker; the current one is joined to the bus. */
export function RailTile({ number, title, href, count, current, folded }: RailTileProps) {
  const counted = count === undefined ? '' : String(count);
  return (
    <View>
      {folded ? null : <View aria-hidden style={[styles.join, current && styles.joined]} />}
      <Anchor
        href={href} current={current ? 'page' : undefined} spokenLabel={folded ? `${number} ${title}` : undefined}
        style={({ pressed }) => [styles.tile, current ? styles.current : styles.other, folded && styles.folded, pressed && styles.pressed]}
      >
        <View style={[styles.number, { backgroundColor: current ? colors.spruce : colors.spruceDeep }]}>
          <Text variant="fine" weight={800} color="paper">{String(number)}</Text>
        </View>
        {folded ? null : <Text variant="note" weight={800} color={current ? 'ink' : 'paper'} style={{ flexGrow: 1 }}>{title}</Text>}
        {folded ? null : <Text variant="note" weight={800} color={current ? 'ink' : 'mist'}>{counted}</Text>}
      </Anchor>
    </View>
  );
}

const styles = StyleSheet.create({
  tile: { flexDirection: 'row', alignItems: 'center', gap: 10, minHeight: 52, borderRadius: radius.small, paddingHorizontal: 10 },
  current: { backgroundColor: colors.paper },
  other: { backgroundColor: colors.breakerOff },
  folded: { width: 44, justifyContent: 'center', paddingHorizontal: 0 },
  pressed: { opacity: 0.85 },
  number: { minWidth: 24, height: 24, borderRadius: radius.plate, alignItems: 'center', justifyContent: 'center', paddingHorizontal: space[1] },
  join: { position: 'absolute', right: -8, top: 20, width: 8, height: 12, backgroundColor: colors.spruceDeep },
  joined: { backgroundColor: colors.copperPale },
});
