import type { KnownFacts } from '../../../pricing/known-facts';
import { planRuns, type RunPlan, type RunWay } from '../../../pricing/run/plan-run';
import { knownHome } from '../../support/known-home';

const way = (known: KnownFacts, wanted: RunWay, method?: RunPlan['method']): RunPlan => {
  const found = planRuns(known).find((run) => run.way === wanted && (method === undefined || run.method === method));
  if (!found) throw new Error(`No way ${wanted} in ${planRuns(known).map((run) => run.way).join(', ')}`);
  return found;
};
const ways = (known: KnownFacts) => planRuns(known).map((run) => `${run.way} ${run.method}`).sort();

describe('panel on a garage wall: pipe along the walls', () => {
  it('gives the figures of the garage in the shared design picture (invented)', () => {
    // Along the walls 20 - 4 = 16 and 9: 25. Up 8 - 5 = 3, down 8 - 45/12 = 4.25: 7.25. Whole run 32.25.
    const run = way(knownHome(), 'surface');
    expect(run).toMatchObject({ method: 'EMT', wallFt: 25, upDownFt: 7.25, lengthFt: 32.25 });
    // The picture spells it in whole feet: 25, 7 and 32.
    expect([run.wallFt, run.upDownFt, run.lengthFt].map(Math.round)).toEqual([25, 7, 32]);
    // Up, corner, down. The picture draws five straps.
    expect(run).toMatchObject({ bends90: 3, pullPoints: 0, supports: 5 });
    expect(run.points).toEqual([
      { xFt: 4, yFt: 0, zFt: 5 }, { xFt: 4, yFt: 0, zFt: 8 }, { xFt: 20, yFt: 0, zFt: 8 },
      { xFt: 20, yFt: 9, zFt: 8 }, { xFt: 20, yFt: 9, zFt: 3.75 },
    ]);
  });

  it('gives the same whole feet with the panel at 4 ft 6 in. (invented)', () => {
    // 15.5 + 9 = 24.5, 7.25, 31.75
    const run = way(knownHome({ panelAt: { wall: 'back', alongFt: 4.5, topIn: 60 } }), 'surface');
    expect([run.wallFt, run.upDownFt, run.lengthFt]).toEqual([24.5, 7.25, 31.75]);
    expect([run.wallFt, run.upDownFt, run.lengthFt].map(Math.round)).toEqual([25, 7, 32]);
  });

  it('takes the shorter way round', () => {
    // Left wall at 9: back over the corner 4 + 9 = 13, not 16 + 22 + 20 + 13.
    const run = way(knownHome({ chargerAt: { wall: 'left', alongFt: 9, heightIn: 45 } }), 'surface');
    expect(run).toMatchObject({ wallFt: 13, upDownFt: 7.25, bends90: 3, oddities: [] });
  });

  it('goes over a house door at the same height and says so', () => {
    // 4 + 18 = 22 past the door at 12.5 to 15.5
    const run = way(knownHome({ chargerAt: { wall: 'left', alongFt: 18, heightIn: 45 } }), 'surface');
    expect(run).toMatchObject({ wallFt: 22, upDownFt: 7.25, oddities: ['Goes up over a door or window'] });
  });

  const besideDoor = { panelAt: { wall: 'right', alongFt: 20, topIn: 60 }, chargerAt: { wall: 'left', alongFt: 20, heightIn: 45 } } as const;
  it('goes the other way round when the garage door’s track is in the way (18 in. above a 7 ft door, common practice)', () => {
    // Front way 2 + 20 + 2 = 24 is barred; back way 20 + 20 + 20 = 60. Up, two corners, down.
    const run = way(knownHome(besideDoor), 'surface');
    expect(run).toMatchObject({ wallFt: 60, bends90: 4, pullPoints: 0 });
    expect(run.oddities).toContain('Goes the longer way round: the garage door’s track bars the shorter one');
  });
  it('goes over the garage door under a ceiling of 9 ft', () => {
    // Height 8.5: 24 along, up 3.5, down 4.75.
    expect(way(knownHome({ ...besideDoor, ceilingFt: 9 }), 'surface')).toMatchObject({ wallFt: 24, upDownFt: 8.25, oddities: ['Goes up over the garage door'] });
    expect(way(knownHome({ ...besideDoor, ceilingFt: 8.9 }), 'surface').wallFt).toBe(60);
  });

  it('joins neighbors straight across (6 ft at most, invented for the demo)', () => {
    // The charger at 3.75 ft is beside the panel's body, 2.5 to 5 ft: 4 ft and no bend.
    const near = knownHome({ chargerAt: { wall: 'back', alongFt: 8, heightIn: 45 } });
    expect(way(near, 'surface')).toMatchObject({ wallFt: 4, upDownFt: 0, lengthFt: 4, bends90: 0 });
    expect(way(knownHome({ chargerAt: { wall: 'back', alongFt: 10, heightIn: 45 } }), 'surface').lengthFt).toBe(6);
    // A step farther it goes up and over: 6.5 along, 3 up, 4.25 down.
    expect(way(knownHome({ chargerAt: { wall: 'back', alongFt: 10.5, heightIn: 45 } }), 'surface')).toMatchObject({ lengthFt: 13.75, bends90: 2 });
  });
  it('leaves a panel’s side at its lowest and jogs down to a lower neighbor', () => {
    // Panel 4.5 to 7 ft, charger at 2 ft: 4 along, 2.5 down, two bends.
    const run = way(knownHome({ panelAt: { wall: 'back', alongFt: 4, topIn: 84 }, chargerAt: { wall: 'back', alongFt: 8, heightIn: 24 } }), 'surface');
    expect(run).toMatchObject({ wallFt: 4, upDownFt: 2.5, bends90: 2 });
  });
  it('does not cross a door low', () => {
    const known = knownHome({ chargerAt: { wall: 'back', alongFt: 9, heightIn: 45 }, openings: [{ wall: 'back', alongFt: 5, widthFt: 3 }] });
    expect(way(known, 'surface')).toMatchObject({ wallFt: 5, upDownFt: 7.25 });
  });

  it('keeps over an 80 in. door under a low ceiling (common practice)', () => {
    // At 7 ft: up 2, down 3.25.
    expect(way(knownHome({ ceilingFt: 7 }), 'surface').upDownFt).toBe(5.25);
    expect(way(knownHome({ ceilingFt: 7.4 }), 'surface').upDownFt).toBe(5.25);
    expect(way(knownHome({ ceilingFt: 12 }), 'surface').upDownFt).toBe(6.5 + 7.75);
  });

  it('finds no way to a charger on the garage door', () => {
    expect(planRuns(knownHome({ chargerAt: { wall: 'front', alongFt: 10, heightIn: 45 }, atticAbove: false }))).toEqual([]);
  });
  it('paints only what is seen', () => {
    expect(way(knownHome({ paintRun: true }), 'surface').paint).toBe(true);
    expect(way(knownHome({ paintRun: true, runLook: 'hidden' }), 'finished_wall').paint).toBe(false);
    const attic = { paintRun: true, atticAbove: true } as const;
    const crawl = { paintRun: true, crawlBelow: true, panelPlace: 'elsewhere' } as const;
    expect([null, 'hidden' as const].map((runLook) => way(knownHome({ ...attic, runLook }), 'attic').paint)).toEqual([true, false]);
    expect([null, 'hidden' as const].map((runLook) => way(knownHome({ ...crawl, runLook }), 'crawl').paint)).toEqual([true, false]);
  });
});

