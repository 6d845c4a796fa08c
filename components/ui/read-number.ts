import { feetInWords, parseFeet } from '../../shared/units';

/**
 * Reads what was typed in a stepper: lengths in feet as people write them, other numbers with or without unit and thousands comma.
 * @returns null when it is not a number
 */
export function readNumber(text: string, unit: string): number | null {
  if (unit === 'ft') return parseFeet(text.replace(/\u00a0/g, ' '));
  const match = /^\s*(\d[\d,]*(?:\.\d+)?)\s*[a-z.\s\u00a0]*$/i.exec(text);
  return match?.[1] ? Number(match[1].replace(/,/g, '')) : null;
}

/** "9 ft 6 in." for 9.5 ft; "2,100 sq ft" else. */
export const writeNumber = (value: number, unit: string): string =>
  unit === 'ft' ? feetInWords(value) : `${value.toLocaleString('en-US')}\u00a0${unit}`;

/** `value` moved by so many steps: on the grid of steps, within the limits. */
export function stepped(value: number, by: number, step: number, min: number, max: number): number {
  const next = Math.round((value + by * step) / step) * step;
  return Math.min(max, Math.max(min, Number(next.toFixed(4))));
}
