import { planDrawing, planProblems } from '../../../pricing/run/plan-drawing';
import { planRuns } from '../../../pricing/run/plan-run';
import type { Facts } from '../../../shared/facts';
import { planDrawingSchema } from '../../../shared/quote';
import { knownHome } from '../../support/known-home';

describe('planDrawing', () => {
  it('draws the garage of the shared design picture (invented) and keeps to the contract', () => {
    const known = knownHome();
    const drawing = planDrawing(known, planRuns(known)[0] ?? null);
    expect(planDrawingSchema.parse(drawing)).toEqual(drawing);
    expect(drawing).toMatchObject({
      panel: { wall: 'back', alongFt: 4, topIn: 60 },
      houseDoor: { wall: 'left', alongFt: 12.5, widthFt: 3 },
      run: { lengthFt: 32, wallFt: 25, upDownFt: 7 },
      cable: { reaches: true, usedFt: 10.4, shortFt: 0 },
    });
  });
  it('leaves out a panel that is elsewhere, and a run that was not found', () => {
    expect(planDrawing(knownHome({ panelPlace: 'elsewhere' }), null)).toMatchObject({ panel: null, run: null });
  });
  it('has nothing to draw outdoors or before a car is placed', () => {
    expect(planDrawing(knownHome({ parking: 'carport' }), null)).toBeNull();
    expect(planDrawing(knownHome({ carAt: null }), null)).toBeNull();
    expect(planDrawing(knownHome({ chargerAt: null }), null)).toBeNull();
  });
});

describe('planProblems', () => {
  const problems = (changes: Partial<Facts> = {}) => planProblems({ ...knownHome(), ...changes } as Facts);

  it('finds none in a good plan', () => expect(problems()).toEqual([]));
  it.each<[string, Partial<Facts>, RegExp]>([
    ['charger on the garage door', { chargerAt: { wall: 'front', alongFt: 10, heightIn: 45 } }, /cannot hang on the garage door/],
    ['charger half on the garage door', { chargerAt: { wall: 'front', alongFt: 18.4, heightIn: 45 } }, /cannot hang on the garage door/],
    ['charger on a door', { chargerAt: { wall: 'left', alongFt: 14, heightIn: 45 } }, /cannot hang on a door/],
    ['charger too high', { chargerAt: { wall: 'right', alongFt: 9, heightIn: 61 } }, /too high/],
    ['charger beyond its wall', { chargerAt: { wall: 'right', alongFt: 23, heightIn: 45 } }, /charger is beyond/],
    ['panel beyond its wall', { panelAt: { wall: 'back', alongFt: 21, topIn: 60 } }, /panel is beyond/],
    ['panel on a door', { panelAt: { wall: 'left', alongFt: 12, topIn: 60 } }, /panel cannot be on a door/],
    ['panel above the ceiling', { ceilingFt: 7, panelAt: { wall: 'back', alongFt: 4, topIn: 85 } }, /above the ceiling/],
    ['charger in the panel’s way (NEC 2023 110.26(A)(2))', { chargerAt: { wall: 'back', alongFt: 5.5, heightIn: 45 } }, /in the way of the panel/],
    ['garage door wider than its wall', { garageDoor: { alongFt: 5, widthFt: 16 } }, /garage door is wider/],
    ['door beyond its wall', { openings: [{ wall: 'left', alongFt: 20, widthFt: 3 }] }, /beyond its wall/],
    ['cable too short', { carAt: { centerXFt: 14.5, parked: 'nose_in', portCorner: 'rear_left' } }, /cable is 5\u00a0ft short/],
  ])('says it: %s', (_, changes, words) => expect(problems(changes)).toEqual(expect.arrayContaining([expect.stringMatching(words)])));

  it('lets a charger hang beside doors and 1 ft 9 in. from the panel’s middle', () => {
    expect(problems({ chargerAt: { wall: 'front', alongFt: 18.5, heightIn: 45 } }).filter((words) => words.includes('hang'))).toEqual([]);
    expect(problems({ chargerAt: { wall: 'back', alongFt: 5.75, heightIn: 45 } }).filter((words) => words.includes('panel'))).toEqual([]);
  });
  it('asks nothing of what is not known or not indoors', () => {
    expect(problems({ room: null, chargerAt: { wall: 'front', alongFt: 10, heightIn: 45 } })).toEqual([]);
    expect(problems({ parking: 'driveway', chargerAt: { wall: 'front', alongFt: 10, heightIn: 45 } })).toEqual([]);
    expect(problems({ panelPlace: 'outside', panelAt: { wall: 'left', alongFt: 13, topIn: 60 } })).toEqual([]);
  });
});
