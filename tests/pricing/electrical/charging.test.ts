import fc from 'fast-check';
import { loadIds } from '../../../shared/loads';
import { busbarVerdict } from '../../../pricing/electrical/busbar';
import { milesPerHour, milesPerNight, pilotReading } from '../../../pricing/electrical/charging';
import { chargingAmpsWithin, planEnergyManagement } from '../../../pricing/electrical/energy-management';
import { typicalLoadVa } from '../../../pricing/electrical/typical-loads';

describe('pilot signal: SAE J1772 / IEC 61851-1 relation as tabulated in an instrument manual', () => {
  it.each([
    [0, 0, 'not_available'], [2.9, 0, 'not_available'], [3, 0, 'error'], [4.5, 0, 'digital'], [5.5, 0, 'digital'], [6, 0, 'error'], [7.5,
    0, 'error'],
    [8, 6, 'current'], [9.9, 6, 'current'], [10, 6, 'current'], [85, 51, 'current'], [85.1, 52.75, 'current'], [96, 80, 'current'], [97,
    80, 'current'],
    [97.1, 0, 'not_available'], [100, 0, 'not_available'],
  ] as const)('%f %% duty: %f A, %s', (duty, amps, meaning) => {
    expect(pilotReading(duty).amps).toBeCloseTo(amps, 6);
    expect(pilotReading(duty).meaning).toBe(meaning);
  });
});

describe('range', () => {
  it('35 miles at 300 Wh need 10.5 kWh: 16 A at 240 V brings them in under 3 h (arithmetic)', () => {
    const milesAnHour = milesPerHour({ kw: 3.84, whPerMile: 300, basis: 'wall' });
    expect(milesPerNight(milesAnHour, 2.7)).toBe(34);
    expect(milesPerNight(milesAnHour, 2.75)).toBe(35);
  });
  it('takes the loss off battery figures, 10 % when not said (85 to 92 % from memory)', () => {
    expect(milesPerHour({ kw: 10, whPerMile: 300, basis: 'battery' })).toBeCloseTo(30, 6);
  });
});

describe('energy management: NEC 2023 220.70 and 750.30, set point as a continuous load', () => {
  const home = { edition: '2023', serviceAmps: 100, homeAmps: 72, chargingAmps: 48 } as const;
  it('a 100 A main may be set to 80 A, which leaves 8 A beside 72 A', () => {
    const plan = planEnergyManagement(home);
    expect(plan).toMatchObject({ setPointAmps: 80, chargingAmpsAtPeak: 8, possible: true, chargesAtPeak: true });
    expect(plan.trace[0]?.clause).toBe('NEC 2023 220.70, 750.30');
    expect(planEnergyManagement({ ...home, edition: '2020' }).trace[0]?.clause).toBe('NEC 2020 625.42(A), 750.30');
  });
  it('below 6 A, the least of the pilot signal, the car waits; above the set point it may not stand for the load (220.70)', () => {
    expect(planEnergyManagement({ ...home, homeAmps: 74 })).toMatchObject({ chargingAmpsAtPeak: 6, chargesAtPeak: true });
    expect(planEnergyManagement({ ...home, homeAmps: 74.1 })).toMatchObject({ chargingAmpsAtPeak: 5, chargesAtPeak: false,
      possible: true });
    expect(planEnergyManagement({ ...home, homeAmps: 80 })).toMatchObject({ chargingAmpsAtPeak: 0, withinSetPoint: true });
    expect(planEnergyManagement({ ...home, homeAmps: 80.1 })).toMatchObject({ withinSetPoint: false });
  });
  it('of the charger only what the system permits counts (625.42(A)), so a home within its service may have one, above it not', () => {
    expect(planEnergyManagement({ ...home, homeAmps: 100 })).toMatchObject({ chargingAmpsAtPeak: 0, possible: true });
    expect(planEnergyManagement({ ...home, homeAmps: 100.1 })).toMatchObject({ chargingAmpsAtPeak: 0, possible: false });
  });
  it('a device listed for 100 % may be set to its whole rating', () => {
    expect(planEnergyManagement({ ...home, deviceFullRated: true })).toMatchObject({ setPointAmps: 100, chargingAmpsAtPeak: 28 });
  });
  it('never gives more than the setting', () => expect(chargingAmpsWithin(200, 50, 48)).toBe(48));
});

describe('busbar: 120 % rule, NEC 2023 705.12(B)(2)', () => {
  it('200 A bus and main take 40 A: 32 A of inverters at 125 % fit exactly, 32.1 A do not', () => {
    const panel = { edition: '2023', busAmps: 200, mainAmps: 200 } as const;
    expect(busbarVerdict({ ...panel, inverterAmps: 32 })).toMatchObject({ maxBackfeedAmps: 40, neededAmps: 40, fits: true,
      clause: 'NEC 2023 705.12(B)(2)' });
    expect(busbarVerdict({ ...panel, inverterAmps: 32.1 }).fits).toBe(false);
  });
  it('leaves nothing, and nothing below that, where the main is larger', () => {
    expect(busbarVerdict({ edition: '2020', busAmps: 100, mainAmps: 125, inverterAmps: 1 })).toMatchObject({ maxBackfeedAmps: 0,
      fits: false });
  });
});

describe('typical ratings: common practice, no source', () => {
  it.each([
    ['range', null, 12_000], ['wallOven', null, 4500], ['cooktop', null, 5000], ['dryer', null, 5000], ['waterHeater', null, 4500],
    ['dishwasher', null, 1200],
    ['disposal', null, 800], ['microwave', null, 1500], ['poolPump', null, 1800], ['wellPump', null, 1500], ['sumpPump', null, 800],
    ['centralAir', 3, 3900], ['heatPump', 2.5, 3250], ['stripHeat', 10, 10_000], ['roomHeaters', 4, 6000], ['instantWaterHeater', 18,
    18_000],
    ['otherCharger', 32, 7680], ['spa', null, 9600],
  ] as const)('%s %s: %i VA', (id, amount, va) => expect(typicalLoadVa(id, amount)).toBe(va));
  it('every load has one, and a larger amount is a larger load', () => {
    for (const id of loadIds) expect(typicalLoadVa(id, null)).toBeGreaterThan(0);
    fc.assert(fc.property(fc.constantFrom(...loadIds), fc.double({ min: 0, max: 50, noNaN: true }), (id, amount) =>
      typicalLoadVa(id, amount) <= typicalLoadVa(id, amount + 1)));
  });
});
