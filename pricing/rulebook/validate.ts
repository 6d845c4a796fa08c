import { compileLikelihoods } from './likelihood';
import { flagNames, ruleNames } from './names';
import { editionSchema, type Distribution, type Edition, type Logic } from './schema';
import { namesInWords } from './words';

/** One thing wrong with a rulebook; `pointer` is a JSON Pointer into it. */
export interface RulebookProblem {
  readonly pointer: string;
  readonly detail: string;
}

const operators = new Set([
  'var',
  'if',
  'and',
  'or',
  '!',
  '!!',
  '==',
  '===',
  '!=',
  '!==',
  '>',
  '>=',
  '<',
  '<=',
  '+',
  '-',
  '*',
  '/',
  '%',
  'min',
  'max',
  'in',
  'cat',
  'merge',
  'missing',
  'some',
  'all',
  'none',
  'map',
  'filter',
  'reduce',
]);
const RESERVED_LINES = ['tax', 'minimum'];

function logicProblems(logic: Logic, names: ReadonlySet<string>, pointer: string): RulebookProblem[] {
  if (logic === null || typeof logic !== 'object') return [];
  if (Array.isArray(logic)) return logic.flatMap((part: Logic, index) => logicProblems(part, names, `${pointer}/${index}`));
  const entries = Object.entries(logic as Record<string, Logic>);
  const [operator, operand] = entries[0] ?? ['', null];
  if (entries.length !== 1 || !operators.has(operator))
    return [{ pointer, detail: `“${entries.map(([key]) => key).join(', ')}” is no operation` }];
  if (operator === 'var') {
    const name: Logic = Array.isArray(operand) ? (operand[0] as Logic) : (operand as Logic);
    return typeof name === 'string' && names.has(name) ? [] : [{ pointer, detail: `There is nothing named “${String(name)}”` }];
  }
  return logicProblems(operand as Logic, names, `${pointer}/${operator}`);
}

const wordProblems = (text: string, pointer: string): RulebookProblem[] =>
  namesInWords(text)
    .filter((name) => !ruleNames.has(name))
    .map((name) => ({ pointer, detail: `There is nothing named “${name}”` }));

function duplicates(ids: readonly string[], pointer: string): RulebookProblem[] {
  return ids.flatMap((id, index) =>
    ids.indexOf(id) === index ? [] : [{ pointer: `${pointer}/${index}/id`, detail: `“${id}” is there twice` }],
  );
}

function ruleProblems(edition: Edition): RulebookProblem[] {
  const lines = new Set(edition.lines.map((line) => line.id));
  return edition.rules.flatMap((rule, index) => {
    const pointer = `/rules/${index}`;
    const { price } = rule;
    const problems = logicProblems(rule.when, ruleNames, `${pointer}/when`);
    if (!lines.has(rule.line)) problems.push({ pointer: `${pointer}/line`, detail: `There is no line “${rule.line}”` });
    if (RESERVED_LINES.includes(rule.line))
      problems.push({ pointer: `${pointer}/line`, detail: `The line “${rule.line}” is worked out by itself` });
    if ('quantity' in price) {
      problems.push(...logicProblems(price.quantity, ruleNames, `${pointer}/price/quantity`));
      if (typeof price.quantity === 'number' && price.quantity < 0)
        problems.push({ pointer: `${pointer}/price/quantity`, detail: 'A quantity cannot be below nothing' });
    }
    if (price.by === 'item') {
      problems.push(...logicProblems(price.item, ruleNames, `${pointer}/price/item`));
      if (typeof price.item === 'string' && !(price.item in edition.priceBook))
        problems.push({ pointer: `${pointer}/price/item`, detail: `The price book has no “${price.item}”` });
    }
    if (price.by === 'task') {
      problems.push(...logicProblems(price.task, ruleNames, `${pointer}/price/task`));
      if (typeof price.task === 'string' && !(price.task in edition.labor.tasks))
        problems.push({ pointer: `${pointer}/price/task`, detail: `There are no hours for “${price.task}”` });
    }
    if (price.by === 'cents') {
      problems.push(...logicProblems(price.cents, ruleNames, `${pointer}/price/cents`));
      if (typeof price.cents === 'number' && price.cents < 0)
        problems.push({ pointer: `${pointer}/price/cents`, detail: 'A price cannot be below nothing' });
    }
    if (price.by === 'takeoff' && !Object.keys(edition.priceBook).some((item) => item.startsWith(price.items))) {
      problems.push({ pointer: `${pointer}/price/items`, detail: `Nothing in the price book starts with “${price.items}”` });
    }
    if (price.by === 'takeoff-tasks' && !Object.keys(edition.labor.tasks).some((task) => task.startsWith(price.tasks))) {
      problems.push({ pointer: `${pointer}/price/tasks`, detail: `No task starts with “${price.tasks}”` });
    }
    return problems;
  });
}

