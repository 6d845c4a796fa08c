import fc from 'fast-check';
import { ElectricalError } from '../../../pricing/electrical/edition';
import { judgeLoad, type DwellingLoads } from '../../../pricing/electrical/load-verdict';
import type { MeasuredDemand } from '../../../pricing/electrical/load-220-87';

/** The constructed home of the three practices: 2,000 sq ft, gas heat, dryer, cooling 4.8 kVA, 100 A; NEC 2020 220.83, constructed here. */
const noHvac = { coolingVa: 0, heatPumpVa: 0, supplementalHeatVa: 0, centralHeatVa: 0, roomHeatersVa: 0, roomHeaterCount: 0 };
const home: DwellingLoads = {
  edition: '2020', floorAreaFt2: 2000, smallApplianceCircuits: 2, laundryCircuits: 1, serviceAmps: 100, volts: 240,
  appliances: [
    { id: 'dishwasher', words: 'Dishwasher', va: 1200 }, { id: 'disposal', words: 'Sink disposal', va: 800 },
    { id: 'microwave', words: 'Built-in microwave', va: 1500 }, { id: 'dryer', words: 'Clothes dryer', va: 5000 },
  ],
  hvac: { ...noHvac, coolingVa: 4800 },
};
const year: MeasuredDemand = { peakW: 8200, days: 365, intervalSeconds: 900, hasGeneration: false };

describe('three practices of placing the charger, constructed case of 220.83', () => {
  const verdict = judgeLoad(home, 40);
  it('literal 87.7 A, charger at 100 % 111.7 A, all in the pool 75.7 A', () => {
    expect(verdict.practices.map(({ id, amps, fits }) => [id, Number(amps.toFixed(1)), fits]))
      .toEqual([['literal', 87.7, true], ['hvac_and_ev_at_100', 111.7, false], ['all_in_pool', 75.7, true]]);
  });
  it('is amber, by the literal reading, which its amps and sheet are of', () => {
    expect(verdict).toMatchObject({ status: 'amber', clause: 'NEC 2020 220.83', method: 'Existing home, the charger with the other loads',
      serviceAmps: 100 });
    expect(verdict.homeAmps).toBeCloseTo(17_200 / 240, 4);
    expect(verdict.withChargerAmps).toBeCloseTo(21_040 / 240, 4);
    expect(verdict.spareAmps).toBeCloseTo(100 - 17_200 / 240, 4);
    expect(verdict.sheet.at(-1)).toMatchObject({ label: 'Calculated load', va: 21_040 });
  });
  it('is green at 150 A by the most cautious practice, and amber by the measured 82.7 A at 100 A', () => {
    expect(judgeLoad({ ...home, serviceAmps: 150 }, 40)).toMatchObject({ status: 'green',
      method: 'Existing home, the charger and heating or cooling in full' });
    const measured = judgeLoad(home, 40, { measured: year });
    expect(measured).toMatchObject({ status: 'amber', method: 'Measured peak', clause: 'NEC 2020 220.87' });
    expect(measured.withChargerAmps).toBeCloseTo(82.71, 2);
    expect(measured.homeAmps).toBeCloseTo(10_250 / 240, 4);
    expect(measured.sheet.map(({ va }) => va)).toEqual([8200, 10_250, 9600, 19_850]);
  });
  it('is red at 80 A, though everything in the pool would fit: that reading is no default', () => {
    const red = judgeLoad({ ...home, serviceAmps: 80 }, 40);
    expect(red.practices.find(({ id }) => id === 'all_in_pool')?.fits).toBe(true);
    expect(red).toMatchObject({ status: 'red', method: 'Existing home, the charger and heating or cooling in full' });
  });
  it('is green by whatever practice the office asks for', () => {
    expect(judgeLoad({ ...home, serviceAmps: 80 }, 40, { practice: 'all_in_pool' }).status).toBe('green');
    expect(judgeLoad(home, 40, { practice: 'literal' }).status).toBe('green');
  });
  it('adds a quarter of the charger where the office asks for it: 21,040 + 2,400 VA', () => {
    const verdictOf = judgeLoad(home, 40, { practice: 'literal', continuousOnService: true });
    expect(verdictOf.withChargerAmps).toBeCloseTo(23_440 / 240, 4);
    expect(verdictOf.sheet.at(-2)).toMatchObject({ va: 2400 });
    expect(judgeLoad(home, 40, { practice: 'all_in_pool', continuousOnService: true }).withChargerAmps).toBeCloseTo((18_160 + 2400) / 240,
      4);
  });
  it('a measurement with solar is not looked at; hourly readings are named', () => {
    expect(judgeLoad(home, 40, { measured: { ...year, hasGeneration: true } }).clause).toBe('NEC 2020 220.83');
    expect(judgeLoad(home, 40, { measured: { ...year, intervalSeconds: 3600 } }).method).toContain('longer than 15 minutes');
  });
});

