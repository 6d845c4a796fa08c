import type { QuoteLine } from '../shared/quote';
import { explainPrice, type PricedOption } from './price-option';
import type { Applied } from './rulebook/evaluate';
import { fillWords, namesInWords } from './rulebook/words';
import type { Home } from './home';
import type { WorkedOption, WorkedOut } from './work-out';
import { lowerFirst } from './words';

const ROUNDING = 'Rounded so that lines add up to whole ten dollars';

const part = ({ rule, words, quantity, unit, unitCents, cents }: Applied) => ({ rule, words, quantity, unit, unitCents, cents });

/** A note in words; one that reads a fact nobody knows says so. */
function noteOf({ sampler }: WorkedOut, template: string, context: object): string {
  const note = fillWords(template, context);
  const drawn = sampler.streams.size > 0
    && namesInWords(template).some((name) => name.startsWith('facts.') && sampler.streams.has(name.slice('facts.'.length)));
  return drawn ? `Likely ${lowerFirst(note)}` : note;
}

/** A home in which this line costs something, to take its words from. */
function contextWithLine(
  worked: WorkedOut,
  { option, lines }: WorkedOption,
  line: number,
  price: (home: Home, option: WorkedOption['option']) => PricedOption | null,
): object {
  const place = lines.findIndex((cents) => (cents[line] ?? 0) > 0);
  return price(worked.homeAt(worked.draws[place] ?? 0), option)?.context ?? {};
}

/**
 * The lines of one option, with words and rules of the middle home. A line that costs nothing there but may in another home
 * says so. The parts of each line add up to its middle price, rounding included.
 */
export function quoteLines(
  worked: WorkedOut,
  entry: WorkedOption,
  middle: { home: Home; priced: PricedOption },
  price: (home: Home, option: WorkedOption['option']) => PricedOption | null,
): QuoteLine[] {
  const parts = explainPrice(worked.compiled, middle.home, middle.priced);
  return worked.compiled.lines.flatMap((rule, index) => {
    const range = entry.band.lines[index];
    if (!range || (range.highCents === 0 && !rule.included)) return [];
    const isThere = range.midCents > 0 || rule.included === true;
    const context = isThere ? middle.priced.context : contextWithLine(worked, entry, index, price);
    const note = noteOf(worked, rule.note, context);
    const rules = parts.filter((applied) => applied.line === index).map(part);
    const rounding = range.midCents - rules.reduce((sum, { cents }) => sum + cents, 0);
    if (rounding !== 0) rules.push({ rule: 'rounding', words: ROUNDING, quantity: 1, unit: 'each', unitCents: rounding, cents: rounding });
    return [
      {
        id: rule.id,
        title: fillWords(rule.title, context),
        note: isThere || note === '' ? note : `Only if needed: ${lowerFirst(note)}`,
        why: fillWords(rule.why, context),
        ...range,
        rules,
      },
    ];
  });
}
