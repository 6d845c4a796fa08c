import { cableCover, cableLegs, fishingPatches, insideLeg, type Garage } from './inside-leg';
import type { RunLeg } from './legs';
import { above, floorPoint, type FloorPoint, type Point, type Spot } from './perimeter';
import { runPlan, type RunPlan } from './run-plan';
import { DOOR_HEAD_FT } from './wall-route';

/** Panel and its knock-outs on the side. Source: common practice, no source. */
export const PANEL_HEIGHT_FT = 2.5;
/** From a ceiling to where a cable lies across the joists above. Source: common practice, no source. */
export const ABOVE_CEILING_FT = 1;

/** Every way from a panel that hangs on a wall of the garage. */
export function garageWays(garage: Garage): RunPlan[] {
  const panelAt = garage.known.panelAt;
  if (panelAt === null) return [];
  const topFt = Math.min(panelAt.topIn / 12, garage.known.ceilingFt);
  const ways = [pipeOnWalls(garage, panelAt, topFt), cableInWalls(garage, panelAt, topFt), attic(garage, panelAt, topFt)];
  return ways.filter((way) => way !== null);
}

function pipeOnWalls(garage: Garage, panel: Spot, topFt: number): RunPlan | null {
  const inside = insideLeg(garage, panel, { bottomFt: topFt - PANEL_HEIGHT_FT, topFt }, true);
  return inside && runPlan({
    method: 'EMT', way: 'surface', methodWords: 'Metal pipe (EMT) along the walls',
    legs: [{ way: 'surface', levelFt: inside.route.levelFt, upDownFt: inside.upDownFt }],
    bends90: inside.bends90, points: inside.points, oddities: inside.oddities, paint: garage.known.paintRun,
  });
}

/** On bare studs, or fished in drywall when it is to be hidden; no other wall takes a cable. */
function cableInWalls(garage: Garage, panel: Spot, topFt: number): RunPlan | null {
  const cover = cableCover(garage.known);
  if (cover === 'surface') return null;
  const inside = insideLeg(garage, panel, { bottomFt: topFt, topFt }, false);
  if (inside === null) return null;
  const fished = cover === 'finished_wall';
  return runPlan({
    method: 'NM_B', way: cover, methodWords: fished ? 'Cable inside the walls' : 'Cable through the open studs, pipe where it is low',
    legs: cableLegs(garage, inside, inside.route.levelFt), bends90: 0, points: inside.points, oddities: inside.oddities,
    patches: fished ? fishingPatches(inside.route.levelFt, inside.route.path.length - 2) : 0,
  });
}

/** Feet across an attic from one floor point to another, along and across the joists. */
export const acrossFt = (from: FloorPoint, to: FloorPoint): number => Math.abs(to.xFt - from.xFt) + Math.abs(to.yFt - from.yFt);

/** From above a floor point across and down to the charger, as points. */
export function atticPoints(garage: Garage, start: FloorPoint): Point[] {
  const end = floorPoint(garage.room, garage.charger);
  const zFt = garage.known.ceilingFt + ABOVE_CEILING_FT;
  const points = [above(start, zFt)];
  if (start.xFt !== end.xFt && start.yFt !== end.yFt) points.push({ xFt: end.xFt, yFt: start.yFt, zFt });
  points.push(above(end, zFt), above(end, garage.charger.heightFt));
  return points;
}

/** The drop from the ceiling to the charger. */
export function dropLegs(garage: Garage): RunLeg[] {
  const { known, charger } = garage;
  const dropFt = Math.abs(known.ceilingFt - charger.heightFt);
  return cableLegs(garage, { upDownFt: dropFt, lowFt: Math.min(dropFt, Math.max(0, DOOR_HEAD_FT - charger.heightFt)) }, 0);
}

function attic(garage: Garage, panel: Spot, topFt: number): RunPlan | null {
  const { known, room, charger } = garage;
  if (!known.atticAbove) return null;
  const start = floorPoint(room, panel);
  const rise: RunLeg = { way: known.wallFinish === 'drywall' ? 'finished_wall' : cableCover(known), levelFt: 0, upDownFt: Math.abs(known.ceilingFt - topFt) };
  return runPlan({
    method: 'NM_B', way: 'attic', methodWords: 'Cable through the attic',
    legs: [rise, { way: 'attic', levelFt: acrossFt(start, floorPoint(room, charger)), upDownFt: 2 * ABOVE_CEILING_FT }, ...dropLegs(garage)],
    bends90: 0, points: [above(start, topFt), ...atticPoints(garage, start)], wallPenetrations: 2,
    paint: known.paintRun && cableCover(known) === 'surface',
  });
}
