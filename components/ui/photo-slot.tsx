import Camera from 'lucide-react-native/icons/camera';
import { Image, StyleSheet, View } from 'react-native';
import { PhotoGhost } from '../drawings/photo-ghost';
import { border, colors, radius, space } from '../theme/tokens';
import { Button } from './button';
import { NumberBox } from './number-box';
import { StatusTag } from './status-tag';
import { Text } from './text';
import { TextButton } from './text-button';

export type PhotoState = 'empty' | 'sending' | 'good' | 'poor' | 'refused' | 'waiting';

export interface PhotoSlotProps {
  /** Names the ghost: panel, label, wall, way, meter. */
  readonly slot: string;
  readonly number: number;
  readonly title: string;
  readonly state: PhotoState;
  readonly thumbUrl?: string | null;
  /** 0 to 100 while sending. */
  readonly percent?: number;
  /** How to take it, or how much it is worth. */
  readonly hint?: string;
  /** The verdict, or why it was refused: "Sharp", "Too dark, retake". */
  readonly verdict?: string;
  /** The one that would narrow the range most. */
  readonly wanted?: boolean;
  readonly onTake: () => void;
  /** From the files of this device. */
  readonly onChoose?: () => void;
  readonly onRemove?: () => void;
}

const TAGS = { good: 'good', poor: 'look', refused: 'bad', waiting: 'quiet' } as const;

/** A place for one photo: frame with a ghost, one action, a verdict that never blocks. */
export function PhotoSlot({
  slot, number, title, state, thumbUrl, percent = 0, hint, verdict, wanted = false, onTake, onChoose, onRemove,
}: PhotoSlotProps) {
  const empty = state === 'empty' || state === 'refused';
  const name = `photo ${number}, ${title.toLowerCase()}`;
  return (
    <View role="group" aria-label={`Photo ${number}: ${title}`} style={[styles.slot, wanted && empty && styles.wanted, state === 'poor' && styles.poor]}>
      <View style={[styles.frame, empty && !wanted && styles.dashed]}>
        {thumbUrl ? <Image source={{ uri: thumbUrl }} role="img" aria-label={title} style={StyleSheet.absoluteFill} resizeMode="cover" /> : <PhotoGhost slot={slot} wanted={wanted} />}
      </View>
      <View style={styles.name}>
        <NumberBox n={number} />
        <Text variant="note" weight={800} style={styles.title}>{title}</Text>
      </View>
      {state === 'sending' ? (
        <View style={{ gap: 4 }}>
          <View role="progressbar" aria-label={`Sending ${name}`} aria-valuemin={0} aria-valuemax={100} aria-valuenow={percent} style={styles.track}>
            <View style={[styles.fill, { width: `${percent}%` }]} />
          </View>
          <Text variant="note" weight={800}>{`${percent}%`}</Text>
        </View>
      ) : null}
      <View role="status">{verdict && state !== 'sending' && state !== 'empty' ? <StatusTag kind={TAGS[state]} label={verdict} /> : null}</View>
      {hint ? <Text variant="note" weight={500} color="ink2">{hint}</Text> : null}
      <View style={styles.actions}>
        {state === 'sending' || state === 'good' ? null : (
          <Button kind={wanted && empty ? 'filled' : 'quiet'} size="desk" icon={Camera} label={empty ? 'Take photo' : 'Retake'} spokenLabel={`${empty ? 'Take' : 'Retake'} ${name}`} onPress={onTake} />
        )}
        {onChoose && empty ? <TextButton variant="note" label="Choose a file" spokenLabel={`Choose a file for ${name}`} onPress={onChoose} /> : null}
        {onRemove && !empty && state !== 'sending' ? <TextButton variant="note" label="Remove" spokenLabel={`Remove ${name}`} onPress={onRemove} /> : null}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  slot: {
    flexGrow: 1, flexBasis: 0, minWidth: 0, gap: space[2], padding: space[2], borderRadius: radius.button, backgroundColor: colors.card,
    borderWidth: border.chosen, borderColor: colors.rule,
  },
  wanted: { borderColor: colors.copper, backgroundColor: colors.copperWash },
  poor: { borderColor: colors.warn },
  frame: { height: 104, borderRadius: radius.small, overflow: 'hidden', backgroundColor: colors.card },
  dashed: { borderWidth: 2, borderStyle: 'dashed', borderColor: colors.edge },
  name: { flexDirection: 'row', gap: space[2], alignItems: 'flex-start' },
  title: { flex: 1, fontSize: 15 },
  track: { height: 6, borderRadius: 3, backgroundColor: colors.well, overflow: 'hidden' },
  fill: { height: 6, backgroundColor: colors.copper },
  actions: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space[4], marginTop: 'auto' },
});
