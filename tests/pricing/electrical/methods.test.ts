import { ElectricalError } from '../../../pricing/electrical/edition';
import { hvacDemandVa, load22082 } from '../../../pricing/electrical/load-220-82';
import { averageW, espiReadingW, load22087, measuredPermission, type MeasuredDemand } from '../../../pricing/electrical/load-220-87';
import {
  dryerDemandVa, fixedApplianceDemandVa, legAmps, lightingDemandVa, rangeDemandVa, standardLoad,
} from '../../../pricing/electrical/load-standard';

const noHvac = { coolingVa: 0, heatPumpVa: 0, supplementalHeatVa: 0, centralHeatVa: 0, roomHeatersVa: 0, roomHeaterCount: 0 };

describe('NEC 2023 220.82(C): the largest of its selections', () => {
  it.each([
    [{ coolingVa: 5000, centralHeatVa: 7000 }, 5000], [{ coolingVa: 4000, centralHeatVa: 10_000 }, 6500], [{ heatPumpVa: 5760 }, 5760],
    [{ roomHeatersVa: 4500, roomHeaterCount: 3 }, 2925], [{ roomHeatersVa: 6000, roomHeaterCount: 4 }, 2400],
  ])('%j: %f VA', (hvac, va) => expect(hvacDemandVa({ ...noHvac, ...hvac })).toBeCloseTo(va, 6));

  it('a compressor that is locked out while the strips run is left out: 15,000 x 0.65 = 9,750, with it 15,510', () => {
    const hvac = { ...noHvac, heatPumpVa: 5760, supplementalHeatVa: 15_000 };
    expect(hvacDemandVa(hvac, true)).toBe(9750);
    expect(hvacDemandVa(hvac, false)).toBe(15_510);
    expect(hvacDemandVa({ ...noHvac, heatPumpVa: 5760 }, true)).toBe(5760);
  });

  it('is for services of 100 A or more, and names its clauses', () => {
    const input = { edition: '2023', generalConnectedVa: 10_001, hvac: noHvac, volts: 240 } as const;
    expect(() => load22082({ ...input, serviceAmps: 99 })).toThrow(ElectricalError);
    const load = load22082({ ...input, serviceAmps: 100 });
    expect(load.generalDemandVa).toBeCloseTo(10_000.4, 6);
    expect(load.trace.map(({ clause }) => clause)).toEqual(['NEC 2023 220.82(B)', 'NEC 2023 220.82(C)']);
  });
});

describe('NEC 2023 standard method', () => {
  it.each([[2999, 2999], [3000, 3000], [4000, 3350], [120_000, 43_950], [124_000, 44_950]])(
    'Table 220.45: %i VA of lighting count %i', (va, demandVa) => expect(lightingDemandVa(va)).toBe(demandVa),
  );
  it('220.53: three appliances whole, four at 75 %', () => {
    expect(fixedApplianceDemandVa([1000, 1000, 1000])).toBe(3000);
    expect(fixedApplianceDemandVa([1000, 1000, 1000, 1000])).toBe(3000);
  });
  it.each([[0, 0], [4000, 5000], [5000, 5000], [5500, 5500]])('220.54: a dryer of %i VA counts %i', (va, demandVa) => {
    expect(dryerDemandVa(va)).toBe(demandVa);
  });
  it.each([
    [0, 0], [3000, 2400], [8750, 7000], [8751, 8000], [12_000, 8000], [12_400, 8000], [12_500, 8400], [14_000, 8800], [27_000, 14_000],
  ])('Table 220.55 (to 8.75 kW from memory): a range of %i VA counts %i', (va, demandVa) => expect(rangeDemandVa(va))
    .toBeCloseTo(demandVa, 6));
  it('Table 220.55 ends at 27 kW', () => expect(() => rangeDemandVa(27_001)).toThrow(ElectricalError));
  it('220.50: a leg without motors has no quarter', () => expect(legAmps(50, [], [10])).toBe(60));
  it('220.60, 220.57, 220.61: heat or cooling and the charger whole, and none of them on the neutral', () => {
    const load = standardLoad({
      edition: '2023', floorAreaFt2: 1500, smallApplianceCircuits: 2, laundryCircuits: 1, rangeDemandVa: 8000, dryerVa: 5500,
      fixedAppliancesVa: [1200], hvacVa: 4800, evseVa: 11_520, volts: 240,
    });
    expect(load.calculatedVa).toBe(18_600 + 1200 + 4800 + 11_520);
    expect(load.neutralVa).toBeCloseTo(14_550 + 1200, 6);
    expect(load.trace.map(({ clause }) => clause)).toEqual([
      'NEC 2023 Table 220.45', 'NEC 2023 220.53', 'NEC 2023 220.54', 'NEC 2023 Table 220.55', 'NEC 2023 220.60', 'NEC 2023 220.57',
    ]);
  });
});

