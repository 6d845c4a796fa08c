import fc from 'fast-check';
import { planRuns, type RunPlan, type RunWay } from '../../../pricing/run/plan-run';
import { sleeveSize } from '../../../pricing/takeoff/names';
import { takeoff, type Takeoff, type TakeoffOptions } from '../../../pricing/takeoff/takeoff';
import { wireFt } from '../../../pricing/takeoff/wire-length';
import { knownCircuit, knownHome } from '../../support/known-home';

// Spare 6 ft and 3 ft, waste 10 %: domain notes, section 7, common practice, no source.
const wire = { panelSlackFt: 6, chargerSlackFt: 3, wastePercent: 10 };
const wired: TakeoffOptions = { ...wire, connection: 'wired', chargersSupplied: 1 };
const outlet: TakeoffOptions = { ...wire, connection: 'plug_in', chargersSupplied: 0 };

const runBy = (way: RunWay, changes: Parameters<typeof knownHome>[0] = {}, method?: RunPlan['method']): RunPlan => {
  const run = planRuns(knownHome(changes)).find((plan) => plan.way === way && (method === undefined || plan.method === method));
  if (!run) throw new Error(`No way ${way}`);
  return run;
};
const list = ({ items }: Takeoff) => items.map(({ item, quantity, unit }) => `${quantity} ${unit} ${item}`);
const tasks = (taken: Takeoff) => Object.fromEntries(taken.tasks.map(({ task, quantity }) => [task, Math.round(quantity * 1000) / 1000]));

describe('length of wire', () => {
  it.each([
    // (32.25 + 6 + 3) x 1.1 = 45.375; (31 + 9) x 1.1 = 44; (0 + 9) x 1.1 = 9.9
    [32.25, 46], [31, 44], [0, 10],
  ])('%d ft of run: %d ft to take along', (runFt, feet) => expect(wireFt(runFt, wire)).toBe(feet));
  it('follows the rulebook’s allowances', () => {
    // 30 + 5 + 2, no waste
    expect(wireFt(30, { panelSlackFt: 5, chargerSlackFt: 2, wastePercent: 0 })).toBe(37);
  });
});

describe('pipe: 48 A wired, 32 ft 3 in. of 3/4 in. EMT (the shared design picture, invented)', () => {
  const taken = takeoff(knownCircuit(), runBy('surface', { paintRun: true }), knownHome(), wired);

  it('lists every thing', () => {
    expect(list(taken)).toEqual([
      // (32.25 + 9) x 1.1 -> 46 ft in each color
      '46 ft wire.thhn.cu.6', '46 ft wire.thhn.cu.6', '46 ft wire.thhn.cu.10',
      // 32.25 ft in whole sticks of 10 ft, couplings one fewer, a connector and bushing at each end; straps 4 + 1
      '4 10 ft stick emt.3/4', '3 each fitting.emt.coupling.3/4', '2 each fitting.emt.connector.3/4', '2 each bushing.3/4', '5 each strap.emt.3/4',
      '1 each paint.pipe', '1 each breaker.60', '1 each mounting.wood', '1 each charger.48', '1 each label.set',
    ]);
  });
  it('names wire by color, as the trade writes it', () => {
    expect(taken.items.slice(0, 3).map(({ words }) => words)).toEqual(['6 AWG copper THHN, black', '6 AWG copper THHN, red', '10 AWG copper THHN, green']);
  });
  it('lists the work in the units of the hours', () => {
    expect(tasks(taken)).toEqual({ panel_tie_in: 1, emt: 3.225, bend: 3, pull: 3.225, paint: 3.225, mount_charger: 1, commissioning: 1 });
  });
});

