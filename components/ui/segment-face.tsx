import { View } from 'react-native';
import { colors, radius, space } from '../theme/tokens';
import { Text } from './text';

export const segmentFrame = { flexDirection: 'row', backgroundColor: colors.well, borderRadius: radius.field, padding: 4 } as const;

/** One part of a segmented control. */
export function SegmentFace({ label, chosen }: { readonly label: string; readonly chosen: boolean }) {
  return (
    <View style={{ minHeight: 44, flexGrow: 1, alignItems: 'center', justifyContent: 'center', paddingHorizontal: space[2], borderRadius: radius.small, backgroundColor: chosen ? colors.ink : 'transparent' }}>
      <Text variant="note" weight={800} color={chosen ? 'paper' : 'ink2'} style={{ fontSize: 15 }}>{label}</Text>
    </View>
  );
}
