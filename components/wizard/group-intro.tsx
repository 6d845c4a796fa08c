import { View } from 'react-native';
import type { Group } from '../../shared/wizard/index';
import { space } from '../theme/tokens';
import { CautionList } from './caution-list';
import { GroupDrawing } from './group-drawing';

interface Props {
  readonly group: Group;
  /** Cautions that stand on this page already. */
  readonly shown?: readonly string[];
}

/** What stands between a group's title and its questions: the picture that helps, and the cautions that come first. */
export function GroupIntro({ group, shown = [] }: Props) {
  const cautions = (group.cautions ?? []).filter((id) => !shown.includes(id));
  const drawing = group.drawing === 'panel' || group.drawing === 'car' ? group.drawing : null;
  if (!drawing && cautions.length === 0) return null;
  return (
    <View style={{ gap: space[3] }}>
      {drawing ? <GroupDrawing id={drawing} /> : null}
      <CautionList ids={cautions} />
    </View>
  );
}
