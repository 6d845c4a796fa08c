import { readNumber, stepped, writeNumber } from '../../../components/ui/read-number';

// The first three ways of typing and how the answer is shown: components.md, "Number stepper with unit".
test.each([
  ['9 6', 'ft', 9.5], ['9.5', 'ft', 9.5], ['9 ft 6 in.', 'ft', 9.5], ['9\u00a0ft 6\u00a0in.', 'ft', 9.5],
  ['45', 'in.', 45], ['45 in.', 'in.', 45], ['2,100 sq ft', 'sq ft', 2100], ['12 steps', 'steps', 12],
])('reads "%s" (%s) as %d', (text, unit, value) => {
  expect(readNumber(text, unit)).toBe(value);
});

test.each([['nine', 'ft'], ['9 14', 'ft'], ['', 'in.'], ['4 5', 'in.'], ['-3', 'in.']])('"%s" (%s) is no number', (text, unit) => {
  expect(readNumber(text, unit)).toBeNull();
});

test('shows feet with inches, and other units with a no-break space', () => {
  expect(writeNumber(9.5, 'ft')).toBe('9\u00a0ft 6\u00a0in.');
  expect(writeNumber(2100, 'sq ft')).toBe('2,100\u00a0sq ft');
});

// Worked by hand.
test('steps stay on their grid and within the limits', () => {
  expect(stepped(9.3, 1, 0.5, 0, 60)).toBe(10);
  expect(stepped(59.8, 1, 0.5, 0, 60)).toBe(60);
  expect(stepped(20, -5, 1, 18, 60)).toBe(18);
});
