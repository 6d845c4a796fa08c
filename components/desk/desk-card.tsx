import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { border, colors, radius, space } from '../theme/tokens';
import { Text } from '../ui/text';

export interface DeskCardProps {
  /** Engraved on its plate; the card's heading. */
  readonly title: string;
  /** At the right of the plate: a count, an edition. */
  readonly aside?: string;
  readonly children: ReactNode;
}

/** One part of a desk page, named by a plate that is its heading of level 2. */
export function DeskCard({ title, aside, children }: DeskCardProps) {
  return (
    <View role="region" aria-label={title} style={styles.card}>
      <View style={styles.head}>
        <View style={styles.plate}><Text variant="plate" color="paper" level={2}>{title}</Text></View>
        {aside ? <Text variant="note" weight={700} color="ink2" style={{ flexShrink: 1 }}>{aside}</Text> : null}
      </View>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    gap: space[3], padding: 14, minWidth: 0,
    borderRadius: radius.button, borderWidth: border.hair, borderColor: colors.rule, backgroundColor: colors.card,
  },
  head: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: space[3] },
  plate: { borderRadius: radius.plate, backgroundColor: colors.spruce, paddingHorizontal: 10 },
});
