import { z } from '../zod';
import { factSources, factsSchema, unknownFacts, type Facts, type FactSource } from '../facts';
import { loadIds, type LoadId } from '../loads';

const load = z.strictObject({ present: z.boolean().nullable().optional(), amount: z.number().positive().nullable().optional() });
/** Any of the facts; what is left out, or null, is not known. */
const partialFacts = z.strictObject({
  ...factsSchema.partial().shape,
  loads: z
    .strictObject(Object.fromEntries(loadIds.map((id) => [id, load.optional()])) as Record<LoadId, z.ZodOptional<typeof load>>)
    .optional(),
});

/** One intake to price: the facts that are known, where they came from, and the day it is priced on. */
export const intakeInputSchema = z.strictObject({
  facts: partialFacts,
  sources: z.partialRecord(z.string(), z.enum(factSources)).optional(),
  pricedOn: z.iso.date().optional(),
});
export type IntakeInput = z.infer<typeof intakeInputSchema>;

/** The whole list of facts, with null for what the input leaves out. */
export function factsOf({ facts }: IntakeInput): Facts {
  const nothing = unknownFacts();
  const given = Object.fromEntries(Object.entries(facts).filter(([, value]) => value !== undefined));
  const loads = { ...nothing.loads };
  for (const id of loadIds) loads[id] = { present: facts.loads?.[id]?.present ?? null, amount: facts.loads?.[id]?.amount ?? null };
  return { ...nothing, ...given, loads };
}

export type FactSources = Partial<Record<string, FactSource>>;
