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

/** The value at a dotted name, or undefined. */
export function lookUp(source: object, name: string): unknown {
  let value: unknown = source;
  for (const key of name.split('.')) {
    if (value === null || typeof value !== 'object') return undefined;
    value = (value as Record<string, unknown>)[key];
  }
  return value;
}

/**
 * Fills "{run.lengthFt|feet}" from the context; formats: amps, feet, inches, dollars, percent, chargers and taxed (by their number),
 * wiring (by the method). Unknown values leave an empty place.
 */
export function fillWords(template: string, context: object): string {
  return template.replaceAll(PLACEHOLDER, (_, name: string, format: string | undefined) => {
    const value = lookUp(context, name);
    if (typeof value === 'number') return numberFormats[format ?? '']?.(value) ?? String(value);
    return typeof value === 'string' ? (textFormats[format ?? '']?.(value) ?? value) : '';
  });
}
