import { useRef, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { BreakerMenu } from './breaker-menu';
import { BreakerTile, type Tile } from './breaker-tile';

export interface BreakerBoardProps {
  /** What is asked, for screen readers. */
  readonly label: string;
  readonly tiles: readonly Tile[];
  readonly onChange: (id: string, present: boolean | null) => void;
}

/** No, Yes, Not sure, and again. */
const after = (state: boolean | null): boolean | null => (state === false ? true : state === true ? null : false);

/**
 * The panel as a form: odd tiles left, even right of a copper bus. A press goes to the next state; a long press or the menu key
 * offers all three at once.
 */
export function BreakerBoard({ label, tiles, onChange }: BreakerBoardProps) {
  const [menuFor, setMenuFor] = useState<string | null>(null);
  const places = useRef(new Map<string, View | null>());
  const closeMenu = (id: string) => {
    setMenuFor(null);
    places.current.get(id)?.focus();
  };
  const rows = Array.from({ length: Math.ceil(tiles.length / 2) }, (_, row) => tiles.slice(row * 2, row * 2 + 2));
  return (
    <View role="group" aria-label={label} dataSet={{ surface: 'spruce' }} style={styles.board}>
      <View aria-hidden style={styles.bus} />
      {rows.map((pair, row) => (
        <View key={pair[0]?.id} style={[styles.row, pair.some((tile) => tile.id === menuFor) && { zIndex: 2 }]}>
          {pair.map((tile, side) => (
            <View key={tile.id} style={styles.half}>
              {tile.state === true ? <View aria-hidden style={[styles.jumper, side === 0 ? { right: -12 } : { left: -12 }]} /> : null}
              <BreakerTile
                ref={(element) => { places.current.set(tile.id, element); }}
                tile={tile}
                number={row * 2 + side + 1}
                onPress={() => onChange(tile.id, after(tile.state))}
                onMenu={() => setMenuFor(tile.id)}
              />
              {menuFor === tile.id ? (
                <BreakerMenu
                  title={tile.title}
                  state={tile.state}
                  onClose={() => closeMenu(tile.id)}
                  onPick={(state) => { closeMenu(tile.id); onChange(tile.id, state); }}
                />
              ) : null}
            </View>
          ))}
          {pair.length === 1 ? <View style={styles.half} /> : null}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  board: { backgroundColor: colors.spruce, borderRadius: radius.card, padding: 10, gap: space[2] },
  bus: {
    position: 'absolute', top: 14, bottom: 14, left: '50%', marginLeft: -4, width: 8, borderRadius: 4, backgroundColor: colors.live, borderWidth: 1,
    borderColor: colors.copperDeep,
  },
  row: { flexDirection: 'row', gap: 24 },
  half: { flex: 1, minWidth: 0 },
  jumper: { position: 'absolute', top: 26, width: 12, height: 8, backgroundColor: colors.liveDark },
});
