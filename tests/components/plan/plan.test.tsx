import { render, screen } from '@testing-library/react-native';
import { cableWay, carBox, portPlace } from '../../../components/plan/car-place';
import { GaragePlan } from '../../../components/plan/garage-plan';
import { onWall, runFromAbove, runOnWalls, swept } from '../../../components/plan/plan-geometry';
import { planInWords } from '../../../components/plan/plan-words';
import { carOutline, chargePort } from '../../../pricing/run/car';
import type { PlanDrawing } from '../../../shared/quote';

// The garage of the design's plan picture: 20 by 22 ft, 25 ft along the walls, 7 ft up and down.
const plan: PlanDrawing = {
  room: { widthFt: 20, depthFt: 22 }, ceilingFt: 8.5, garageDoor: { alongFt: 2, widthFt: 16 }, houseDoor: { wall: 'left', alongFt: 12.5, widthFt: 3 },
  panel: { wall: 'back', alongFt: 4, topIn: 60 }, charger: { wall: 'right', alongFt: 9, heightIn: 45 },
  car: { centerXFt: 14.4, parked: 'nose_in', portCorner: 'rear_right' }, cableLengthFt: 18,
  run: {
    points: [
      { xFt: 4, yFt: 0, zFt: 5 }, { xFt: 4, yFt: 0, zFt: 8 }, { xFt: 12, yFt: 0, zFt: 8 }, { xFt: 20, yFt: 0, zFt: 8 },
      { xFt: 20, yFt: 9, zFt: 8 }, { xFt: 20, yFt: 9, zFt: 3.75 },
    ],
    lengthFt: 32, wallFt: 25, upDownFt: 7,
  },
  cable: { reaches: true, usedFt: 12, shortFt: 0 },
};

test('places on walls: origin back left, x right, y to the garage door', () => {
  expect(onWall(plan.room, 'back', 4)).toEqual({ x: 4, y: 0 });
  expect(onWall(plan.room, 'front', 4)).toEqual({ x: 4, y: 22 });
  expect(onWall(plan.room, 'left', 9)).toEqual({ x: 0, y: 9 });
  expect(onWall(plan.room, 'right', 9)).toEqual({ x: 20, y: 9 });
});

test('the run from above has a point for each corner and a dimension for each wall', () => {
  const above = plan.run ? runFromAbove(plan.run) : [];
  expect(above).toEqual([{ x: 4, y: 0 }, { x: 20, y: 0 }, { x: 20, y: 9 }]);
  expect(runOnWalls(plan.room, above)).toEqual([{ wall: 'back', fromFt: 4, toFt: 20 }, { wall: 'right', fromFt: 0, toFt: 9 }]);
});

test('corners become sweeps', () => {
  expect(swept([{ x: 0, y: 0 }, { x: 100, y: 0 }, { x: 100, y: 50 }], 12)).toBe('M0.0 0.0L88.0 0.0Q100.0 0.0 100.0 12.0L100.0 50.0');
});

// The drawing must show the car that the server measures: both sides' places for every way of parking and every corner.
test.each(['nose_in', 'back_in'] as const)('car and port are where the price takes them (%s)', (parked) => {
  for (const portCorner of ['front_left', 'front_right', 'rear_left', 'rear_right'] as const) {
    for (const room of [{ widthFt: 20, depthFt: 22 }, { widthFt: 10, depthFt: 17 }]) {
      const drawn = { ...plan, room, car: { centerXFt: 14.4, parked, portCorner } };
      const { leftFt, rightFt, backFt, frontFt } = carOutline(room, drawn.car);
      const { xFt, yFt } = chargePort(room, drawn.car);
      expect(carBox(drawn)).toEqual({ left: leftFt, right: rightFt, back: backFt, front: frontFt });
      expect(portPlace(drawn)).toEqual({ x: xFt, y: yFt });
    }
  }
});

test('the cable goes straight on the near side and round the car to the far side', () => {
  expect(cableWay(plan, { x: 19.2, y: 9 })).toHaveLength(2);
  const far = { ...plan, car: { ...plan.car, portCorner: 'rear_left' as const } };
  const way = cableWay(far, { x: 19.2, y: 9 });
  expect(way.length).toBeGreaterThan(2);
  const box = carBox(far);
  for (const corner of way.slice(1, -1)) expect([box.left, box.right]).toContain(corner.x);
});

test('the picture is named by one paragraph with every measure', () => {
  render(<GaragePlan plan={plan} />);
  const name = planInWords(plan);
  expect(screen.getByLabelText(name).props.role).toBe('img');
  for (const words of ['20\u00a0ft wide', '22\u00a0ft deep', 'Charger on the right wall, 9\u00a0ft from the back wall, 45\u00a0in. up', '25\u00a0ft along, 7\u00a0ft up and down']) expect(name).toContain(words);
});

test('a cable that is too short is said so', () => {
  expect(planInWords({ ...plan, cable: { reaches: false, usedFt: 24, shortFt: 6 } })).toContain('cable is 6\u00a0ft short');
});
