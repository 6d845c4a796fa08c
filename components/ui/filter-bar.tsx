import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { border, colors, radius, space, targetPx } from '../theme/tokens';
import { Text } from './text';

export interface FilterBarProps {
  /** What is being picked, for screen readers: "Stage". */
  readonly label: string;
  readonly views: readonly { readonly value: string; readonly label: string; readonly count?: number }[];
  readonly value: string;
  readonly onChange: (value: string) => void;
  /** At the right: search, sort. */
  readonly children?: ReactNode;
}

/** Counted views as chips; the chosen one is filled. Arrow keys move between them. */
export function FilterBar({ label, views, value, onChange, children }: FilterBarProps) {
  const at = Math.max(0, views.findIndex((view) => view.value === value));
  const move = (by: number) => {
    const next = views[(at + by + views.length) % views.length];
    if (next) onChange(next.value);
  };
  return (
    <View style={styles.bar}>
      <View
        role="radiogroup" aria-label={label} style={styles.views}
        onKeyDown={(event) => {
          const by = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 }[event.key];
          if (by) { event.preventDefault(); move(by); }
        }}
      >
        {views.map((view, index) => {
          const chosen = index === at;
          return (
            <Pressable key={view.value} role="radio" aria-checked={chosen} tabIndex={chosen ? 0 : -1} onPress={() => onChange(view.value)}
              style={({ pressed }) => [styles.chip, chosen && styles.chosen, pressed && !chosen && { backgroundColor: colors.well }]}>
              <Text variant="note" weight={800} color={chosen ? 'paper' : 'ink'} style={{ fontSize: 15 }}>{view.label}</Text>
              {view.count === undefined ? null : <Text variant="note" weight={700} color={chosen ? 'mist' : 'ink2'} style={{ fontSize: 15 }}>{String(view.count)}</Text>}
            </Pressable>
          );
        })}
      </View>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', justifyContent: 'space-between', gap: space[3] },
  views: { flexDirection: 'row', flexWrap: 'wrap', gap: space[2], flexShrink: 1, minWidth: 0 },
  chip: { flexDirection: 'row', alignItems: 'center', gap: space[2], minHeight: targetPx, paddingHorizontal: 14, borderRadius: radius.small, borderWidth: border.control, borderColor: colors.edge, backgroundColor: colors.card },
  chosen: { backgroundColor: colors.ink, borderColor: colors.ink },
});
