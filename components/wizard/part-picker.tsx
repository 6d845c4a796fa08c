import { View } from 'react-native';
import type { Group, Step } from '../../shared/wizard/index';
import { Anchor } from '../ui/anchor';
import { SegmentFace, segmentFrame } from '../ui/segment-face';
import { placeHref } from './step-flow';

const upper = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** The parts of the drawn garage. Links, because each is a group of questions with an address of its own. */
export function PartPicker({ step, group, groups }: { step: Step; group: Group; groups: readonly Group[] }) {
  return (
    <View role="navigation" aria-label="Parts of the garage" style={segmentFrame}>
      {groups.map((entry) => (
        <Anchor key={entry.id} href={placeHref({ step, group: entry })} current={entry.id === group.id ? 'step' : undefined} style={() => ({ flexGrow: 1 })}>
          <SegmentFace label={upper(entry.short)} chosen={entry.id === group.id} />
        </Anchor>
      ))}
    </View>
  );
}
