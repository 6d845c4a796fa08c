import type { Edition, Jurisdiction } from '../../pricing/rulebook/schema';

/** The town that a ZIP belongs to; null when we do not serve it or none is known. */
export const placeOfZip = (edition: Edition, zip: unknown): Jurisdiction | null =>
  edition.jurisdictions.find(({ zips }) => zips.some((one) => one === zip)) ?? null;

/** Where a ZIP's clocks are; the contractor's own town when it is not served or not known. */
export const timeZoneOfZip = (edition: Edition, zip: unknown): string => (placeOfZip(edition, zip) ?? edition.jurisdictions[0])?.timeZone ?? 'UTC';
