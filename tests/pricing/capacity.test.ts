import { priceIntake } from '../../pricing/quote';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import type { Facts } from '../../shared/facts';
import { exampleFacts } from '../support/any-facts';

const price = (changes: Partial<Facts>) =>
  priceIntake({ facts: exampleFacts(changes), edition: editionOne, pricedOn: '2026-05-12', samples: 40 });
const loads = (present: Partial<Record<keyof Facts['loads'], number | null>>): Facts['loads'] => {
  const none = Object.keys(exampleFacts().loads).map((id) => [id, { present: false, amount: null }]);
  const some = Object.entries(present).map(([id, amount]) => [id, { present: true, amount }]);
  return Object.fromEntries([...none, ...some]) as Facts['loads'];
};
const main = (amps: NonNullable<Facts['mainBreakerAmps']>): Partial<Facts> => ({ mainBreakerAmps: amps, busRatingAmps: null });
const option = (document: ReturnType<typeof price>, id: string) => {
  const found = document.options.find((entry) => entry.id === id);
  if (!found) throw new Error(`no ${id}`);
  return found;
};

describe('208 V', () => {
  it('divides the load by its own volts, NEC 2023 220.5(A) (from memory) and 220.83(B)', () => {
    // 1,900 ft2 * 3 + 4,500 + range 12,000 = 22,200; 8,000 + 0.4 * 14,200 = 13,680; air 3 tons 3,900: 17,580 VA / 208 V = 84.5 A.
    // The charger of 16 A: 7,200 VA at least (220.57), in the 40 % pool 2,880 VA / 208 V = 13.8 A. Together 98.3 A of 100 A: amber.
    const document = price({ volts: 208, ...main(100), loads: loads({ range: null, centralAir: 3 }) });
    expect(option(document, 'wired-16').load).toMatchObject({ status: 'amber', homeAmps: 84.5, chargerAmps: 13.8, spareAmps: 15.5 });
    // 48 A: 0.4 * 9,984 / 208 = 19.2 A more is 103.7 A: not within 100 A.
    expect(option(document, 'wired-48').panelChange).toBe('energy_management');
  });
});

describe('energy management: NEC 2023 625.42(A), of the charger only what the system permits counts', () => {
  // 22,200 + dryer 5,000 + water heater 4,500 = 31,700; 8,000 + 0.4 * 23,700 = 17,480; air 3,900: 21,380 VA = 89.1 A of 100 A.
  const document = price({ ...main(100), loads: loads({ range: null, dryer: null, waterHeater: null, centralAir: 3 }) });
  const { load, because, panelChange } = option(document, 'wired-48');

  it('keeps home and charger within the service, and the sheet says the same', () => {
    // The set point is 80 A (220.70, continuous: 80 % of an ordinary main); beside 89.1 A it leaves nothing, so the charger waits.
    expect(panelChange).toBe('energy_management');
    expect(load).toMatchObject({ status: 'amber', homeAmps: 89.1, chargerAmps: 0, spareAmps: 10.9, clause: 'NEC 2023 220.83, 625.42(A)' });
    expect(load.lines.find(({ label }) => label === 'New charger, 48 A')).toMatchObject({ va: 0, clause: 'NEC 2023 625.42(A)' });
    expect(load.lines.at(-1)).toMatchObject({ label: 'Calculated load', va: 21_380 });
  });
  it('tells the homeowner that the charger waits and who confirms it', () => {
    expect(because).toContain('The charger waits while the house is busy; the electrician confirms it.');
    expect(because).toContain('up to');
    expect(document.cautions.some((words) => words.startsWith('A load manager may hold the charger at nothing'))).toBe(true);
  });
});

describe('a larger service', () => {
  it('is none for a service that is as large already: a visit, and no price', () => {
    // 40 kW of strips and an instant heater of 36 kW: 166.7 A of heat alone, and more in the pool. Source: arithmetic.
    const heavy = loads({ stripHeat: 40, instantWaterHeater: 36, range: null });
    for (const amps of [200, 225] as const) {
      const document = price({ ...main(amps), loads: heavy });
      expect([document.outcome, document.flags.map(({ id }) => id)]).toEqual(['visit', ['beyond_service']]);
    }
    // 100 A cannot become enough by 200 A either.
    expect(price({ ...main(100), loads: heavy }).outcome).toBe('visit');
    expect(price({ ...main(400), loads: heavy }).outcome).toBe('firm');
  });
});

describe('a flush panel', () => {
  const patches = (changes: Partial<Facts>) =>
    option(price({ panelMount: 'flush', wallFinish: 'bare_studs', ...changes }), 'wired-48').lines
      .flatMap(({ rules }) => rules).filter(({ rule }) => rule === 'flush-panel').length;
  it('opens no bare studs, but the wall of a panel elsewhere in the house, whatever the garage looks like', () => {
    // Source: trade sense, no source.
    expect(patches({})).toBe(0);
    expect(patches({ panelPlace: 'elsewhere', panelAt: null, pacesToPanel: 8, floorsBetween: 0 })).toBe(1);
    expect(patches({ panelPlace: 'outside', panelAt: null, pacesToPanel: 8, floorsBetween: 0 })).toBe(0);
  });
});
