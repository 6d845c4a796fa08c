import { z } from 'zod';
import { LIGHTING_VA_PER_FT2, otherConnectedVa } from '../../pricing/electrical/dwelling-loads';
import { load22082 } from '../../pricing/electrical/load-220-82';
import { load22083A, load22083B, seasonsOf } from '../../pricing/electrical/load-220-83';

const edition = z.enum(['2020', '2023']);
const appliances = z.array(z.strictObject({ name: z.string(), va: z.number() }));
const home = {
  unit_va_per_ft2: z.literal(LIGHTING_VA_PER_FT2), area_ft2: z.number(), small_appliance_circuits: z.number(),
  laundry_circuits: z.number(), appliances,
};
const noHvac = { coolingVa: 0, heatPumpVa: 0, supplementalHeatVa: 0, centralHeatVa: 0, roomHeatersVa: 0, roomHeaterCount: 0 };

interface GivenHome {
  readonly area_ft2: number;
  readonly small_appliance_circuits: number;
  readonly laundry_circuits: number;
  readonly appliances: readonly { readonly name: string; readonly va: number }[];
}

const connectedOf = (given: GivenHome) =>
  otherConnectedVa({
    floorAreaFt2: given.area_ft2, smallApplianceCircuits: given.small_appliance_circuits, laundryCircuits: given.laundry_circuits,
    appliances: given.appliances.map(({ name, va }) => ({ id: name, words: name, va })),
  });

const in83 = z.union([
  z.strictObject({ edition, total_connected_va: z.number(), hvac_treatment: z.enum(['in_other_loads', 'omit']), voltage: z.number() }),
  z.strictObject({
    ...home, edition, hvac_treatment: z.enum(['omit', 'larger_at_100', 'in_other_loads']), ac_va: z.number(), heat_va: z.number(),
      ev_va: z.number(),
    evse_nameplate_va: z.number().optional(), ev_treatment: z.literal('in_other_loads'), voltage: z.number(),
  }),
]);
const out83 = z.strictObject({ other_connected_va: z.number(), calculated_va: z.number(), amps: z.number() });

/** A case of 220.83: within 1 VA and 0.01 A, as the list states. */
export function check22083(inputs: unknown, expected: unknown): void {
  const [given, wanted] = [in83.parse(inputs), out83.parse(expected)];
  const seasons = 'ac_va' in given && given.hvac_treatment === 'larger_at_100'
    ? seasonsOf({ ...noHvac, coolingVa: given.ac_va, centralHeatVa: given.heat_va })
    : null;
  const pooledHvacVa = 'ac_va' in given && given.hvac_treatment === 'in_other_loads' ? Math.max(given.ac_va, given.heat_va) : 0;
  const connectedVa = 'ac_va' in given ? connectedOf(given) + given.ev_va + pooledHvacVa : given.total_connected_va;
  const load = seasons ? load22083B(given.edition, connectedVa, seasons, 0, given.voltage) : load22083A(given.edition, connectedVa,
    given.voltage);
  expect(connectedVa).toBe(wanted.other_connected_va);
  expect(Math.abs(load.calculatedVa - wanted.calculated_va)).toBeLessThanOrEqual(1);
  expect(Math.abs(load.amps - wanted.amps)).toBeLessThanOrEqual(0.01);
}

const hvac = z.strictObject({
  ac_va: z.number().optional(), separately_controlled_heat_va: z.number().optional(), separately_controlled_units: z.number().optional(),
  heat_pump_va: z.number().optional(), supplemental_heat_va: z.number().optional(),
  heat_pump_runs_with_supplemental: z.boolean().optional(),
});
const common82 = { edition, first_tier_va: z.literal(10_000), hvac, ev_va: z.number(), ev_treatment: z.literal('in_general'),
  voltage: z.number() };
const in82 = z.union([z.strictObject({ ...home, ...common82 }), z.strictObject({ ...common82, total_general_va: z.number() })]);
const out82 = z.strictObject({
  general_connected_va: z.number(), general_demand_va: z.number(), hvac_va: z.number(), calculated_va: z.number(), amps: z.number(),
});

/** A case of 220.82: within 1 VA and 0.01 A, as the list states. */
export function check22082(inputs: unknown, expected: unknown): void {
  const [given, wanted] = [in82.parse(inputs), out82.parse(expected)];
  const generalConnectedVa = 'area_ft2' in given ? connectedOf(given) + given.ev_va : given.total_general_va;
  const load = load22082({
    edition: given.edition, generalConnectedVa, serviceAmps: 200, volts: given.voltage,
    compressorLockedOut: given.hvac.heat_pump_runs_with_supplemental === false,
    hvac: {
      coolingVa: given.hvac.ac_va ?? 0, heatPumpVa: given.hvac.heat_pump_va ?? 0, supplementalHeatVa: given.hvac.supplemental_heat_va ?? 0,
      centralHeatVa: 0, roomHeatersVa: given.hvac.separately_controlled_heat_va ?? 0,
      roomHeaterCount: given.hvac.separately_controlled_units ?? 0,
    },
  });
  expect(generalConnectedVa).toBe(wanted.general_connected_va);
  for (const [actual, value] of [
    [load.generalDemandVa, wanted.general_demand_va], [load.hvacVa, wanted.hvac_va], [load.calculatedVa, wanted.calculated_va],
  ] as const) expect(Math.abs(actual - value)).toBeLessThanOrEqual(1);
  expect(Math.abs(load.amps - wanted.amps)).toBeLessThanOrEqual(0.01);
}
