import type { Facts } from '../../shared/facts';
import { cableWords } from './cable-reach';
import { wallLengthFt, type Room, type Spot } from './perimeter';
import type { Opening } from './wall-route';

/** Half the width of a panel and of a wall charger, feet. Source: common practice, no source. */
const HALF_PANEL_FT = 0.6;
const HALF_CHARGER_FT = 0.5;
/** Keeps a charger out of the 30 in. in front of a panel: half of that and half of a charger. NEC 2023 110.26(A)(2). */
const PANEL_CLEAR_FT = 1.25 + HALF_CHARGER_FT;
/** Highest place of the charger, inches. Source: common practice, no source. */
const HIGHEST_IN = 60;

/** A door of the garage as an opening of its front wall. */
const garageOpening = ({ garageDoor }: Facts): Opening[] => (garageDoor === null ? [] : [{ wall: 'front', ...garageDoor }]);

const overlaps = (spot: Spot, halfFt: number, opening: Opening): boolean =>
  spot.wall === opening.wall && spot.alongFt + halfFt > opening.alongFt && spot.alongFt - halfFt < opening.alongFt + opening.widthFt;

const offWall = (room: Room, { wall, alongFt }: Spot): boolean => alongFt > wallLengthFt(room, wall);

/** What cannot be as it is on the plan, each in a sentence or two; what is not known is no problem. */
export function planProblems(facts: Facts): string[] {
  const { room, panelAt, chargerAt, carAt, ceilingFt } = facts;
  if (room === null || facts.parking === 'carport' || facts.parking === 'driveway') return [];
  const problems: string[] = [];
  const say = (wrong: boolean, words: string) => { if (wrong) problems.push(words); };
  const garageDoors = garageOpening(facts);

  say(garageDoors.some((door) => door.alongFt + door.widthFt > room.widthFt), 'The garage door is wider than its wall. Check both.');
  say(facts.openings.some((door) => door.alongFt + door.widthFt > wallLengthFt(room, door.wall)), 'A door ends beyond its wall. Move it or check the garage’s size.');
  if (chargerAt !== null) {
    say(offWall(room, chargerAt), 'The charger is beyond the end of its wall. Move it or check the garage’s size.');
    say(garageDoors.some((door) => overlaps(chargerAt, HALF_CHARGER_FT, door)), 'A charger cannot hang on the garage door. Move it to the side.');
    say(facts.openings.some((door) => overlaps(chargerAt, HALF_CHARGER_FT, door)), 'A charger cannot hang on a door. Move it to the side.');
    say(chargerAt.heightIn > HIGHEST_IN, `The charger hangs too high. ${HIGHEST_IN}\u00a0in. is the most.`);
  }
  if (panelAt !== null && facts.panelPlace === 'garage_wall') {
    say(offWall(room, panelAt), 'The panel is beyond the end of its wall. Move it or check the garage’s size.');
    say([...garageDoors, ...facts.openings].some((door) => overlaps(panelAt, HALF_PANEL_FT, door)), 'The panel cannot be on a door. Move one of them.');
    say(ceilingFt !== null && panelAt.topIn / 12 > ceilingFt, 'The top of the panel is above the ceiling. Check both heights.');
    say(
      chargerAt !== null && chargerAt.wall === panelAt.wall && Math.abs(chargerAt.alongFt - panelAt.alongFt) < PANEL_CLEAR_FT,
      'The charger is in the way of the panel. Keep 1\u00a0ft 9\u00a0in. between their middles.',
    );
  }
  if (chargerAt !== null && carAt !== null && facts.cableLengthFt !== null) {
    const words = cableWords(room, carAt, chargerAt, facts.cableLengthFt);
    if (words !== null) problems.push(words);
  }
  return problems;
}
