import type { Facts } from '../shared/facts';
import type { Flag } from '../shared/quote';
import { bandOf, type Band } from './band';
import { isFlagged, raisedFlags } from './flags';
import { homeOf, tidyWays, type Home } from './home';
import type { KnownFacts } from './known-facts';
import { MIDDLE, samplerFor, type Sampler } from './known-sampling';
import { candidates, chooseOptions, coversUsualDay, type OptionPlan } from './option-plan';
import { capacityFixes } from './panel-fix';
import { priceOption } from './price-option';
import { compileEdition, type CompiledEdition } from './rulebook/compile';
import type { Edition, Jurisdiction } from './rulebook/schema';

export interface WorkedOption {
  readonly option: OptionPlan;
  readonly band: Band;
  readonly totals: readonly number[];
  readonly lines: readonly (readonly number[])[];
  readonly recommended: boolean;
}

/** What the homes that fit the answers have in common: flags, or options with their ranges. */
export interface WorkedOut {
  readonly compiled: CompiledEdition;
  readonly sampler: Sampler;
  readonly place: Jurisdiction;
  readonly flags: readonly Flag[];
  /** Draw numbers of the homes that could be priced. Empty with flags. */
  readonly draws: readonly number[];
  readonly options: readonly WorkedOption[];
  /** True when every home that fits can be priced, and each option has one price in all of them. */
  readonly firm: boolean;
  /** True when some homes that fit the answers would ask for a visit; the ranges leave them out. */
  readonly leavesOut: boolean;
  readonly homeAt: (draw: number) => Home;
  /** The likeliest home, for what is said of car and habits. */
  readonly likely: KnownFacts;
}

/** While nothing says otherwise, the service is taken to carry a charger. */
const CARRIED = { carried: true };

const placeOf = (compiled: CompiledEdition, zip: string | null): Jurisdiction | undefined =>
  zip === null ? undefined : compiled.jurisdictionByZip.get(zip);

/** Index of the option to recommend: the cheapest as asked that covers the usual day; the fastest as asked when none does. */
function recommend(options: readonly { option: OptionPlan; band: Band }[], likely: KnownFacts): number {
  const asked = options.map((entry, index) => ({ ...entry, index })).filter(({ option }) => option.asAsked);
  const covering = asked.filter(({ option }) => coversUsualDay(option.chargingAmps, likely));
  const byPrice = [...covering].sort((a, b) => a.band.midCents - b.band.midCents || b.option.chargingAmps - a.option.chargingAmps);
  const bySpeed = [...asked].sort((a, b) => b.option.chargingAmps - a.option.chargingAmps || a.band.midCents - b.band.midCents);
  return (byPrice[0] ?? bySpeed[0])?.index ?? 0;
}

/**
 * Prices the options in every drawn home that fits the answers. With nothing open there is one home and one price.
 * @param samples how many homes to draw while something is open.
 * @throws RulebookError when the edition cannot price a home; validateEdition finds that beforehand.
 */
export function workOut(facts: Facts, edition: Edition, samples: number): WorkedOut {
  const compiled = compileEdition(edition);
  const sampler = samplerFor(facts, edition, samples);
  const served = facts.zip === null || compiled.jurisdictionByZip.has(facts.zip);
  const likely = sampler.home(MIDDLE);
  const homePlace = placeOf(compiled, likely.zip) ?? edition.jurisdictions[0];
  if (!homePlace) throw new RangeError('An edition has at least one jurisdiction');
  const likelyWays = tidyWays(likely);
  let likelyHome: Home | null = null;
  const isOnlyHome = sampler.streams.size === 0;
  const homeAt = (draw: number): Home => {
    const isLikely = draw === MIDDLE || isOnlyHome;
    if (isLikely && likelyHome) return likelyHome;
    const known = isLikely ? likely : sampler.home(draw);
    const place = placeOf(compiled, known.zip) ?? homePlace;
    if (!isLikely) return homeOf(known, place, edition.options.upgradeAmps);
    return (likelyHome = homeOf(known, place, edition.options.upgradeAmps, likelyWays));
  };
  const flags = raisedFlags(compiled, { facts, place: { served }, run: { ways: likelyWays.length }, load: CARRIED });
  const nothing = { compiled, sampler, place: homePlace, draws: [], options: [], firm: false, leavesOut: false, homeAt, likely };
  if (flags.length > 0) return { ...nothing, flags };

  const middle = homeAt(MIDDLE);
  const all = candidates(facts, likely, edition);
  const inMiddle = new Map(all.map((option) => [option.id, priceOption(compiled, middle, option)]));
  const plans = chooseOptions(all, likely, ({ id }) => inMiddle.get(id)?.totalCents ?? null);
  const draws: number[] = [];
  const totals = plans.map((): number[] => []);
  const lines = plans.map((): (readonly number[])[] => []);
  const count = isOnlyHome ? 1 : samples;
  for (let draw = 0; draw < count; draw += 1) {
    const home = homeAt(draw);
    if (isFlagged(compiled, { facts: home.known, place: { served: true }, run: { ways: home.runs.length }, load: CARRIED })) continue;
    const prices = plans.map((option) => (home === middle ? inMiddle.get(option.id) : priceOption(compiled, home, option)) ?? null);
    if (prices.some((price) => price === null)) continue;
    draws.push(draw);
    prices.forEach((price, index) => {
      if (price === null) return;
      totals[index]?.push(price.totalCents);
      lines[index]?.push(price.lineCents);
    });
  }
  if (draws.length === 0 || plans.length === 0) {
    const carried = all.some(({ chargingAmps }) => capacityFixes(middle, chargingAmps).length > 0);
    return { ...nothing, flags: raisedFlags(compiled, { facts, place: { served }, run: { ways: carried ? 0 : 1 }, load: { carried } }) };
  }

  const banded = plans.map((option, index) => ({
    option,
    totals: totals[index] ?? [],
    lines: lines[index] ?? [],
    band: bandOf({ totals: totals[index] ?? [], lines: lines[index] ?? [] }),
  }));
  const recommended = recommend(banded, likely);
  const single = banded.every(({ totals: all }) => all.every((cents) => cents === all[0]));
  return {
    ...nothing,
    flags,
    draws,
    firm: single && draws.length === count,
    leavesOut: draws.length < count,
    options: banded.map((entry, index) => ({ ...entry, recommended: index === recommended })),
  };
}