describe('other ends', () => {
  it('an outlet has a ground-fault breaker, a box and a neutral (NEC 2023 625.54; neutral common practice)', () => {
    const circuit = knownCircuit({ chargingAmps: 40, breakerAmps: 50, hotAwg: '6', gfciRequired: true });
    const taken = takeoff(circuit, runBy('surface'), knownHome(), outlet);
    expect(list(taken)).toEqual(expect.arrayContaining(['1 each breaker.gfci.50', '1 each receptacle.14-50', '1 each receptacle.box']));
    expect(taken.items.filter(({ words }) => words === '6 AWG copper THHN, white')).toHaveLength(1);
    expect(taken.items.map(({ item }) => item)).not.toEqual(expect.arrayContaining([expect.stringMatching(/charger|mounting/)]));
    expect(tasks(taken)).toMatchObject({ receptacle: 1 });
    expect(tasks(taken)).not.toHaveProperty('mount_charger');
  });
  it('an outlet outdoors has an in-use cover', () => {
    const run = runBy('outside_wall', { parking: 'driveway', panelPlace: 'outside' }, 'PVC80');
    expect(list(takeoff(knownCircuit({ method: 'PVC80' }), run, knownHome(), outlet))).toContain('1 each receptacle.box.outdoor');
  });
  it('a switch by the charger only where the code asks for it (NEC 2023 625.43: over 60 A)', () => {
    const items = (disconnectRequired: boolean) => list(takeoff(knownCircuit({ disconnectRequired }), runBy('surface'), knownHome(), wired));
    expect(items(true)).toContain('1 each disconnect.100');
    expect(items(false)).not.toContain('1 each disconnect.100');
  });
  it('brings as many chargers as asked, and anchors for masonry', () => {
    const items = list(takeoff(knownCircuit(), runBy('surface'), knownHome({ wallFinish: 'masonry' }), { ...wired, chargersSupplied: 2 }));
    expect(items).toEqual(expect.arrayContaining(['2 each charger.48', '1 each mounting.masonry']));
    expect(list(takeoff(knownCircuit(), runBy('surface'), knownHome(), { ...wired, chargersSupplied: 0 })).join()).not.toMatch(/charger/);
  });
});

describe('cable', () => {
  const circuit = knownCircuit({ method: 'NM_B', insulation: 'NM-B', hotAwg: '4', racewayTradeSize: null });

  it('through an attic, with a pipe down to the charger', () => {
    // Up 3.5 in the wall, 25 + 2 in the attic, 4.75 down in pipe: 35.25. (35.25 + 9) x 1.1 = 48.675. Staples 27/4.5 + 1 = 7.
    const taken = takeoff(circuit, runBy('attic', { atticAbove: true }), knownHome(), wired);
    expect(list(taken)).toEqual([
      '49 ft cable.nmb.4-2', '7 each strap.nm', '2 each fitting.nm.connector',
      '1 10 ft stick emt.1-1/4', '2 each fitting.emt.connector.1-1/4', '2 each bushing.1-1/4', '2 each strap.emt.1-1/4',
      '2 each seal.wall', '1 each breaker.60', '1 each mounting.wood', '1 each charger.48', '1 each label.set',
    ]);
    expect(tasks(taken)).toEqual({
      panel_tie_in: 1, emt: 0.475, pull: 0.475, nm_attic: 2.7, nm_fished: 0.35, wall_penetration: 2, mount_charger: 1, commissioning: 1,
    });
  });
  it('through open studs', () => {
    // 25 + 2 open, 5.25 in pipe
    expect(tasks(takeoff(circuit, runBy('open_studs', { wallFinish: 'bare_studs' }), knownHome(), wired))).toMatchObject({ nm_open: 2.7, emt: 0.525 });
  });
  it('hidden in the wall takes no pipe, and openings to patch', () => {
    const taken = takeoff(circuit, runBy('finished_wall', { runLook: 'hidden' }), knownHome(), wired);
    expect(list(taken)).toContain('5 each patch.kit');
    expect(list(taken).join()).not.toMatch(/emt|strap/);
    expect(tasks(taken)).toMatchObject({ nm_fished: 3.225, patch: 5 });
    expect(tasks(taken)).not.toHaveProperty('emt');
  });
  it('for an outlet has three wires', () => {
    expect(list(takeoff(circuit, runBy('attic', { atticAbove: true }), knownHome(), outlet))[0]).toBe('49 ft cable.nmb.4-3');
  });
  it.each([['10', '3/4'], ['8', '3/4'], ['6', '1'], ['4', '1-1/4']])('%s AWG is protected by %s in. pipe (cable widths from memory)', (awg, size) => {
    expect(sleeveSize(awg)).toBe(size);
  });
});

