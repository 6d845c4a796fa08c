import fc from 'fast-check';
import type { KnownFacts } from '../../../pricing/known-facts';
import { planRuns, type Point, type RunPlan } from '../../../pricing/run/plan-run';
import { knownHome } from '../../support/known-home';

const halfFeet = (low: number, high: number) => fc.integer({ min: low * 2, max: high * 2 }).map((halves) => halves / 2);
const wall = fc.constantFrom('back', 'right', 'front', 'left');
const share = fc.integer({ min: 0, max: 100 }).map((percent) => percent / 100);

/** Garages with panel, charger and doors anywhere on their walls. */
const garages = fc.record({
  room: fc.record({ widthFt: halfFeet(8, 40), depthFt: halfFeet(8, 40) }), ceilingFt: halfFeet(7, 14),
  wallFinish: fc.constantFrom('drywall', 'bare_studs', 'masonry'),
  panelWall: wall, panelShare: share, topIn: fc.integer({ min: 36, max: 90 }),
  chargerWall: wall, chargerShare: share, heightIn: fc.integer({ min: 18, max: 60 }),
  doorShare: share, houseWall: fc.constantFrom('back', 'left', 'right'), houseShare: share, atticAbove: fc.boolean(),
  runLook: fc.constantFrom('hidden', 'pipe', null), panelPlace: fc.constantFrom('garage_wall', 'next_room', 'elsewhere', 'outside', 'basement'),
  paces: fc.integer({ min: 1, max: 40 }), floors: fc.integer({ min: 0, max: 2 }),
}).map((drawn): KnownFacts => {
  const { room } = drawn;
  const length = (name: string) => (name === 'back' || name === 'front' ? room.widthFt : room.depthFt);
  const doorFt = Math.min(16, room.widthFt - 1);
  return knownHome({
    room, ceilingFt: drawn.ceilingFt, wallFinish: drawn.wallFinish, runLook: drawn.runLook,
    atticAbove: drawn.atticAbove, crawlBelow: drawn.atticAbove,
    panelPlace: drawn.panelPlace, pacesToPanel: drawn.paces, floorsBetween: drawn.floors,
    garageDoor: { alongFt: drawn.doorShare * (room.widthFt - doorFt), widthFt: doorFt },
    openings: [{ wall: drawn.houseWall, alongFt: drawn.houseShare * (length(drawn.houseWall) - 3), widthFt: 3 }],
    panelAt: { wall: drawn.panelWall, alongFt: drawn.panelShare * length(drawn.panelWall), topIn: drawn.topIn },
    chargerAt: { wall: drawn.chargerWall, alongFt: drawn.chargerShare * length(drawn.chargerWall), heightIn: drawn.heightIn },
  });
});

const distance = (a: Point, b: Point) => Math.hypot(a.xFt - b.xFt, a.yFt - b.yFt, a.zFt - b.zFt);
const stretches = ({ points }: RunPlan): [Point, Point][] => points.slice(1).map((point, index) => [points[index] as Point, point]);
const pathFt = (run: RunPlan) => stretches(run).reduce((sum, [a, b]) => sum + distance(a, b), 0);
const spotOf = (known: KnownFacts, spot: { wall: string; alongFt: number }, zFt: number): Point => {
  const { widthFt, depthFt } = known.room;
  if (spot.wall === 'left' || spot.wall === 'right') return { xFt: spot.wall === 'left' ? 0 : widthFt, yFt: spot.alongFt, zFt };
  return { xFt: spot.alongFt, yFt: spot.wall === 'back' ? 0 : depthFt, zFt };
};
const runs = 500;

