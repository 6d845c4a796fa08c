import { useEffect } from 'react';
import { View } from 'react-native';
import { photoSlots } from '../../shared/wizard/index';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/use-breakpoint';
import { Text } from '../ui/text';
import { useWizard } from '../wizard/wizard-context';
import { mostWanted } from './photo-words';
import { PhotoPlace } from './photo-place';
import { readyPickers } from './pick-photo';

/** The five places for photos, each with what it is worth. */
export default function PhotosBoard() {
  const { intake } = useWizard();
  const columns = useBreakpoint() === 'phone' ? 2 : 3;
  useEffect(() => { void readyPickers(); }, []);
  const photos = intake?.photos ?? [];
  const wanted = mostWanted(intake?.range.narrowing ?? [], new Set(photos.map((photo) => photo.slot)));
  const rowCount = Math.ceil(photoSlots.length / columns);
  const rows = Array.from({ length: rowCount }, (_, row) => photoSlots.slice(row * columns, (row + 1) * columns));
  return (
    <View style={{ gap: space[3] }}>
      {rows.map((row) => (
        <View key={row[0]?.id} style={{ flexDirection: 'row', gap: space[3] }}>
          {row.map((slot) => (
            <PhotoPlace
              key={slot.id} slot={slot} wanted={slot.id === wanted} narrowing={intake?.range.narrowing ?? []}
              photo={photos.findLast((photo) => photo.slot === slot.id)}
            />
          ))}
          {Array.from({ length: columns - row.length }, (_, index) => <View key={index} style={{ flex: 1 }} />)}
        </View>
      ))}
      <Text variant="note" color="ink2">Where a picture was taken is removed before it is kept. Only the electrician sees them.</Text>
    </View>
  );
}
