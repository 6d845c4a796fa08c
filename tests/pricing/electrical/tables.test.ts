import { ambientFactor, bundlingFactor, tableAmpacity } from '../../../pricing/electrical/ampacity';
import { awgSizes, circularMils, compareAwg, type Awg } from '../../../pricing/electrical/awg';
import { allowedAreaIn2, conductorAreaIn2, maximumCount, smallestRaceway, tradeSizes,
  type Raceway } from '../../../pricing/electrical/conduit-fill';
import { coverDepth, trenchDepthIn, type BuriedMethod, type CoverLocation } from '../../../pricing/electrical/cover-depth';
import { clause, clauseOf, ElectricalError, parseEdition } from '../../../pricing/electrical/edition';
import { groundForCircuit, groundForDevice } from '../../../pricing/electrical/grounding';
import { chargingAmpsOn, standardRatingAtLeast, standardRatingsAmps } from '../../../pricing/electrical/standard-ratings';
import { voltageDrop } from '../../../pricing/electrical/voltage-drop';

describe('editions', () => {
  it('2020 and 2023 are read; 2026 is refused in words, as its text is not confirmed', () => {
    expect([parseEdition('2020'), parseEdition('2023')]).toEqual(['2020', '2023']);
    expect(() => parseEdition('2026')).toThrow(ElectricalError);
    expect(() => parseEdition('2026')).toThrow('2026 NEC moved');
    expect(() => parseEdition('1999')).toThrow('not one of the editions');
  });

  it('names clauses in their edition: floor area 220.12 (2020), 220.5(C) (2023); busbar 705.12(B)(3)(2), 705.12(B)(2)', () => {
    expect(clause('2023', '210.20(A)')).toBe('NEC 2023 210.20(A)');
    expect([clauseOf('2020', 'floorArea'), clauseOf('2023', 'floorArea')]).toEqual(['NEC 2020 220.12', 'NEC 2023 220.5(C)']);
    expect([clauseOf('2020', 'busbar'), clauseOf('2023', 'busbar')]).toEqual(['NEC 2020 705.12(B)(3)(2)', 'NEC 2023 705.12(B)(2)']);
    expect([clauseOf('2020', 'lightingDemand'), clauseOf('2023', 'lightingDemand')]).toEqual(['NEC 2020 Table 220.42',
      'NEC 2023 Table 220.45']);
    expect(clauseOf('2023', 'energyManagement')).toContain('220.70');
  });
});

describe('NEC 2023 240.6(A) standard ratings', () => {
  it('are those of the list', () => {
    expect(standardRatingsAmps).toEqual([15, 20, 25, 30, 35, 40, 45, 50, 60, 70, 80, 90, 100, 110, 125, 150, 175, 200, 225, 250, 300, 350,
      400]);
  });
  it.each([[15, 15], [15.01, 20], [50, 50], [50.01, 60], [60, 60], [60.01, 70], [110.5, 125], [400, 400]])('%f A takes %i A', (amps,
    rating) => {
    expect(standardRatingAtLeast(amps)).toBe(rating);
  });
  it.each([400.01, 0, -1, NaN])('%f A has none', (amps) => expect(() => standardRatingAtLeast(amps)).toThrow(ElectricalError));
  it.each([[60, 48], [50, 40], [40, 32], [30, 24], [20, 16]])('625.41: a %i A device carries %i A of charging, 80 %%', (device,
    charging) => {
    expect(chargingAmpsOn(device)).toBe(charging);
  });
});

describe('NEC 2023 Table 310.16 (2018/2021 residential code reprint)', () => {
  const rows: readonly (readonly [Awg, readonly number[], readonly number[] | null])[] = [
    ['14', [15, 20, 25], null], ['12', [20, 25, 30], [15, 20, 25]], ['10', [30, 35, 40], [25, 30, 35]], ['8', [40, 50, 55], [35, 40, 45]],
    ['6', [55, 65, 75], [40, 50, 55]], ['4', [70, 85, 95], [55, 65, 75]], ['3', [85, 100, 115], [65, 75, 85]], ['2', [95, 115, 130], [75,
    90, 100]],
    ['1', [110, 130, 145], [85, 100, 115]], ['1/0', [125, 150, 170], [100, 120, 135]], ['2/0', [145, 175, 195], [115, 135, 150]],
    ['3/0', [165, 200, 225], [130, 155, 175]], ['4/0', [195, 230, 260], [150, 180, 205]], ['250', [215, 255, 290], [170, 205, 230]],
  ];
  it.each(rows)('%s AWG: copper %j, aluminum %j', (awg, copper, aluminum) => {
    expect(([60, 75, 90] as const).map((column) => tableAmpacity('Cu', awg, column))).toEqual(copper);
    expect(([60, 75, 90] as const).map((column) => tableAmpacity('Al', awg, column))).toEqual(aluminum ?? [null, null, null]);
  });
  it('covers every size, each of more amps than the one before', () => {
    expect(rows.map(([awg]) => awg)).toEqual([...awgSizes]);
    expect(compareAwg('4', '6')).toBeGreaterThan(0);
    expect(compareAwg('1', '1/0')).toBeLessThan(0);
    expect(awgSizes.map((awg) => circularMils[awg])).toEqual([...awgSizes.map((awg) => circularMils[awg])].sort((a, b) => a - b));
  });
});

