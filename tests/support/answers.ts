import type { Answers } from '../../shared/wizard/index';

/** Answers of a whole home; the garage is that of the shared design picture (invented). */
export const completeAnswers: Answers = {
  zip: '00017', homeKind: 'house', tenure: 'own', parking: 'attached_garage', yearBuilt: '1990_2009', floorAreaFt2: 1900,
  carMaxAmps: '48', whPerMile: '300', milesPerDay: 35, hoursHome: 10, secondCar: 'no', chargerSupply: 'ours',
  mainBreakerAmps: '200', blankSpaces: '2', panelCondition: [], panelPlace: 'garage_wall', panelMount: 'surface', serviceDrop: 'overhead', solarAmps: '0',
  loads: { range: { present: true, amount: null }, dryer: { present: false, amount: null }, centralAir: { present: true, amount: 3 } },
  roomWidthFt: 20, roomDepthFt: 22, ceilingFt: 8.5, garageDoorWidthFt: 16, wallFinish: 'drywall', atticAbove: 'no', crawlBelow: 'no',
  houseDoorWall: 'left', houseDoorAlongFt: 12.5, panelWall: 'back', panelAlongFt: 4, panelTopIn: 60, chargerWall: 'right', chargerAlongFt: 9, chargerHeightIn: 45,
  carParked: 'nose_in', portCorner: 'rear_right', carCenterXFt: 14.5, runLook: 'pipe', paintRun: 'no',
};

/** The same with everything that may be doubted answered "Not sure". */
export const unsureAnswers = (answers: Answers, ids: readonly string[]): Answers => ({ ...answers, ...Object.fromEntries(ids.map((id) => [id, 'unsure'])) });
