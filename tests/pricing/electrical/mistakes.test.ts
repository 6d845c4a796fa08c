import { designCircuit, type CircuitInput } from '../../../pricing/electrical/circuit';
import { ampacity } from '../../../pricing/electrical/ampacity';
import { milesPerHour, pilotReading } from '../../../pricing/electrical/charging';
import { conductorAreaIn2, maximumCount, smallestRaceway } from '../../../pricing/electrical/conduit-fill';
import { coverDepth } from '../../../pricing/electrical/cover-depth';
import { disconnectRequired } from '../../../pricing/electrical/disconnect';
import { EXISTING_FIRST_TIER_VA, load22083A, load22083B, seasonsOf } from '../../../pricing/electrical/load-220-83';
import { espiReadingW, load22087, measuredPermission, type MeasuredDemand } from '../../../pricing/electrical/load-220-87';
import { standardLoad } from '../../../pricing/electrical/load-standard';
import { judgeLoad, type DwellingLoads } from '../../../pricing/electrical/load-verdict';
import { voltageDrop } from '../../../pricing/electrical/voltage-drop';

const circuit: CircuitInput = {
  edition: '2023', chargingAmps: 48, volts: 240, connection: 'wired', place: 'indoor', method: 'EMT', material: 'Cu', oneWayFt: 100,
  ambientC: 30,
};
const home: DwellingLoads = {
  edition: '2020', floorAreaFt2: 2000, smallApplianceCircuits: 2, laundryCircuits: 1, serviceAmps: 100, volts: 240,
  appliances: [{ id: 'dryer', words: 'Dryer', va: 5000 }],
  hvac: { coolingVa: 4800, heatPumpVa: 0, supplementalHeatVa: 0, centralHeatVa: 10_000, roomHeatersVa: 0, roomHeaterCount: 0 },
};
const year: MeasuredDemand = { peakW: 8200, days: 365, intervalSeconds: 900, hasGeneration: false };