describe('NEC 2023 310.15', () => {
  const upperC = [10, 15, 20, 25, 30, 35, 40, 45, 50, 55, 60, 65, 70];
  const factors = {
    60: [1.29, 1.22, 1.15, 1.08, 1, 0.91, 0.82, 0.71, 0.58, 0.41],
    75: [1.2, 1.15, 1.11, 1.05, 1, 0.94, 0.88, 0.82, 0.75, 0.67, 0.58, 0.47, 0.33],
    90: [1.15, 1.12, 1.08, 1.04, 1, 0.96, 0.91, 0.87, 0.82, 0.76, 0.71, 0.65, 0.58],
  };
  it.each([60, 75, 90] as const)('Table 310.15(B)(1): every band of %i C wire at both of its ends', (insulationC) => {
    factors[insulationC].forEach((factor, band) => {
      expect(ambientFactor(insulationC, upperC[band] ?? NaN)).toBe(factor);
      if (band > 0) expect(ambientFactor(insulationC, (upperC[band - 1] ?? NaN) + 1)).toBe(factor);
    });
  });
  it.each([60, 75, 90] as const)('310.15(B) formula: each factor of %i C wire is near the root of (Tc - Ta) / (Tc - 30)', (insulationC) => {
    factors[insulationC].forEach((factor, band) => {
      const formula = Math.sqrt((insulationC - (upperC[band] ?? NaN)) / (insulationC - 30));
      expect(Math.abs(factor - formula)).toBeLessThan(0.011);
    });
  });
  it('wire of 60 C insulation ends at 55 C, the others at 70 C in the table kept here', () => {
    expect(() => ambientFactor(60, 56)).toThrow(ElectricalError);
    expect(() => ambientFactor(90, 71)).toThrow('may not be used');
    expect(() => ambientFactor(90, NaN)).toThrow(ElectricalError);
  });
  it.each([[2, 1], [3, 1], [4, 0.8], [6, 0.8], [7, 0.7], [9, 0.7], [10, 0.5], [20, 0.5], [21, 0.45], [30, 0.45], [31, 0.4], [40, 0.4],
    [41, 0.35]])(
    'Table 310.15(C)(1): %i conductors, %f', (count, factor) => expect(bundlingFactor(count)).toBe(factor),
  );
});

describe('NEC 2023 Table 250.122', () => {
  it.each([
    [15, '14', '12'], [16, '12', '10'], [20, '12', '10'], [21, '10', '8'], [60, '10', '8'], [61, '8', '6'], [100, '8', '6'], [101, '6',
    '4'], [200, '6', '4'],
    [201, '4', '2'], [300, '4', '2'], [301, '3', '1'], [400, '3', '1'],
  ] as const)('%i A: %s copper, %s aluminum', (amps, copper, aluminum) => {
    expect([groundForDevice(amps, 'Cu'), groundForDevice(amps, 'Al')]).toEqual([copper, aluminum]);
  });
  it('ends at 400 A', () => expect(() => groundForDevice(401, 'Cu')).toThrow(ElectricalError));
  it('250.122(A): never thicker than the hots, 12 AWG on a 20 A circuit with 12 AWG hots; 8 AWG hots of a 30 A circuit upsized from 10',
    () => {
    expect(groundForCircuit({ deviceAmps: 30, material: 'Cu', minimumHotAwg: '12', installedHotAwg: '12' })).toBe('12');
    expect(groundForCircuit({ deviceAmps: 30, material: 'Cu', minimumHotAwg: '10', installedHotAwg: '8' })).toBe('8');
  });
  it('250.122(B): in proportion of circular mils, 50 A from 8 to 4 AWG: 10,380 x 41,740 / 16,510 = 26,242, 6 AWG within 0.1 %', () => {
    expect(groundForCircuit({ deviceAmps: 50, material: 'Cu', minimumHotAwg: '8', installedHotAwg: '4' })).toBe('6');
  });
});

