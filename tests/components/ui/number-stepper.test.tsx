import { fireEvent, render, screen } from '@testing-library/react-native';
import { useState } from 'react';
import { NumberStepper } from '../../../components/ui/number-stepper';

function Asked({ start = null, onChange = () => undefined }: { start?: number | null; onChange?: (value: number | null) => void }) {
  const [value, setValue] = useState<number | null>(start);
  return (
    <NumberStepper id="height" label="Height off the floor" unit="in." min={18} max={60} step={1} start={45} value={value}
      onChange={(next) => { setValue(next); onChange(next); }} />
  );
}

const box = () => screen.getByLabelText('Height off the floor');

test('is unanswered until it is touched, then begins at its usual value', () => {
  const onChange = jest.fn();
  render(<Asked onChange={onChange} />);
  expect(box().props.value).toBe('');
  fireEvent.press(screen.getByRole('button', { name: 'Height off the floor: more' }));
  expect(onChange).toHaveBeenLastCalledWith(45);
  fireEvent.press(screen.getByRole('button', { name: 'Height off the floor: more' }));
  expect(onChange).toHaveBeenLastCalledWith(46);
});

// Arrow keys step, Page keys step five, Home and End go to the limits: components.md, "Number stepper with unit".
test.each([['ArrowUp', 46], ['ArrowDown', 44], ['PageUp', 50], ['PageDown', 40], ['Home', 18], ['End', 60]])('%s gives %d', (key, expected) => {
  const onChange = jest.fn();
  render(<Asked start={45} onChange={onChange} />);
  fireEvent(box(), 'keyPress', { nativeEvent: { key }, preventDefault: () => undefined });
  expect(onChange).toHaveBeenLastCalledWith(expected);
});

test('says what it could not read, and keeps it', () => {
  const onChange = jest.fn();
  render(<Asked onChange={onChange} />);
  fireEvent.changeText(box(), 'chest high');
  expect(screen.getByText('Type a number, such as 45\u00a0in.')).toBeOnTheScreen();
  expect(box().props.value).toBe('chest high');
  expect(onChange).not.toHaveBeenCalled();
});

test('hands on typed numbers beyond the limits, and emptying', () => {
  const onChange = jest.fn();
  render(<Asked onChange={onChange} />);
  fireEvent.changeText(box(), '64');
  expect(onChange).toHaveBeenLastCalledWith(64);
  fireEvent.changeText(box(), '');
  expect(onChange).toHaveBeenLastCalledWith(null);
});

test('at its limit the sign does nothing more', () => {
  const onChange = jest.fn();
  render(<Asked start={60} onChange={onChange} />);
  fireEvent.press(screen.getByRole('button', { name: 'Height off the floor: more' }));
  expect(onChange).not.toHaveBeenCalled();
});
