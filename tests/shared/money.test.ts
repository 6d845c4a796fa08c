import { dollarChange, dollarRange, dollars, roundCents, spokenRange } from '../../shared/money';

// Source of the wordings: the design's voice rules, "How numbers are written".
describe('money in words', () => {
  it('has a comma at thousands and no cents when there are none', () => {
    expect(dollars(184_000)).toBe('$1,840');
    expect(dollars(1_750)).toBe('$17.50');
    expect(dollars(0)).toBe('$0');
  });
  it('writes a change with its sign and a real minus', () => {
    expect(dollarChange(10_500)).toBe('+$105');
    expect(dollarChange(-6_000)).toBe('−$60');
    expect(dollarChange(0)).toBe('same');
  });
  it('joins a range by an en dash that cannot break, and says it aloud', () => {
    expect(dollarRange(164_000, 208_000)).toBe('$1,640\u00a0–\u00a0$2,080');
    expect(dollarRange(195_000, 195_000)).toBe('$1,950');
    expect(dollarRange(0, 93_000)).toBe('up to\u00a0$930');
    expect(spokenRange(164_000, 208_000)).toBe('1,640 to 2,080 dollars');
  });
  it('rounds to whole steps, halves away from zero', () => {
    expect(roundCents(184_499, 1_000)).toBe(184_000);
    expect(roundCents(184_500, 1_000)).toBe(185_000);
    expect(roundCents(-184_500, 1_000)).toBe(-185_000);
    expect(Object.is(roundCents(-1, 1_000), 0)).toBe(true);
  });
});
