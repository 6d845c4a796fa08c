import type { Ref } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { BreakerHandle } from '../drawings/breaker-handle';
import { LoadGlyph } from '../drawings/load-glyphs';
import { colors, radius } from '../theme/tokens';
import { Text } from './text';

export interface Tile {
  /** Also names its glyph. */
  readonly id: string;
  readonly title: string;
  /** null: not sure. */
  readonly state: boolean | null;
  /** In place of "Yes": "50 A", "3 tons". */
  readonly stateWords?: string;
}

interface Props {
  readonly ref?: Ref<View>;
  readonly tile: Tile;
  readonly number: number;
  readonly onPress: () => void;
  readonly onMenu: () => void;
}

/** One load on the board: number, glyph, state in a word, handle, name. */
export function BreakerTile({ ref, tile, number, onPress, onMenu }: Props) {
  const { state } = tile;
  const words = state === true ? (tile.stateWords ?? 'Yes') : state === null ? 'Unsure' : 'No';
  const quiet = state === true ? 'copper' : state === null ? 'blade' : 'mist';
  return (
    <Pressable
      {...(ref ? { ref } : {})}
      role="checkbox"
      aria-checked={state === null ? 'mixed' : state}
      aria-label={`${tile.title}. ${state === null ? 'Not sure' : words}`}
      aria-haspopup="menu"
      onPress={onPress}
      onLongPress={onMenu}
      onKeyDown={(event) => {
        const menu = event.key === 'ContextMenu' || (event.key === 'F10' && event.shiftKey);
        if (!menu && event.key !== ' ') return;
        event.preventDefault();
        if (menu) onMenu();
        else onPress();
      }}
      style={({ pressed }) => [styles.tile, state ? styles.on : styles.off, state === null && styles.unsure, pressed && styles.pressed]}
    >
      <View style={styles.line}>
        <View dataSet={{ part: 'load-number' }} style={[styles.number, { backgroundColor: state === true ? colors.spruce : colors.spruceDeep }]}>
          <Text variant="fine" weight={800} color={state === true ? 'paper' : 'mist'}>{String(number)}</Text>
        </View>
        <View dataSet={{ part: 'load-glyph' }}><LoadGlyph id={tile.id} color={state === true ? 'copper' : 'mist'} /></View>
        <Text variant="fine" weight={800} color={quiet} style={styles.words} numberOfLines={1}>{words}</Text>
        <BreakerHandle state={state === null ? 'unsure' : state ? 'on' : 'off'} dark={state !== true} />
      </View>
      <Text variant="note" weight={700} color={state === true ? 'ink' : 'paper'} style={styles.title}>{tile.title}</Text>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  tile: { minHeight: 58, borderRadius: radius.small, paddingHorizontal: 7, paddingVertical: 6, gap: 2, borderWidth: 2, justifyContent: 'center', flexGrow: 1 },
  on: { backgroundColor: colors.paper, borderColor: colors.paper },
  off: { backgroundColor: colors.breakerOff, borderColor: colors.breakerOff },
  unsure: { borderColor: colors.edgeDark },
  pressed: { opacity: 0.85 },
  line: { flexDirection: 'row', alignItems: 'center', gap: 5 },
  number: { minWidth: 20, height: 20, borderRadius: 5, alignItems: 'center', justifyContent: 'center', paddingHorizontal: 3 },
  words: { flex: 1, minWidth: 0 },
  title: { paddingLeft: 26, fontSize: 15 },
});
