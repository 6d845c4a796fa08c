import { backTurn, detour, groupAt, nextTurn, problemsOnNext } from '../../../components/wizard/step-flow';
import { stepById, type Answers, type Step } from '../../../shared/wizard/index';

const step = (id: string): Step => {
  const found = stepById(id);
  if (!found) throw new Error(`no step ${id}`);
  return found;
};
const homeDone: Answers = { zip: '00017', homeKind: 'house', tenure: 'own', parking: 'driveway', yearBuilt: 'unsure', floorAreaFt2: 'unsure' };

// Order and wording: product.md's seven steps;
// the design's phone and wide pictures ("Next: blank spaces", "Next: big loads", "Back: car", "See my price").
describe('going on and back', () => {
  it('walks group by group on a phone and step by step on a wide screen', () => {
    const main = groupAt(step('panel'), homeDone, undefined);
    expect(main?.id).toBe('main');
    expect(nextTurn(step('panel'), main, homeDone, true)).toEqual({ href: '/quote/panel?part=spaces', label: 'Next: blank spaces' });
    expect(nextTurn(step('panel'), main, homeDone, false)).toEqual({ href: '/quote/loads', label: 'Next: big loads' });
    expect(backTurn(step('panel'), main, homeDone, false)).toEqual({ href: '/quote/car', label: 'Back: car' });
    expect(backTurn(step('panel'), main, homeDone, true)).toEqual({ href: '/quote/car?part=charger', label: 'Back: car' });
    expect(nextTurn(step('photos'), groupAt(step('photos'), homeDone, undefined), homeDone, true)).toEqual({ href: '/quote/price', label: 'See my price' });
    expect(backTurn(step('home'), groupAt(step('home'), {}, undefined), {}, true).href).toBe('/');
  });
  it('leaves out groups that do not apply', () => {
    expect(groupAt(step('garage'), homeDone, 'size')?.id).toBe('paces');
  });
  it('leads to the first open step when one before is open, and nowhere else', () => {
    expect(detour(step('panel'), homeDone)?.id).toBe('car');
    expect(detour(step('car'), homeDone)).toBeNull();
    expect(detour(step('photos'), {})?.id).toBe('home');
  });
  it('asks only for what is on the screen, and on the last screen for all of the step', () => {
    const [home, place, age] = [step('home'), groupAt(step('home'), {}, 'place'), groupAt(step('home'), {}, 'age')];
    expect(problemsOnNext(home, place, {}, true).map((problem) => problem.field)).toEqual(['zip']);
    expect(problemsOnNext(home, age, { yearBuilt: 'unsure', floorAreaFt2: 1800 }, true).map((problem) => problem.field)).toEqual(['zip', 'homeKind', 'tenure', 'parking']);
    expect(problemsOnNext(home, place, { zip: '00017' }, false)).toHaveLength(5);
  });
});
