import type { Jurisdiction } from '../schema';

/** Invented for the demo: towns, ZIP codes, state, fees and tax rates. */
export const jurisdictions: Jurisdiction[] = [
  {
    id: 'harrow-bend',
    name: 'Harrow Bend',
    zips: ['00017', '00018'],
    state: 'XX',
    timeZone: 'America/Denver',
    codeEdition: '2023',
    permitCents: 9_500,
    inspectionVisits: 1,
    tax: { material: 500, charger: 500, labor: 0 },
  },
  {
    id: 'pell-landing',
    name: 'Pell Landing',
    zips: ['00021'],
    state: 'XX',
    timeZone: 'America/Denver',
    codeEdition: '2023',
    permitCents: 14_000,
    inspectionVisits: 1,
    tax: { material: 550, charger: 550, labor: 0 },
  },
];
