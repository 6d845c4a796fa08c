import { z } from '../../zod';
import { loadIds, loadKinds, type LoadKind } from '../../loads';
import { countInWords } from '../../units';
import { type LoadsField, type Step } from '../field';

const kinds: readonly LoadKind[] = loadKinds;
const tile = z.object({ present: z.boolean().nullable(), amount: z.number().positive().nullable() });

/** One answer of the board: `present` null is "Not sure", `amount` null is "as usual". */
export type LoadsAnswer = Partial<Record<string, z.infer<typeof tile>>>;

const board: LoadsField = {
  kind: 'loads', id: 'loads', name: 'Big loads', label: 'Which of these run on electricity?',
  schema: z.partialRecord(z.enum(loadIds), tile).superRefine((answer, context) => {
    for (const kind of kinds) {
      const amount = answer[kind.id as keyof typeof answer]?.amount;
      if (amount == null) continue;
      if (kind.amount === 'none' || amount < (kind.min ?? 0) || amount > (kind.max ?? Infinity)) {
        context.addIssue({ code: 'custom', path: [kind.id, 'amount'], message: `${kind.amountLabel ?? kind.title}: between ${kind.min ?? 0} and ${kind.max ?? 0}` });
      }
    }
  }),
  words: (value) => loadsInWords(value as LoadsAnswer),
};

/** "Range, oven; Clothes dryer; Central air, 3 tons", or "None". */
export function loadsInWords(answer: LoadsAnswer): string {
  const on = kinds.filter((kind) => answer[kind.id]?.present === true).map((kind) => {
    const amount = answer[kind.id]?.amount;
    return amount == null ? kind.title : `${kind.title}, ${amount} ${amountUnit(kind, amount)}`;
  });
  const unsure = kinds.filter((kind) => answer[kind.id]?.present === null).map((kind) => `${kind.title} (not sure)`);
  return [...on, ...unsure].join('; ') || 'None';
}

/** The unit of a load's amount in words. */
export function amountUnit(kind: LoadKind, amount: number): string {
  if (kind.amount === 'tons') return amount === 1 ? 'ton' : 'tons';
  if (kind.amount === 'kilowatts') return 'kW';
  if (kind.amount === 'count') return amount === 1 ? 'heater' : 'heaters';
  return 'A';
}

/** Step 4: what a dwelling load calculation needs, tile by tile. */
export const loads: Step = {
  id: 'loads', number: 4, short: 'Big loads',
  groups: [{
    id: 'board', title: 'Which of these run on electricity?', short: 'big loads', hint: 'Gas ones don’t count. Tap again for “not sure”.', drawing: 'loads',
    why: 'This tells how much room the service has for a charger.', fields: [board],
  }],
  summary: (answers) => {
    const answer = (answers.loads ?? {}) as LoadsAnswer;
    const on = kinds.filter((kind) => answer[kind.id]?.present === true).length;
    return on === 0 ? 'None of them' : countInWords(on, 'big load', 'big loads');
  },
};
