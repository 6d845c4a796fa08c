import { fireEvent, render, screen } from '@testing-library/react-native';
import { CheckCards } from '../../../components/ui/check-cards';
import { ChoiceCards } from '../../../components/ui/choice-cards';

const unsure = { label: 'Not sure', note: 'Fine. A photo of the label will tell us.', photo: 'label' };
const ratings = [{ value: '150', label: '150 A' }, { value: '200', label: '200 A' }];
const odd = [{ value: 'rust', label: 'Rust or water' }, { value: 'warm', label: 'Warm to stand by' }];

test('one of several: the chosen one is checked, "Not sure" is last and a choice like any other', () => {
  const onChange = jest.fn();
  render(<ChoiceCards id="main" label="Main breaker" choices={ratings} value="200" onChange={onChange} unsure={unsure} />);
  const radios = screen.getAllByRole('radio');
  expect(radios.map((radio) => radio.props.accessibilityLabel as string)).toEqual(['150 A', '200 A', 'Not sure']);
  expect(screen.getByRole('radio', { name: '200 A', checked: true })).toBeOnTheScreen();
  fireEvent.press(screen.getByRole('radio', { name: 'Not sure' }));
  expect(onChange).toHaveBeenLastCalledWith('unsure');
});

test('picking "Not sure" adds one calm line', () => {
  const { rerender } = render(<ChoiceCards id="main" label="Main breaker" choices={ratings} value={null} onChange={() => undefined} unsure={unsure} />);
  expect(screen.queryByText(unsure.note)).toBeNull();
  rerender(<ChoiceCards id="main" label="Main breaker" choices={ratings} value="unsure" onChange={() => undefined} unsure={unsure} />);
  expect(screen.getByText(unsure.note)).toBeOnTheScreen();
});

test.each([
  [['rust'], 'Warm to stand by', ['rust', 'warm']],
  [['rust', 'warm'], 'Rust or water', ['warm']],
  [['rust'], 'Nothing odd', []],
  [[], 'Not sure', 'unsure'],
  ['unsure', 'Rust or water', ['rust']],
] as const)('any of several: %j and "%s" give %j', (value, pressed, expected) => {
  const onChange = jest.fn();
  render(<CheckCards id="odd" label="What do you see?" choices={odd} value={value} onChange={onChange} none="Nothing odd" unsure={unsure} />);
  fireEvent.press(screen.getByRole('checkbox', { name: pressed }));
  expect(onChange).toHaveBeenLastCalledWith(expected);
});

test('no answer is not the answer "none"', () => {
  const { rerender } = render(<CheckCards id="odd" label="What?" choices={odd} value={null} onChange={() => undefined} none="Nothing odd" />);
  expect(screen.getByRole('checkbox', { name: 'Nothing odd', checked: false })).toBeOnTheScreen();
  rerender(<CheckCards id="odd" label="What?" choices={odd} value={[]} onChange={() => undefined} none="Nothing odd" />);
  expect(screen.getByRole('checkbox', { name: 'Nothing odd', checked: true })).toBeOnTheScreen();
});
