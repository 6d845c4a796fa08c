import { Redirect, useLocalSearchParams } from 'expo-router';
import { visibleGroups, type Group, type Step } from '../../shared/wizard/index';
import { isProblem } from '../api/client';
import { useBreakpoint } from '../theme/use-breakpoint';
import { GonePage, OpenFailedPage, OpeningPage } from './opening-pages';
import { NarrowStep } from './narrow-step';
import { PlanStep } from './plan-step';
import { detour, groupAt } from './step-flow';
import { useHydrated } from './use-hydrated';
import { useStep } from './use-step';
import { useWizard } from './wizard-context';
import { WideStep } from './wide-step';

/** One step of the wizard: by groups on phones and tablets, whole on wide windows, beside the plan where there is one. */
export function StepScreen({ step }: { step: Step }) {
  const { part } = useLocalSearchParams<{ part?: string }>();
  const hydrated = useHydrated();
  const wide = useBreakpoint() === 'wide';
  const wizard = useWizard();
  const { answers, intake } = wizard;

  if (wizard.save === 'gone' || isProblem(wizard.openError, 401, 404, 410)) return <GonePage />;
  if (wizard.openError) return <OpenFailedPage error={wizard.openError} onAgain={wizard.openAgain} />;
  // Which questions the garage asks depends on answers that are still on their way.
  if (!intake && step.id === 'garage') return <OpeningPage title="Your garage" />;
  if (intake?.served === false && step.id !== 'home') return <Redirect href="/quote/home" />;
  const open = intake ? detour(step, answers) : null;
  if (open) return <Redirect href={`/quote/${open.id}`} />;

  const group = groupAt(step, answers, hydrated ? part : undefined);
  const drawn = visibleGroups(step, answers).some((entry) => entry.drawing === 'plan');
  return <StepBody key={step.id} step={step} group={group} layout={!wide ? 'narrow' : drawn ? 'plan' : 'wide'} />;
}

function StepBody({ step, group, layout }: { step: Step; group: Group | null; layout: 'narrow' | 'plan' | 'wide' }) {
  const state = useStep(step, group, layout !== 'wide');
  if (layout === 'wide') return <WideStep state={state} />;
  if (layout === 'plan') return <PlanStep state={state} />;
  return <NarrowStep key={group?.id ?? ''} state={state} />;
}
