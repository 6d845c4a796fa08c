import { StyleSheet, View } from 'react-native';
import Svg, { G } from 'react-native-svg';
import { Conduit } from '../drawings/conduit';
import { RunBox, type RunState } from '../drawings/run-parts';
import { colors, space, type ColorName } from '../theme/tokens';
import { Text } from './text';

export interface TimelineItem {
  readonly key: string;
  readonly title: string;
  readonly note?: string;
  readonly state: RunState;
  /** Of the second line: copper for a promise with a time. */
  readonly tone?: ColorName;
}

const BEFORE = 20;
const AFTER = 44;
const MARK = 24;

/** The run as a timeline: what is done in copper, the present one where the pipe jogs out, the rest in outline. */
export function RunTimeline({ label, items }: { readonly label: string; readonly items: readonly TimelineItem[] }) {
  const now = items.findIndex((item) => item.state === 'now');
  return (
    <View role="list" aria-label={label}>
      {items.map((item, index) => (
        <View key={item.key} role="listitem" aria-current={item.state === 'now' ? 'step' : undefined} style={styles.row}>
          <Pipe
            state={item.state} first={index === 0} last={index === items.length - 1} jogs={index === now && index > 0}
            x={now > 0 && index >= now ? AFTER : BEFORE}
          />
          <View style={styles.words}>
            <Text variant="subheading">{item.title}</Text>
            {item.note ? <Text variant="note" color={item.tone ?? 'ink2'} weight={item.tone ? 800 : 600}>{item.note}</Text> : null}
          </View>
        </View>
      ))}
    </View>
  );
}

/** The piece of pipe beside one row. Only its straight part grows with the row. */
function Pipe({ state, first, last, jogs, x }: { state: RunState; first: boolean; last: boolean; jogs: boolean; x: number }) {
  const y = jogs ? MARK + 14 : MARK;
  const done = state === 'done';
  const straight = [styles.straight, { left: x - 5 }, done && styles.copper];
  return (
    <View aria-hidden style={styles.column}>
      {last ? null : <View style={[straight, { top: y, bottom: 0 }]} />}
      {first || jogs ? null : <View style={[straight, { top: 0, height: y }]} />}
      <Svg width={64} height={60} style={{ position: 'absolute' }}>
        <G>
          {jogs ? <Conduit d={`M${BEFORE} -2a12 12 0 0 0 12 12a12 12 0 0 1 12 12V${y}`} width={10} /> : null}
          <RunBox x={x} y={y} state={state} mark="" />
        </G>
      </Svg>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', minHeight: 64 },
  column: { width: 64 },
  straight: { position: 'absolute', width: 10, borderLeftWidth: 1.5, borderRightWidth: 1.5, backgroundColor: colors.card, borderColor: colors.edge },
  copper: { backgroundColor: colors.live, borderColor: colors.copperDeep },
  words: { flex: 1, paddingTop: 11, paddingBottom: space[3] },
});
