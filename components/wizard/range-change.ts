import { dollars, spokenRange } from '../../shared/money';
import type { LiveRange, Narrowing } from '../../shared/quote';

export interface RangeStand { readonly lowCents: number; readonly highCents: number }

/** The two ends, or null while there is no range to show. */
export const standOf = (range: LiveRange | undefined): RangeStand | null =>
  range && range.lowCents !== null && range.highCents !== null && (range.outcome === 'range' || range.outcome === 'firm')
    ? { lowCents: range.lowCents, highCents: range.highCents }
    : null;

/** How much narrower the range is than before, cents; below zero: wider. */
export const narrowedBy = (before: RangeStand, now: RangeStand): number =>
  before.highCents - before.lowCents - (now.highCents - now.lowCents);

/** "Narrowed by $570." or "Wider now, by $120."; null when the width is the same. */
export function changeWords(before: RangeStand | null, now: RangeStand): string | null {
  if (!before) return null;
  const change = narrowedBy(before, now);
  if (change === 0) return null;
  return change > 0 ? `Narrowed by ${dollars(change)}.` : `Wider now, by ${dollars(-change)}.`;
}

/** What a screen reader hears once the range is at rest. */
export function spokenChange(before: RangeStand | null, now: RangeStand): string {
  const change = before ? narrowedBy(before, now) : 0;
  const plain = (cents: number) => (cents / 100).toLocaleString('en-US', { maximumFractionDigits: 0 });
  const tail = change > 0 ? ` Narrowed by ${plain(change)}.` : change < 0 ? ` Wider by ${plain(-change)}.` : '';
  const end = now.lowCents === now.highCents ? 'Firm price now' : 'Range now';
  return `${end} ${spokenRange(now.lowCents, now.highCents)}.${tail}`;
}

const pictured: Readonly<Record<string, string>> = {
  panel: 'the open panel', label: 'the panel label', wall: 'the charger wall', way: 'the way between', meter: 'the meter',
};

/** What would narrow the range most: a question by its name; where photos are asked for, the picture that answers it. */
function mostOf(narrowing: readonly Narrowing[], byPhoto: boolean): { words: string; cents: number } | null {
  const photo = byPhoto ? narrowing.find((entry) => entry.photo !== null) : undefined;
  if (photo?.photo) return { words: `A photo of ${pictured[photo.photo] ?? 'it'}`, cents: photo.cents };
  const first = narrowing[0];
  return first ? { words: first.title, cents: first.cents } : null;
}

/** The one line under the tape: what the last answer did, then what would narrow it most. `byPhoto`: the photos are being asked for. */
export function rangeLine(range: LiveRange, before: RangeStand | null, byPhoto = false): string {
  const now = standOf(range);
  if (!now) return '';
  if (range.outcome === 'firm') return 'Nothing that matters is open. This is a firm price.';
  const did = changeWords(before, now);
  const most = mostOf(range.narrowing, byPhoto);
  if (!most) return did ?? '';
  if (did) return `${did} ${most.words} would take off about ${dollars(most.cents)} more.`;
  return `${most.words} would narrow this by about ${dollars(most.cents)}.`;
}
