import { keepUnits } from '../units';
import { z } from '../zod';

/** The answer "Not sure". It never blocks; it widens the range. */
export const UNSURE = 'unsure';
export type Unsure = typeof UNSURE;

/** Field id to answer. Absent: not answered yet. */
export type Answers = Readonly<Record<string, unknown>>;

export interface Choice {
  readonly value: string;
  readonly label: string;
  readonly note?: string;
}

interface FieldBase {
  readonly id: string;
  /** The question, as a homeowner reads it. */
  readonly label: string;
  /** A short name for check-your-answers, mails and the desk. */
  readonly name: string;
  readonly hint?: string;
  /** "If you like": the step can be left without it. */
  readonly optional?: boolean;
  /** Set when "Not sure" is an answer: its words, one line shown when picked, and the photo slot that can answer it. */
  readonly unsure?: { readonly label: string; readonly note: string; readonly photo?: string };
  /** Asked only when this holds. */
  readonly when?: (answers: Answers) => boolean;
  /** A calm remark on an answer that is allowed but worth a word. */
  readonly remark?: (answers: Answers) => string | null;
  readonly schema: z.ZodType;
  /** The answer in words, for people. */
  readonly words: (value: unknown) => string;
}

export interface ChoiceField extends FieldBase { readonly kind: 'choice'; readonly choices: readonly Choice[]; readonly columns?: 1 | 2 | 3 }
export interface ManyField extends FieldBase {
  readonly kind: 'many';
  readonly choices: readonly Choice[];
  /** The label of "nothing of these", stored as an empty list. */
  readonly none: string;
}
export interface NumberField extends FieldBase {
  readonly kind: 'number';
  readonly unit: 'ft' | 'in.' | 'sq ft' | 'miles' | 'hours' | 'steps' | 'A';
  readonly min: number;
  readonly max: number;
  readonly step: number;
  /** Where the stepper stands before it is touched; it is no answer until it is. */
  readonly start: number;
}
export interface TextField extends FieldBase { readonly kind: 'text'; readonly inputMode: 'numeric' | 'text'; readonly autoComplete?: string; readonly maxLength: number }
export interface LoadsField extends FieldBase { readonly kind: 'loads' }

export type Field = ChoiceField | ManyField | NumberField | TextField | LoadsField;

export interface Group {
  readonly id: string;
  /** The screen's title: a question, or a plain statement. */
  readonly title: string;
  /** Two or three words for "Next: blank spaces" and for the segments of the plan. */
  readonly short: string;
  readonly hint?: string;
  /** Ids of drawings in components/drawings. */
  readonly drawing?: 'panel' | 'plan' | 'loads' | 'car';
  /** Ids of cautions; they come before the questions. */
  readonly cautions?: readonly CautionId[];
  readonly why?: string;
  readonly fields: readonly Field[];
  readonly when?: (answers: Answers) => boolean;
}

export interface Step {
  readonly id: string;
  readonly number: number;
  /** "Panel", on the run and in "Next: panel". */
  readonly short: string;
  readonly groups: readonly Group[];
  /** Problems between answers; shown beside the field and in the error summary. */
  readonly check?: (answers: Answers) => readonly { field: string; detail: string }[];
  /** One line under the step's name once it is done: "200 A, two blank spaces". */
  readonly summary: (answers: Answers) => string;
}

export const cautions = {
  cover: { level: 'caution', words: 'Never remove the metal cover of the panel. Open the hinged door only.' },
  screwed: { level: 'caution', words: 'If the door is screwed shut, leave it. A photo of the outside is enough.' },
  danger: { level: 'stop', words: 'Stop here if you smell burning, hear buzzing or see rust or water. Leave the panel alone and call {phone}.' },
  noSwitching: { level: 'caution', words: 'Do not switch any breaker for this. Reading the numbers is all we need.' },
  ladders: { level: 'caution', words: 'Keep your feet on the floor. No ladders for photos.' },
  emergency: { level: 'stop', words: 'If anything is sparking or smoking, leave the house and call 911.' },
} as const satisfies Record<string, { level: 'caution' | 'stop'; words: string }>;
export type CautionId = keyof typeof cautions;

const UNSURE_WORDS = 'Not sure';

type Common = Pick<FieldBase, 'id' | 'label' | 'name'> & Partial<Pick<FieldBase, 'hint' | 'optional' | 'unsure' | 'when' | 'remark'>>;

const withUnsure = (schema: z.ZodType, common: Common): z.ZodType => (common.unsure ? z.union([schema, z.literal(UNSURE)]) : schema);

/** One of several. */
export function choice(common: Common & { choices: readonly Choice[]; columns?: 1 | 2 | 3 }): ChoiceField {
  const choices = common.choices.map((entry) => ({ ...entry, label: keepUnits(entry.label), ...(entry.note ? { note: keepUnits(entry.note) } : {}) }));
  const labels = new Map(choices.map((entry) => [entry.value, entry.label]));
  return {
    ...common,
    choices,
    kind: 'choice',
    schema: withUnsure(z.enum(choices.map((entry) => entry.value) as [string, ...string[]], { error: 'Pick one of these' }), common),
    words: (value) => (value === UNSURE ? UNSURE_WORDS : (labels.get(String(value)) ?? '')),
  };
}

/** Any of several, or none. */
export function many(common: Common & { choices: readonly Choice[]; none: string }): ManyField {
  const labels = new Map(common.choices.map((entry) => [entry.value, entry.label]));
  return {
    ...common,
    kind: 'many',
    schema: withUnsure(z.array(z.enum(common.choices.map((entry) => entry.value) as [string, ...string[]])).max(common.choices.length), common),
    words: (value) => {
      if (!Array.isArray(value)) return UNSURE_WORDS;
      return value.length === 0 ? common.none : value.map((entry) => labels.get(String(entry)) ?? '').join(', ');
    },
  };
}

/** A measure, with its unit and limits. */
export function number(common: Common & Pick<NumberField, 'unit' | 'min' | 'max' | 'step' | 'start'>): NumberField {
  const { min, max, unit } = common;
  const schema = z
    .number({ error: 'Type a number' })
    .min(min, { error: `${min.toLocaleString('en-US')} ${unit} at least` })
    .max(max, { error: `${max.toLocaleString('en-US')} ${unit} at most` });
  return {
    ...common,
    kind: 'number',
    schema: withUnsure(schema, common),
    words: (value) => (typeof value === 'number' ? `${value.toLocaleString('en-US')}\u00a0${unit}` : UNSURE_WORDS),
  };
}

/** The number answered for `id`, or null when it is unanswered or "Not sure". */
export const numberAnswer = (answers: Answers, id: string): number | null => {
  const value = answers[id];
  return typeof value === 'number' ? value : null;
};

/** The word answered for `id`, or null when it is unanswered or "Not sure". */
export const wordAnswer = (answers: Answers, id: string): string | null => {
  const value = answers[id];
  return typeof value === 'string' && value !== UNSURE ? value : null;
};
