import type { PlanDrawing } from '../../shared/quote';
import type { KnownFacts } from '../known-facts';
import { cableReach } from './cable-reach';
import type { RunPlan } from './run-plan';
import { wholeFeet } from './whole-feet';

export { planProblems } from './plan-problems';

/** Everything to draw of the garage and one run in it; null where there is no garage to draw. */
export function planDrawing(known: KnownFacts, run: RunPlan | null): PlanDrawing | null {
  const { room, chargerAt, carAt, panelAt, garageDoor } = known;
  if (known.parking === 'carport' || known.parking === 'driveway' || chargerAt === null || carAt === null) return null;
  const { reaches, usedFt, shortFt } = cableReach(room, carAt, chargerAt, known.cableLengthFt);
  const houseDoor = known.openings.find(({ wall }) => wall !== 'front');
  return {
    room: { ...room }, ceilingFt: known.ceilingFt,
    garageDoor: garageDoor && { ...garageDoor }, houseDoor: houseDoor ? { ...houseDoor } : null,
    panel: known.panelPlace === 'garage_wall' && panelAt !== null ? { ...panelAt } : null,
    charger: { ...chargerAt }, car: { ...carAt }, cableLengthFt: known.cableLengthFt,
    run: run && { points: run.points.map((point) => ({ ...point })), ...wholeFeet(run) },
    cable: { reaches, usedFt, shortFt },
  };
}
