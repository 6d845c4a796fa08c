import type { Answers } from '../../../shared/wizard/index';

/** An invented house whose panel hangs in the attached garage: every question is answered, so its price is firm or nearly so. */
export const knownHouse: Answers = {
  zip: '00017', homeKind: 'house', tenure: 'own', parking: 'attached_garage', yearBuilt: '1990_2009', floorAreaFt2: 1900,
  carMaxAmps: '48', whPerMile: '300', milesPerDay: 40, hoursHome: 10, secondCar: 'no', chargerSupply: 'ours',
  mainBreakerAmps: '200', blankSpaces: '2', panelCondition: [], panelPlace: 'garage_wall', panelMount: 'surface', serviceDrop: 'overhead', solarAmps: '0',
  loads: { range: { present: true, amount: null }, dryer: { present: true, amount: null }, centralAir: { present: true, amount: 3 } },
  roomWidthFt: 20, roomDepthFt: 22, ceilingFt: 9, garageDoorWidthFt: 16,
  panelWall: 'left', panelAlongFt: 6, chargerWall: 'left', chargerAlongFt: 14, carParked: 'nose_in', portCorner: 'front_left',
  wallFinish: 'drywall', atticAbove: 'no', houseDoorWall: 'back', runLook: 'pipe', paintRun: 'no',
};

/** The same house with doubts that leave a range. */
export const doubtfulHouse: Answers = { ...knownHouse, mainBreakerAmps: 'unsure', blankSpaces: 'unsure', wallFinish: 'unsure' };

/** The same house with rust in the panel: a danger, so no price from here. */
export const rustyHouse: Answers = { ...knownHouse, panelCondition: ['rust_or_water'] };
