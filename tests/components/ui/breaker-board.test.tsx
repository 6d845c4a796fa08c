import { fireEvent, render, screen } from '@testing-library/react-native';
import { BreakerBoard } from '../../../components/ui/breaker-board';

const tiles = [
  { id: 'range', title: 'Range, oven', state: true, stateWords: '50 amps' },
  { id: 'dryer', title: 'Clothes dryer', state: false },
  { id: 'spa', title: 'Hot tub', state: null },
] as const;

// States and their order: components.md, "Breaker board".
test.each([['Range, oven. 50 amps', 'range', null], ['Clothes dryer. No', 'dryer', true], ['Hot tub. Not sure', 'spa', false]])('%s goes on to the next state', (name, id, next) => {
  const onChange = jest.fn();
  render(<BreakerBoard label="Which of these run on electricity?" tiles={tiles} onChange={onChange} />);
  fireEvent.press(screen.getByRole('checkbox', { name }));
  expect(onChange).toHaveBeenCalledWith(id, next);
});

test('a tile says its state to assistive technology as checked, unchecked or mixed', () => {
  render(<BreakerBoard label="Loads" tiles={tiles} onChange={() => undefined} />);
  expect(screen.getByRole('checkbox', { name: /Range/, checked: true })).toBeOnTheScreen();
  expect(screen.getByRole('checkbox', { name: /Hot tub/, checked: 'mixed' })).toBeOnTheScreen();
});

test('a long press offers all three answers at once', () => {
  const onChange = jest.fn();
  render(<BreakerBoard label="Loads" tiles={tiles} onChange={onChange} />);
  fireEvent(screen.getByRole('checkbox', { name: /Clothes dryer/ }), 'longPress');
  fireEvent.press(screen.getByRole('menuitem', { name: 'Not sure' }));
  expect(onChange).toHaveBeenCalledWith('dryer', null);
  expect(screen.queryByRole('menuitem')).toBeNull();
});
