import { stepDone, steps, type Answers, type Step } from '../../shared/wizard/index';
import type { RunStep } from '../ui/run-steps';

/** The run as it stands: finished steps with their answers in words, as links back. `current` null: none is being answered. */
export function runOfSteps(current: Step | null, answers: Answers, photoCount: number, town: string | null): readonly RunStep[] {
  const before = current?.number ?? steps.length + 1;
  return steps.map((step): RunStep => {
    if (step.id === current?.id) return { id: step.id, label: step.short, state: 'now' };
    const done = step.id === 'photos' ? photoCount > 0 || step.number < before : step.id === 'price' ? false : stepDone(step, answers);
    if (!done) return { id: step.id, label: step.short, state: 'todo' };
    return { id: step.id, label: step.short, state: 'done', href: `/quote/${step.id}`, summary: summaryOf(step, answers, photoCount, town) };
  });
}

function summaryOf(step: Step, answers: Answers, photoCount: number, town: string | null): string {
  if (step.id === 'photos') return photoCount === 0 ? 'None yet' : photoCount === 1 ? 'One photo' : `${photoCount} photos`;
  const words = step.summary(answers);
  return step.id === 'home' && town ? `${town}. ${words}` : words;
}
