import { designCircuit } from '../../../pricing/electrical/circuit';
import type { KnownFacts } from '../../../pricing/known-facts';
import { editionOne } from '../../../pricing/rulebook/edition-1';
import { planRuns } from '../../../pricing/run/plan-run';
import { takeoff } from '../../../pricing/takeoff/takeoff';
import { knownHome } from '../../support/known-home';

const homes: Partial<KnownFacts>[] = [
  { atticAbove: true, runLook: 'hidden', paintRun: true }, { wallFinish: 'bare_studs' }, { wallFinish: 'masonry', panelPlace: 'outside' },
  { panelPlace: 'next_room' }, { panelPlace: 'elsewhere', atticAbove: true, crawlBelow: true }, { panelPlace: 'basement' },
  { parking: 'driveway', panelPlace: 'outside' }, { parking: 'carport', panelPlace: 'elsewhere', crawlBelow: true }, { parking: 'carport', panelPlace: 'basement' },
];

describe('whatever a takeoff can hold has its price and its hours in edition 1', () => {
  it.each(homes)('%j', (changes) => {
    const known = knownHome(changes);
    const settings = [
      ...editionOne.options.wiredAmps.map((amps) => ['wired', amps] as const),
      ...editionOne.options.plugInAmps.map((amps) => ['plug_in', amps] as const),
    ];
    let seen = 0;
    for (const run of planRuns(known)) {
      for (const [connection, chargingAmps] of settings) {
        const circuit = designCircuit({
          edition: '2023', chargingAmps, volts: 240, connection, place: run.outdoor ? 'outdoor' : 'indoor', method: run.method, material: 'Cu',
          oneWayFt: run.lengthFt, ambientC: run.ambientC, wetLocation: run.wet,
        });
        const { items, tasks } = takeoff(circuit, run, known, { ...editionOne.wire, connection, chargersSupplied: 1 });
        for (const { item, unit } of items) expect([item, editionOne.priceBook[item]?.unit]).toEqual([item, unit]);
        for (const { task, unit } of tasks) expect([task, editionOne.labor.tasks[task]?.unit]).toEqual([task, unit]);
        seen += items.length + tasks.length;
      }
    }
    expect(seen).toBeGreaterThan(100);
  });
});
