import { useRouter } from 'expo-router';
import { useState } from 'react';
import { stepProblems, visibleFields, visibleGroups, type Answers, type Group, type Step } from '../../shared/wizard/index';
import { afterPress } from '../ui/after-press';
import { fullBoard } from './full-board';
import { backTurn, groupOfField, nextTurn, placeHref, problemsOnNext, type FieldProblem, type Turn } from './step-flow';
import { useWizard } from './wizard-context';

export interface StepState {
  readonly step: Step;
  readonly group: Group | null;
  readonly groups: readonly Group[];
  readonly next: Turn;
  readonly back: Turn;
  /** True while Next waits for the server. */
  readonly busy: boolean;
  /** What Next found, as long as it is still so; the summary shows them. */
  readonly problems: readonly FieldProblem[];
  /** Counts the times that Next was refused, so that the summary takes focus each time. */
  readonly refusals: number;
  /** Why Next could not go on although the answers are right. */
  readonly obstacle: string | null;
  readonly errorOf: (fieldId: string) => string | null;
  /** The person has left this field: what is wrong with it may be said. */
  readonly leaveField: (fieldId: string) => void;
  readonly goOn: () => void;
  readonly goTo: (group: Group) => void;
}

const NOT_SAVED = 'Your answers have not reached us yet. They are kept on this page. Try again in a moment.';

/** Everything a screen of the wizard needs: what is shown, what is wrong with it, and where Next and Back lead. */
export function useStep(step: Step, group: Group | null, byGroup: boolean): StepState {
  const router = useRouter();
  const wizard = useWizard();
  const { answers } = wizard;
  const place = `${step.id}/${byGroup ? (group?.id ?? '') : ''}`;
  const [tried, setTried] = useState({ place: '', count: 0 });
  const [left, setLeft] = useState<ReadonlySet<string>>(new Set());
  const [busy, setBusy] = useState(false);
  const [obstacle, setObstacle] = useState<string | null>(null);

  const refusedHere = (fields: ReadonlySet<string>) =>
    Object.entries(wizard.refused).filter(([id]) => fields.has(id)).map(([field, detail]) => ({ field, detail }));
  const problemsNow = (given: Answers) => {
    const found = problemsOnNext(step, group, given, byGroup);
    const asked = new Set(visibleGroups(step, given).flatMap((entry) => visibleFields(entry, given)).map((field) => field.id));
    return [...found, ...refusedHere(asked).filter(({ field }) => !found.some((problem) => problem.field === field))];
  };
  const problems = tried.place === place ? problemsNow(answers) : [];
  const live = stepProblems(step, answers).filter(({ field }) => answers[field] !== undefined && left.has(field));

  const next = nextTurn(step, group, answers, byGroup);

  const goOn = async () => {
    if (busy) return;
    const given = step.id === 'loads' ? { ...answers, loads: fullBoard(answers.loads) } : answers;
    const found = problemsNow(given);
    setObstacle(null);
    if (found.length > 0) {
      const elsewhere = byGroup ? groupOfField(step, found[0]?.field ?? '') : null;
      const target = elsewhere && elsewhere !== group ? elsewhere : group;
      if (target !== group && target) router.navigate(placeHref({ step, group: target }));
      setTried({ place: `${step.id}/${byGroup ? (target?.id ?? '') : ''}`, count: tried.count + 1 });
      return;
    }
    if (step.id === 'loads') wizard.answer('loads', given.loads);
    const mustBeSaved = next.href === '/quote/price' || (step.id === 'home' && wizard.intake?.served == null);
    if (mustBeSaved) {
      setBusy(true);
      const through = await wizard.flush();
      setBusy(false);
      if (!through) return setObstacle(NOT_SAVED);
    } else {
      void wizard.flush();
    }
    router.push(next.href);
  };

  return {
    step, group, next, busy, obstacle, problems,
    groups: visibleGroups(step, answers),
    back: backTurn(step, group, answers, byGroup),
    refusals: tried.place === place ? tried.count : 0,
    errorOf: (id) => wizard.refused[id] ?? [...problems, ...live].find((problem) => problem.field === id)?.detail ?? null,
    leaveField: (id) => {
      afterPress(() => setLeft((before) => (before.has(id) ? before : new Set([...before, id]))));
      void wizard.flush();
    },
    goOn: () => void goOn(),
    goTo: (target) => router.navigate(placeHref({ step, group: target })),
  };
}