const distributionProblems = (distribution: Distribution, pointer: string): RulebookProblem[] => {
  if (!('triangle' in distribution)) return [];
  const { low, mode, high } = distribution.triangle;
  return low <= mode && mode <= high && low < high ? [] : [{ pointer, detail: 'Low, likeliest and high must rise' }];
};

function likelihoodProblems(edition: Edition): RulebookProblem[] {
  return Object.entries(edition.likelihoods).flatMap(([fact, likelihood]) => {
    const pointer = `/likelihoods/${fact}`;
    if (!('by' in likelihood)) return distributionProblems(likelihood, pointer);
    return [
      ...(likelihood.by in edition.likelihoods
        ? []
        : [{ pointer: `${pointer}/by`, detail: `There is no likelihood of “${likelihood.by}”` }]),
      ...Object.entries(likelihood.cases).flatMap(([value, distribution]) =>
        distributionProblems(distribution, `${pointer}/cases/${value}`),
      ),
      ...distributionProblems(likelihood.otherwise, `${pointer}/otherwise`),
    ];
  });
}

/** Takeoff things of which no rule, or more than one rule, would charge. `things` are all keys a takeoff can have. */
export function unclaimed(edition: Edition, things: readonly string[], by: 'takeoff' | 'takeoff-tasks'): RulebookProblem[] {
  return things.flatMap((thing) => {
    const claims = edition.rules.filter(({ price }) =>
      price.by === 'takeoff' && by === 'takeoff'
        ? thing.startsWith(price.items)
        : price.by === 'takeoff-tasks' && by === 'takeoff-tasks' && thing.startsWith(price.tasks),
    );
    if (claims.length === 1) return [];
    return [
      {
        pointer: '/rules',
        detail:
          claims.length === 0
            ? `No rule charges for “${thing}”`
            : `“${thing}” is charged twice, by ${claims.map(({ id }) => id).join(' and ')}`,
      },
    ];
  });
}

/**
 * Everything wrong with a rulebook, each with its place: shape, names that rules and words read, prices and hours that are
 * missing, ids used twice, ZIPs in two places, likelihoods that cannot be. Empty: it can be used.
 */
export function validateEdition(input: unknown): RulebookProblem[] {
  const parsed = editionSchema.safeParse(input);
  if (!parsed.success)
    return parsed.error.issues.map((issue) => ({ pointer: `/${issue.path.map(String).join('/')}`, detail: issue.message }));
  const edition = parsed.data;
  const zips = edition.jurisdictions.flatMap((place) => place.zips);
  const lineIds = edition.lines.map((line) => line.id);
  const problems = [
    ...duplicates(
      edition.rules.map((rule) => rule.id),
      '/rules',
    ),
    ...duplicates(lineIds, '/lines'),
    ...duplicates(
      edition.flags.map((flag) => flag.id),
      '/flags',
    ),
    ...duplicates(
      edition.jurisdictions.map((place) => place.id),
      '/jurisdictions',
    ),
    ...zips
      .filter((zip, index) => zips.indexOf(zip) !== index)
      .map((zip) => ({ pointer: '/jurisdictions', detail: `ZIP ${zip} is in two places` })),
    ...RESERVED_LINES.filter((id) => !lineIds.includes(id)).map((id) => ({ pointer: '/lines', detail: `The line “${id}” is missing` })),
    ...edition.lines.flatMap((line, index) => [
      ...wordProblems(line.title, `/lines/${index}/title`),
      ...wordProblems(line.note, `/lines/${index}/note`),
      ...wordProblems(line.why, `/lines/${index}/why`),
    ]),
    ...edition.flags.flatMap((flag, index) => logicProblems(flag.when, flagNames, `/flags/${index}/when`)),
    ...ruleProblems(edition),
    ...likelihoodProblems(edition),
    ...Object.entries(edition.labor.tasks)
      .filter(([, task]) => task.low > task.typical || task.typical > task.high)
      .map(([task]) => ({ pointer: `/labor/tasks/${task}`, detail: 'Low, typical and high hours must rise' })),
  ];
  if (problems.length === 0) compileLikelihoods(edition);
  return problems;
}
