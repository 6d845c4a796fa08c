import { priceIntake } from '../../pricing/quote';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import type { Facts } from '../../shared/facts';
import { exampleFacts } from '../support/any-facts';

const outdoors: Partial<Facts> = { panelPlace: 'outside', panelAt: null, pacesToPanel: 8, floorsBetween: 0 };
const optionsOf = (changes: Partial<Facts>) =>
  priceIntake({ facts: exampleFacts(changes), edition: editionOne, pricedOn: '2026-05-12' }).options;
const breakers = (changes: Partial<Facts>) => optionsOf(changes).map(({ id, takeoff, circuit }) =>
  [id, takeoff.find(({ item }) => item.startsWith('breaker.'))?.item, circuit.disconnectRequired]);

// Sources: NEC 2023 210.8(F) (outdoor outlets of dwellings to 50 A), 625.54 (receptacles), 625.43 (above 60 A), by domain notes section 1.
describe('the breaker and the switch that are priced', () => {
  it.each(['carport', 'driveway'] as const)('%s: wired outdoors a GFCI breaker to 50 A, and none at 60 A; no switch', (parking) => {
    expect(breakers({ ...outdoors, parking, carMaxAmps: 40 })).toContainEqual(['wired-40', 'breaker.gfci.50', false]);
    expect(breakers({ ...outdoors, parking })).toContainEqual(['wired-48', 'breaker.60', false]);
  });
  it('in an attached garage: none for a wired charger, always for an outlet', () => {
    expect(breakers({})).toEqual([
      ['wired-16', 'breaker.20', false], ['wired-48', 'breaker.60', false], ['outlet-32', 'breaker.gfci.40', false],
    ]);
  });
  it('our charger with a plug comes with its mounting, their own does not', () => {
    const mounted = (changes: Partial<Facts>) =>
      optionsOf({ chargerConnection: 'plug_in', ...changes }).every(({ takeoff }) => takeoff.some(({ item }) => item.startsWith('mounting.')));
    expect([mounted({}), mounted({ chargerSupply: 'theirs' })]).toEqual([true, false]);
  });
});
