import { z } from './zod';
import { factSources, walls } from './facts';

const cents = z.number().int();
const range = z.object({ lowCents: cents, midCents: cents, highCents: cents });

/** How one figure came to be: what, its value in words, and the clause or rule that made it. */
export const traceSchema = z.object({ what: z.string(), value: z.string(), clause: z.string() });

/** One line of the price. Lines add up to the option's total at low, mid and high alike. */
export const quoteLineSchema = range.extend({
  id: z.string(),
  title: z.string(),
  note: z.string(),
  /** Words for the homeowner: why this line is there. */
  why: z.string(),
  /** The rules that made it in the middle case, for the desk. `clause` names the rulebook's rule. */
  rules: z.array(z.object({ rule: z.string(), words: z.string(), quantity: z.number(), unit: z.string(), unitCents: z.number(), cents })),
});

const pointSchema = z.object({ xFt: z.number(), yFt: z.number(), zFt: z.number() });

/** Everything that components/plan needs to draw one run; see the plan's coordinates there. */
export const planDrawingSchema = z.object({
  room: z.object({ widthFt: z.number(), depthFt: z.number() }),
  ceilingFt: z.number(),
  garageDoor: z.object({ alongFt: z.number(), widthFt: z.number() }).nullable(),
  houseDoor: z.object({ wall: z.enum(walls), alongFt: z.number(), widthFt: z.number() }).nullable(),
  panel: z.object({ wall: z.enum(walls), alongFt: z.number(), topIn: z.number() }).nullable(),
  charger: z.object({ wall: z.enum(walls), alongFt: z.number(), heightIn: z.number() }),
  car: z.object({ centerXFt: z.number(), parked: z.enum(['nose_in', 'back_in']), portCorner: z.enum(['front_left', 'front_right', 'rear_left', 'rear_right']) }),
  cableLengthFt: z.number(),
  run: z.object({ points: z.array(pointSchema), lengthFt: z.number(), wallFt: z.number(), upDownFt: z.number() }).nullable(),
  cable: z.object({ reaches: z.boolean(), usedFt: z.number(), shortFt: z.number() }),
});

export const loadSheetSchema = z.object({
  status: z.enum(['green', 'amber', 'red']),
  method: z.string(),
  clause: z.string(),
  serviceAmps: z.number(),
  homeAmps: z.number(),
  chargerAmps: z.number(),
  spareAmps: z.number(),
  /** False when a big fact of it was assumed; then the sheet is a typical home and says so. */
  known: z.boolean(),
  lines: z.array(z.object({ label: z.string(), va: z.number(), clause: z.string(), note: z.string().optional() })),
});

export const panelChanges = ['none', 'tandem', 'sub_panel', 'energy_management', 'new_panel', 'service_upgrade'] as const;
export const panelChangeWords: Record<(typeof panelChanges)[number], string> = {
  none: 'Nothing in the panel has to change',
  tandem: 'Two slim breakers make room',
  sub_panel: 'A small sub-panel makes room',
  energy_management: 'A load manager keeps the service within its limit',
  new_panel: 'A new panel of the same size',
  service_upgrade: 'A larger service from the utility',
};

export const quoteOptionSchema = range.extend({
  id: z.string(),
  /** "Wall charger, 60 A" */
  title: z.string(),
  /** "Charger included", "You bring the charger" */
  subtitle: z.string(),
  connection: z.enum(['wired', 'plug_in']),
  chargingAmps: z.number(),
  breakerAmps: z.number(),
  kw: z.number(),
  milesPerHour: z.number(),
  milesPerNight: z.number(),
  coversUsualDay: z.boolean(),
  recommended: z.boolean(),
  /** In the middle case. */
  panelChange: z.enum(panelChanges),
  /** Why this one, or what it brings, and what it asks for, in a sentence or two. */
  because: z.string(),
  depositCents: cents,
  lines: z.array(quoteLineSchema),
  circuit: z.object({
    hotAwg: z.string(), groundAwg: z.string(), material: z.string(), insulation: z.string(), method: z.string(), methodWords: z.string(),
    racewayTradeSize: z.string().nullable(), voltageDropPercent: z.number(), gfciRequired: z.boolean(), disconnectRequired: z.boolean(),
    /** "6 AWG copper THHN in 3/4 in. EMT" */
    words: z.string(),
  }),
  run: z.object({
    method: z.string(), methodWords: z.string(), lengthFt: z.number(), wallFt: z.number(), upDownFt: z.number(),
    bends: z.number(), pullPoints: z.number(), supports: z.number(),
  }),
  /** The pick list of the middle case. */
  takeoff: z.array(z.object({ item: z.string(), words: z.string(), quantity: z.number(), unit: z.string() })),
  laborHours: z.number(),
  load: loadSheetSchema,
  trace: z.array(traceSchema),
});

export const flagSchema = z.object({
  id: z.string(),
  /** For the homeowner: why no price from here, plainly. */
  words: z.string(),
  /** For the desk. */
  deskWords: z.string(),
  /** True: a caution comes first and the lead is marked. */
  danger: z.boolean(),
});

/** Facts whose answer would narrow the range, most first; `cents` is how much. */
export const narrowingSchema = z.object({ fact: z.string(), title: z.string(), cents, photo: z.string().nullable() });

export const quoteDocumentSchema = z.object({
  schema: z.literal(1),
  pricedOn: z.string(),
  heldUntil: z.string(),
  rulebookEdition: z.number().int(),
  codeEdition: z.string(),
  jurisdiction: z.object({ id: z.string(), name: z.string(), state: z.string(), timeZone: z.string() }),
  /** firm: nothing that matters is unknown and nothing is flagged. visit: no automatic price, `options` is empty. */
  outcome: z.enum(['range', 'firm', 'visit']),
  flags: z.array(flagSchema),
  options: z.array(quoteOptionSchema),
  recommendedOptionId: z.string().nullable(),
  narrowing: z.array(narrowingSchema),
  facts: z.array(z.object({ name: z.string(), label: z.string(), words: z.string(), source: z.enum(factSources) })),
  plan: planDrawingSchema.nullable(),
  /** "Designed to the 2023 NEC. The local code, the permit office and the licensed electrician decide." */
  cautions: z.array(z.string()),
});

/** What the wizard shows while answers arrive: the recommended option's range, not frozen and not a promise. */
export const liveRangeSchema = z.object({
  outcome: z.enum(['range', 'firm', 'visit', 'too-early']),
  lowCents: cents.nullable(),
  highCents: cents.nullable(),
  optionTitle: z.string().nullable(),
  narrowing: z.array(narrowingSchema),
  flags: z.array(flagSchema),
  load: loadSheetSchema.nullable(),
  plan: planDrawingSchema.nullable(),
  /** What is wrong on the plan, in words; empty when nothing is. */
  planProblems: z.array(z.string()),
});

export type QuoteDocument = z.infer<typeof quoteDocumentSchema>;
export type QuoteOption = z.infer<typeof quoteOptionSchema>;
export type QuoteLine = z.infer<typeof quoteLineSchema>;
export type LoadSheet = z.infer<typeof loadSheetSchema>;
export type PlanDrawing = z.infer<typeof planDrawingSchema>;
export type LiveRange = z.infer<typeof liveRangeSchema>;
export type Flag = z.infer<typeof flagSchema>;
export type Narrowing = z.infer<typeof narrowingSchema>;
export type Trace = z.infer<typeof traceSchema>;
export type PanelChange = (typeof panelChanges)[number];
