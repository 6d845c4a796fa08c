import fc from 'fast-check';
import { daysAfter, liveRange, openingRange, priceIntake } from '../../pricing/quote';
import { editionOne } from '../../pricing/rulebook/edition-1/index';
import { unknownFacts, type Facts } from '../../shared/facts';
import { liveRangeSchema, quoteDocumentSchema, type QuoteDocument } from '../../shared/quote';
import { anyFacts, barelyKnown, exampleFacts, plainFacts } from '../support/any-facts';

const price = (facts: Facts, samples = 60): QuoteDocument => priceIntake({ facts, edition: editionOne, pricedOn: '2026-05-12', samples });
const recommended = (document: QuoteDocument) => document.options.find((option) => option.recommended);
const ends = ['lowCents', 'midCents', 'highCents'] as const;

/** Every number anywhere in a value. */
function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  return value !== null && typeof value === 'object' ? Object.values(value).flatMap(numbersIn) : [];
}

function expectSound(document: QuoteDocument): void {
  expect(quoteDocumentSchema.parse(document)).toEqual(document);
  expect(numbersIn(document).every(Number.isFinite)).toBe(true);
  expect(document.options.length).toBeLessThanOrEqual(4);
  expect(new Set(document.options.map((option) => option.id)).size).toBe(document.options.length);
  expect(document.options.filter((option) => option.recommended).map((option) => option.id)).toEqual(
    document.options.length === 0 ? [] : [document.recommendedOptionId],
  );
  expect(document.options.length === 0).toBe(document.outcome === 'visit');
  for (const option of document.options) {
    for (const end of ends) {
      expect(option.lines.reduce((sum, line) => sum + line[end], 0)).toBe(option[end]);
      for (const line of option.lines) expect(line[end]).toBeGreaterThanOrEqual(0);
    }
    for (const line of option.lines) {
      expect(line.lowCents).toBeLessThanOrEqual(line.midCents);
      expect(line.midCents).toBeLessThanOrEqual(line.highCents);
      expect(line.title).not.toBe('');
      expect(line.why).not.toBe('');
      expect(line.rules.reduce((sum, rule) => sum + rule.cents, 0)).toBe(line.midCents);
      // Only what is included, or is there in another home, may have no rule in the middle one.
      expect(line.rules.length > 0 || line.midCents === 0).toBe(true);
    }
    expect(option.milesPerNight >= 0 && option.depositCents <= option.highCents).toBe(true);
  }
}

// Sources: the product's rules (lines add up at low, mid and high; no line without a reason; same input, same bytes).
describe('a quote document', () => {
  it('is sound for any answers, known or not', () => {
    fc.assert(
      fc.property(anyFacts, (facts) => expectSound(price(facts, 12))),
      { numRuns: 200 },
    );
  });

  it('has options for any home that nothing flags, a wire can reach and a service can carry', () => {
    fc.assert(
      fc.property(plainFacts, (facts) => {
        const document = price(facts, 12);
        expectSound(document);
        expect(document.flags.map((flag) => flag.id).filter((id) => id !== 'no_way' && id !== 'beyond_service')).toEqual([]);
      }),
      { numRuns: 100 },
    );
  });

  it('has the same bytes for the same input, whatever was priced in between', () => {
    fc.assert(
      fc.property(plainFacts, plainFacts, (facts, other) => {
        const first = JSON.stringify(price(facts, 12));
        price(other, 12);
        expect(JSON.stringify(price(structuredClone(facts), 12))).toBe(first);
      }),
      { numRuns: 25 },
    );
  });

  it('is held for the rulebook’s days', () => {
    // 30 days after May 12: May has 31 days, so June 11. Source: calendar; the design's own example says "held until Thu, June 11".
    expect(price(exampleFacts()).heldUntil).toBe('2026-06-11');
    expect(daysAfter('2028-02-28', 2)).toBe('2028-03-01');
  });
});

describe('a firm price', () => {
  it('is given when all that matters is known, and is one number to the cent', () => {
    const document = price(exampleFacts());
    expect(document.outcome).toBe('firm');
    for (const option of document.options) expect([option.lowCents, option.highCents]).toEqual([option.midCents, option.midCents]);
    expect(document.narrowing).toEqual([]);
  });

  it('is the price of the full facts when what is not known cannot matter', () => {
    // 200 A and no electric heat: the floor area may be anything likely, the service carries it; the year only serves the unknown main.
    const open = price(exampleFacts({ yearBuilt: null, floorAreaFt2: null, serviceDrop: null, pacesToPanel: null }));
    const known = price(exampleFacts());
    expect(open.outcome).toBe('firm');
    expect(open.options.map(({ id, midCents }) => [id, midCents])).toEqual(known.options.map(({ id, midCents }) => [id, midCents]));
  });

  it('is not given while an unknown answer could still ask for a visit', () => {
    const document = price(exampleFacts({ panelCondition: null }), 200);
    expect(document.outcome).toBe('range');
  });
});