describe('any garage (fast-check)', () => {
  it('ends every run at the charger; with the panel in the garage it starts at the panel and its points measure its length', () => {
    fc.assert(fc.property(garages, (known) => {
      const { panelAt, chargerAt } = known;
      if (!panelAt || !chargerAt) return;
      for (const run of planRuns(known)) {
        const [first, last] = [run.points[0] as Point, run.points.at(-1) as Point];
        expect(distance(last, spotOf(known, chargerAt, chargerAt.heightIn / 12))).toBeLessThan(1e-9);
        if (known.panelPlace !== 'garage_wall') {
          expect(pathFt(run)).toBeLessThanOrEqual(run.lengthFt + 0.02);
          continue;
        }
        const panel = spotOf(known, panelAt, first.zFt);
        expect(distance(first, panel)).toBeLessThan(1e-9);
        const topFt = Math.min(panelAt.topIn / 12, known.ceilingFt);
        expect(first.zFt).toBeLessThanOrEqual(topFt + 1e-9);
        expect(first.zFt).toBeGreaterThanOrEqual(topFt - 2.5 - 1e-9);
        expect(Math.abs(pathFt(run) - run.lengthFt)).toBeLessThan(0.02);
        expect(run.lengthFt).toBeGreaterThanOrEqual(distance(first, last) - 0.02);
      }
    }), { numRuns: runs });
  });

  it('never crosses the garage door below its springs, and stays on the walls unless it is above the ceiling', () => {
    fc.assert(fc.property(garages, (known) => {
      const { room, garageDoor: door, ceilingFt } = known;
      if (!door) return;
      for (const run of planRuns(known)) {
        for (const [a, b] of stretches(run)) {
          const above = Math.min(a.zFt, b.zFt) > ceilingFt;
          const onSide = a.xFt === b.xFt && (a.xFt === 0 || a.xFt === room.widthFt);
          const onWall = onSide || (a.yFt === b.yFt && (a.yFt === 0 || a.yFt === room.depthFt));
          expect(above || onWall).toBe(true);
          const [left, right] = [Math.min(a.xFt, b.xFt), Math.max(a.xFt, b.xFt)];
          const onFront = a.yFt === room.depthFt && b.yFt === room.depthFt && right > left;
          const atDoor = left < door.alongFt + door.widthFt - 1e-6 && right > door.alongFt + 1e-6;
          if (onFront && atDoor && !above) expect(Math.min(a.zFt, b.zFt)).toBeGreaterThanOrEqual(8.5);
        }
      }
    }), { numRuns: runs });
  });

  it('never shortens a run in a larger room', () => {
    fc.assert(fc.property(garages, halfFeet(0, 10), halfFeet(0, 10), (drawn, wider, deeper) => {
      const known = { ...drawn, panelPlace: 'garage_wall' as const };
      const larger = { ...known, room: { widthFt: known.room.widthFt + wider, depthFt: known.room.depthFt + deeper } };
      const before = planRuns(known);
      const after = planRuns(larger);
      expect(after.map(({ way }) => way)).toEqual(before.map(({ way }) => way));
      before.forEach((run, index) => expect(after[index]?.lengthFt).toBeGreaterThanOrEqual(run.lengthFt - 0.011));
    }), { numRuns: runs });
  });

  it('keeps to 360 degrees, counts enough supports, and has no figure that is not one', () => {
    fc.assert(fc.property(garages, (known) => {
      for (const run of planRuns(known)) {
        if (run.method !== 'NM_B') expect(run.bends90).toBeLessThanOrEqual(4 * (run.pullPoints + 1));
        for (const feet of [run.lengthFt, run.wallFt, run.upDownFt, run.supports, run.patches]) {
          expect(Number.isFinite(feet)).toBe(true);
          expect(feet).toBeGreaterThanOrEqual(0);
        }
        for (const leg of run.legs) expect(Math.min(leg.levelFt, leg.upDownFt)).toBeGreaterThanOrEqual(-1e-9);
        expect(Math.abs(run.wallFt + run.upDownFt - run.lengthFt)).toBeLessThan(0.006);
      }
    }), { numRuns: runs });
  });

  it('never gets shorter with more paces or floors', () => {
    fc.assert(fc.property(garages, fc.constantFrom('next_room', 'elsewhere', 'outside', 'basement'), (drawn, panelPlace) => {
      const known = { ...drawn, panelPlace };
      const farther = planRuns({ ...known, pacesToPanel: known.pacesToPanel + 1, floorsBetween: known.floorsBetween + 1 });
      planRuns(known).forEach((run, index) => expect(farther[index]?.lengthFt).toBeGreaterThan(run.lengthFt));
    }), { numRuns: runs });
  });
});
