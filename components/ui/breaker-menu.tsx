import { useEffect, useRef } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { colors, radius, shadow, space, targetPx } from '../theme/tokens';
import { Text } from './text';

const STATES = [{ state: false, label: 'No' }, { state: true, label: 'Yes' }, { state: null, label: 'Not sure' }] as const;

interface Props {
  readonly title: string;
  readonly state: boolean | null;
  readonly onPick: (state: boolean | null) => void;
  readonly onClose: () => void;
}

/** The three answers of one tile at once, so that pressing through them is never the only way. */
export function BreakerMenu({ title, state, onPick, onClose }: Props) {
  const items = useRef<(View | null)[]>([]);
  useEffect(() => {
    items.current[STATES.findIndex((entry) => entry.state === state)]?.focus();
  }, [state]);
  const key = (name: string, at: number) => {
    if (name === 'Escape' || name === 'Tab') onClose();
    const by = name === 'ArrowDown' ? 1 : name === 'ArrowUp' ? -1 : 0;
    if (by !== 0) items.current[(at + by + STATES.length) % STATES.length]?.focus();
    if (name === ' ') onPick(STATES[at]?.state ?? null);
    return by !== 0 || name === ' ' || name === 'Escape';
  };
  return (
    <View role="menu" aria-label={title} dataSet={{ surface: 'menu' }} style={styles.menu}>
      {STATES.map((entry, index) => (
        <Pressable
          key={entry.label}
          ref={(element) => { items.current[index] = element; }}
          role="menuitem"
          aria-label={entry.state === state ? `${entry.label}, chosen` : entry.label}
          onPress={() => onPick(entry.state)}
          onKeyDown={(event) => { if (key(event.key, index)) event.preventDefault(); }}
          style={({ pressed }) => [styles.item, pressed && { backgroundColor: colors.well }]}
        >
          <Text weight={entry.state === state ? 800 : 600} color={entry.state === state ? 'copper' : 'ink'}>{entry.label}</Text>
        </Pressable>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  menu: { position: 'absolute', top: '100%', left: 0, right: 0, marginTop: 4, zIndex: 5, borderRadius: radius.small, backgroundColor: colors.card, boxShadow: shadow.sheet, padding: 4 },
  item: { minHeight: targetPx, justifyContent: 'center', paddingHorizontal: space[3], borderRadius: radius.tag },
});
