import type { PlanDrawing } from '../../shared/quote';
import { feetInWords, inchesInWords } from '../../shared/units';
import type { Wall } from './plan-geometry';

const WALL: Readonly<Record<Wall, string>> = { back: 'back wall', right: 'right wall', front: 'front wall', left: 'left wall' };
const FROM: Readonly<Record<Wall, string>> = { back: 'from the left corner', front: 'from the left corner', right: 'from the back wall', left: 'from the back wall' };
const CORNER: Readonly<Record<PlanDrawing['car']['portCorner'], string>> = { front_left: 'front left', front_right: 'front right', rear_left: 'rear left', rear_right: 'rear right' };

const place = (at: { wall: Wall; alongFt: number }) => `on the ${WALL[at.wall]}, ${feetInWords(at.alongFt)} ${FROM[at.wall]}`;

/** The whole plan in one paragraph, for those who do not see it. */
export function planInWords(plan: PlanDrawing): string {
  const { room, garageDoor, houseDoor, panel, charger, car, cable, run } = plan;
  return [
    `Plan of the garage, ${feetInWords(room.widthFt)} wide and ${feetInWords(room.depthFt)} deep, ceiling at ${feetInWords(plan.ceilingFt)}.`,
    garageDoor && `Garage door ${feetInWords(garageDoor.widthFt)} wide in the front wall.`,
    houseDoor && `Door to the house ${place(houseDoor)}.`,
    panel && `Panel ${place(panel)}, its top at ${inchesInWords(panel.topIn)}.`,
    `Charger ${place(charger)}, ${inchesInWords(charger.heightIn)} up.`,
    `Car parked ${car.parked === 'nose_in' ? 'nose in' : 'back in'}, its charge port ${CORNER[car.portCorner]}.`,
    run && `The run is ${feetInWords(run.lengthFt)}: ${feetInWords(run.wallFt)} along, ${feetInWords(run.upDownFt)} up and down.`,
    cable.reaches
      ? `The ${feetInWords(plan.cableLengthFt)} cable reaches; it takes about ${feetInWords(Math.round(cable.usedFt))}.`
      : `The ${feetInWords(plan.cableLengthFt)} cable is ${feetInWords(cable.shortFt)} short.`,
  ].filter(Boolean).join(' ');
}
