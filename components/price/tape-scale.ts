/** The tape's fixed scale, cents: $500 to $5,000, so that narrowing is real and visible. */
export const TAPE_FROM_CENTS = 50_000;
export const TAPE_TO_CENTS = 500_000;

export interface Scale { readonly fromCents: number; readonly toCents: number }
export const wizardScale: Scale = { fromCents: TAPE_FROM_CENTS, toCents: TAPE_TO_CENTS };

/** Where an amount stands on the scale, per cent from its left end; amounts beyond it stand at its end. */
export const placeOn = (scale: Scale, cents: number): number =>
  Math.min(100, Math.max(0, ((cents - scale.fromCents) / (scale.toCents - scale.fromCents)) * 100));

export interface Tick { readonly cents: number; readonly place: number; readonly kind: 'short' | 'middle' | 'long' }

/** A tick each $100, longer at $500 and longest at $1,000. */
export function ticks(scale: Scale): readonly Tick[] {
  const first = Math.ceil(scale.fromCents / 10_000) * 10_000;
  const count = Math.floor((scale.toCents - first) / 10_000) + 1;
  return Array.from({ length: Math.max(0, count) }, (_, index) => {
    const cents = first + index * 10_000;
    return { cents, place: placeOn(scale, cents), kind: cents % 100_000 === 0 ? 'long' : cents % 50_000 === 0 ? 'middle' : 'short' };
  });
}

/**
 * Labels that fit: each $1,000 (each $500 on a long tape, each $2,000 on a very short one), none under a pin.
 * `widthPx` is the scale's own length.
 */
export function labels(scale: Scale, widthPx: number, pins: readonly number[]): readonly Tick[] {
  const per500Px = (widthPx / (scale.toCents - scale.fromCents)) * 50_000;
  const every = per500Px >= 58 ? 50_000 : per500Px >= 24 ? 100_000 : 200_000;
  const halfLabelPx = 22;
  return ticks(scale).filter(({ cents, place }) => {
    if (cents % every !== 0 || place < (halfLabelPx / widthPx) * 100 || place > 100 - (halfLabelPx / widthPx) * 100) return false;
    return pins.every((pin) => Math.abs(pin - place) * widthPx > (halfLabelPx + 4) * 100);
  });
}
