import type { CircuitDesign } from '../../pricing/electrical/circuit';
import type { KnownFacts } from '../../pricing/known-facts';
import { unknownFacts } from '../../shared/facts';
import { loadIds } from '../../shared/loads';

/**
 * A home of which everything is known. The garage is that of the shared design picture (invented): 20 by 22 ft, panel on the back
 * wall 4 ft from the left with its top at 5 ft, charger on the right wall 9 ft from the back at 45 in., pipe at 8 ft.
 */
export function knownHome(changes: Partial<KnownFacts> = {}): KnownFacts {
  return {
    ...unknownFacts(),
    zip: '00017', homeKind: 'house', tenure: 'own', parking: 'attached_garage', yearBuilt: '1990_2009', floorAreaFt2: 1900,
    carMaxAmps: 48, milesPerDay: 35, hoursHome: 10, whPerMile: 300, secondCar: 'no', chargerSupply: 'ours', chargerMaxAmps: 48,
    chargerConnection: 'wired', cableLengthFt: 18, mainBreakerAmps: 200, busRatingAmps: 200, blankSpaces: 2, panelPlace: 'garage_wall',
    panelMount: 'surface', serviceDrop: 'overhead', solarAmps: 0, panelCondition: [],
    loads: Object.fromEntries(loadIds.map((id) => [id, { present: false, amount: null }])) as KnownFacts['loads'],
    room: { widthFt: 20, depthFt: 22 }, ceilingFt: 8.5, wallFinish: 'drywall', atticAbove: false, crawlBelow: false,
    garageDoor: { alongFt: 2, widthFt: 16 }, openings: [{ wall: 'left', alongFt: 12.5, widthFt: 3 }],
    panelAt: { wall: 'back', alongFt: 4, topIn: 60 }, chargerAt: { wall: 'right', alongFt: 9, heightIn: 45 },
    carAt: { centerXFt: 14.5, parked: 'nose_in', portCorner: 'rear_right' },
    pacesToPanel: 12, floorsBetween: 0, trenchFt: 30, surfaceOver: 'soil', runLook: null, paintRun: false,
    ...changes,
  };
}

/** A 48 A circuit in 3/4 in. EMT as the circuit table of the domain notes has it: 60 A, 6 AWG, ground 10 AWG. */
export const knownCircuit = (changes: Partial<CircuitDesign> = {}): CircuitDesign => ({
  edition: '2023', chargingAmps: 48, volts: 240, minimumDeviceAmps: 60, breakerAmps: 60, hotAwg: '6', groundAwg: '10', material: 'Cu', insulation: 'THHN',
  method: 'EMT', racewayTradeSize: '3/4', fillPercent: 23, voltageDropV: 1.5, voltageDropPercent: 0.6,
  suggestedAwgForDrop: null, upsizedForDrop: false, disconnectRequired: false,
  gfciRequired: false, gfciReason: '', kw: 11.52, trace: [],
  ...changes,
});
