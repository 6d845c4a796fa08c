import { firstOpenStep, stepProblems, steps, visibleGroups, type Answers, type Group, type Step } from '../../shared/wizard/index';

/** A place in the wizard: a step, and on phones one of its groups. */
export interface Place { readonly step: Step; readonly group: Group | null }

export const placeHref = ({ step, group }: Place): string => `/quote/${step.id}${group ? `?part=${group.id}` : ''}`;

/** The group that the address names, or the step's first. */
export const groupAt = (step: Step, answers: Answers, part: string | undefined): Group | null => {
  const groups = visibleGroups(step, answers);
  return groups.find((group) => group.id === part) ?? groups[0] ?? null;
};

const stepAfter = (step: Step, by: 1 | -1): Step | null => steps.find((entry) => entry.number === step.number + by) ?? null;
const lower = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);

export interface FieldProblem { readonly field: string; readonly detail: string }
export interface Turn { readonly href: string; readonly label: string }

/** Where Next leads and what it says. `byGroup`: one group a screen. */
export function nextTurn(step: Step, group: Group | null, answers: Answers, byGroup: boolean): Turn {
  const groups = visibleGroups(step, answers);
  const following = byGroup && group ? groups[groups.indexOf(group) + 1] : undefined;
  if (following) return { href: placeHref({ step, group: following }), label: `Next: ${following.short}` };
  const next = stepAfter(step, 1) ?? step;
  return { href: `/quote/${next.id}`, label: next.id === 'price' ? 'See my price' : `Next: ${lower(next.short)}` };
}

/** Where Back leads: the group or step before; the start page from the very first. */
export function backTurn(step: Step, group: Group | null, answers: Answers, byGroup: boolean): Turn {
  const groups = visibleGroups(step, answers);
  const earlier = byGroup && group ? groups[groups.indexOf(group) - 1] : undefined;
  if (earlier) return { href: placeHref({ step, group: earlier }), label: `Back: ${earlier.short}` };
  const before = stepAfter(step, -1);
  if (!before) return { href: '/', label: 'Back to the start' };
  const last = byGroup ? (visibleGroups(before, answers).at(-1) ?? null) : null;
  return { href: placeHref({ step: before, group: last }), label: `Back: ${lower(before.short)}` };
}

/** The step to show instead when an earlier one is still open; null when this one may be shown. */
export const detour = (step: Step, answers: Answers): Step | null => {
  const open = firstOpenStep(answers);
  return open.number < step.number ? open : null;
};

/** What keeps Next from going on: the group on screen first; on the last group, whatever else of the step is open. */
export function problemsOnNext(step: Step, group: Group | null, answers: Answers, byGroup: boolean): readonly FieldProblem[] {
  if (!byGroup || !group) return stepProblems(step, answers);
  const here = stepProblems(step, answers, [group]);
  const last = visibleGroups(step, answers).at(-1)?.id === group.id;
  return here.length > 0 || !last ? here : stepProblems(step, answers);
}

/** The group of a step in which a field is asked. */
export const groupOfField = (step: Step, fieldId: string): Group | null =>
  step.groups.find((group) => group.fields.some((field) => field.id === fieldId)) ?? null;
