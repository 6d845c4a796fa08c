import type { Facts, FactSource } from '../facts';
import { loadKinds, type LoadKind } from '../loads';
import { ampsInWords, feetInWords, inchesInWords } from '../units';
import { fieldsById } from './index';
import { amountUnit } from './steps/loads';

export interface FactInWords { readonly name: string; readonly label: string; readonly words: string; readonly source: FactSource }

const wallWords = { back: 'back wall', right: 'right wall', front: 'front wall', left: 'left wall' } as const;
const fromWhere = { back: 'from the left corner', front: 'from the left corner', right: 'from the back', left: 'from the back' } as const;

/** Facts that a wizard field answers under the same name: its own words are used. */
const sameName = [
  'zip', 'homeKind', 'tenure', 'parking', 'yearBuilt', 'floorAreaFt2', 'carMaxAmps', 'whPerMile', 'milesPerDay', 'hoursHome', 'secondCar',
  'chargerSupply', 'chargerMaxAmps', 'chargerConnection', 'cableLengthFt', 'mainBreakerAmps', 'blankSpaces', 'panelCondition', 'panelPlace', 'panelMount',
  'serviceDrop', 'solarAmps', 'pacesToPanel', 'floorsBetween', 'trenchFt', 'surfaceOver', 'wallFinish', 'runLook',
] as const satisfies readonly (keyof Facts)[];

const numericFields = new Set(['floorAreaFt2', 'milesPerDay', 'hoursHome', 'cableLengthFt', 'pacesToPanel', 'trenchFt']);

function own(name: (typeof sameName)[number], facts: Facts): string {
  const field = fieldsById.get(name);
  const value = facts[name];
  if (!field || value === null) return 'Not sure';
  const words = field.words(numericFields.has(name) || Array.isArray(value) ? value : String(value));
  // A corrected value may lie between the choices of the wizard.
  return words || (typeof value === 'number' ? ampsInWords(value) : String(value));
}

const yesNo = (value: boolean | null) => (value === null ? 'Not sure' : value ? 'Yes' : 'No');
const place = (at: { wall: keyof typeof wallWords; alongFt: number } | null, heightIn: number | null) =>
  at === null ? 'Not sure' : `${wallWords[at.wall]}, ${feetInWords(at.alongFt)} ${fromWhere[at.wall]}${heightIn === null ? '' : `, ${inchesInWords(heightIn)} up`}`;

const corner = { front_left: 'front left', front_right: 'front right', rear_left: 'rear left', rear_right: 'rear right' } as const;

/** Every fact in words for people, in the wizard's order. Facts that do not apply to this home are left out. */
export function factsInWords(facts: Facts, sources: Partial<Record<string, FactSource>>): readonly FactInWords[] {
  const inGarage = facts.parking === 'attached_garage' || facts.parking === 'detached_garage';
  const entry = (name: string, label: string, words: string): FactInWords => ({ name, label, words, source: words === 'Not sure' ? 'assumed' : (sources[name] ?? 'homeowner') });
  const applies = (name: (typeof sameName)[number]) => {
    if (['chargerMaxAmps', 'chargerConnection', 'cableLengthFt'].includes(name)) return facts.chargerSupply === 'theirs';
    if (name === 'trenchFt' || name === 'surfaceOver') return facts.parking === 'detached_garage';
    if (name === 'pacesToPanel' || name === 'floorsBetween') return !(inGarage && facts.panelPlace === 'garage_wall');
    return name !== 'wallFinish' || inGarage;
  };
  const loads = (loadKinds as readonly LoadKind[]).map((kind) => {
    const load = facts.loads[kind.id as keyof Facts['loads']];
    const amount = load?.amount == null ? '' : `, ${load.amount} ${amountUnit(kind, load.amount)}`;
    return entry(`loads.${kind.id}`, kind.title, load?.present == null ? 'Not sure' : load.present ? `Electric${amount}` : 'No');
  });
  return [
    ...sameName.filter(applies).map((name) => entry(name, fieldsById.get(name)?.name ?? name, own(name, facts))),
    ...loads,
    ...(inGarage
      ? [
          entry('room', 'Garage', facts.room ? `${feetInWords(facts.room.widthFt)} by ${feetInWords(facts.room.depthFt)}` : 'Not sure'),
          entry('ceilingFt', 'Ceiling', facts.ceilingFt === null ? 'Not sure' : feetInWords(facts.ceilingFt)),
          entry('garageDoor', 'Garage door', facts.garageDoor ? feetInWords(facts.garageDoor.widthFt) : 'Not sure'),
          ...(facts.panelPlace === 'garage_wall' ? [entry('panelAt', 'Panel on the plan', place(facts.panelAt, null))] : []),
          entry('chargerAt', 'Charger on the plan', place(facts.chargerAt, facts.chargerAt?.heightIn ?? null)),
          entry('carAt', 'Car', facts.carAt ? `${facts.carAt.parked === 'nose_in' ? 'Nose in' : 'Back in'}, port ${corner[facts.carAt.portCorner]}` : 'Not sure'),
          entry('atticAbove', 'Attic above', yesNo(facts.atticAbove)),
        ]
      : []),
    ...(facts.panelPlace === 'garage_wall' ? [] : [entry('crawlBelow', 'Crawl space', yesNo(facts.crawlBelow))]),
    entry('paintRun', 'Paint the pipe', yesNo(facts.paintRun)),
  ];
}
