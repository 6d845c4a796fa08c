import { z } from 'zod';
import { cancellationDeadline } from '../../pricing/cancellation';
import { depositLimit } from '../../pricing/deposit-limit';
import { ampacity } from '../../pricing/electrical/ampacity';
import { awgSizes } from '../../pricing/electrical/awg';
import { busbarVerdict } from '../../pricing/electrical/busbar';
import { chargingKw, milesPerHour, pilotReading } from '../../pricing/electrical/charging';
import { conductorAreaIn2, maximumCount, smallestRaceway, tradeSizes } from '../../pricing/electrical/conduit-fill';
import { smallestConductor } from '../../pricing/electrical/conductor';
import { coverDepth } from '../../pricing/electrical/cover-depth';
import { disconnectRequired } from '../../pricing/electrical/disconnect';
import { LIGHTING_VA_PER_FT2 } from '../../pricing/electrical/dwelling-loads';
import { groundForCircuit, groundForDevice } from '../../pricing/electrical/grounding';
import { averageW, espiReadingW, load22087, measuredPermission } from '../../pricing/electrical/load-220-87';
import { standardLoad } from '../../pricing/electrical/load-standard';
import { breakerForCharging, minimumDeviceAmps } from '../../pricing/electrical/standard-ratings';
import { voltageDrop } from '../../pricing/electrical/voltage-drop';
import { check22082, check22083 } from './load-checks';

export interface CheckCase {
  readonly id: string;
  readonly inputs: unknown;
  readonly expected: unknown;
  readonly source: string;
  readonly from_memory: boolean;
  readonly note: string;
}

type Checker = (inputs: unknown, expected: unknown) => void;

const checker = <In, Out>(inputs: z.ZodType<In>, expected: z.ZodType<Out>, run: (given: In, wanted: Out) => void): Checker =>
  (given, wanted) => run(inputs.parse(given), expected.parse(wanted));

const awg = z.enum(awgSizes);
const metal = z.enum(['Cu', 'Al']);
const columnC = z.literal([60, 75, 90]);

/** What the case asks may not differ by more than the tolerance that the list states. */
export function near(actual: number, expected: number, tolerance: number): void {
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(tolerance);
}

const conductor = z.strictObject({
  evse_amps: z.number(), material: metal, nm_cable: z.boolean(), terminal_c: z.literal([60, 75]), ambient_c: z.number(), ccc: z.number(),
});

const measured = z.union([
  z.strictObject({ peak_w: z.number(), new_load_va: z.number(), new_load_factor: z.number(), service_a: z.number(), voltage: z.number() }),
  z.strictObject({ espi: z.strictObject({ value: z.number(), powerOfTenMultiplier: z.number(), uom: z.number(),
    interval_s: z.number() }) }),
  z.strictObject({ has_pv: z.boolean(), days: z.number(), interval_s: z.number() }),
  z.strictObject({ dst_fallback: z.strictObject({ label_hour_kwh: z.number(), physical_hours: z.number() }) }),
]);
const measuredResult = z.strictObject({
  calculated_va: z.number().optional(), amps: z.number().optional(), fits: z.boolean().optional(), peak_w: z.number().optional(),
  permitted: z.boolean().optional(),
});

function checkMeasured(given: z.infer<typeof measured>, wanted: z.infer<typeof measuredResult>): void {
  if ('espi' in given) {
    near(espiReadingW({ ...given.espi, intervalSeconds: given.espi.interval_s }), wanted.peak_w ?? NaN, 0.5);
  } else if ('dst_fallback' in given) {
    near(averageW(given.dst_fallback.label_hour_kwh * 1000, given.dst_fallback.physical_hours * 3600), wanted.peak_w ?? NaN, 0.5);
  } else if ('has_pv' in given) {
    const demand = { peakW: 5000, days: given.days, intervalSeconds: given.interval_s, hasGeneration: given.has_pv };
    expect(measuredPermission(demand).permitted).toBe(wanted.permitted);
  } else {
    const demand = { peakW: given.peak_w, days: 365, intervalSeconds: 900, hasGeneration: false };
    const load = load22087({
      edition: '2023', demand, newLoadVa: given.new_load_va, newLoadFactor: given.new_load_factor, serviceAmps: given.service_a,
      volts: given.voltage,
    });
    near(load.calculatedVa, wanted.calculated_va ?? NaN, 1);
    near(load.amps, wanted.amps ?? NaN, 0.01);
    expect(load.fits).toBe(wanted.fits);
  }
}

