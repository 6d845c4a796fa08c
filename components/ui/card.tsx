import type { ReactNode } from 'react';
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native';
import { border, colors, radius } from '../theme/tokens';

export interface CardProps {
  /** spruce is the panel: only the price card, the board and the rail. */
  readonly tone?: 'card' | 'spruce' | 'lake' | 'warn';
  readonly padded?: boolean;
  readonly style?: StyleProp<ViewStyle>;
  readonly children: ReactNode;
}

const tones = StyleSheet.create({
  card: { backgroundColor: colors.card, borderWidth: border.hair, borderColor: colors.rule },
  spruce: { backgroundColor: colors.spruce, borderRadius: radius.sheet },
  lake: { backgroundColor: colors.lakeWash },
  warn: { backgroundColor: colors.warnWash },
});

/** A surface. Paper lies flat: no shadow. */
export function Card({ tone = 'card', padded = true, style, children }: CardProps) {
  return (
    <View
      dataSet={{ surface: tone, ...(padded ? { padded: 'yes' } : {}) }}
      style={[styles.card, tones[tone], padded && styles.padded, style]}
    >
      {children}
    </View>
  );
}

const styles = StyleSheet.create({ card: { borderRadius: radius.card }, padded: { padding: 16 } });
