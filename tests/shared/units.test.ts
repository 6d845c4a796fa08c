import { countInWords, feetInWords, inchesInWords, keepUnits, kilowattsInWords, parseFeet } from '../../shared/units';

// Source of the wordings: the design's voice rules, "How numbers are written", and components, "Number stepper".
describe('measures in words', () => {
  it('writes runs in feet and heights in inches, number and unit joined', () => {
    expect(feetInWords(32)).toBe('32\u00a0ft');
    expect(feetInWords(9.5)).toBe('9\u00a0ft 6\u00a0in.');
    expect(feetInWords(0.5)).toBe('6\u00a0in.');
    expect(feetInWords(9.999)).toBe('10\u00a0ft');
    expect(inchesInWords(45)).toBe('45\u00a0in.');
    expect(kilowattsInWords(11.52)).toBe('11.5\u00a0kW');
    expect(countInWords(1, 'photo', 'photos')).toBe('1 photo');
    expect(countInWords(1200, 'photo', 'photos')).toBe('1,200 photos');
  });
  it.each([['9 6', 9.5], ['9.5', 9.5], ['9 ft 6 in.', 9.5], ["9'6\"", 9.5], ['  20 ', 20], ['20 feet', 20]])('reads %j as typed', (text, feet) => {
    expect(parseFeet(text)).toBe(feet);
  });
  it.each(['', 'nine', '9 13', '-4', '9 6 3', '1e3'])('does not read %j as a length', (text) => {
    expect(parseFeet(text)).toBeNull();
  });
});

it('keeps every number with its unit', () => {
  expect(keepUnits('A 60 A breaker, 48 A charging, 32 ft of run; 3 Apples')).toBe('A 60\u00a0A breaker, 48\u00a0A charging, 32\u00a0ft of run; 3 Apples');
});