describe('ten mistakes of the trade', () => {
  it('1: 6 AWG NM-B for a 48 A charger; NEC 2023 334.80, Table 310.16: 55 A is less than 60 A', () => {
    expect(designCircuit({ ...circuit, method: 'NM_B' }).hotAwg).toBe('4');
  });

  it('2: the 90 C column at terminals, 110.14(C); or a table from before 2011', () => {
    // 8 AWG THHN is 55 A in the 90 C column, which would seem enough for the 55 A of a 44 A setting.
    expect(designCircuit({ ...circuit, chargingAmps: 44 }).hotAwg).toBe('6');
    const inAir = { ambientC: 30, currentCarryingConductors: 2, nmCable: false, material: 'Cu' } as const;
    expect(ampacity({ ...inAir, awg: '12', insulationC: 60, terminalC: 60 })).toBe(20);
    expect(ampacity({ ...inAir, awg: '3', insulationC: 90, terminalC: 90 })).toBe(115);
  });

  it('3: 125 % forgotten on the device, taken twice, or used for voltage drop; 210.20(A), Chapter 9 Table 8', () => {
    const design = designCircuit(circuit);
    expect(design.breakerAmps).toBe(60);
    expect(design.hotAwg).toBe('6');
    expect(design.voltageDropV).toBeCloseTo((2 * 48 * 0.491 * 100) / 1000, 6);
  });

  it('4: service less breaker handles, or 80 % of the panel, instead of 220.83: 90.8 A calculated fits 100 A', () => {
    // 2,000 sq ft: 10,500 VA; dryer 5,000: 8,000 + 0.4 x 7,500 = 11,000; heat 10,000; charger 800 VA at 100 % makes 21,800 VA, 90.8 A.
    const verdict = judgeLoad(home, 800 / 240);
    expect(verdict.withChargerAmps).toBeCloseTo(21_800 / 240, 4);
    expect(verdict.status).toBe('green');
  });

  it('5: the tier of 220.82 in 220.83, 65 % heat, heat and cooling together, 75 % on the charger, the floor of 2023 in 2020', () => {
    expect(EXISTING_FIRST_TIER_VA).toBe(8000);
    expect(load22083A('2023', 10_000, 240).calculatedVa).toBe(8800);
    expect(load22083B('2023', 8000, seasonsOf(home.hvac), 0, 240).calculatedVa).toBe(18_000);
    const standard = standardLoad({
      edition: '2023', floorAreaFt2: 1000, smallApplianceCircuits: 2, laundryCircuits: 1, rangeDemandVa: 0, dryerVa: 0,
      fixedAppliancesVa: [1000, 1000, 1000], evseVa: 9600, volts: 240,
    });
    expect(standard.fixedDemandVa).toBe(3000);
    const added = (edition: '2020' | '2023') => {
      const verdict = judgeLoad({ ...home, edition, serviceAmps: 200 }, 16);
      return (verdict.withChargerAmps - verdict.homeAmps) * 240;
    };
    expect(added('2020')).toBeCloseTo(3840, 2);
    expect(added('2023')).toBeCloseTo(7200, 2);
  });

  it('6: 220.87 with solar, net, daily or monthly data, 30 days of hourly data; ESPI multiplier and interval; its 125 %', () => {
    expect(measuredPermission({ ...year, hasGeneration: true }).permitted).toBe(false);
    expect(measuredPermission({ ...year, hasPeakShaving: true }).permitted).toBe(false);
    expect(measuredPermission({ ...year, intervalSeconds: 86_400 }).permitted).toBe(false);
    const recorder = { onHighestLoadedPhase: true, continuous: true, occupied: true, seasonalVa: 0 };
    expect(measuredPermission({ ...year, days: 30, intervalSeconds: 3600, recorder }).permitted).toBe(false);
    expect(measuredPermission({ ...year, days: 30, recorder }).permitted).toBe(true);
    // 500 Wh in 15 minutes is 2 kW, not 0.5 kW.
    expect(espiReadingW({ value: 500, powerOfTenMultiplier: 0, uom: 72, intervalSeconds: 900 })).toBe(2000);
    expect(load22087({ edition: '2023', demand: year, newLoadVa: 0, serviceAmps: 100, volts: 240 }).calculatedVa).toBe(10_250);
  });

  it('7: ground left out of the fill, 1/2 in. EMT for 2 x 6 + 10, Schedule 80 as 40, ground not upsized; Chapter 9, 250.122(B)', () => {
    const wires = [{ areaIn2: conductorAreaIn2('6'), count: 2 }, { areaIn2: conductorAreaIn2('10'), count: 1 }];
    expect(smallestRaceway('EMT', wires).tradeSize).toBe('3/4');
    const hots8 = [{ areaIn2: conductorAreaIn2('8'), count: 2 }, { areaIn2: conductorAreaIn2('10'), count: 1 }];
    expect(smallestRaceway('PVC40', hots8).tradeSize).toBe('1/2');
    expect(smallestRaceway('PVC80', hots8).tradeSize).toBe('3/4');
    expect(maximumCount('EMT', '1/2', '10')).toBe(5);
    expect(designCircuit({ ...circuit, chargingAmps: 40, oneWayFt: 150, upsizeForDrop: true }).groundAwg).toBe('8');
  });

  it('8: one way for voltage drop; Chapter 9 Table 8 (from memory): 48 A, 6 AWG, 60 ft there and back is 2.828 V', () => {
    expect(voltageDrop({ amps: 48, material: 'Cu', awg: '6', oneWayFt: 60, volts: 240 }).dropV).toBeCloseTo(2.828, 2);
  });

  it('9: the 12 in. column of 120 V for a 240 V circuit; Table 300.5(A)', () => {
    const driveway = { edition: '2023', location: 'general', deviceAmps: 20 } as const;
    expect(() => coverDepth({ ...driveway, method: 'gfci_120v_20a', volts: 240 })).toThrow('goes deeper');
    expect(() => coverDepth({ ...driveway, method: 'gfci_120v_20a', volts: 120, deviceAmps: 30 })).toThrow('goes deeper');
    expect(coverDepth({ ...driveway, method: 'pvc', volts: 240 }).coverIn).toBe(18);
  });

  it('10: GFCI everywhere or nowhere, a disconnect at 60 A exactly, efficiency on figures at the wall, 52.5 A at 85 % duty', () => {
    const gfci = (change: Partial<CircuitInput>) => designCircuit({ ...circuit, ...change }).gfciRequired;
    expect(gfci({ chargingAmps: 40, connection: 'plug_in' })).toBe(true);
    expect(gfci({ chargingAmps: 40, place: 'outdoor' })).toBe(true);
    expect(gfci({ chargingAmps: 48, place: 'outdoor' })).toBe(false);
    expect(gfci({ chargingAmps: 40 })).toBe(false);
    expect([disconnectRequired(60, 120), disconnectRequired(60.1, 120), disconnectRequired(16, 150), disconnectRequired(16, 151)])
      .toEqual([false, true, false, true]);
    expect(milesPerHour({ kw: 9, whPerMile: 300, basis: 'wall', efficiency: 0.9 })).toBe(30);
    expect(milesPerHour({ kw: 9, whPerMile: 300, basis: 'battery', efficiency: 0.9 })).toBeCloseTo(27, 6);
    expect(pilotReading(85).amps).toBeCloseTo(51, 6);
  });
});
