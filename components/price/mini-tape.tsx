import { StyleSheet, View } from 'react-native';
import { dollars, spokenRange } from '../../shared/money';
import { colors } from '../theme/tokens';
import { placeOn, wizardScale } from './tape-scale';

interface MiniTapeProps {
  readonly lowCents: number;
  readonly highCents: number;
  readonly firmCents?: number | null;
}

/** A range as a short tape for tables, the firm price as an ink bar; the numbers stand beside it. */
export function MiniTape({ lowCents, highCents, firmCents = null }: MiniTapeProps) {
  const [from, to] = [placeOn(wizardScale, lowCents), placeOn(wizardScale, highCents)];
  return (
    <View role="img" aria-label={`Range ${spokenRange(lowCents, highCents)}${firmCents === null ? '' : `, firm price ${dollars(firmCents)}`}`} style={styles.tape}>
      <View style={styles.scale}>
        {[100_000, 200_000, 300_000, 400_000].map((cents) => <View key={cents} style={[styles.tick, { left: `${placeOn(wizardScale, cents)}%` }]} />)}
        <View style={[styles.segment, { left: `${from}%`, right: `${100 - to}%` }]} />
        {firmCents === null ? null : <View style={[styles.firm, { left: `${placeOn(wizardScale, firmCents)}%` }]} />}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  tape: { width: '100%', minWidth: 96, height: 18, justifyContent: 'center' },
  scale: { height: 13, marginHorizontal: 2, backgroundColor: colors.blade, borderWidth: 1, borderColor: '#B99A4A', borderRadius: 2 },
  tick: { position: 'absolute', top: 0, width: 1.5, height: 5, backgroundColor: colors.ink },
  segment: { position: 'absolute', bottom: 0, height: 11, minWidth: 4, borderBottomWidth: 5, borderLeftWidth: 2, borderRightWidth: 2, borderColor: colors.copper },
  firm: { position: 'absolute', top: -2, bottom: -2, width: 3, marginLeft: -1.5, backgroundColor: colors.ink },
});
