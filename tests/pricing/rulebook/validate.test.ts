import { editionOne } from '../../../pricing/rulebook/edition-1/index';
import type { Edition, Rule } from '../../../pricing/rulebook/schema';
import { unclaimed, validateEdition } from '../../../pricing/rulebook/validate';

const [first] = editionOne.rules as [Rule, ...Rule[]];
/** Edition 1 with one thing wrong. */
const broken = (changes: Partial<Edition>): Edition => ({ ...editionOne, ...changes });
const withRule = (changes: Partial<Rule>): Edition => broken({ rules: [{ ...first, ...changes }, ...editionOne.rules.slice(1)] });

/** Keys that no takeoff has: rules ask for these by name. */
const byName = /^(panel|sharing)\./;

// Source: the product's rule that validation finds what is wrong and says where.
describe('a rulebook', () => {
  it('opens with an edition that has nothing wrong, also after a way through JSON', () => {
    expect(validateEdition(editionOne)).toEqual([]);
    expect(validateEdition(JSON.parse(JSON.stringify(editionOne)))).toEqual([]);
  });

  it('charges for each thing and each task of a takeoff exactly once', () => {
    expect(
      unclaimed(
        editionOne,
        Object.keys(editionOne.priceBook).filter((key) => !byName.test(key)),
        'takeoff',
      ),
    ).toEqual([]);
    const asked = ['visit', 'tandem', 'sub_panel', 'energy_management', 'service_upgrade', 'permit_paperwork', 'meet_inspector'];
    expect(
      unclaimed(
        editionOne,
        Object.keys(editionOne.labor.tasks).filter((task) => !asked.includes(task)),
        'takeoff-tasks',
      ),
    ).toEqual([]);
    expect(unclaimed(editionOne, ['gold.wire'], 'takeoff')).toEqual([{ pointer: '/rules', detail: 'No rule charges for “gold.wire”' }]);
  });

  const wrong: [string, unknown, string][] = [
    ['a name that is not there', withRule({ when: { '>': [{ var: 'run.lenghtFt' }, 3] } }), '/rules/0/when/>/0'],
    ['an operation that is not there', withRule({ when: { launch: [1] } }), '/rules/0/when'],
    ['a line that is not there', withRule({ line: 'nowhere' }), '/rules/0/line'],
    ['a rule on a line that is worked out by itself', withRule({ line: 'tax' }), '/rules/0/line'],
    ['an item without a price', withRule({ price: { by: 'item', item: 'panel.gold', quantity: 1 } }), '/rules/0/price/item'],
    ['a task without hours', withRule({ price: { by: 'task', task: 'dance', quantity: 1 } }), '/rules/0/price/task'],
    ['a price below nothing', withRule({ price: { by: 'cents', cents: -1, quantity: 1, unit: 'each' } }), '/rules/0/price/cents'],
    ['a quantity below nothing', withRule({ price: { by: 'cents', cents: 1, quantity: -1, unit: 'each' } }), '/rules/0/price/quantity'],
    [
      'takeoff things that nothing in the price book matches',
      withRule({ price: { by: 'takeoff', items: 'gold.' } }),
      '/rules/0/price/items',
    ],
    ['a rule twice', broken({ rules: [...editionOne.rules, first] }), `/rules/${editionOne.rules.length}/id`],
    [
      'a ZIP in two places',
      broken({ jurisdictions: editionOne.jurisdictions.map((place) => ({ ...place, zips: ['00017'] })) }),
      '/jurisdictions',
    ],
    [
      'words that name nothing',
      broken({ lines: editionOne.lines.map((line, index) => (index === 0 ? { ...line, note: '{run.color}' } : line)) }),
      '/lines/0/note',
    ],
    [
      'a triangle that does not rise',
      broken({ likelihoods: { ...editionOne.likelihoods, ceilingFt: { triangle: { low: 9, mode: 8, high: 10, step: 1 } } } }),
      '/likelihoods/ceilingFt',
    ],
    [
      'a likelihood by a fact that has none',
      broken({ likelihoods: { ...editionOne.likelihoods, ceilingFt: { by: 'mood', cases: {}, otherwise: { fixed: 8 } } } }),
      '/likelihoods/ceilingFt/by',
    ],
    ['no line for the tax', broken({ lines: editionOne.lines.filter((line) => line.id !== 'tax') }), '/lines'],
    [
      'hours that do not rise',
      broken({
        labor: {
          ...editionOne.labor,
          tasks: { ...editionOne.labor.tasks, visit: { words: 'Visit', unit: 'visit', low: 2, typical: 1, high: 3 } },
        },
      }),
      '/labor/tasks/visit',
    ],
    ['a price that is no whole cents', broken({ minimumCents: 1.5 }), '/minimumCents'],
    ['nothing at all', null, '/'],
  ];
  it.each(wrong)('is refused with %s, and says where', (_, edition, pointer) => {
    expect(validateEdition(edition).map((problem) => problem.pointer)).toContain(pointer);
  });
});
