import fc from 'fast-check';
import { pullPointsFor } from '../../../pricing/run/bends';
import { pipeFt, stapledFt, undergroundFt, type RunLeg } from '../../../pricing/run/legs';
import { supportCount, supportRule, supportsFor } from '../../../pricing/run/supports';

describe('distances between supports', () => {
  it.each([
    ['EMT', null, 10, 3, 'NEC 2023 358.30(A)'],
    ['EMT', '2', 10, 3, 'NEC 2023 358.30(A)'],
    ['PVC40', '1/2', 3, 3, 'NEC 2023 Table 352.30'],
    ['PVC80', '1', 3, 3, 'NEC 2023 Table 352.30'],
    ['PVC40', '1-1/4', 5, 3, 'NEC 2023 Table 352.30, from memory'],
    ['PVC80', '2', 5, 3, 'NEC 2023 Table 352.30, from memory'],
    ['NM_B', null, 4.5, 1, 'NEC 2023 334.30'],
  ] as const)('%s %s: every %d ft, %d ft from an end (%s)', (method, size, everyFt, fromEndFt, _source) => {
    expect(supportRule(method, size)).toMatchObject({ everyFt, fromEndFt });
  });

  it.each([
    // One for each interval and one more at each end: domain notes, section 7, common practice.
    [32.25, 5], [30, 4], [10, 2], [10.01, 3], [0.5, 2], [0, 0],
  ])('%d ft of EMT: %d straps', (lengthFt, straps) => expect(supportCount(lengthFt, supportRule('EMT'))).toBe(straps));

  it('is never fewer than the clause asks for: the first within its distance of each end, the rest between (fast-check)', () => {
    const rule = fc.constantFrom(supportRule('EMT'), supportRule('PVC40'), supportRule('PVC40', '1-1/4'), supportRule('NM_B'));
    fc.assert(fc.property(fc.double({ min: 0.1, max: 300, noNaN: true }), rule, (lengthFt, { everyFt, fromEndFt, clause }) => {
      const least = lengthFt <= 2 * fromEndFt ? 1 : 1 + Math.ceil((lengthFt - 2 * fromEndFt) / everyFt - 1e-9);
      expect(supportCount(lengthFt, { everyFt, fromEndFt, clause })).toBeGreaterThanOrEqual(least);
    }));
  });
});

describe('which feet are held by what', () => {
  const legs: RunLeg[] = [
    { way: 'finished_wall', levelFt: 0, upDownFt: 3.5 }, { way: 'attic', levelFt: 25, upDownFt: 2 }, { way: 'surface', levelFt: 0, upDownFt: 4.75 },
  ];
  it('staples cable but not where it is fished (NEC 2023 334.30(B)(1)) or in a pipe', () => {
    expect(stapledFt('NM_B', legs)).toBe(27);
    expect(pipeFt('NM_B', legs)).toBe(4.75);
    // 27/4.5 = 6, + 1; 4.75/10 -> 1, + 1
    expect(supportsFor('NM_B', legs)).toBe(9);
  });
  it('straps a pipe all the way, except in the ground', () => {
    const yard: RunLeg[] = [{ way: 'underground', levelFt: 30, upDownFt: 3 }, { way: 'surface', levelFt: 12, upDownFt: 0 }];
    expect(pipeFt('PVC40', yard)).toBe(12);
    expect(undergroundFt(yard)).toBe(33);
    expect(stapledFt('PVC40', yard)).toBe(0);
    expect(supportsFor('PVC40', yard)).toBe(5);
  });
});

describe('360 degrees between pull points (NEC 2023 358.26, 352.26)', () => {
  it.each([[0, 0], [1, 0], [4, 0], [5, 1], [8, 1], [9, 2], [12, 2], [13, 3]])('%d quarter bends: %d pull points', (bends, points) => {
    expect(pullPointsFor(bends)).toBe(points);
  });
});
