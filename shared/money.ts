/** Whole US cents. Never a fraction; never a float of dollars. */
export type Cents = number;

const NBSP = '\u00a0';
// A formatter costs more to make than to use, and a document writes many prices.
const wholeDollars = new Intl.NumberFormat('en-US', { maximumFractionDigits: 0 });
const withCents = new Intl.NumberFormat('en-US', { minimumFractionDigits: 2, maximumFractionDigits: 2 });

/** "$1,840", or "$17.50" when there are cents. Minus is a real minus sign. */
export function dollars(cents: Cents): string {
  const text = (Math.abs(cents) % 100 === 0 ? wholeDollars : withCents).format(Math.abs(cents) / 100);
  return `${cents < 0 ? '−' : ''}$${text}`;
}

/** "$1,640 – $2,080"; one number when both ends are the same; "up to $930" from nothing, which is never written as $0. */
export function dollarRange(lowCents: Cents, highCents: Cents): string {
  if (lowCents === highCents) return dollars(lowCents);
  return lowCents === 0 ? `up to${NBSP}${dollars(highCents)}` : `${dollars(lowCents)}${NBSP}–${NBSP}${dollars(highCents)}`;
}

/** "1,640 to 2,080 dollars", for screen readers. */
export const spokenRange = (lowCents: Cents, highCents: Cents): string => {
  const plain = (cents: Cents) => wholeDollars.format(cents / 100);
  return lowCents === highCents ? `${plain(lowCents)} dollars` : `${plain(lowCents)} to ${plain(highCents)} dollars`;
};

/** "+$105", "−$60", "same". */
export const dollarChange = (cents: Cents): string => (cents === 0 ? 'same' : cents > 0 ? `+${dollars(cents)}` : dollars(cents));

/** Nearest multiple, halves away from zero; `stepCents` 1,000 gives whole ten dollars. */
export const roundCents = (cents: number, stepCents: Cents): Cents =>
  Math.sign(cents) * Math.round(Math.abs(cents) / stepCents) * stepCents || 0;
