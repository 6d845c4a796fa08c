import { dollars } from '../../shared/money';
import { ampsInWords, feetInWords, inchesInWords } from '../../shared/units';

const numberFormats: Record<string, (value: number) => string> = {
  amps: ampsInWords,
  feet: (value) => feetInWords(Math.round(value)),
  inches: inchesInWords,
  dollars,
  percent: (value) => `${Math.round(value * 100)}%`,
  chargers: (value) => (value === 1 ? 'Wall charger' : 'Two wall chargers'),
  taxed: (value) => (value === 0 ? 'materials' : value === 1 ? 'materials and the charger' : 'materials and the chargers'),
};
const textFormats: Record<string, (value: string) => string> = {
  wiring: (method) => (method === 'NM_B' ? 'Cable' : 'Wire and conduit'),
};
const PLACEHOLDER = /\{([a-zA-Z0-9.]+)(?:\|([a-z]+))?\}/g;

/** Names that a text reads: "{circuit.words}" gives circuit.words. */
export const namesInWords = (template: string): string[] => [...template.matchAll(PLACEHOLDER)].map((match) => match[1] ?? '');

/** The value at a name's keys, or undefined. */
function lookUp(source: object, keys: readonly string[]): unknown {
  let value: unknown = source;
  for (const key of keys) {
    if (value === null || typeof value !== 'object') return undefined;
    value = (value as Record<string, unknown>)[key];
  }
  return value;
}

type Write = (value: unknown) => string;
/** A text cut at its places: words, then a name with its format, and so on; cut once, filled for every price. */
interface Cut { readonly words: readonly string[]; readonly places: readonly { readonly keys: readonly string[]; readonly write: Write }[] }
const cuts = new Map<string, Cut>();

function cutOf(template: string): Cut {
  let cut = cuts.get(template);
  if (!cut) {
    const places = [...template.matchAll(PLACEHOLDER)];
    const words: string[] = [];
    let from = 0;
    for (const { index, 0: whole } of places) {
      words.push(template.slice(from, index));
      from = index + whole.length;
    }
    words.push(template.slice(from));
    cut = { words, places: places.map(([, name = '', format = '']) => ({ keys: name.split('.'), write: writerOf(format) })) };
    cuts.set(template, cut);
  }
  return cut;
}

const writerOf = (format: string): Write => (value) => {
  if (typeof value === 'number') return numberFormats[format]?.(value) ?? String(value);
  return typeof value === 'string' ? (textFormats[format]?.(value) ?? value) : '';
};

/**
 * Fills "{run.lengthFt|feet}" from the context; formats: amps, feet, inches, dollars, percent, chargers and taxed (by their number),
 * wiring (by the method). Unknown values leave an empty place.
 */
export function fillWords(template: string, context: object): string {
  const { words, places } = cutOf(template);
  let text = words[0] ?? '';
  places.forEach(({ keys, write }, index) => {
    text += write(lookUp(context, keys)) + (words[index + 1] ?? '');
  });
  return text;
}
