/** Joins a number and its unit so that they never part at a line's end. */
const NBSP = '\u00a0';
const grouped = new Intl.NumberFormat('en-US');

/** Puts a no-break space between every number and its unit in a text. */
export const keepUnits = (text: string): string => text.replace(/(\d) (A|V|kW|ft|in\.|AWG|sq ft|miles|hours|steps)(?![a-z])/g, `$1${NBSP}$2`);

/** "9 ft 6 in." for 9.5; "9 ft" for 9. Rounded to the nearest inch. */
export function feetInWords(lengthFt: number): string {
  const inches = Math.round(lengthFt * 12);
  const feet = Math.floor(inches / 12);
  const rest = inches - feet * 12;
  if (rest === 0) return `${feet}${NBSP}ft`;
  return feet === 0 ? `${rest}${NBSP}in.` : `${feet}${NBSP}ft ${rest}${NBSP}in.`;
}

/** "45 in." Heights are given in inches. */
export const inchesInWords = (lengthIn: number): string => `${Math.round(lengthIn)}${NBSP}in.`;

/** "48 A" */
export const ampsInWords = (amps: number): string => `${Math.round(amps)}${NBSP}A`;

/** "11.5 kW", one decimal. */
export const kilowattsInWords = (kw: number): string => `${kw.toFixed(1)}${NBSP}kW`;

/** "1 photo", "3 photos". */
export const countInWords = (count: number, one: string, many: string): string =>
  `${grouped.format(count)} ${count === 1 ? one : many}`;

/**
 * Reads a length as people type it: "9.5", "9 6", "9 ft 6 in.", "9'6".
 * @returns feet, or null when the text is not a length.
 */
export function parseFeet(text: string): number | null {
  const match = /^\s*(\d+(?:\.\d+)?)\s*(?:ft\.?|feet|foot|')?\s*(?:(\d+(?:\.\d+)?)\s*(?:in\.?|inches|inch|")?)?\s*$/i.exec(text);
  if (!match?.[1]) return null;
  const inches = match[2] === undefined ? 0 : Number(match[2]);
  return inches >= 12 ? null : Number(match[1]) + inches / 12;
}
