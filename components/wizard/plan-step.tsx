import { View } from 'react-native';
import { SideView } from '../plan/side-view';
import { space } from '../theme/tokens';
import { Card } from '../ui/card';
import { GroupExtras } from './group-extras';
import { GroupFields } from './group-fields';
import { PartPicker } from './part-picker';
import { PlanPane } from './plan-pane';
import { RangeCard } from './range-card';
import { RunSums } from './run-sums';
import { BackLink, NextButton } from './step-nav';
import type { StepState } from './use-step';
import { WideFrame } from './wide-frame';
import { useWizard } from './wizard-context';

/** The garage on wide windows: the plan in the middle, its measures part by part at the right. */
export function PlanStep({ state }: { state: StepState }) {
  const { step, group, groups } = state;
  const plan = useWizard().intake?.range.plan;
  if (!group) return null;
  return (
    <WideFrame
      state={state} title={group.title} focusKey={`${step.id}/${group.id}`}
      {...(group.hint ? { hint: group.hint } : {})}
      side={(
        <>
          <RangeCard small />
          <Card style={{ gap: space[4] }}>
            <PartPicker step={step} group={group} groups={groups} />
            <GroupFields group={group} state={state} compact />
            <GroupExtras group={group} />
            {plan && group.id === 'charger-place' ? <SideView plan={plan} /> : null}
          </Card>
          <View style={{ flexDirection: 'row', gap: space[3] }}>
            <BackLink state={state} />
            <NextButton state={state} />
          </View>
          <RunSums />
        </>
      )}
    >
      <PlanPane size="wide" />
    </WideFrame>
  );
}
