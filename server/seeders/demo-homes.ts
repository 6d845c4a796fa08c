import { steps, askedFields, fieldsById, UNSURE, type Answers } from '../../shared/wizard/index';
import { loadIds } from '../../shared/loads';
import type { Chance } from './random';

/** How a demo home is meant to come out. */
export type DemoHomeKind = 'garage' | 'elsewhere' | 'outdoors' | 'detached' | 'odd';

const gas = { present: false, amount: null };
const electric = { present: true, amount: null };

function loadsOf(random: Chance) {
  const some = (share: number) => (random.often(share) ? electric : gas);
  const board = Object.fromEntries(loadIds.map((id) => [id, gas])) as Record<string, { present: boolean; amount: number | null }>;
  const heatPump = random.often(0.2);
  return {
    ...board, range: some(0.6), dryer: some(0.65), waterHeater: some(0.4), dishwasher: some(0.85), disposal: some(0.6), microwave: some(0.5), spa: some(0.08), poolPump: some(0.1),
    centralAir: heatPump ? gas : { present: random.often(0.8), amount: random.pick([2, 3, 3, 4]) },
    heatPump: { present: heatPump, amount: heatPump ? random.pick([2, 3, 4]) : null },
  };
}

function placesOf(kind: DemoHomeKind, random: Chance): Answers {
  if (kind === 'outdoors') return { parking: random.pick(['driveway', 'carport']), panelPlace: random.pick(['outside', 'basement', 'elsewhere']), pacesToPanel: random.whole(4, 18), floorsBetween: random.pick(['0', '0', '1']) };
  const two = random.often(0.65);
  const roomWidthFt = two ? random.whole(19, 24) : random.whole(11, 14);
  const roomDepthFt = random.whole(20, 25);
  const chargerWall = random.pick(['right', 'left', 'back']);
  const garage: Answers = {
    parking: kind === 'detached' ? 'detached_garage' : 'attached_garage', roomWidthFt, roomDepthFt, ceilingFt: random.pick([8, 8.5, 9, 10]), garageDoorWidthFt: two ? 16 : 9,
    chargerWall, chargerAlongFt: chargerWall === 'back' ? Math.round(roomWidthFt * 0.7) : random.whole(4, 14), chargerHeightIn: 45,
    carParked: random.pick(['nose_in', 'nose_in', 'back_in']), portCorner: random.pick(['front_left', 'rear_left', 'rear_right', 'front_right']), carCenterXFt: two ? roomWidthFt - 6 : roomWidthFt / 2,
    wallFinish: random.pick(['drywall', 'drywall', 'drywall', 'bare_studs', 'masonry']), atticAbove: random.pick(['yes', 'no', 'no']), houseDoorWall: 'left', houseDoorAlongFt: Math.min(14, roomDepthFt - 5),
  };
  if (kind === 'detached') return { ...garage, panelPlace: random.pick(['outside', 'basement']), trenchFt: random.whole(18, 70), surfaceOver: random.pick(['soil', 'soil', 'paved']) };
  if (kind === 'elsewhere') return { ...garage, panelPlace: random.pick(['next_room', 'elsewhere', 'basement', 'outside']), pacesToPanel: random.whole(4, 20), floorsBetween: random.pick(['0', '0', '1']) };
  return { ...garage, panelPlace: 'garage_wall', panelWall: random.pick(['back', 'left']), panelAlongFt: random.whole(2, 7), panelTopIn: 60 };
}

/**
 * Answers of one invented home, all of them such as the wizard takes.
 * @param doubt share of the questions answered "Not sure", where that is an answer
 */
export function demoHome(kind: DemoHomeKind, random: Chance, doubt: number): Answers {
  const yearBuilt = random.pick(['before_1965', '1965_1989', '1965_1989', '1990_2009', '1990_2009', '2010_or_later']);
  const old = yearBuilt === 'before_1965' || yearBuilt === '1965_1989';
  const theirs = random.often(0.3);
  const full: Answers = {
    zip: random.pick(['00017', '00018', '00021']), homeKind: random.pick(['house', 'house', 'house', 'town_house']), tenure: 'own', yearBuilt, floorAreaFt2: random.whole(11, 32) * 100,
    carMaxAmps: random.pick(['32', '32', '40', '48', '48', '48']), whPerMile: random.pick(['260', '300', '300', '380', '480']), milesPerDay: random.whole(3, 16) * 5, hoursHome: random.whole(8, 13), secondCar: random.pick(['no', 'no', 'maybe', 'yes']),
    chargerSupply: theirs ? 'theirs' : 'ours', chargerMaxAmps: random.pick(['32', '40']), chargerConnection: random.pick(['wired', 'plug_in']), cableLengthFt: random.pick([18, 20, 24]),
    mainBreakerAmps: old ? random.pick(['100', '100', '125', '150', '200']) : random.pick(['150', '200', '200', '200']), blankSpaces: random.pick(['0', '1', '2', '2', '2']),
    panelCondition: kind === 'odd' ? [random.pick(['rust_or_water', 'fuses', 'warm'])] : [], panelMount: random.pick(['flush', 'flush', 'surface']), serviceDrop: random.pick(['overhead', 'underground']), solarAmps: random.pick(['0', '0', '0', '0', '30']),
    loads: loadsOf(random), runLook: random.pick(['pipe', 'pipe', 'hidden']), paintRun: random.pick(['yes', 'no']), crawlBelow: random.pick(['yes', 'no']), pacesToPanel: random.whole(4, 20), floorsBetween: '0',
    ...placesOf(kind === 'odd' ? 'garage' : kind, random),
  };
  const doubted: Answers = Object.fromEntries(Object.entries(full).map(([id, value]) => [id, fieldsById.get(id)?.unsure && random.often(doubt) ? UNSURE : value]));
  // Doubt decides what else is asked, so what applies is read last.
  return Object.fromEntries(steps.flatMap((step) => askedFields(step, doubted)).flatMap((field) => (doubted[field.id] === undefined ? [] : [[field.id, doubted[field.id]]])));
}
