import { home } from './steps/home';
import { car } from './steps/car';
import { panel } from './steps/panel';
import { loads } from './steps/loads';
import { garageStep } from './steps/garage';
import { photos } from './steps/photos';
import { price } from './steps/price';
import type { Answers, Field, Group, Step } from './field';

/** The public wizard, in order. */
export const steps: readonly Step[] = [home, car, panel, loads, garageStep, photos, price];
export const stepIds = steps.map((step) => step.id) as [string, ...string[]];

export const stepById = (id: string): Step | undefined => steps.find((step) => step.id === id);

/** Every field of the wizard by id. */
export const fieldsById: ReadonlyMap<string, Field> = new Map(steps.flatMap((step) => step.groups.flatMap((group) => group.fields.map((field) => [field.id, field] as const))));

/** The groups of a step that apply to these answers, each with at least one field to ask (photos and price have none of their own). */
export const visibleGroups = (step: Step, answers: Answers): readonly Group[] =>
  step.groups.filter((group) => (group.when?.(answers) ?? true) && (group.fields.length === 0 || visibleFields(group, answers).length > 0));

export const visibleFields = (group: Group, answers: Answers): readonly Field[] => group.fields.filter((field) => field.when?.(answers) ?? true);

/** Fields of a step that are asked with these answers. */
export const askedFields = (step: Step, answers: Answers): readonly Field[] => visibleGroups(step, answers).flatMap((group) => visibleFields(group, answers));

/**
 * What keeps a step, or some of its groups, from being done: missing answers, answers that are out of limits, answers that contradict
 * each other. Same words beside the field and in the summary.
 */
export function stepProblems(step: Step, answers: Answers, groups: readonly Group[] = visibleGroups(step, answers)): readonly { field: string; detail: string }[] {
  const asked = groups.flatMap((group) => visibleFields(group, answers));
  const single = asked.flatMap((field) => {
    if (answers[field.id] === undefined) return field.optional || field.kind === 'loads' ? [] : [{ field: field.id, detail: missingWords(field) }];
    const result = field.schema.safeParse(answers[field.id]);
    return result.success ? [] : [{ field: field.id, detail: result.error.issues[0]?.message ?? 'Check this answer' }];
  });
  const seen = new Set(single.map((problem) => problem.field));
  const ids = new Set(asked.map((field) => field.id));
  return [...single, ...(step.check?.(answers) ?? []).filter((problem) => ids.has(problem.field) && !seen.has(problem.field))];
}

const missingWords = (field: Field): string => {
  if (field.kind === 'text') return `${field.label}: fill this in`;
  if (field.unsure) return `${field.label.replace(/\?$/, '')}: pick an answer, “${field.unsure.label}” is fine`;
  return `${field.label.replace(/\?$/, '')}: pick an answer`;
};

/** True when every question of the step that applies is answered within its limits. */
export const stepDone = (step: Step, answers: Answers): boolean => step.groups.some((group) => group.fields.length > 0) && (step.id !== 'loads' || answers.loads !== undefined) && stepProblems(step, answers).length === 0;

/** The first step with something left to ask; the price when all are done. Photos hold nobody up. */
export const firstOpenStep = (answers: Answers): Step => steps.find((step) => step.number <= 5 && !stepDone(step, answers)) ?? price;

export { answersToFacts } from './answers-to-facts';
export { UNSURE, cautions, numberAnswer, wordAnswer, type Answers, type CautionId, type Choice, type Field, type Group, type Step } from './field';
export { photoSlots, photoSlotIds, type PhotoSlotId } from './steps/photos';
