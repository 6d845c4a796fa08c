import { z } from '../../shared/zod';
import { mainBreakerRatings } from '../../shared/facts';

/** A JsonLogic expression over the names in names.ts; a bare value stands for itself. */
export type Logic = null | boolean | number | string | readonly Logic[] | { readonly [operator: string]: Logic };
export const logicSchema: z.ZodType<Logic> = z.lazy(() =>
  z.union([z.null(), z.boolean(), z.number(), z.string(), z.array(logicSchema), z.record(z.string(), logicSchema)]),
);

const cents = z.number().int().min(0).max(10_000_000);
const id = z.string().regex(/^[a-z][a-z0-9_-]*$/);
const basisPoints = z.number().int().min(0).max(10_000);

export const jurisdictionSchema = z.object({
  id,
  name: z.string(),
  zips: z.array(z.string().regex(/^\d{5}$/)).min(1),
  state: z.string().length(2),
  timeZone: z.string(),
  codeEdition: z.enum(['2020', '2023']),
  permitCents: cents,
  inspectionVisits: z.number().int().min(0).max(4),
  /** Sales tax in basis points of the price, by kind of rule. Fees are never taxed. */
  tax: z.object({ material: basisPoints, charger: basisPoints, labor: basisPoints }),
});

/** Item keys and what one unit costs us, before markup. */
export const priceBookSchema = z.record(z.string(), z.object({ words: z.string(), unit: z.string(), cents }));

const hours = z.number().min(0).max(80);
export const laborSchema = z.object({
  rateCents: cents,
  tasks: z.record(z.string(), z.object({ words: z.string(), unit: z.string(), low: hours, typical: hours, high: hours })),
});

/** What an unknown answer may turn out to be. */
export const distributionSchema = z.union([
  z.object({ fixed: z.unknown() }),
  z.object({ weighted: z.array(z.object({ value: z.unknown(), weight: z.number().positive() })).min(1) }),
  z.object({ triangle: z.object({ low: z.number(), mode: z.number(), high: z.number(), step: z.number().positive() }) }),
]);
/** One distribution, or one for each value of another fact. */
export const likelihoodSchema = z.union([
  distributionSchema,
  z.object({ by: z.string(), cases: z.record(z.string(), distributionSchema), otherwise: distributionSchema }),
]);

export const flagRuleSchema = z.object({
  id,
  when: logicSchema,
  words: z.string(),
  deskWords: z.string(),
  danger: z.boolean(),
  source: z.string(),
});

export const lineSchema = z.object({
  id,
  title: z.string(),
  note: z.string(),
  /** Why the line is there, for the homeowner. */
  why: z.string(),
  /** Shown as "Included" when it costs nothing by itself. */
  included: z.boolean().optional(),
});

export const ruleKinds = ['material', 'charger', 'labor', 'fee'] as const;
export const priceOfRuleSchema = z.discriminatedUnion('by', [
  /** Each thing of the takeoff whose key starts so, at the price book's price and the rule's markup. */
  z.object({ by: z.literal('takeoff'), items: z.string() }),
  /** Each task of the takeoff whose key starts so, at the hourly rate. */
  z.object({ by: z.literal('takeoff-tasks'), tasks: z.string() }),
  z.object({ by: z.literal('item'), item: logicSchema, quantity: logicSchema }),
  z.object({ by: z.literal('task'), task: logicSchema, quantity: logicSchema }),
  z.object({ by: z.literal('cents'), cents: logicSchema, quantity: logicSchema, unit: z.string() }),
]);

export const ruleSchema = z.object({
  id,
  line: id,
  kind: z.enum(ruleKinds),
  when: logicSchema,
  price: priceOfRuleSchema,
  words: z.string(),
  deskWords: z.string(),
  source: z.string(),
});

export const editionSchema = z.object({
  number: z.number().int().positive(),
  validFrom: z.iso.date(),
  author: z.string(),
  note: z.string(),
  jurisdictions: z.array(jurisdictionSchema).min(1),
  priceBook: priceBookSchema,
  labor: laborSchema,
  /** Added to the price book's price of materials and chargers. */
  markup: z.object({ material: basisPoints, charger: basisPoints }),
  minimumCents: cents,
  wire: z.object({
    panelSlackFt: z.number().min(0).max(30),
    chargerSlackFt: z.number().min(0).max(30),
    wastePercent: z.number().min(0).max(50),
  }),
  deposit: z.object({ cents }),
  holdDays: z.number().int().min(1).max(365),
  options: z.object({
    wiredAmps: z.array(z.number()).min(1),
    plugInAmps: z.array(z.number()).min(1),
    ourChargerAmps: z.number(),
    upgradeAmps: z.literal(mainBreakerRatings),
  }),
  likelihoods: z.record(z.string(), likelihoodSchema),
  flags: z.array(flagRuleSchema),
  lines: z.array(lineSchema).min(1),
  rules: z.array(ruleSchema).min(1),
});

export type Jurisdiction = z.infer<typeof jurisdictionSchema>;
export type PriceBook = z.infer<typeof priceBookSchema>;
export type Labor = z.infer<typeof laborSchema>;
export type Distribution = z.infer<typeof distributionSchema>;
export type Likelihood = z.infer<typeof likelihoodSchema>;
export type FlagRule = z.infer<typeof flagRuleSchema>;
export type LineRule = z.infer<typeof lineSchema>;
export type Rule = z.infer<typeof ruleSchema>;
export type RuleKind = (typeof ruleKinds)[number];
export type Edition = z.infer<typeof editionSchema>;
