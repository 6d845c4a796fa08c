import { unknownFacts, type Facts, type Wall, walls, type PortCorner } from '../facts';
import { loadIds } from '../loads';
import { numberAnswer, wordAnswer, type Answers } from './field';
import type { LoadsAnswer } from './steps/loads';

/**
 * Turns what a homeowner answered into the facts that the computation reads. "Not sure" and what was not asked become null.
 * A place on a wall counts only when wall and distance are both known. Answers must have passed their fields' schemas.
 */
export function answersToFacts(answers: Answers): Facts {
  const word = <T extends string>(id: string) => wordAnswer(answers, id) as T | null;
  const measure = (id: string) => numberAnswer(answers, id);
  const asNumber = <T extends number>(id: string) => {
    const value = wordAnswer(answers, id);
    return value === null ? null : (Number(value) as T);
  };
  const yes = (id: string) => ({ yes: true, no: false })[String(word(id))] ?? null;
  const wall = (id: string): Wall | null => walls.find((name) => name === answers[id]) ?? null;

  const [widthFt, depthFt] = [measure('roomWidthFt'), measure('roomDepthFt')];
  const doorWidthFt = measure('garageDoorWidthFt');
  const [panelWall, panelAlongFt] = [wall('panelWall'), measure('panelAlongFt')];
  const [chargerWall, chargerAlongFt] = [wall('chargerWall'), measure('chargerAlongFt')];
  const [houseDoorWall, houseDoorAlongFt] = [wall('houseDoorWall'), measure('houseDoorAlongFt')];
  const parked = word<'nose_in' | 'back_in'>('carParked');
  const portCorner = word<PortCorner>('portCorner');
  const inGarage = answers.parking === 'attached_garage' || answers.parking === 'detached_garage';
  const board = (answers.loads ?? {}) as LoadsAnswer;
  const theirs = answers.chargerSupply === 'theirs';

  return {
    ...unknownFacts(),
    zip: word('zip'), homeKind: word('homeKind'), tenure: word('tenure'), parking: word('parking'), yearBuilt: word('yearBuilt'),
    floorAreaFt2: measure('floorAreaFt2'),
    carMaxAmps: asNumber('carMaxAmps'), milesPerDay: measure('milesPerDay'), hoursHome: measure('hoursHome'), whPerMile: asNumber('whPerMile'),
    secondCar: word('secondCar'), chargerSupply: word('chargerSupply'),
    chargerMaxAmps: theirs ? asNumber('chargerMaxAmps') : null,
    chargerConnection: theirs ? word('chargerConnection') : null,
    cableLengthFt: theirs ? measure('cableLengthFt') : null,
    mainBreakerAmps: asNumber('mainBreakerAmps'), blankSpaces: asNumber('blankSpaces'), panelPlace: word('panelPlace'), panelMount: word('panelMount'),
    serviceDrop: word('serviceDrop'), solarAmps: asNumber('solarAmps'),
    panelCondition: Array.isArray(answers.panelCondition) ? (answers.panelCondition as Facts['panelCondition']) : null,
    loads: Object.fromEntries(loadIds.map((id) => [id, board[id] ?? { present: null, amount: null }])) as Facts['loads'],
    room: inGarage && widthFt !== null && depthFt !== null ? { widthFt, depthFt } : null,
    ceilingFt: inGarage ? measure('ceilingFt') : null,
    wallFinish: inGarage ? word('wallFinish') : null,
    atticAbove: inGarage ? yes('atticAbove') : null,
    crawlBelow: yes('crawlBelow'),
    garageDoor: inGarage && widthFt !== null && doorWidthFt !== null ? { alongFt: Math.max(0, (widthFt - doorWidthFt) / 2), widthFt: doorWidthFt } : null,
    openings: inGarage && houseDoorWall && houseDoorAlongFt !== null ? [{ wall: houseDoorWall, alongFt: houseDoorAlongFt, widthFt: 3 }] : [],
    panelAt: inGarage && answers.panelPlace === 'garage_wall' && panelWall && panelAlongFt !== null ? { wall: panelWall, alongFt: panelAlongFt, topIn: measure('panelTopIn') ?? 60 } : null,
    chargerAt: inGarage && chargerWall && chargerAlongFt !== null ? { wall: chargerWall, alongFt: chargerAlongFt, heightIn: measure('chargerHeightIn') ?? 45 } : null,
    carAt: inGarage && parked && portCorner ? { centerXFt: measure('carCenterXFt') ?? (widthFt === null ? 10 : widthFt / 2), parked, portCorner } : null,
    pacesToPanel: measure('pacesToPanel'), floorsBetween: asNumber('floorsBetween'),
    trenchFt: measure('trenchFt'), surfaceOver: word('surfaceOver'), runLook: word('runLook'),
    paintRun: answers.runLook === 'hidden' ? false : yes('paintRun'),
  };
}
