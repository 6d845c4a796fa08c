import { View } from 'react-native';
import { steps } from '../../shared/wizard/index';
import { space } from '../theme/tokens';
import { useBreakpoint } from '../theme/use-breakpoint';
import { ErrorSummary } from '../ui/error-summary';
import { FieldError } from '../ui/field-notes';
import { Page } from '../ui/page';
import { RunStrip } from '../ui/run-strip';
import { Text } from '../ui/text';
import { FinishLater } from './finish-later';
import { GroupExtras } from './group-extras';
import { GroupFields } from './group-fields';
import { GroupIntro } from './group-intro';
import { PartPicker } from './part-picker';
import { PlanPane } from './plan-pane';
import { RangeDock } from './range-dock';
import { runOfSteps } from './run-of-steps';
import type { StepState } from './use-step';
import { WhyNote } from './why-note';
import { useWizard } from './wizard-context';

/** One group of questions a screen, the run above, the dock below: phones and tablets. */
export function NarrowStep({ state }: { state: StepState }) {
  const { step, group, groups } = state;
  const { answers, intake } = useWizard();
  const phone = useBreakpoint() === 'phone';
  if (!group) return null;
  const following = steps[step.number];
  const drawn = group.drawing === 'plan';
  // Before the room is measured there is nothing to look at.
  const planFirst = drawn && group !== groups[0];
  // On a phone the picture of the panel says it.
  const hint = group.hint && !(phone && group.drawing === 'panel') ? <Text color="ink2">{group.hint}</Text> : null;
  return (
    <Page
      title={`${group.title} Step ${step.number} of ${steps.length}`}
      focusKey={`${step.id}/${group.id}`}
      hidePhone={phone}
      header={<FinishLater />}
      run={<RunStrip steps={runOfSteps(step, answers, intake?.photos.length ?? 0, intake?.town ?? null)} {...(following ? { next: `Next: ${following.short}` } : {})} />}
      dock={intake?.served === false ? null : <RangeDock state={state} />}
    >
      <View style={{ width: '100%', maxWidth: 680, alignSelf: 'center', gap: space[5] }}>
        <ErrorSummary problems={state.problems} attempt={state.refusals} />
        {groups.some((entry) => entry.drawing === 'plan') ? <PartPicker step={step} group={group} groups={groups} /> : null}
        <View style={{ gap: space[1] }}>
          <Text variant={drawn ? 'heading' : 'title'} level={1}>{group.title}</Text>
          {planFirst ? null : hint}
        </View>
        {planFirst && phone ? <><PlanPane />{hint}</> : null}
        <GroupIntro group={group} />
        {drawn && !phone ? (
          <View style={{ flexDirection: 'row', gap: space[5] }}>
            <View style={{ flex: 1 }}><PlanPane size="tablet" /></View>
            <View style={{ width: 260, gap: space[4] }}>{planFirst ? hint : null}<GroupFields group={group} state={state} compact /></View>
          </View>
        ) : <GroupFields group={group} state={state} />}
        {drawn && phone && !planFirst ? <PlanPane /> : null}
        <GroupExtras group={group} />
        {group.why ? <WhyNote words={group.why} /> : null}
        {state.obstacle ? <FieldError id="next">{state.obstacle}</FieldError> : null}
      </View>
    </Page>
  );
}
