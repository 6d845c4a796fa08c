import Camera from 'lucide-react-native/icons/camera';
import { StyleSheet, View } from 'react-native';
import { BreakerHandle, type HandleState } from '../drawings/breaker-handle';
import { border, colors, radius, space } from '../theme/tokens';
import type { ChoiceOption } from './choice-options';
import { Glyph } from './glyph';
import { Text } from './text';

export interface ChoiceFaceProps {
  readonly option: Pick<ChoiceOption, 'label' | 'note' | 'figure' | 'tag' | 'details'>;
  readonly chosen: boolean;
  /** "Not sure": dashed, no handle. */
  readonly unsure?: boolean;
  readonly photo?: boolean;
  readonly layout?: 'row' | 'tall';
}

/** What a choice card looks like. Chosen changes place of the handle, shape, weight of the outline and color together. */
export function ChoiceFace({ option, chosen, unsure = false, photo = false, layout = 'row' }: ChoiceFaceProps) {
  const handle: HandleState = chosen ? 'on' : 'off';
  const tall = layout === 'tall';
  return (
    <View style={[styles.card, tall && styles.tall, unsure && styles.unsure, chosen && (unsure ? styles.unsureChosen : styles.chosen)]}>
      <View style={styles.words}>
        {option.tag ? <Text variant="fine" color="copper" weight={800}>{option.tag}</Text> : null}
        <View style={styles.line}>
          <Text variant="subheading" style={styles.label}>{option.label}</Text>
          {option.figure && !tall ? <Text variant="subheading">{option.figure}</Text> : null}
        </View>
        {option.figure && tall ? <Text variant="figure" style={styles.figure}>{option.figure}</Text> : null}
        {option.note ? <Text variant="note" color="ink2" weight={500}>{option.note}</Text> : null}
        {option.details}
      </View>
      {unsure ? (photo ? <Glyph of={Camera} color="ink2" /> : null) : <BreakerHandle state={handle} />}
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    flexGrow: 1, flexShrink: 1, minWidth: 0, minHeight: 52, flexDirection: 'row', alignItems: 'center', gap: space[3], backgroundColor: colors.card, borderRadius: radius.button,
    // The widest outline is always reserved, so that choosing moves nothing.
    borderWidth: border.control, margin: 1, borderColor: colors.edge, paddingHorizontal: 14, paddingVertical: space[2],
  },
  tall: { alignItems: 'flex-start', paddingVertical: 14 },
  chosen: { borderWidth: border.chosen, margin: 0, borderColor: colors.copper, backgroundColor: colors.copperWash },
  unsure: { backgroundColor: 'transparent', borderWidth: 2, borderStyle: 'dashed', margin: 0.5 },
  unsureChosen: { borderColor: colors.ink, borderWidth: border.chosen, margin: 0, backgroundColor: colors.well },
  words: { flex: 1, minWidth: 0 },
  line: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', columnGap: space[2] },
  label: { flexShrink: 1, fontSize: 17 },
  figure: { fontSize: 22, lineHeight: 30 },
});