describe('NEC 2023 220.87: conditions of a measurement', () => {
  const recorder = { onHighestLoadedPhase: true, continuous: true, occupied: true, seasonalVa: 5000 };
  const month: MeasuredDemand = { peakW: 6000, days: 30, intervalSeconds: 900, hasGeneration: false, recorder };
  const year: MeasuredDemand = { peakW: 6000, days: 365, intervalSeconds: 900, hasGeneration: false };

  it.each([
    ['30 days', month, true], ['29 days', { ...month, days: 29 }, false], ['a month without a recorder', { ...month,
    recorder: undefined }, false],
    ['364 days without a recorder', { ...year, days: 364 }, false], ['16 minutes', { ...month, intervalSeconds: 960 }, false],
    ['an empty home', { ...month, recorder: { ...recorder, occupied: false } }, false],
    ['a gap', { ...month, recorder: { ...recorder, continuous: false } }, false],
    ['the other phase', { ...month, recorder: { ...recorder, onHighestLoadedPhase: false } }, false],
    ['a year by the hour', { ...year, intervalSeconds: 3600 }, true], ['a year by two hours', { ...year, intervalSeconds: 7200 }, false],
    ['no peak', { ...year, peakW: NaN }, false], ['no interval', { ...year, intervalSeconds: 0 }, false],
  ] as const)('%s', (_name, demand, permitted) => {
    const permission = measuredPermission(demand);
    expect(permission.permitted).toBe(permitted);
    expect(permission.whyNot === '').toBe(permitted);
  });

  it('readings longer than 15 minutes understate the peak; those of 15 do not', () => {
    expect(measuredPermission({ ...year, intervalSeconds: 901 }).understates).toBe(true);
    expect(measuredPermission(year).understates).toBe(false);
    expect(measuredPermission({ ...year, intervalSeconds: 7200 }).understates).toBe(false);
  });

  it('the exception adds the season: 1.25 x 6,000 + 5,000 = 12,500 VA; a whole year does not', () => {
    const input = { edition: '2023', newLoadVa: 7200, serviceAmps: 100, volts: 240 } as const;
    expect(load22087({ ...input, demand: month })).toMatchObject({ existingVa: 12_500, calculatedVa: 19_700, fits: true,
      clause: 'NEC 2023 220.87' });
    expect(load22087({ ...input, demand: { ...year, recorder } }).existingVa).toBe(7500);
  });

  it('fits to the service’s very rating: 1.25 x 12,000 + 9,000 = 24,000 VA, 100 A; and never without permission', () => {
    const input = { edition: '2023', serviceAmps: 100, volts: 240, newLoadVa: 9000 } as const;
    expect(load22087({ ...input, demand: { ...year, peakW: 12_000 } }).fits).toBe(true);
    expect(load22087({ ...input, demand: { ...year, peakW: 12_001 } }).fits).toBe(false);
    expect(load22087({ ...input, demand: { ...year, hasGeneration: true } }).fits).toBe(false);
  });

  it('offices that want kVA or a quarter more: 6,000 / 0.95 x 1.25 = 7,894.74; 8,000 x 1.25', () => {
    const load = load22087({ edition: '2023', demand: year, newLoadVa: 8000, newLoadFactor: 1.25, powerFactor: 0.95, serviceAmps: 100,
      volts: 240 });
    expect(load.existingVa).toBeCloseTo(7894.74, 2);
    expect(load.calculatedVa).toBeCloseTo(17_894.74, 2);
  });

  it('ESPI schema: watts as they are, milliwatt-hours by their multiplier, other units refused', () => {
    expect(espiReadingW({ value: 4200, powerOfTenMultiplier: 0, uom: 38, intervalSeconds: 900 })).toBe(4200);
    expect(espiReadingW({ value: 1_500_000, powerOfTenMultiplier: -3, uom: 72, intervalSeconds: 3600 })).toBe(1500);
    expect(() => espiReadingW({ value: 1, powerOfTenMultiplier: 0, uom: 169, intervalSeconds: 3600 })).toThrow('unit 169');
    expect(() => averageW(1000, 0)).toThrow(ElectricalError);
  });
});