describe('panel on a garage wall: cable', () => {
  it('goes through open studs, in pipe below 7 ft (garage practice, common practice)', () => {
    // 25 along at 8 ft. Above 7 ft: 1 up, 1 down. Below: 7 - 5 = 2 and 7 - 3.75 = 3.25.
    const run = way(knownHome({ wallFinish: 'bare_studs' }), 'open_studs');
    expect(run.legs).toEqual([{ way: 'open_studs', levelFt: 25, upDownFt: 2 }, { way: 'surface', levelFt: 0, upDownFt: 5.25 }]);
    // Staples 27/4.5 = 6, + 1; straps 5.25/10 -> 1, + 1.
    expect(run).toMatchObject({ method: 'NM_B', lengthFt: 32.25, bends90: 0, pullPoints: 0, supports: 9, patches: 0 });
  });
  it('goes up into the attic, along and across its joists, and down in pipe', () => {
    // Up 8.5 - 5 = 3.5 and 1; across 16 + 9 = 25; down 1 and 8.5 - 3.75 = 4.75.
    const run = way(knownHome({ atticAbove: true }), 'attic');
    expect(run.legs).toEqual([
      { way: 'finished_wall', levelFt: 0, upDownFt: 3.5 }, { way: 'attic', levelFt: 25, upDownFt: 2 }, { way: 'surface', levelFt: 0, upDownFt: 4.75 },
    ]);
    expect(run).toMatchObject({ lengthFt: 35.25, wallFt: 25, upDownFt: 10.25, ambientC: 54, wallPenetrations: 2 });
  });
  it('draws no corner in the attic above a charger on the panel’s own wall', () => {
    const run = way(knownHome({ atticAbove: true, chargerAt: { wall: 'back', alongFt: 14, heightIn: 45 } }), 'attic');
    expect(run.points).toEqual([
      { xFt: 4, yFt: 0, zFt: 5 }, { xFt: 4, yFt: 0, zFt: 9.5 }, { xFt: 14, yFt: 0, zFt: 9.5 }, { xFt: 14, yFt: 0, zFt: 3.75 },
    ]);
  });
  it('drops inside the wall when it is to be hidden', () => {
    expect(way(knownHome({ atticAbove: true, runLook: 'hidden' }), 'attic').legs[2]).toEqual({ way: 'finished_wall', levelFt: 0, upDownFt: 4.75 });
  });
  it('fishes finished walls with an opening every 8 ft and at corners (invented for the demo)', () => {
    // 25/8 -> 4, and one corner.
    expect(way(knownHome({ runLook: 'hidden' }), 'finished_wall')).toMatchObject({ method: 'NM_B', lengthFt: 32.25, patches: 5 });
  });
  it('offers what the walls allow', () => {
    expect(ways(knownHome())).toEqual(['surface EMT']);
    expect(ways(knownHome({ atticAbove: true, runLook: 'hidden' }))).toEqual(['attic NM_B', 'finished_wall NM_B', 'surface EMT']);
    expect(ways(knownHome({ wallFinish: 'bare_studs', atticAbove: true }))).toEqual(['attic NM_B', 'open_studs NM_B', 'surface EMT']);
    expect(ways(knownHome({ wallFinish: 'masonry', runLook: 'hidden' }))).toEqual(['surface EMT']);
  });
});