describe('the range', () => {
  const truths = [
    exampleFacts(),
    exampleFacts({ blankSpaces: 0 }),
    exampleFacts({ panelPlace: 'basement', pacesToPanel: 14, floorsBetween: 1 }),
  ];
  const hidden: Partial<Facts>[] = [
    { blankSpaces: null },
    { mainBreakerAmps: null, busRatingAmps: null },
    { panelAt: null },
    { wallFinish: null },
    { paintRun: null },
  ];

  it('holds the true price when one answer is missing', () => {
    for (const truth of truths) {
      const truePrice = recommended(price(truth));
      for (const gap of hidden) {
        const option = price({ ...truth, ...gap }, 200).options.find(({ id }) => id === truePrice?.id);
        expect(option && truePrice && option.lowCents <= truePrice.midCents && truePrice.midCents <= option.highCents).toBe(true);
      }
    }
  });

  it('narrows on average as answers arrive', () => {
    const width = (facts: Facts) => {
      const option = recommended(price(facts, 200));
      return option ? option.highCents - option.lowCents : 0;
    };
    const truth = exampleFacts();
    const steps: Partial<Facts>[] = [
      {},
      {
        mainBreakerAmps: truth.mainBreakerAmps,
        busRatingAmps: 200,
        blankSpaces: 2,
        panelCondition: [],
        panelPlace: 'garage_wall',
        panelMount: 'surface',
      },
      { floorAreaFt2: truth.floorAreaFt2, loads: truth.loads },
      truth,
    ];
    const widths: number[] = [];
    let facts = barelyKnown();
    for (const step of steps) widths.push(width((facts = { ...facts, ...step })));
    expect(widths[0]).toBeGreaterThan(100_000);
    expect(widths[1]).toBeLessThan((widths[0] ?? 0) / 2);
    expect(widths[3]).toBe(0);
  });

  it('starts wide, inside the scale that the tape shows', () => {
    // The tape's fixed scale is $500 to $5,000. Source: the design's component sheet, "The tape".
    const opening = openingRange(unknownFacts(), editionOne);
    expect(opening?.lowCents).toBeGreaterThan(50_000);
    expect(opening?.highCents).toBeLessThan(500_000);
    expect((opening?.highCents ?? 0) - (opening?.lowCents ?? 0)).toBeGreaterThan(120_000);
  });

  it('names what would narrow it most, first', () => {
    const { narrowing } = price(exampleFacts({ blankSpaces: null, paintRun: null }), 400);
    expect(narrowing[0]?.fact).toBe('blankSpaces');
    expect(narrowing.map(({ cents }) => cents)).toEqual([...narrowing.map(({ cents }) => cents)].sort((a, b) => b - a));
    expect(narrowing[0]?.photo).toBe('panel');
  });
});

describe('what stops an automatic price', () => {
  // Source: product rules, flags of the domain notes section 11 and the condition answers; dangers lead the list.
  const flagged: [string, Partial<Facts>, boolean][] = [
    ['scorch', { panelCondition: ['scorch'] }, true],
    ['warm', { panelCondition: ['warm'] }, true],
    ['buzzing', { panelCondition: ['buzzing'] }, true],
    ['rust_or_water', { panelCondition: ['rust_or_water'] }, true],
    ['fuses', { panelCondition: ['fuses'] }, false],
    ['screwed_shut', { panelCondition: ['screwed_shut'] }, false],
    ['no_main', { mainBreakerAmps: 0 }, false],
    ['small_main', { mainBreakerAmps: 60 }, false],
    ['legacy_panel', { legacyPanel: true }, false],
    ['flat', { homeKind: 'flat' }, false],
    ['mobile_home', { homeKind: 'mobile_home' }, false],
    ['rent', { tenure: 'rent' }, false],
    ['detached_garage', { parking: 'detached_garage' }, false],
    ['paved_trench', { surfaceOver: 'paved' }, false],
    ['not_served', { zip: '99999' }, false],
  ];
  it.each(flagged)('%s asks for a visit, with words and no number', (id, change, danger) => {
    const document = price(exampleFacts(change));
    expect(document.outcome).toBe('visit');
    expect(document.options).toEqual([]);
    expect(document.recommendedOptionId).toBeNull();
    const flag = document.flags.find((entry) => entry.id === id);
    expect(flag?.danger).toBe(danger);
    expect(flag?.words.length).toBeGreaterThan(10);
    const live = liveRange({ facts: exampleFacts(change), edition: editionOne });
    expect([live.outcome, live.lowCents, live.highCents]).toEqual(['visit', null, null]);
  });
  it('does not take an unknown answer, or rent with consent, for a flag', () => {
    expect(
      price(exampleFacts({ tenure: 'rent_with_consent', panelCondition: null, mainBreakerAmps: null, busRatingAmps: null })).flags,
    ).toEqual([]);
  });
});

describe('the live range', () => {
  it('waits for the sure questions of the first two steps', () => {
    for (const missing of ['zip', 'homeKind', 'parking', 'chargerSupply'] as const) {
      const live = liveRange({ facts: barelyKnown({ [missing]: null }), edition: editionOne, samples: 50 });
      expect([missing, live.outcome, live.lowCents]).toEqual([missing, 'too-early', null]);
    }
    expect(liveRange({ facts: barelyKnown(), edition: editionOne, samples: 50 }).outcome).toBe('range');
  });
  it('fits its contract and shows the recommended option of the document', () => {
    const facts = exampleFacts({ blankSpaces: null });
    const live = liveRangeSchema.parse(liveRange({ facts, edition: editionOne, samples: 200 }));
    const option = recommended(price(facts, 200));
    expect([live.lowCents, live.highCents, live.optionTitle]).toEqual([option?.lowCents, option?.highCents, option?.title]);
  });
  it('draws the plan when the room is measured, and the run when both its ends are known', () => {
    expect(liveRange({ facts: barelyKnown(), edition: editionOne, samples: 20 }).plan).toBeNull();
    const half = liveRange({ facts: exampleFacts({ panelAt: null }), edition: editionOne, samples: 20 }).plan;
    expect([half?.panel, half?.run]).toEqual([null, null]);
    expect(liveRange({ facts: exampleFacts(), edition: editionOne }).plan?.run?.lengthFt).toBe(32);
  });
});
