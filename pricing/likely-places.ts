import type { Facts, Wall } from '../shared/facts';
import { chargePort, type CarAt } from './run/car';

type Room = NonNullable<Facts['room']>;
/** A home while it is being drawn, fact by fact. */
export type Draft = { -readonly [Name in keyof Facts]: Facts[Name] };
export type Fill = (draft: Draft, draw: number) => void;
/** Prepares the drawing of one fact by its likelihood; idle: the likeliest value, always. */
export type Chooser = (name: string, isIdle?: boolean) => (draft: Draft, draw: number) => unknown;

const roomOf = (draft: Draft): Room => draft.room ?? { widthFt: 20, depthFt: 22 };
/** True when the car stands, or may stand, in a garage. */
export const indoors = (parking: Facts['parking']): boolean =>
  parking === null || parking === 'attached_garage' || parking === 'detached_garage';

const SIDE_WALL_CHANCE = 0.75;
/** How far along its wall the charger may be from the port. */
const STRAY_FT = 4;
const HEIGHT_IN = 45;

const clampHalfFt = (value: number, low: number, high: number) => Math.round(Math.min(Math.max(low, high), Math.max(low, value)) * 2) / 2;

/**
 * A likely place for the charger: mostly on the side wall nearest to the port, else on the back wall. Invented for the demo.
 * @param port where the charge port is, feet from the left wall and from the back.
 * @param wallDraw,alongDraw places between 0 and 1 of the likelihoods.
 */
function chargerByPort(
  room: Room,
  port: { xFt: number; yFt: number },
  wallDraw: number,
  alongDraw: number,
): NonNullable<Facts['chargerAt']> {
  const stray = (alongDraw - 0.5) * 2 * STRAY_FT;
  const sideWall: Wall = port.xFt < room.widthFt / 2 ? 'left' : 'right';
  return wallDraw < SIDE_WALL_CHANCE
    ? { wall: sideWall, alongFt: clampHalfFt(port.yFt + stray, 1, room.depthFt - 1), heightIn: HEIGHT_IN }
    : { wall: 'back', alongFt: clampHalfFt(port.xFt + stray, 1, room.widthFt - 1), heightIn: HEIGHT_IN };
}

/**
 * Places on the plan: the garage door in the middle, the car in its half, the charger by the port, the panel on any wall. None outdoors.
 * @param placeOf gives, by its name, a place between 0 and 1 of the likelihoods for each draw.
 */
export function fillPlaces(facts: Facts, chooser: Chooser, fills: Fill[], placeOf: (name: string) => (draw: number) => number): void {
  if (!indoors(facts.parking)) return;
  if (facts.garageDoor === null) {
    fills.push((draft) => {
      const { widthFt: roomFt } = roomOf(draft);
      const widthFt = roomFt >= 18 ? 16 : Math.min(9, roomFt - 1);
      draft.garageDoor = { alongFt: (roomFt - widthFt) / 2, widthFt };
    });
  }
  if (facts.carAt === null) {
    const [port, parked] = [chooser('portCorner'), chooser('parked')];
    fills.push((draft, draw) => {
      const { widthFt } = roomOf(draft);
      draft.carAt = {
        centerXFt: widthFt >= 18 ? widthFt * 0.7 : widthFt / 2,
        parked: parked(draft, draw) as CarAt['parked'],
        portCorner: port(draft, draw) as CarAt['portCorner'],
      };
    });
  }
  if (facts.chargerAt === null) {
    const [wall, along] = [placeOf('chargerAt.wall'), placeOf('chargerAt.alongFt')];
    fills.push((draft, draw) => {
      if (draft.carAt) draft.chargerAt = chargerByPort(roomOf(draft), chargePort(roomOf(draft), draft.carAt), wall(draw), along(draw));
    });
  }
  if (facts.panelAt === null && (facts.panelPlace === null || facts.panelPlace === 'garage_wall')) {
    const [wall, along] = [chooser('panelWall'), placeOf('panelAt.alongFt')];
    fills.push((draft, draw) => {
      if (draft.panelPlace !== 'garage_wall') return;
      const onWall = wall(draft, draw) as Wall;
      const room = roomOf(draft);
      const lengthFt = onWall === 'back' || onWall === 'front' ? room.widthFt : room.depthFt;
      // On the front wall there is room only beside the door.
      const alongFt = onWall === 'front' ? 1 : Math.round((1 + along(draw) * (lengthFt - 2)) * 2) / 2;
      draft.panelAt = { wall: onWall, alongFt, topIn: 60 };
    });
  }
}
