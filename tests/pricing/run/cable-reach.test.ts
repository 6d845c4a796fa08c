import { carOutline, chargePort } from '../../../pricing/run/car';
import { cableReach, cableWords } from '../../../pricing/run/cable-reach';

// Car 16 ft by 6 ft 2 in., 3 ft from the back wall, port 3 ft from its bumper: common practice, no source. 3 ft slack: the plan's legend.
const room = { widthFt: 20, depthFt: 22 };
const car = (parked: 'nose_in' | 'back_in', portCorner: 'front_left' | 'front_right' | 'rear_left' | 'rear_right') => ({ centerXFt: 14.5, parked, portCorner });

describe('where the car and its port are', () => {
  it('stands 3 ft from the back wall', () => {
    const outline = carOutline(room, car('nose_in', 'rear_right'));
    expect([outline.backFt, outline.frontFt]).toEqual([3, 19]);
    expect(outline.rightFt - outline.leftFt).toBeCloseTo(6 + 2 / 12, 9);
  });
  it('is centered in a garage too short for that, and kept inside the side walls', () => {
    expect(carOutline({ widthFt: 20, depthFt: 18 }, car('nose_in', 'rear_right')).backFt).toBe(1);
    expect(carOutline({ widthFt: 20, depthFt: 14 }, car('nose_in', 'rear_right')).backFt).toBe(0);
    expect(carOutline(room, { ...car('nose_in', 'rear_right'), centerXFt: 19.5 }).rightFt).toBeCloseTo(20, 9);
    expect(carOutline(room, { ...car('nose_in', 'rear_right'), centerXFt: 0 }).leftFt).toBeCloseTo(0, 9);
  });
  it.each([
    ['nose_in', 'front_left', 'left', 6], ['nose_in', 'front_right', 'right', 6], ['nose_in', 'rear_left', 'left', 16], ['nose_in', 'rear_right', 'right', 16],
    ['back_in', 'front_left', 'right', 16], ['back_in', 'front_right', 'left', 16], ['back_in', 'rear_left', 'right', 6], ['back_in', 'rear_right', 'left', 6],
  ] as const)('%s, %s as the driver sits: on the %s of the plan, %d ft from the back', (parked, corner, side, yFt) => {
    const port = chargePort(room, car(parked, corner));
    expect(port.yFt).toBe(yFt);
    expect(port.xFt).toBeCloseTo(side === 'left' ? 14.5 - 37 / 12 : 14.5 + 37 / 12, 9);
  });
});

describe('reach', () => {
  it('reaches a port on its own side straight', () => {
    // Charger (20, 9), port (17.583, 16): hypot(2.417, 7) = 7.405, + 3.
    const reach = cableReach(room, car('nose_in', 'rear_right'), { wall: 'right', alongFt: 9 }, 18);
    expect(reach).toMatchObject({ reaches: true, usedFt: 10.4, shortFt: 0 });
  });
  it('goes round the car by the shorter of both ways', () => {
    // Port (11.417, 16), charger (20, 9).
    // Past the garage-door end: 3 + 6.167 + hypot(20 - 17.583, 19 - 9) = 10.288 -> 19.455, + 3 = 22.5.
    // Past the back: 13 + hypot(6.167, 0) + hypot(2.417, 6) = 6.468 -> 25.635, + 3 = 28.6.
    const reach = cableReach(room, car('nose_in', 'rear_left'), { wall: 'right', alongFt: 9 }, 18);
    expect(reach).toEqual({ reaches: false, usedFt: 22.5, shortFt: 5, waysFt: [22.5, 28.6] });
  });
  it('is short by nothing at exactly the cable’s length', () => {
    expect(cableReach(room, car('nose_in', 'rear_right'), { wall: 'right', alongFt: 9 }, 10.4)).toMatchObject({ reaches: true, shortFt: 0 });
    expect(cableReach(room, car('nose_in', 'rear_right'), { wall: 'right', alongFt: 9 }, 10.3)).toMatchObject({ reaches: false, shortFt: 1 });
  });
});

describe('words (voice, string 8)', () => {
  it('says nothing when it reaches', () => {
    expect(cableWords(room, car('nose_in', 'rear_right'), { wall: 'right', alongFt: 9 }, 18)).toBeNull();
  });
  it('offers to turn the car where that helps', () => {
    // Backed in, a rear left port is on the right, 6 ft from the back: hypot(2.417, 3) + 3 = 6.9.
    expect(cableWords(room, car('nose_in', 'rear_left'), { wall: 'right', alongFt: 9 }, 18)).toBe('The cable is 5\u00a0ft short. Move the charger, or back the car in.');
    expect(cableWords(room, car('back_in', 'rear_right'), { wall: 'right', alongFt: 9 }, 15)).toMatch(/Move the charger, or park nose in\.$/);
  });
  it('does not offer what would not help', () => {
    // A port at the far left; the charger at the far right of the front wall stays out of reach of a 12 ft cable either way.
    const words = cableWords({ widthFt: 40, depthFt: 22 }, { centerXFt: 4, parked: 'nose_in', portCorner: 'front_left' }, { wall: 'right', alongFt: 20 }, 12);
    expect(words).toMatch(/short\. Move the charger\.$/);
  });
});
