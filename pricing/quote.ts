import type { Facts } from '../shared/facts';
import { roundCents, type Cents } from '../shared/money';
import type { LiveRange, Narrowing, PlanDrawing, QuoteDocument, QuoteOption } from '../shared/quote';
import { TOTAL_STEP_CENTS } from './band';
import { depositLimit } from './deposit-limit';
import { ADVISED_DROP_PERCENT } from './electrical/voltage-drop';
import { tidyWays } from './home';
import { MIDDLE } from './known-sampling';
import { loadSheet } from './load-sheet';
import { narrowingOf } from './narrowing';
import { coversUsualDay, kwOf, milesPerNight } from './option-plan';
import { circuitWords } from './circuit-for';
import { priceOption } from './price-option';
import { quoteLines } from './quote-lines';
import type { Edition } from './rulebook/schema';
import { wholeFeet } from './run/whole-feet';
import { planDrawing, planProblems } from './run/plan-drawing';
import { runTrace } from './run-trace';
import { workOut, type WorkedOption, type WorkedOut } from './work-out';
import { optionBecause, optionSubtitle, optionTitle } from './words';

export const DOCUMENT_SAMPLES = 1_000;
export const LIVE_SAMPLES = 400;
const DAY_MS = 86_400_000;

export interface IntakeToPrice {
  readonly facts: Facts;
  readonly edition: Edition;
  /** ISO date of the price, as the place's calendar has it. */
  readonly pricedOn: string;
  /** The facts in people's words, for the document. */
  readonly factsInWords?: QuoteDocument['facts'];
  readonly samples?: number;
}