describe('panel elsewhere at the house', () => {
  // Comes in beside the door on the left wall: 12.5 - 0.5 = 12. From there over the back wall: 12 + 20 + 9 = 41 to the charger.
  it('goes from a room next door on its walls: paces of 2.5 ft, as the wizard says', () => {
    const run = way(knownHome({ panelPlace: 'next_room', pacesToPanel: 4 }), 'surface');
    // 10 + 41 along; up 3.5, down 4.25. Up, through; corner, corner, down.
    expect(run).toMatchObject({ wallFt: 51, upDownFt: 7.75, lengthFt: 58.75, bends90: 5, pullPoints: 1 });
    expect(run).toMatchObject({ wallPenetrations: 1, masonryCores: 0 });
    expect(run.points[0]).toEqual({ xFt: 0, yFt: 12, zFt: 8 });
  });
  it('adds 9 ft for each floor between', () => {
    const same = way(knownHome({ panelPlace: 'elsewhere' }), 'outside_wall');
    expect(way(knownHome({ panelPlace: 'elsewhere', floorsBetween: 2 }), 'outside_wall').upDownFt).toBe(same.upDownFt + 18);
  });
  it('goes on the outside wall in wet pipe, through two walls, or one when the panel is outside', () => {
    const run = way(knownHome({ panelPlace: 'elsewhere' }), 'outside_wall', 'PVC40');
    // 30 + 41; up 3, down 4.25
    expect(run).toMatchObject({ wallFt: 71, upDownFt: 7.25, wet: true, outdoor: false, ambientC: 40, wallPenetrations: 2 });
    expect(way(knownHome({ panelPlace: 'outside' }), 'outside_wall').wallPenetrations).toBe(1);
    expect(way(knownHome({ panelPlace: 'outside', wallFinish: 'masonry' }), 'outside_wall')).toMatchObject({ wallPenetrations: 0, masonryCores: 1 });
  });
  it('comes up from basement joists', () => {
    // 30 + 41 along; up 3 to the joists, 1 through the floor, 8 up the garage wall, 4.25 down.
    const known = knownHome({ panelPlace: 'basement', floorsBetween: 1 });
    expect(way(known, 'joists')).toMatchObject({ method: 'NM_B', wallFt: 71, upDownFt: 16.25 });
    expect(way(known, 'surface')).toMatchObject({ method: 'EMT', wallFt: 71, upDownFt: 16.25 });
    expect(ways(known)).toEqual(['joists NM_B', 'surface EMT']);
  });
  it('goes through the crawl space only where there is one', () => {
    expect(ways(knownHome({ panelPlace: 'elsewhere' }))).not.toContain('crawl NM_B');
    // 30 + 41 along; down 2.5, 1 below and 1 up again, 8 up the garage wall, 4.25 down.
    expect(way(knownHome({ panelPlace: 'elsewhere', crawlBelow: true }), 'crawl')).toMatchObject({ wallFt: 71, upDownFt: 16.75, wallPenetrations: 2 });
  });
  it('goes through the attic straight to above the charger', () => {
    // 30; from (0, 12) to (20, 9): 20 + 3. Up 3.5 and 1, down 1 and 4.75.
    expect(way(knownHome({ panelPlace: 'elsewhere', atticAbove: true }), 'attic')).toMatchObject({ wallFt: 53, upDownFt: 10.25, ambientC: 54 });
  });
  it('bores one floor plate more for each floor between', () => {
    const holes = (floorsBetween: number, wanted: RunWay) =>
      way(knownHome({ panelPlace: 'elsewhere', atticAbove: true, crawlBelow: true, floorsBetween }), wanted).wallPenetrations;
    // Attic: two top plates. Crawl space: a floor and the garage's wall. Inside the walls: the garage's wall.
    expect([0, 1, 2].map((floors) => holes(floors, 'attic'))).toEqual([2, 3, 4]);
    expect([0, 1, 2].map((floors) => holes(floors, 'crawl'))).toEqual([2, 3, 4]);
    expect([0, 1, 2].map((floors) => holes(floors, 'finished_wall'))).toEqual([1, 2, 3]);
  });
  it('patches what is fished in the house, and in the garage too when it is to be hidden there (invented for the demo)', () => {
    // House 30/8 -> 4, and a turn; garage 41/8 -> 6, and two corners.
    expect(way(knownHome({ panelPlace: 'elsewhere' }), 'finished_wall').patches).toBe(5);
    expect(way(knownHome({ panelPlace: 'elsewhere', runLook: 'hidden' }), 'finished_wall').patches).toBe(13);
  });
  it('takes a cable on bare studs up to run height even to a neighbor', () => {
    // Comes up at 12 - 0.5 = 11.5 from below, charger at 9 on the same wall: 2.5 along at 8 ft, not at 3.75 ft.
    const near = { panelPlace: 'basement', floorsBetween: 1, chargerAt: { wall: 'left', alongFt: 9, heightIn: 45 } } as const;
    // 3 and 1 to the floor; 8 up and 4.25 down, or 3.75 up.
    expect(way(knownHome({ ...near, wallFinish: 'bare_studs' }), 'joists').upDownFt).toBe(16.25);
    expect(way(knownHome(near), 'joists').upDownFt).toBe(7.75);
  });
  it('comes in at the middle of the back wall when no door is known', () => {
    expect(way(knownHome({ panelPlace: 'next_room', openings: [] }), 'surface').points[0]).toEqual({ xFt: 10, yFt: 0, zFt: 8 });
  });
});