describe('NEC 2023 Chapter 9', () => {
  it.each([
    ['1/2', [12, 9, 5, 3, 2, 1]], ['3/4', [22, 16, 10, 6, 4, 2]], ['1', [35, 26, 16, 9, 7, 4]], ['1-1/4', [61, 45, 28, 16, 12, 7]],
  ] as const)('Annex C Table C.1, THHN in %s EMT: 14, 12, 10, 8, 6, 4 AWG %j', (size, counts) => {
    expect((['14', '12', '10', '8', '6', '4'] as const).map((awg) => maximumCount('EMT', size, awg))).toEqual(counts);
  });
  it.each([['1/2', [3, 1, 1]], ['3/4', [6, 3, 2]], ['1', [11, 6, 4]]] as const)('Annex C, XHHW in %s PVC 80: 10, 8, 6 AWG %j', (size,
    counts) => {
    expect((['10', '8', '6'] as const).map((awg) => maximumCount('PVC80', size, awg, 'XHHW'))).toEqual(counts);
  });
  it('Annex C: nothing fits where not even one does', () => expect(maximumCount('PVC80', '1/2', '2/0')).toBe(0));

  const table4: Readonly<Record<Raceway, readonly number[]>> = {
    EMT: [0.122, 0.213, 0.346, 0.598, 0.814, 1.342], PVC40: [0.114, 0.203, 0.333, 0.581, 0.794, 1.316], PVC80: [0.087, 0.164, 0.275,
    0.495, 0.684, 1.15],
    FMC: [0.127, 0.213, 0.327, 0.511, 0.743, 1.307], LFMC: [0.125, 0.216, 0.349, 0.611, 0.792, 1.298],
  };
  it.each(Object.entries(table4) as [Raceway, number[]][])('Table 4: %s at 40 %% in sq in. %j (PVC areas and LFMC from memory)', (raceway,
    areas) => {
    expect(tradeSizes.map((size) => allowedAreaIn2(raceway, size, 3))).toEqual(areas);
  });
  it('Table 1: one conductor 53 %, two 31 %; 3/4 EMT of 0.824 in. inside', () => {
    expect(allowedAreaIn2('EMT', '3/4', 1)).toBeCloseTo(0.53 * 0.5333, 3);
    expect(allowedAreaIn2('EMT', '3/4', 2)).toBeCloseTo(0.31 * 0.5333, 3);
  });
  it('Table 5: THHN and XHHW areas', () => {
    const sizes = ['14', '12', '10', '8', '6', '4', '3', '2', '1', '1/0', '2/0'] as const;
    expect(sizes.map((awg) => conductorAreaIn2(awg))).toEqual([0.0097, 0.0133, 0.0211, 0.0366, 0.0507, 0.0824, 0.0973, 0.1158, 0.1562,
      0.1855, 0.2223]);
    expect(sizes.map((awg) => conductorAreaIn2(awg, 'XHHW')))
      .toEqual([0.0139, 0.0181, 0.0243, 0.0437, 0.059, 0.0814, 0.0962, 0.1146, 0.1534, 0.1825, 0.219]);
    expect(() => conductorAreaIn2('250')).toThrow(ElectricalError);
  });
  it('refuses what 2 in. does not hold', () => {
    expect(() => smallestRaceway('EMT', [{ areaIn2: conductorAreaIn2('2/0'), count: 7 }])).toThrow('larger than 2 in.');
  });
  it('has no resistance for sizes beyond its list', () => {
    expect(() => voltageDrop({ amps: 48, material: 'Cu', awg: '250', oneWayFt: 10, volts: 240 })).toThrow('250 AWG copper');
  });
});

describe('NEC 2023 Table 300.5(A), residential reprint', () => {
  const rows: readonly (readonly [CoverLocation, readonly number[]])[] = [
    ['general', [24, 6, 18]], ['under_2in_concrete', [18, 6, 12]], ['under_building', [0, 0, 0]], ['under_4in_slab_no_vehicles', [18, 4,
    4]],
    ['street_or_parking', [24, 24, 24]], ['dwelling_driveway', [18, 18, 18]],
  ];
  it.each(rows)('%s: direct burial, RMC, PVC %j in.', (location, covers) => {
    const methods: readonly BuriedMethod[] = ['direct_burial_cable', 'rmc_imc', 'pvc'];
    expect(methods.map((method) => coverDepth({ edition: '2023', location, method, volts: 240, deviceAmps: 60 }).coverIn)).toEqual(covers);
  });
  it.each([['general', 12, 6], ['under_2in_concrete', 6, 6], ['under_4in_slab_no_vehicles', 6, 6], ['street_or_parking', 24, 24],
    ['dwelling_driveway', 12, 18]] as const)(
    '%s: 120 V with GFCI %i in., low voltage %i in.', (location, gfciIn, lowIn) => {
      expect(coverDepth({ edition: '2023', location, method: 'gfci_120v_20a', volts: 120, deviceAmps: 20 }).coverIn).toBe(gfciIn);
      expect(coverDepth({ edition: '2023', location, method: 'low_voltage', volts: 24, deviceAmps: 5 }).coverIn).toBe(lowIn);
    },
  );
  it('names its table by edition, and digs the pipe deeper than its cover (3/4 PVC 1.05 in. outside, from memory)', () => {
    expect(coverDepth({ edition: '2020', location: 'general', method: 'pvc', volts: 240, deviceAmps: 60 }).clause)
      .toBe('NEC 2020 Table 300.5');
    expect(trenchDepthIn(18, '3/4')).toBeCloseTo(19.05, 6);
  });
  it('refuses the low-voltage column above 30 V (from memory)', () => {
    expect(() => coverDepth({ edition: '2023', location: 'general', method: 'low_voltage', volts: 240, deviceAmps: 20 }))
      .toThrow(ElectricalError);
  });
});
