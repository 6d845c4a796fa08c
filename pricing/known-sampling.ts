import type { Facts } from '../shared/facts';
import { loadIds, type LoadId } from '../shared/loads';
import { stratifiedDraws } from './random';
import { RulebookError } from './rulebook/compile';
import { compileLikelihoods, type CompiledLikelihood } from './rulebook/likelihood';
import type { Edition } from './rulebook/schema';
import type { KnownFacts } from './known-facts';
import { fillPlaces, indoors, type Chooser, type Draft, type Fill } from './likely-places';

/** The likeliest home instead of a drawn one. */
export const MIDDLE = -1;

export interface Sampler {
  /** The home of one draw; MIDDLE gives the likeliest. The same number gives the same home always. */
  readonly home: (draw: number) => KnownFacts;
  /** Draws by name ("mainBreakerAmps", "panelAt.alongFt"), one number a home; what varies is what is not known. */
  readonly streams: ReadonlyMap<string, Float64Array>;
}

/** Facts whose unknown value is drawn by their own name. Those read by another's likelihood come first. */
const plainFacts = [
  'yearBuilt',
  'parking',
  'zip',
  'homeKind',
  'tenure',
  'floorAreaFt2',
  'carMaxAmps',
  'milesPerDay',
  'hoursHome',
  'whPerMile',
  'secondCar',
  'chargerSupply',
  'chargerMaxAmps',
  'cableLengthFt',
  'mainBreakerAmps',
  'blankSpaces',
  'panelPlace',
  'panelMount',
  'serviceDrop',
  'solarAmps',
  'panelCondition',
  'room',
  'ceilingFt',
  'wallFinish',
  'atticAbove',
  'crawlBelow',
  'pacesToPanel',
  'floorsBetween',
  'trenchFt',
  'surfaceOver',
  'paintRun',
] as const satisfies readonly (keyof Facts)[];
/** Likelihoods of loads may read the heat pump. */
const loadOrder: readonly LoadId[] = ['heatPump', ...loadIds.filter((id) => id !== 'heatPump')];

/** Facts that cannot matter for what is already known; they take their likeliest value and are not drawn. */
function idle(facts: Facts, name: string): boolean {
  const onGarageWall = facts.panelPlace === 'garage_wall' && indoors(facts.parking);
  switch (name) {
    case 'room':
    case 'ceilingFt':
    case 'wallFinish':
    case 'atticAbove':
      return !indoors(facts.parking);
    case 'pacesToPanel':
    case 'floorsBetween':
    case 'crawlBelow':
      return onGarageWall;
    case 'yearBuilt':
      return facts.mainBreakerAmps !== null;
    default:
      return false;
  }
}

/**
 * Prepares drawing of what is not known, `count` homes in all.
 * @throws RulebookError when the edition has no likelihood for an unknown fact.
 */
export function samplerFor(facts: Facts, edition: Edition, count: number): Sampler {
  const likelihoods = compileLikelihoods(edition);
  const streams = new Map<string, Float64Array>();
  const fills: Fill[] = [];

  const place = (name: string) => {
    const draws = stratifiedDraws(name, count);
    streams.set(name, draws);
    return draws;
  };
  const chooser = (name: string, isIdle = false): ((draft: Draft, draw: number) => unknown) => {
    const likelihood = likelihoods.get(name);
    if (!likelihood) throw new RulebookError(`The rulebook has no likelihood for ${name}`);
    const chanceFor = (draft: Draft) =>
      likelihood.by === null ? likelihood.otherwise : (likelihood.cases.get(valueOf(draft, likelihood)) ?? likelihood.otherwise);
    if (isIdle || !likelihood.varies) return (draft) => chanceFor(draft).likeliest;
    const draws = place(name);
    return (draft, draw) => (draw === MIDDLE ? chanceFor(draft).likeliest : chanceFor(draft).draw(draws[draw] ?? 0.5));
  };

  for (const name of plainFacts) {
    if (facts[name] !== null) continue;
    const choose = chooser(name, idle(facts, name));
    // The rulebook's validation stands for the value's type.
    fills.push((draft, draw) => {
      (draft as Record<string, unknown>)[name] = choose(draft, draw);
    });
  }
  for (const id of loadOrder) fillLoad(facts, id, likelihoods, chooser, fills);
  fillPlaces(facts, chooser, fills, (name) => {
    const draws = place(name);
    return (draw) => (draw === MIDDLE ? 0.5 : (draws[draw] ?? 0.5));
  });

  return {
    streams,
    home: (draw) => {
      const draft: Draft = { ...facts, loads: { ...facts.loads } };
      for (const fill of fills) fill(draft, draw);
      return {
        ...draft,
        busRatingAmps: draft.busRatingAmps ?? draft.mainBreakerAmps,
        chargerConnection: draft.chargerConnection ?? 'wired',
      } as KnownFacts;
    },
  };
}

const valueOf = (draft: Draft, { by }: CompiledLikelihood): string =>
  by?.startsWith('loads.') ? String(draft.loads[by.slice('loads.'.length) as LoadId]?.present) : String(draft[by as keyof Facts]);

function fillLoad(facts: Facts, id: LoadId, likelihoods: ReadonlyMap<string, CompiledLikelihood>, chooser: Chooser, fills: Fill[]): void {
  const load = facts.loads[id] ?? { present: null, amount: null };
  const choosePresent = load.present === null ? chooser(`loads.${id}`) : null;
  const amountName = `loads.${id}.amount`;
  const chooseAmount = load.amount === null && load.present !== false && likelihoods.has(amountName) ? chooser(amountName) : null;
  if (!choosePresent && !chooseAmount) return;
  fills.push((draft, draw) => {
    const present = choosePresent ? choosePresent(draft, draw) === true : load.present === true;
    const amount = present && chooseAmount ? Number(chooseAmount(draft, draw)) : load.amount;
    draft.loads[id] = { present, amount };
  });
}
