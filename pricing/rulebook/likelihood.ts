import { drawFrom, likeliest, type Draw } from './distribution';
import type { Distribution, Edition } from './schema';

export interface Chance {
  readonly draw: Draw;
  readonly likeliest: unknown;
}
export interface CompiledLikelihood {
  /** The fact that decides which chance holds; null: `otherwise` always. */
  readonly by: string | null;
  readonly cases: ReadonlyMap<string, Chance>;
  readonly otherwise: Chance;
  /** False when the answer is taken as one fixed value. */
  readonly varies: boolean;
}

const chance = (distribution: Distribution): Chance => ({ draw: drawFrom(distribution), likeliest: likeliest(distribution) });
const compiled = new WeakMap<Edition, ReadonlyMap<string, CompiledLikelihood>>();

/** The edition's likelihoods by fact, ready to draw from; made once an edition. */
export function compileLikelihoods(edition: Edition): ReadonlyMap<string, CompiledLikelihood> {
  const known = compiled.get(edition);
  if (known) return known;
  const all = new Map<string, CompiledLikelihood>(
    Object.entries(edition.likelihoods).map(([fact, likelihood]) => [
      fact,
      'by' in likelihood
        ? {
            by: likelihood.by,
            cases: new Map(Object.entries(likelihood.cases).map(([value, entry]) => [value, chance(entry)])),
            otherwise: chance(likelihood.otherwise),
            varies: true,
          }
        : { by: null, cases: new Map<string, Chance>(), otherwise: chance(likelihood), varies: !('fixed' in likelihood) },
    ]),
  );
  compiled.set(edition, all);
  return all;
}