describe('charger outdoors and detached garages', () => {
  it('hangs on the outside wall in Schedule 80 where a car can touch it (NEC 2023 352.12(C))', () => {
    const known = knownHome({ parking: 'driveway', panelPlace: 'outside', chargerAt: null, carAt: null, panelAt: null });
    // 30 along; up 3 to the eaves, down 8 - 3.75
    expect(way(known, 'outside_wall', 'PVC80')).toMatchObject({ wallFt: 30, upDownFt: 7.25, outdoor: true, wet: true, wallPenetrations: 0, points: [] });
    expect(ways(known)).toEqual(['outside_wall EMT', 'outside_wall PVC80']);
  });
  it('joins an outdoor neighbor straight across', () => {
    const known = knownHome({ parking: 'carport', panelPlace: 'outside', pacesToPanel: 2 });
    expect(way(known, 'outside_wall', 'PVC80')).toMatchObject({ wallFt: 5, upDownFt: 1.25, bends90: 2 });
    // Two paces fit into 6 ft, three do not.
    expect(way({ ...known, pacesToPanel: 3 }, 'outside_wall', 'PVC80')).toMatchObject({ wallFt: 7.5, upDownFt: 7.25, bends90: 3 });
    // Not from another floor: 3 up, 9, and 4.25 down.
    expect(way({ ...known, floorsBetween: 1 }, 'outside_wall', 'PVC80').upDownFt).toBe(16.25);
  });
  it('comes out behind the charger', () => {
    const outdoor = (changes: Partial<KnownFacts>, wanted: RunWay) => way(knownHome({ parking: 'carport', crawlBelow: true, ...changes }), wanted);
    // 30 along; down 2.5, 1 and 1 below the floor, up 3.75. Floor, sole plate and outer wall.
    expect(outdoor({ panelPlace: 'elsewhere' }, 'crawl')).toMatchObject({ wallFt: 30, upDownFt: 8.25, wallPenetrations: 3, outdoor: true });
    expect(outdoor({ panelPlace: 'elsewhere', floorsBetween: 1 }, 'crawl').wallPenetrations).toBe(4);
    // Up 3 to the joists, 1 through the floor, 3.75.
    expect(outdoor({ panelPlace: 'basement', floorsBetween: 1 }, 'joists')).toMatchObject({ upDownFt: 7.75, wallPenetrations: 2 });
    expect(outdoor({ panelPlace: 'basement', floorsBetween: 2 }, 'joists').upDownFt).toBe(16.75);
    // Panel's top at 5 ft, charger at 3.75; an opening every 8 of 30 ft and at a turn.
    expect(outdoor({ panelPlace: 'next_room' }, 'finished_wall')).toMatchObject({ wallFt: 30, upDownFt: 1.25, patches: 5, wallPenetrations: 1 });
  });
  it('keeps cable out of the weather', () => {
    for (const panelPlace of ['next_room', 'elsewhere', 'outside', 'basement', 'garage_wall'] as const) {
      for (const run of planRuns(knownHome({ parking: 'carport', panelPlace, crawlBelow: true }))) {
        if (run.method === 'NM_B') expect(run.wet).toBe(false);
      }
    }
  });
  it('crosses the yard 18 in. deep in plastic pipe (NEC 2023 Table 300.5(A))', () => {
    const run = way(knownHome({ parking: 'detached_garage', panelPlace: 'elsewhere', surfaceOver: 'paved' }), 'underground');
    // Down 5 from the panel; 30 across with 1.5 down and up; up the back wall from its middle: 8, along 10 + 9, down 4.25.
    expect(run).toMatchObject({ method: 'PVC40', wallFt: 49, upDownFt: 20.25, trenchFt: 30, wet: true, bends90: 5, pullPoints: 1 });
    expect(run.oddities).toContain('Goes under paving');
  });
});
