import { compileEdition, RulebookError } from '../../../pricing/rulebook/compile';
import { editionOne } from '../../../pricing/rulebook/edition-1/index';
import { evaluateRules, type Applied } from '../../../pricing/rulebook/evaluate';
import type { RuleContext } from '../../../pricing/rulebook/names';
import type { Edition, Rule } from '../../../pricing/rulebook/schema';
import { fillWords } from '../../../pricing/rulebook/words';
import type { Takeoff } from '../../../pricing/takeoff/takeoff';

// All prices of this file are invented; the arithmetic stands beside each.
const rule = (id: string, changes: Pick<Rule, 'price'> & Partial<Rule>): Rule => ({
  id,
  line: 'work',
  kind: 'material',
  when: true,
  words: id,
  deskWords: id,
  source: 'invented',
  ...changes,
});

const edition = (rules: Rule[], changes: Partial<Edition> = {}): Edition => ({
  ...editionOne,
  rules,
  lines: ['work', 'tax', 'minimum'].map((id) => ({ id, title: id, note: '', why: id })),
  priceBook: { 'wire.a': { words: 'Wire', unit: 'ft', cents: 101 }, 'charger.48': { words: 'Charger', unit: 'each', cents: 40_000 } },
  labor: { rateCents: 10_000, tasks: { pull: { words: 'Pull', unit: '10 ft', low: 0.1, typical: 0.125, high: 0.2 } } },
  markup: { material: 2_500, charger: 1_000 },
  minimumCents: 0,
  ...changes,
});
const noTax = { ...editionOne.jurisdictions[0]!, tax: { material: 0, charger: 0, labor: 0 } };
const takeoff: Takeoff = {
  items: [{ item: 'wire.a', words: 'Wire, black', quantity: 45, unit: 'ft' }],
  tasks: [{ task: 'pull', quantity: 3.2, unit: '10 ft' }],
};
const nothing: Takeoff = { items: [], tasks: [] };
const context = { run: { lengthFt: 32 }, option: { chargers: 2 }, facts: { blankSpaces: 2 } } as unknown as RuleContext;
const claimAll = [
  rule('wire', { price: { by: 'takeoff', items: 'wire.' } }),
  rule('pull', { kind: 'labor', price: { by: 'takeoff-tasks', tasks: 'pull' } }),
];

function evaluate(book: Edition, taken: Takeoff, place = noTax) {
  const parts: Applied[] = [];
  return { ...evaluateRules(compileEdition(book), context, taken, place, (part) => parts.push(part)), parts };
}

describe('rules', () => {
  it('charge for the takeoff: things with markup, tasks by the hour', () => {
    const result = evaluate(edition(claimAll), takeoff);
    // Wire: 101 * 1.25 = 126.25 -> 126 a foot, 45 * 126 = 5,670. Pull: 3.2 * 0.125 h = 0.4 h at 10,000 = 4,000.
    expect(result.parts.map(({ rule: id, quantity, unitCents, cents }) => [id, quantity, unitCents, cents])).toEqual([
      ['wire', 45, 126, 5_670],
      ['pull', 0.4, 10_000, 4_000],
    ]);
    expect([result.totalCents, result.hours, result.lineCents]).toEqual([9_670, 0.4, [9_670, 0, 0]]);
    expect(result.parts[0]?.words).toBe('Wire, black');
  });

  it('hold only when their condition does, and take quantities and prices from expressions', () => {
    const over20 = { max: [0, { '-': [{ var: 'run.lengthFt' }, 20] }] };
    const book = edition([
      rule('long-run', {
        kind: 'fee',
        price: { by: 'cents', cents: 250, quantity: over20, unit: 'ft' },
        when: { '>': [{ var: 'run.lengthFt' }, 20] },
      }),
      rule('never', {
        kind: 'fee',
        price: { by: 'cents', cents: 99, quantity: 1, unit: 'each' },
        when: { '===': [{ var: 'facts.blankSpaces' }, 0] },
      }),
      rule('chargers', { kind: 'charger', price: { by: 'item', item: { cat: ['charger.', 48] }, quantity: { var: 'option.chargers' } } }),
    ]);
    // (32 - 20) * 250 = 3,000. 2 * 40,000 * 1.10 = 88,000.
    expect(evaluate(book, nothing).parts.map(({ rule: id, cents }) => [id, cents])).toEqual([
      ['long-run', 3_000],
      ['chargers', 88_000],
    ]);
  });

  it('are taxed by kind on the price, fees never, rounded once', () => {
    const place = { ...noTax, tax: { material: 550, charger: 500, labor: 0 } };
    const book = edition([...claimAll, rule('fee', { kind: 'fee', price: { by: 'cents', cents: 1_000, quantity: 1, unit: 'each' } })]);
    // 5.5 % of 5,670 = 311.85 -> 312; nothing on labor and the fee. 5,670 + 4,000 + 1,000 + 312 = 10,982.
    const result = evaluate(book, takeoff, place);
    expect([result.lineCents, result.totalCents]).toEqual([[10_670, 312, 0], 10_982]);
    expect(result.parts.at(-1)).toMatchObject({ rule: 'tax-material', cents: 312 });
  });

  it('are lifted to the smallest job', () => {
    const result = evaluate(edition(claimAll, { minimumCents: 20_000 }), takeoff);
    expect([result.totalCents, result.lineCents]).toEqual([20_000, [9_670, 0, 10_330]]);
  });

  it('refuse a thing that nobody charges for, and what has no price', () => {
    expect(() => evaluate(edition([]), takeoff)).toThrow(RulebookError);
    expect(() => evaluate(edition([rule('x', { price: { by: 'item', item: { cat: ['gold.', 1] }, quantity: 1 } })]), nothing)).toThrow(
      'no gold.1',
    );
    expect(() =>
      evaluate(edition([rule('x', { price: { by: 'cents', cents: { '*': ['a', 2] }, quantity: 1, unit: 'each' } })]), nothing),
    ).toThrow(RulebookError);
  });
});

describe('words of a line', () => {
  it('are filled from names, with formats', () => {
    expect(
      fillWords('{option.breakerAmps|amps} breaker, {run.lengthFt|feet} of {circuit.words}{run.none}', {
        option: { breakerAmps: 60 },
        run: { lengthFt: 31.75 },
        circuit: { words: 'wire' },
      }),
    ).toBe('60\u00a0A breaker, 32\u00a0ft of wire');
  });
});
