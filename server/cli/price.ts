import { readFileSync } from 'node:fs';
import { priceIntake } from '../../pricing/quote';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import { factsOf } from '../../shared/api/intake-input';
import type { Problem } from '../../shared/problem';
import { factsInWords } from '../../shared/wizard/facts-in-words';
import { exampleIntake } from './example-intake';
import { inputProblem, parseIntake } from './parse-intake';

const USAGE = 'Use: npm run --silent price -- FILE.json, or the same on stdin, or -- --example';
const BAD_INPUT = 2;

const print = (value: unknown): void => {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`);
};

function refuse(problem: Problem): number {
  process.stderr.write(`${JSON.stringify(problem, null, 2)}\n`);
  return BAD_INPUT;
}

function readInput(file: string | undefined): string | Problem {
  try {
    return readFileSync(file ?? 0, 'utf8');
  } catch (error) {
    return inputProblem('malformed', `${error instanceof Error ? error.message : 'The file cannot be read'}. ${USAGE}`);
  }
}

/** Today on the calendar of the contractor's town, as an ISO date. */
const today = (): string =>
  new Intl.DateTimeFormat('en-CA', { timeZone: editionOne.jurisdictions[0]?.timeZone ?? 'UTC' }).format(new Date());

function main([first, ...rest]: readonly string[]): number {
  if (first === '--example' && rest.length === 0) {
    print(exampleIntake);
    return 0;
  }
  if (rest.length > 0 || first?.startsWith('--')) return refuse(inputProblem('malformed', USAGE));
  const text = readInput(first);
  if (typeof text !== 'string') return refuse(text);
  const parsed = parseIntake(text);
  if ('problem' in parsed) return refuse(parsed.problem);
  const facts = factsOf(parsed.input);
  print(
    priceIntake({
      facts,
      edition: editionOne,
      pricedOn: parsed.input.pricedOn ?? today(),
      factsInWords: [...factsInWords(facts, parsed.input.sources ?? {})],
    }),
  );
  return 0;
}

process.exitCode = main(process.argv.slice(2));