describe('largest setting that the service carries', () => {
  it.each([
    // Without the charger 17,200 VA; literal: + 0.4 x setting x 240. 48 A: 21,808 VA, 40: 21,040, 32: 20,272, 24: 19,504, 16: 18,736.
    [91, 48], [90, 40], [85, 32], [82, 24], [79, 16], [78, 0],
  ])('%i A service: %i A', (serviceAmps, setting) => expect(judgeLoad({ ...home, serviceAmps }, 48).maxChargingAmps).toBe(setting));

  it('NEC 2023 220.57 counts 7,200 VA at least: 16 A adds as much as 30 A, and no more than the setting above it', () => {
    const home2023 = { ...home, edition: '2023' } as const;
    const at = (amps: number) => judgeLoad(home2023, amps, { practice: 'hvac_and_ev_at_100' }).practices[1]?.amps;
    expect(at(16)).toBe(at(30));
    expect(at(32)).toBeGreaterThan(at(30) ?? NaN);
    expect(judgeLoad(home2023, 16).sheet.find(({ label }) => label === 'New charger, 16 A')).toMatchObject({ va: 7200,
      note: 'counts at least 7,200 VA', clause: 'NEC 2023 220.57' });
  });
});

describe('heating and cooling, 220.83(B) and 220.60', () => {
  const atFull = (hvac: Partial<DwellingLoads['hvac']>) => judgeLoad({ ...home, hvac: { ...noHvac, ...hvac } }, 0).homeAmps * 240;
  // Other loads 19,000 VA: 8,000 + 0.4 x 11,000 = 12,400.
  it('the larger of them, whole: furnace 10 kVA over cooling 4.8 kVA', () => expect(atFull({ coolingVa: 4800, centralHeatVa: 10_000 }))
    .toBeCloseTo(22_400, 2));
  it('a heat pump with its strips, whole', () => expect(atFull({ heatPumpVa: 3900, supplementalHeatVa: 10_000 })).toBeCloseTo(26_300, 2));
  it('three room heaters whole, four with the other loads', () => {
    expect(atFull({ roomHeatersVa: 4500, roomHeaterCount: 3 })).toBeCloseTo(16_900, 2);
    expect(atFull({ roomHeatersVa: 6000, roomHeaterCount: 4 })).toBeCloseTo(12_400 + 0.4 * 6000, 2);
  });
  it('cooling of 4.8 kVA outweighs four room heaters at 40 %, whose connected load is larger', () => {
    expect(atFull({ coolingVa: 4800, roomHeatersVa: 6000, roomHeaterCount: 4 })).toBeCloseTo(17_200, 2);
  });
  it('the sheet names the season and where it counts', () => {
    const sheetOf = (hvac: Partial<DwellingLoads['hvac']>, practice: 'literal' | 'all_in_pool') =>
      judgeLoad({ ...home, serviceAmps: 400, hvac: { ...noHvac, ...hvac } }, 40, { practice }).sheet.map(({ label }) => label);
    expect(sheetOf({ centralHeatVa: 10_000, coolingVa: 4800 }, 'literal')).toContain('Heating in full');
    expect(sheetOf({ roomHeatersVa: 9000, roomHeaterCount: 6 }, 'literal')).toContain('Room heaters, four or more');
    expect(sheetOf({ coolingVa: 4800 }, 'all_in_pool')).toContain('Cooling');
    expect(sheetOf({}, 'all_in_pool')).not.toContain('Cooling');
  });
});

it('a charger that is there counts as chargers do: 7,200 VA at least (220.57), whole by the cautious practice', () => {
  const withOther = { ...home, edition: '2023', appliances: [...home.appliances, { id: 'otherCharger', words: 'Another charger',
    va: 3840 }] } as const;
  const verdict = judgeLoad(withOther, 40);
  expect(verdict.practices[1]?.amps).toBeCloseTo((17_200 + 7200 + 9600) / 240, 4);
  expect(verdict.sheet.filter(({ label }) => label === 'Charger that is there')).toHaveLength(1);
});

