import { View } from 'react-native';
import { space } from '../theme/tokens';
import { Text } from '../ui/text';
import { GroupExtras } from './group-extras';
import { GroupFields } from './group-fields';
import { GroupIntro } from './group-intro';
import { RangeCard } from './range-card';
import { StepNav } from './step-nav';
import type { StepState } from './use-step';
import { WhyNote } from './why-note';
import { WideFrame } from './wide-frame';
import { useWizard } from './wizard-context';
import { YourCard } from './your-card';

const SHOWN_FROM_STEP = 3;

/** A whole step on one page: its first group under the title, the others as sections. */
export function WideStep({ state }: { state: StepState }) {
  const { step, groups } = state;
  const { intake } = useWizard();
  const first = groups[0];
  if (!first) return null;
  const whys = groups.flatMap((group) => group.why ?? []);
  return (
    <WideFrame
      state={state} title={first.title} focusKey={step.id}
      {...(first.hint ? { hint: first.hint } : {})}
      side={(
        <>
          {step.number >= SHOWN_FROM_STEP ? <RangeCard /> : null}
          <YourCard />
          {whys.map((words) => <WhyNote key={words} words={words} />)}
        </>
      )}
    >
      {groups.map((group, index) => (
        <View key={group.id} style={{ gap: space[4] }}>
          {index > 0 ? (
            <View style={{ gap: space[1], paddingTop: space[3] }}>
              <Text variant="heading" level={2}>{group.title}</Text>
              {group.hint ? <Text color="ink2">{group.hint}</Text> : null}
            </View>
          ) : null}
          <GroupIntro group={group} shown={groups.slice(0, index).flatMap((entry) => entry.cautions ?? [])} />
          <GroupFields group={group} state={state} />
          <GroupExtras group={group} />
        </View>
      ))}
      {intake?.served === false ? null : <StepNav state={state} />}
    </WideFrame>
  );
}
