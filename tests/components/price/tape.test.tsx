import { render, screen } from '@testing-library/react-native';
import { labels, placeOn, ticks, wizardScale } from '../../../components/price/tape-scale';
import { Tape } from '../../../components/price/tape';

// Scale and ticks: components.md, "The tape": $500 to $5,000, short $100, middle $500, long $1,000.
test('the scale goes from $500 to $5,000 and never further', () => {
  expect(placeOn(wizardScale, 50_000)).toBe(0);
  expect(placeOn(wizardScale, 275_000)).toBe(50);
  expect(placeOn(wizardScale, 500_000)).toBe(100);
  expect(placeOn(wizardScale, 900_000)).toBe(100);
  expect(placeOn(wizardScale, 10_000)).toBe(0);
});

test('a tick each $100, longer at $500, longest at $1,000', () => {
  const all = ticks(wizardScale);
  expect(all).toHaveLength(46);
  expect(all.filter((tick) => tick.kind === 'long').map((tick) => tick.cents)).toEqual([100_000, 200_000, 300_000, 400_000, 500_000]);
  expect(all.filter((tick) => tick.kind === 'middle')).toHaveLength(5);
});

test('labels hide under a pin, and are each $1,000 on a phone', () => {
  expect(labels(wizardScale, 300, []).map((tick) => tick.cents)).toEqual([100_000, 200_000, 300_000, 400_000]);
  expect(labels(wizardScale, 187, []).map((tick) => tick.cents)).toEqual([200_000, 400_000]);
  expect(labels(wizardScale, 300, [placeOn(wizardScale, 208_000)]).map((tick) => tick.cents)).toEqual([100_000, 300_000, 400_000]);
});

test.each([
  [{ lowCents: 164_000, highCents: 208_000, outcome: 'range' as const }, 'Price range 1,640 to 2,080 dollars, 440 wide'],
  [{ lowCents: 195_000, highCents: 195_000, outcome: 'firm' as const }, 'Firm price 1,950 dollars'],
  [{ lowCents: null, highCents: null, outcome: 'visit' as const }, 'No price range: needs a visit'],
  [{ lowCents: null, highCents: null, outcome: 'too-early' as const }, 'No price range yet'],
])('the tape is a picture with a name: %j', (props, name) => {
  render(<Tape {...props} />);
  expect(screen.getByLabelText(name).props.role).toBe('img');
});

test('beyond the scale the case shows the number', () => {
  render(<Tape lowCents={400_000} highCents={620_000} />);
  expect(screen.getByText('$6,200')).toBeOnTheScreen();
});