/** ISO date some days later. */
export const daysAfter = (isoDate: string, days: number): string =>
  new Date(Date.parse(`${isoDate}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);

function narrowing(worked: WorkedOut): Narrowing[] {
  const entry = worked.options.find(({ recommended }) => recommended);
  return entry ? narrowingOf(entry.totals, worked.draws, worked.sampler.streams) : [];
}

/** The plan as far as it is known: no drawing before the room is measured, no run before both ends have a place. */
function planOf(facts: Facts, worked: WorkedOut): PlanDrawing | null {
  if (facts.room === null) return null;
  const entry = worked.options.find(({ recommended }) => recommended);
  const home = entry ? worked.homeAt(worked.draws[entry.band.midSample] ?? MIDDLE) : null;
  const run = entry && home ? priceOption(worked.compiled, home, entry.option)?.run : tidyWays(worked.likely)[0];
  const drawing = planDrawing(home?.known ?? worked.likely, run ?? null);
  if (!drawing) return null;
  const startKnown = facts.panelPlace === 'garage_wall' ? facts.panelAt !== null : facts.panelPlace !== null;
  return {
    ...drawing,
    panel: facts.panelAt === null ? null : drawing.panel,
    run: startKnown && facts.chargerAt !== null ? drawing.run : null,
  };
}

function quoteOption(facts: Facts, worked: WorkedOut, entry: WorkedOption, recommendedMidCents: Cents): QuoteOption {
  const { option, band, recommended } = entry;
  const { edition } = worked.compiled;
  const home = worked.homeAt(worked.draws[band.midSample] ?? MIDDLE);
  const priced = priceOption(worked.compiled, home, option, true);
  if (!priced) throw new RangeError(`Option ${option.id} was priced and cannot be built`);
  const { place } = home;
  const known = worked.likely;
  const { circuit, run } = priced;
  const kw = kwOf(option.chargingAmps, known);
  const covers = coversUsualDay(option.chargingAmps, known);
  return {
    id: option.id,
    title: optionTitle(option, circuit.breakerAmps),
    subtitle: optionSubtitle(option, known),
    connection: option.connection,
    chargingAmps: option.chargingAmps,
    breakerAmps: circuit.breakerAmps,
    kw,
    milesPerHour: Math.round((kw * 1000) / known.whPerMile),
    milesPerNight: milesPerNight(option.chargingAmps, known),
    coversUsualDay: covers,
    recommended,
    panelChange: priced.panelChange,
    because: optionBecause(option, known, {
      recommended,
      covers,
      kw,
      dearerCents: roundCents(band.midCents - recommendedMidCents, TOTAL_STEP_CENTS),
      kindOpen: facts.chargerSupply === 'theirs' && facts.chargerConnection === null,
      managed: priced.capacityFix === 'energy_management',
      upgraded: priced.capacityFix === 'service_upgrade',
    }),
    depositCents: Math.min(edition.deposit.cents, depositLimit(place.state, band.lowCents).limitCents ?? edition.deposit.cents),
    lowCents: band.lowCents,
    midCents: band.midCents,
    highCents: band.highCents,
    lines: quoteLines(worked, entry, { home, priced }, (other, plan) => priceOption(worked.compiled, other, plan)),
    circuit: {
      hotAwg: circuit.hotAwg,
      groundAwg: circuit.groundAwg,
      material: circuit.material,
      insulation: circuit.insulation,
      method: circuit.method,
      methodWords: run.methodWords,
      racewayTradeSize: circuit.racewayTradeSize,
      voltageDropPercent: Math.round(circuit.voltageDropPercent * 100) / 100,
      gfciRequired: circuit.gfciRequired,
      disconnectRequired: circuit.disconnectRequired,
      words: circuitWords(circuit),
    },
    run: {
      method: run.method,
      methodWords: run.methodWords,
      ...wholeFeet(run),
      bends: run.bends90,
      pullPoints: run.pullPoints,
      supports: run.supports,
    },
    takeoff: priced.takeoff.items.map(({ item, words, quantity, unit }) => ({ item, words, quantity, unit })),
    laborHours: priced.hours,
    load: loadSheet(home, option.chargingAmps, priced.capacityFix, isLoadKnown(worked)),
    trace: [...circuit.trace, ...runTrace(run, place.codeEdition)].map(({ what, value, clause }) => ({ what, value, clause })),
  };
}

/** True when nothing of the load calculation was drawn: the main, the floor area, the big loads and their sizes were answered. */
const isLoadKnown = ({ sampler }: WorkedOut): boolean =>
  ![...sampler.streams.keys()].some((name) => name === 'mainBreakerAmps' || name === 'floorAreaFt2' || name.startsWith('loads.'));

function cautionsOf({ place, leavesOut }: WorkedOut, options: readonly QuoteOption[]): string[] {
  const { codeEdition } = place;
  const recommended = options.find((option) => option.recommended);
  return [
    `Designed to the ${codeEdition} NEC. The local code, the permit office and the licensed electrician decide.`,
    ...(options.some(({ load, panelChange }) => load.status === 'amber' && panelChange !== 'energy_management')
      ? ['The service carries this by one accepted calculation and not by the strictest. The electrician checks it.']
      : []),
    ...(options.some(({ panelChange }) => panelChange === 'energy_management')
      ? ['A load manager may hold the charger at nothing while the home is at its peak. The electrician confirms that it is enough.']
      : []),
    ...(recommended && recommended.circuit.voltageDropPercent > ADVISED_DROP_PERCENT
      ? [`The run is long: about ${recommended.circuit.voltageDropPercent.toFixed(1)}% of the voltage is lost on it. Thicker wire would help; ask us.`]
      : []),
    ...(leavesOut ? ['The range leaves out homes that we would have to see first: a look at the panel tells.'] : []),
    ...(options.some(({ load }) => !load.known) ? ['The load calculation takes a typical home where an answer is missing.'] : []),
  ];
}

/**
 * Prices one intake into the document that is frozen: options with their ranges and every line's reason, or the flags that ask
 * for a visit. Same facts, edition and date give the same bytes.
 * @throws RulebookError when the edition cannot price it.
 */
export function priceIntake({ facts, edition, pricedOn, factsInWords = [], samples = DOCUMENT_SAMPLES }: IntakeToPrice): QuoteDocument {
  const worked = workOut(facts, edition, samples);
  const { place } = worked;
  const recommended = worked.options.find((entry) => entry.recommended);
  const options = worked.options.map((entry) => quoteOption(facts, worked, entry, recommended?.band.midCents ?? 0));
  return {
    schema: 1,
    pricedOn,
    heldUntil: daysAfter(pricedOn, edition.holdDays),
    rulebookEdition: edition.number,
    codeEdition: place.codeEdition,
    jurisdiction: { id: place.id, name: place.name, state: place.state, timeZone: place.timeZone },
    outcome: worked.flags.length > 0 ? 'visit' : worked.firm ? 'firm' : 'range',
    flags: [...worked.flags],
    options,
    recommendedOptionId: recommended?.option.id ?? null,
    narrowing: narrowing(worked),
    facts: [...factsInWords],
    plan: planOf(facts, worked),
    cautions: cautionsOf(worked, options),
  };
}

/** The range before anything is answered, of the recommended option. */
export function openingRange(facts: Facts, edition: Edition, samples = DOCUMENT_SAMPLES): { lowCents: Cents; highCents: Cents } | null {
  const band = workOut(facts, edition, samples).options.find(({ recommended }) => recommended)?.band;
  return band ? { lowCents: band.lowCents, highCents: band.highCents } : null;
}

/** What must be answered before a range means anything to this homeowner: the first two steps' sure questions. */
const isTooEarly = ({ zip, homeKind, parking, chargerSupply }: Facts): boolean =>
  zip === null || homeKind === null || parking === null || chargerSupply === null;

/** The recommended option's range while answers arrive: not frozen, not a promise. */
export function liveRange({ facts, edition, samples = LIVE_SAMPLES }: Pick<IntakeToPrice, 'facts' | 'edition' | 'samples'>): LiveRange {
  const worked = workOut(facts, edition, samples);
  const entry = worked.options.find(({ recommended }) => recommended);
  // Of the likely home: a home drawn near the middle of the range may have another main than most, and the gauge would jump about.
  const home = entry ? worked.homeAt(MIDDLE) : null;
  const priced = entry && home ? priceOption(worked.compiled, home, entry.option) : null;
  const tooEarly = isTooEarly(facts) && worked.flags.length === 0;
  const shown = tooEarly ? undefined : entry;
  return {
    outcome: worked.flags.length > 0 ? 'visit' : tooEarly ? 'too-early' : worked.firm ? 'firm' : 'range',
    lowCents: shown?.band.lowCents ?? null,
    highCents: shown?.band.highCents ?? null,
    optionTitle: shown && priced ? optionTitle(shown.option, priced.circuit.breakerAmps) : null,
    narrowing: tooEarly ? [] : narrowing(worked),
    flags: [...worked.flags],
    load: entry && home && priced ? loadSheet(home, entry.option.chargingAmps, priced.capacityFix, isLoadKnown(worked)) : null,
    plan: planOf(facts, worked),
    planProblems: planProblems(facts),
  };
}