it.each([{ floorAreaFt2: NaN }, { serviceAmps: 0 }, { volts: 0 }])('refuses a home without its numbers: %j', (change) => {
  expect(() => judgeLoad({ ...home, ...change }, 40)).toThrow(ElectricalError);
});

describe('for any home', () => {
  const va = fc.integer({ min: 0, max: 20_000 });
  const anyHome: fc.Arbitrary<DwellingLoads> = fc.record({
    edition: fc.constantFrom('2020' as const, '2023' as const), floorAreaFt2: fc.integer({ min: 300, max: 8000 }),
    smallApplianceCircuits: fc.constant(2), laundryCircuits: fc.constant(1), volts: fc.constantFrom(240, 208),
    serviceAmps: fc.constantFrom(60, 100, 150, 200, 400),
    appliances: fc.array(fc.record({ id: fc.constantFrom('range', 'otherCharger', 'spa'), words: fc.constant('A load'), va }),
    { maxLength: 6 }),
    hvac: fc.record({
      coolingVa: va, heatPumpVa: va, supplementalHeatVa: va, centralHeatVa: va, roomHeatersVa: va, roomHeaterCount: fc.integer({ min: 0,
      max: 8 }),
    }),
  });
  const setting = fc.integer({ min: 6, max: 80 });

  it('a bigger load never frees capacity, and a smaller service never carries more', () => {
    fc.assert(fc.property(anyHome, setting, fc.integer({ min: 0, max: 9000 }), (loads, amps, moreVa) => {
      const [before, after] = [judgeLoad(loads, amps), judgeLoad({ ...loads, appliances: [...loads.appliances, { id: 'more',
        words: 'More', va: moreVa }] }, amps)];
      before.practices.forEach(({ amps: was }, index) => expect(after.practices[index]?.amps).toBeGreaterThanOrEqual(was));
      expect(after.maxChargingAmps).toBeLessThanOrEqual(before.maxChargingAmps);
      expect(judgeLoad({ ...loads, serviceAmps: loads.serviceAmps * 2 }, amps).maxChargingAmps)
        .toBeGreaterThanOrEqual(before.maxChargingAmps);
    }), { numRuns: 300 });
  });

  it('practices stand in their order of caution, and the status follows from them', () => {
    fc.assert(fc.property(anyHome, setting, (loads, amps) => {
      const { practices, status } = judgeLoad(loads, amps);
      const [literal, full, pool] = practices;
      if (!literal || !full || !pool) throw new Error('three practices');
      expect(literal.amps).toBeLessThanOrEqual(full.amps + 1e-6);
      expect(pool.amps).toBeLessThanOrEqual(literal.amps + 1e-6);
      expect(status).toBe(full.fits ? 'green' : literal.fits ? 'amber' : 'red');
    }), { numRuns: 300 });
  });

  it('a sheet adds up: what is connected to its subtotal, the tiers and the rest to the calculated load', () => {
    fc.assert(fc.property(anyHome, setting, fc.constantFrom('literal' as const, 'hvac_and_ev_at_100' as const, 'all_in_pool' as const),
      (loads, amps, practice) => {
      const verdict = judgeLoad({ ...loads, serviceAmps: 4000 }, amps, { practice });
      const subtotal = verdict.sheet.findIndex(({ label }) => label === 'These together, as connected');
      const sum = (from: number, to: number) => verdict.sheet.slice(from, to).reduce((total, line) => total + line.va, 0);
      expect(sum(0, subtotal)).toBeCloseTo(verdict.sheet[subtotal]?.va ?? NaN, 4);
      expect(sum(subtotal + 1, -1)).toBeCloseTo(verdict.sheet.at(-1)?.va ?? NaN, 4);
      expect(verdict.withChargerAmps * loads.volts).toBeCloseTo(verdict.sheet.at(-1)?.va ?? NaN, 2);
      expect(verdict.sheet.every(({ va: shown, clause }) => Number.isFinite(shown) && clause.length > 0)).toBe(true);
    }), { numRuns: 300 });
  });

  it('the same home gives the same bytes', () => {
    fc.assert(fc.property(anyHome, setting, (loads, amps) => JSON.stringify(judgeLoad(loads,
      amps)) === JSON.stringify(judgeLoad(structuredClone(loads), amps))));
  });
});
