import { View } from 'react-native';
import type { Photo } from '../../shared/api/intakes';
import type { Narrowing } from '../../shared/quote';
import type { photoSlots } from '../../shared/wizard/index';
import { PhotoSlot, type PhotoState } from '../ui/photo-slot';
import { TextButton } from '../ui/text-button';
import { slotWorth, verdictHelp, verdictWords, worthWords } from './photo-words';
import { useSlotPhoto, type SlotPhoto } from './use-slot-photo';

interface Props {
  readonly slot: (typeof photoSlots)[number];
  readonly photo: Photo | undefined;
  readonly narrowing: readonly Narrowing[];
  /** Its picture would narrow the range most. */
  readonly wanted: boolean;
}

/** One place for a photo: take or choose, see it arrive, keep, retake or take it back. */
export function PhotoPlace({ slot, photo, narrowing, wanted }: Props) {
  const work = useSlotPhoto(slot.id, photo);
  const worth = slotWorth(slot.id, narrowing);
  const hint = photo ? (photo.verdict === 'good' ? undefined : verdictHelp[photo.verdict]) : worth === null ? slot.hint : `${slot.hint} ${worthWords(worth)}.`;
  return (
    <View style={{ flex: 1, minWidth: 0 }}>
      <View style={{ flexDirection: 'row', flexGrow: 1 }}>
        <PhotoSlot
          slot={slot.id} number={slot.number} title={slot.name} wanted={wanted}
          state={stateOf(work, photo)} percent={work.percent ?? 0}
          thumbUrl={photo?.thumbUrl ?? null}
          {...(work.failure ?? hint ? { hint: work.failure ?? hint ?? '' } : {})}
          {...(work.failure ? { verdict: 'Not sent' } : photo ? { verdict: verdictWords[photo.verdict] } : {})}
          onTake={() => work.take('camera')}
          onChoose={() => work.take('files')}
          onRemove={work.remove}
        />
      </View>
      {work.canRepeat ? <TextButton variant="note" label="Try again" spokenLabel={`Try photo ${slot.number} again`} onPress={work.again} /> : null}
    </View>
  );
}

function stateOf(work: SlotPhoto, photo: Photo | undefined): PhotoState {
  if (work.percent !== null || work.removing) return 'sending';
  if (work.failure) return 'refused';
  return photo ? (photo.verdict === 'good' ? 'good' : 'poor') : 'empty';
}
