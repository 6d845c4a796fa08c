import { act, fireEvent, render, screen } from '@testing-library/react-native';
import { ErrorSummary } from '../../../components/ui/error-summary';
import { Field } from '../../../components/ui/field';
import { LoadGauge } from '../../../components/ui/load-gauge';
import { Toast } from '../../../components/ui/toast';

test('the summary counts the problems and has one line for each', () => {
  render(<ErrorSummary problems={[{ field: 'email', detail: 'E-mail: add the ending, such as .com' }, { field: 'height', detail: 'Height off the floor: 60 in. at most' }]} />);
  expect(screen.getByRole('heading', { name: 'Two answers to fix' })).toBeOnTheScreen();
  expect(screen.getAllByRole('button')).toHaveLength(2);
});

test('without problems there is no summary', () => {
  render(<ErrorSummary problems={[]} />);
  expect(screen.queryByRole('alert')).toBeNull();
});

test('a field tells its error and hands on what is typed', () => {
  const onChangeText = jest.fn();
  render(<Field id="email" label="E-mail" value="maren@example" onChangeText={onChangeText} error="Add the ending, such as .com" />);
  expect(screen.getByText('Add the ending, such as .com')).toBeOnTheScreen();
  fireEvent.changeText(screen.getByLabelText('E-mail'), 'maren@example.com');
  expect(onChangeText).toHaveBeenCalledWith('maren@example.com');
});

// 200 - 93 - 48 = 59 and 100 - 78 - 48 = -26, by hand.
test('the load gauge says in words and numbers what is left', () => {
  const { rerender } = render(<LoadGauge serviceAmps={200} homeAmps={93} chargerAmps={48} status="green" known />);
  expect(screen.getByText('Fits')).toBeOnTheScreen();
  expect(screen.getByText('59\u00a0A spare')).toBeOnTheScreen();
  rerender(<LoadGauge serviceAmps={100} homeAmps={78} chargerAmps={48} status="red" known={false} />);
  expect(screen.getByText('Too much')).toBeOnTheScreen();
  expect(screen.getByText('26\u00a0A over')).toBeOnTheScreen();
  expect(screen.getByText(/typical home/)).toBeOnTheScreen();
});

// 6 s, and until closed when it offers an action: tokens.md, "Motion".
test('a toast goes after six seconds unless it offers something', () => {
  jest.useFakeTimers();
  const onClose = jest.fn();
  const { rerender } = render(<Toast message="Charger moved" onClose={onClose} action={{ label: 'Undo', onPress: () => undefined }} />);
  act(() => { jest.advanceTimersByTime(10_000); });
  expect(onClose).not.toHaveBeenCalled();
  rerender(<Toast message="Charger moved" onClose={onClose} />);
  act(() => { jest.advanceTimersByTime(5_900); });
  expect(onClose).not.toHaveBeenCalled();
  act(() => { jest.advanceTimersByTime(200); });
  expect(onClose).toHaveBeenCalledTimes(1);
  jest.useRealTimers();
});