const fill = z.union([
  z.strictObject({
    raceway: z.enum(['EMT', 'PVC40', 'PVC80']), insulation: z.literal('THHN'), conductors: z.array(z.strictObject({ awg, n: z.number() })),
  }),
  z.strictObject({ max_same_size: z.literal(true), raceway: z.literal('EMT'), trade_size: z.enum(tradeSizes), awg,
    insulation: z.literal('THHN') }),
]);
const fillResult = z.strictObject({ trade_size: z.enum(tradeSizes).optional(), conductor_area_in2: z.number().optional(),
  max_count: z.number().optional() });

const byMethod = { table8_dc: 'table8_dc', table9_ac_pf1: 'table9_ac', k_factor: 'k_factor' } as const;

/** One function a group of the list. */
export const checkers: Readonly<Record<string, Checker>> = {
  load_calc_220_83: check22083,
  load_calc_220_82: check22082,
  load_calc_standard: checker(
    z.strictObject({
      unit_va_per_ft2: z.literal(LIGHTING_VA_PER_FT2), area_ft2: z.number(), small_appliance_circuits: z.number(),
      laundry_circuits: z.number(),
      range_demand_va: z.number(), dryer_va: z.number(), fixed_appliances: z.array(z.number()), voltage: z.number(),
    }),
    z.strictObject({ lighting_demand_va: z.number(), fixed_demand_va: z.number().optional(), calculated_va: z.number(), amps: z.number() }),
    (given, wanted) => {
      const load = standardLoad({
        edition: '2023', floorAreaFt2: given.area_ft2, smallApplianceCircuits: given.small_appliance_circuits,
        laundryCircuits: given.laundry_circuits,
        rangeDemandVa: given.range_demand_va, dryerVa: given.dryer_va, fixedAppliancesVa: given.fixed_appliances, volts: given.voltage,
      });
      near(load.lightingDemandVa, wanted.lighting_demand_va, 1);
      if (wanted.fixed_demand_va !== undefined) near(load.fixedDemandVa, wanted.fixed_demand_va, 1);
      near(load.calculatedVa, wanted.calculated_va, 1);
      near(load.amps, wanted.amps, 0.01);
    },
  ),
  load_calc_220_87: checker(measured, measuredResult, checkMeasured),
  ocpd_for_load: checker(z.strictObject({ evse_amps: z.number() }), z.strictObject({ min_rating_a: z.number(), ocpd_a: z.number() }),
    (given, wanted) => {
    expect(minimumDeviceAmps(given.evse_amps)).toBe(wanted.min_rating_a);
    expect(breakerForCharging(given.evse_amps)).toBe(wanted.ocpd_a);
  }),
  ampacity: checker(
    z.strictObject({ material: metal, size_awg: awg, insulation_c: columnC, ambient_c: z.number(), ccc: z.number(), terminal_c: columnC,
      nm_cable: z.boolean() }),
    z.number(),
    (given, wanted) => near(ampacity({
      material: given.material, awg: given.size_awg, insulationC: given.insulation_c, terminalC: given.terminal_c,
      ambientC: given.ambient_c,
      currentCarryingConductors: given.ccc, nmCable: given.nm_cable,
    }), wanted, 0.01),
  ),
  conductor_for_circuit: checker(conductor, z.strictObject({ size_awg: awg }), (given, wanted) => {
    expect(smallestConductor({
      chargingAmps: given.evse_amps, deviceAmps: breakerForCharging(given.evse_amps), material: given.material, nmCable: given.nm_cable,
      terminalC: given.terminal_c, ambientC: given.ambient_c, currentCarryingConductors: given.ccc,
    })).toBe(wanted.size_awg);
  }),
  egc: checker(
    z.strictObject({ ocpd_a: z.number(), phase_min_awg: awg.optional(), phase_installed_awg: awg.optional() }),
    z.strictObject({ cu_awg: awg, al_awg: awg.optional() }),
    ({ ocpd_a: deviceAmps, phase_min_awg: minimumHotAwg, phase_installed_awg: installedHotAwg }, wanted) => {
      if (minimumHotAwg && installedHotAwg) {
        expect(groundForCircuit({ deviceAmps, material: 'Cu', minimumHotAwg, installedHotAwg })).toBe(wanted.cu_awg);
      } else {
        expect(groundForDevice(deviceAmps, 'Cu')).toBe(wanted.cu_awg);
        expect(groundForDevice(deviceAmps, 'Al')).toBe(wanted.al_awg);
      }
    },
  ),
  voltage_drop: checker(
    z.strictObject({
      amps: z.number(), material: metal, size_awg: awg, one_way_ft: z.number(), voltage: z.number(), raceway: z.literal('PVC').optional(),
      method: z.enum(['table8_dc', 'table9_ac_pf1', 'k_factor']), k: z.literal(12.9).optional(),
    }),
    z.strictObject({ drop_v: z.number(), drop_pct: z.number() }),
    (given, wanted) => {
      const drop = voltageDrop({
        amps: given.amps, material: given.material, awg: given.size_awg, oneWayFt: given.one_way_ft, volts: given.voltage,
        by: byMethod[given.method],
      });
      near(drop.dropV, wanted.drop_v, 0.005);
      near(drop.dropPercent, wanted.drop_pct, 0.005);
    },
  ),
  conduit_fill: checker(fill, fillResult, (given, wanted) => {
    if ('max_same_size' in given) {
      expect(maximumCount(given.raceway, given.trade_size, given.awg)).toBe(wanted.max_count);
      return;
    }
    const found = smallestRaceway(given.raceway, given.conductors.map(({ awg: size, n }) => ({ areaIn2: conductorAreaIn2(size),
      count: n })));
    expect(found.tradeSize).toBe(wanted.trade_size);
    near(found.conductorAreaIn2, wanted.conductor_area_in2 ?? NaN, 0.0005);
  }),
  cover_depth: checker(
    z.strictObject({
      location: z.enum(['general', 'dwelling_driveway', 'under_4in_slab_no_vehicles', 'under_2in_concrete']),
      method: z.enum(['direct_burial_cable', 'pvc', 'rmc_imc']),
    }),
    z.strictObject({ min_cover_in: z.number() }),
    (given, wanted) => expect(coverDepth({ edition: '2023', ...given, volts: 240, deviceAmps: 60 }).coverIn).toBe(wanted.min_cover_in),
  ),
  miles_per_hour: checker(
    z.strictObject({ amps: z.number(), voltage: z.number(), consumption_basis: z.literal('wall'), wh_per_mile: z.number(),
      efficiency: z.number() }),
    z.strictObject({ power_kw: z.number(), miles_per_hour: z.number() }),
    (given, wanted) => {
      const kw = chargingKw(given.amps, given.voltage);
      near(kw, wanted.power_kw, 0.001);
      near(milesPerHour({ kw, whPerMile: given.wh_per_mile, basis: given.consumption_basis, efficiency: given.efficiency }),
        wanted.miles_per_hour, 0.05);
    },
  ),
  pilot_duty: checker(z.strictObject({ duty_pct: z.number() }), z.strictObject({ amps: z.number() }), (given, wanted) =>
    near(pilotReading(given.duty_pct).amps, wanted.amps, 0.01)),
  busbar_120: checker(z.strictObject({ busbar_a: z.number(), main_a: z.number() }), z.strictObject({ max_backfeed_a: z.number() }),
    (given, wanted) =>
    expect(busbarVerdict({ edition: '2023', busAmps: given.busbar_a, mainAmps: given.main_a, inverterAmps: 0 }).maxBackfeedAmps)
      .toBe(wanted.max_backfeed_a)),
  deposit_limit: checker(
    z.strictObject({ state: z.string(), contract_price: z.number(), special_order_materials: z.number() }),
    z.strictObject({ max_deposit: z.number() }),
    (given, wanted) => near(
      (depositLimit(given.state, given.contract_price * 100, given.special_order_materials * 100).limitCents ?? NaN) / 100,
        wanted.max_deposit, 0.01,
    ),
  ),
  cancellation_deadline: checker(z.strictObject({ signed: z.string() }), z.strictObject({ last_day: z.string() }), (given, wanted) =>
    expect(cancellationDeadline(given.signed)).toBe(wanted.last_day)),
  disconnect_required: checker(
    z.strictObject({ evse_amps: z.number(), volts_to_ground: z.number() }), z.strictObject({ required: z.boolean() }),
    (given, wanted) => expect(disconnectRequired(given.evse_amps, given.volts_to_ground)).toBe(wanted.required),
  ),
};

/** Runs one case of the list; fails on an input or a result that the group's function does not look at. */
export function checkCase(group: string, { inputs, expected }: CheckCase): void {
  const check = checkers[group];
  if (!check) throw new Error(`No function checks ${group}`);
  check(inputs, expected);
}
