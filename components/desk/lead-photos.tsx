import Search from 'lucide-react-native/icons/search';
import { Image, Pressable, StyleSheet, View } from 'react-native';
import type { Photo } from '../../shared/api/intakes';
import { photoSlots } from '../../shared/wizard/steps/photos';
import { verdictWords } from '../photos/photo-words';
import { border, colors, radius, space } from '../theme/tokens';
import { EmptyState } from '../ui/empty-state';
import { Glyph } from '../ui/glyph';
import { Text } from '../ui/text';

const slotOf = (photo: Photo) => photoSlots.find((slot) => slot.id === photo.slot);

export interface LeadPhotosProps {
  readonly photos: readonly Photo[];
  /** The slot whose photo is shown large. */
  readonly shown: string;
  readonly onShow: (slot: string) => void;
}

/** The homeowner's photos: one large, the others to pick from; large opens in full size beside the desk. */
export function LeadPhotos({ photos, shown, onShow }: LeadPhotosProps) {
  const large = photos.find((photo) => photo.slot === shown) ?? photos[0];
  if (!large) return <View style={styles.none}><EmptyState title="No photos" note="The homeowner sent none. The facts are as answered." /></View>;
  const slot = slotOf(large);
  const name = `Photo ${slot?.number ?? ''}, ${slot?.name ?? large.slot}`;
  return (
    <View style={{ gap: space[2] }}>
      <View style={styles.frame}>
        <Image source={{ uri: large.url }} role="img" aria-label={name} resizeMode="contain" style={StyleSheet.absoluteFill} />
        <View style={styles.plate}><Text variant="fine" weight={800}>{`Photo ${slot?.number ?? ''}`}</Text></View>
        <View role="link" href={large.url} hrefAttrs={{ target: 'blank', rel: 'noopener' }} aria-label={`Open ${name.toLowerCase()} in full size`} style={styles.full}>
          <Glyph of={Search} color="ink" />
        </View>
      </View>
      <View style={styles.words}>
        <Text variant="note" weight={800}>{slot?.name ?? large.slot}</Text>
        <Text variant="note" color={large.verdict === 'good' ? 'ok' : 'warn'} weight={700}>{verdictWords[large.verdict].replace(', retake', '')}</Text>
      </View>
      {photos.length > 1 ? (
        <View role="group" aria-label="Photos" style={styles.thumbs}>
          {photos.map((photo) => <Thumb key={photo.id} photo={photo} picked={photo.id === large.id} onPress={() => onShow(photo.slot)} />)}
        </View>
      ) : null}
    </View>
  );
}

function Thumb({ photo, picked, onPress }: { readonly photo: Photo; readonly picked: boolean; readonly onPress: () => void }) {
  const slot = slotOf(photo);
  return (
    <Pressable
      role="button" aria-pressed={picked} aria-label={`Show photo ${slot?.number ?? ''}, ${slot?.name ?? photo.slot}`} onPress={onPress}
      style={[styles.thumb, picked && styles.picked]}
    >
      <Image source={{ uri: photo.thumbUrl }} resizeMode="cover" style={styles.small} />
      <Text variant="fine" weight={picked ? 800 : 600} color={picked ? 'ink' : 'ink2'} numberOfLines={1}>{`${slot?.number ?? ''}`}</Text>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  none: { borderRadius: radius.button, borderWidth: border.hair, borderColor: colors.rule, backgroundColor: colors.card },
  frame: { aspectRatio: 1.4, width: '100%', borderRadius: radius.button, overflow: 'hidden', backgroundColor: colors.ink },
  plate: { position: 'absolute', left: 10, top: 10, borderRadius: radius.tag, backgroundColor: colors.card, paddingHorizontal: 10, paddingVertical: 4 },
  full: {
    position: 'absolute', right: 10, bottom: 10, width: 44, height: 44,
    borderRadius: radius.small, backgroundColor: colors.card, alignItems: 'center', justifyContent: 'center',
  },
  words: { flexDirection: 'row', justifyContent: 'space-between', gap: space[3] },
  thumbs: { flexDirection: 'row', gap: space[2] },
  thumb: {
    flex: 1, maxWidth: 96, gap: 2, alignItems: 'center', padding: 2,
    borderRadius: radius.small, borderWidth: border.chosen, borderColor: 'transparent',
  },
  picked: { borderColor: colors.copper },
  small: { width: '100%', height: 44, borderRadius: radius.tag, backgroundColor: colors.well },
});
