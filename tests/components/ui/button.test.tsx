import { fireEvent, render, screen } from '@testing-library/react-native';
import { Button } from '../../../components/ui/button';

test('a double tap is one wish', () => {
  const onPress = jest.fn();
  render(<Button label="Pay $150 deposit" onPress={onPress} />);
  fireEvent.press(screen.getByRole('button', { name: 'Pay $150 deposit' }));
  fireEvent.press(screen.getByRole('button', { name: 'Pay $150 deposit' }));
  expect(onPress).toHaveBeenCalledTimes(1);
});

test('busy, it says so and ignores presses', () => {
  const onPress = jest.fn();
  render(<Button label="Send" busy busyLabel="Sending" onPress={onPress} />);
  const button = screen.getByRole('button', { name: 'Sending', busy: true });
  fireEvent.press(button);
  expect(onPress).not.toHaveBeenCalled();
});

test('off, its reason stands under it', () => {
  const onPress = jest.fn();
  render(<Button label="Next: car" off offReason="Type your ZIP first" onPress={onPress} />);
  fireEvent.press(screen.getByRole('button', { name: 'Next: car', disabled: true }));
  expect(onPress).not.toHaveBeenCalled();
  expect(screen.getByText('Type your ZIP first')).toBeOnTheScreen();
});
