import { View } from 'react-native';
import { cautions, type CautionId } from '../../shared/wizard/index';
import { useCompany } from '../api/use-company';
import { space } from '../theme/tokens';
import { CautionBox } from '../ui/caution-box';
import { Text } from '../ui/text';

/** The cautions of a group, before what they guard, in the approved words: what stops first, then the others in one box. */
export function CautionList({ ids }: { ids: readonly CautionId[] }) {
  const phone = useCompany().data?.phone ?? 'us';
  const levels = (['stop', 'caution'] as const).map((level) => ({ level, ids: ids.filter((id) => cautions[id].level === level) }));
  return levels.filter((entry) => entry.ids.length > 0).map(({ level, ids: same }) => (
    <CautionBox key={level} level={level}>
      <View style={{ gap: space[1] }}>
        {same.map((id) => <Text key={id} weight={600}>{cautions[id].words.replace('{phone}', phone)}</Text>)}
      </View>
    </CautionBox>
  ));
}
