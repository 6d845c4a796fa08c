import type { ReactNode } from 'react';
import { View } from 'react-native';
import Svg, { Path, Rect } from 'react-native-svg';
import { colors, space } from '../theme/tokens';
import { Text } from './text';

/** Nothing here: the missing run, one bold line, one on what happens next, at most one action. */
export function EmptyState({ title, note, action }: { readonly title: string; readonly note: string; readonly action?: ReactNode }) {
  return (
    <View style={{ alignItems: 'center', gap: space[2], padding: space[6] }}>
      <Svg width={96} height={56} viewBox="0 0 96 56" aria-hidden>
        <Rect x={8} y={4} width={36} height={48} rx={8} fill="none" stroke={colors.edge} strokeWidth={2} strokeDasharray="5 4" />
        <Path d="M44 26h14a8 8 0 0 1 8 8v2a8 8 0 0 0 8 8h14" fill="none" stroke={colors.edge} strokeWidth={2} strokeDasharray="5 4" />
      </Svg>
      <Text variant="subheading" style={{ textAlign: 'center' }}>{title}</Text>
      <Text variant="note" color="ink2" style={{ textAlign: 'center' }}>{note}</Text>
      {action}
    </View>
  );
}