describe('plastic pipe, walls and trenches', () => {
  it('goes through walls by covered elbows, with pull boxes every 360 degrees', () => {
    // 30 + 41 along, 7.25 up and down: 78.25. Sticks 8. Bends 3 + corner, corner, down = 6: one box. Straps 78.25/3 -> 27, + 1.
    const taken = takeoff(knownCircuit({ method: 'PVC40', insulation: 'THWN-2' }), runBy('outside_wall', { panelPlace: 'elsewhere' }, 'PVC40'), knownHome(), wired);
    expect(list(taken)).toEqual(expect.arrayContaining([
      '8 10 ft stick pvc40.3/4', '7 each fitting.pvc.coupling.3/4', '4 each fitting.pvc.connector.3/4', '2 each fitting.pvc.lb.3/4', '1 each box.pull', '28 each strap.pvc.3/4', '2 each seal.wall',
    ]));
    expect(tasks(taken)).toMatchObject({ pvc: 7.825, bend: 6 + 1 + 2, wall_penetration: 2 });
  });
  it('straps larger plastic pipe every 5 ft (NEC 2023 Table 352.30, from memory)', () => {
    const run = runBy('outside_wall', { panelPlace: 'elsewhere' }, 'PVC40');
    // 78.25/5 -> 16, + 1
    expect(list(takeoff(knownCircuit({ method: 'PVC40', racewayTradeSize: '1-1/4' }), run, knownHome(), wired))).toContain('17 each strap.pvc.1-1/4');
  });
  it('cores masonry', () => {
    const taken = takeoff(knownCircuit(), runBy('outside_wall', { panelPlace: 'outside', wallFinish: 'masonry' }, 'EMT'), knownHome({ wallFinish: 'masonry' }), wired);
    expect(tasks(taken)).toMatchObject({ masonry_core: 1 });
    expect(tasks(taken)).not.toHaveProperty('wall_penetration');
  });
  it('digs the trench, and straps no pipe in it', () => {
    const run = runBy('underground', { parking: 'detached_garage', panelPlace: 'elsewhere' });
    const taken = takeoff(knownCircuit({ method: 'PVC40', insulation: 'THWN-2' }), run, knownHome(), wired);
    // 49 + 20.25 = 69.25 in all, 33 of it in the ground: straps 36.25/3 -> 13, + 1
    expect(tasks(taken)).toMatchObject({ trench: 30, pvc: 6.925 });
    expect(list(taken)).toEqual(expect.arrayContaining(['7 10 ft stick pvc40.3/4', '14 each strap.pvc.3/4']));
  });
});

describe('any run (fast-check)', () => {
  it('takes no less for a longer run, and nothing by fractions or below nothing', () => {
    const halfFeet = (most: number) => fc.integer({ min: 0, max: most * 2 }).map((halves) => halves / 2);
    fc.assert(fc.property(halfFeet(20), halfFeet(22), fc.constantFrom(wired, outlet), (along, chargerAlong, options) => {
      const known = knownHome({ panelAt: { wall: 'back', alongFt: along, topIn: 60 }, chargerAt: { wall: 'right', alongFt: chargerAlong, heightIn: 45 }, openings: [] });
      const [run] = planRuns(known);
      if (!run) return;
      const taken = takeoff(knownCircuit(), run, known, options);
      for (const { quantity, unit } of taken.items) {
        expect(quantity).toBeGreaterThan(0);
        expect(Number.isInteger(quantity)).toBe(true);
        expect(['ft', 'each', '10 ft stick']).toContain(unit);
      }
      for (const { quantity } of taken.tasks) expect(quantity > 0 && Number.isFinite(quantity)).toBe(true);
      const longer = takeoff(knownCircuit(), { ...run, lengthFt: run.lengthFt + 10, legs: [...run.legs, { way: 'surface', levelFt: 10, upDownFt: 0 }] }, known, options);
      const more = new Map(longer.items.map(({ words, quantity }) => [words, quantity]));
      for (const { words, quantity } of taken.items) expect(more.get(words)).toBeGreaterThanOrEqual(quantity);
    }));
  });
});
