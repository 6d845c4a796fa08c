import { dollars } from '../../shared/money';
import { ampsInWords, feetInWords, inchesInWords } from '../../shared/units';

const formats: Record<string, (value: number) => string> = {
  amps: ampsInWords,
  feet: (value) => feetInWords(Math.round(value)),
  inches: inchesInWords,
  dollars,
  percent: (value) => `${Math.round(value * 100)}%`,
};
const PLACEHOLDER = /\{([a-zA-Z0-9.]+)(?:\|([a-z]+))?\}/g;

/** Names that a text reads: "{circuit.words}" gives circuit.words. */
export const namesInWords = (template: string): string[] => [...template.matchAll(PLACEHOLDER)].map((match) => match[1] ?? '');

/** The value at a dotted name, or undefined. */
export function lookUp(source: object, name: string): unknown {
  let value: unknown = source;
  for (const key of name.split('.')) {
    if (value === null || typeof value !== 'object') return undefined;
    value = (value as Record<string, unknown>)[key];
  }
  return value;
}

/** Fills "{run.lengthFt|feet}" from the context; formats: amps, feet, inches, dollars, percent. Unknown values leave an empty place. */
export function fillWords(template: string, context: object): string {
  return template.replaceAll(PLACEHOLDER, (_, name: string, format: string | undefined) => {
    const value = lookUp(context, name);
    const write = format === undefined ? undefined : formats[format];
    if (typeof value === 'number') return write ? write(value) : String(value);
    return typeof value === 'string' ? value : '';
  });
}
