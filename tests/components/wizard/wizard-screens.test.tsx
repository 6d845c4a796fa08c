import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act, fireEvent, screen, waitFor } from '@testing-library/react-native';
import { Slot } from 'expo-router';
import { renderRouter } from 'expo-router/testing-library';
import { Text } from 'react-native';
import { StepRoute } from '../../../components/wizard/step-route';
import { WizardProvider } from '../../../components/wizard/wizard-provider';
import { fakeApi } from './fake-api';

/** Every step before the named one answered; an invented home. */
const home = { zip: '00017', homeKind: 'house', tenure: 'own', parking: 'attached_garage', yearBuilt: 'unsure', floorAreaFt2: 'unsure' };
const car = { carMaxAmps: '48', whPerMile: '300', milesPerDay: 40, hoursHome: 10, secondCar: 'no', chargerSupply: 'ours' };
const panel = { mainBreakerAmps: '200', blankSpaces: '2', panelCondition: [], panelPlace: 'garage_wall', panelMount: 'flush', serviceDrop: 'overhead', solarAmps: '0' };

function open(address: string) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false, gcTime: Infinity }, mutations: { retry: false } } });
  const Layout = () => <QueryClientProvider client={client}><WizardProvider><Slot /></WizardProvider></QueryClientProvider>;
  return renderRouter({ 'quote/_layout': Layout, 'quote/[step]': StepRoute, 'quote/price': () => <Text>The price</Text>, index: () => <Text>Start</Text> }, { initialUrl: address });
}
const press = (name: string | RegExp, role: 'button' | 'radio' | 'checkbox' | 'link' = 'button') => fireEvent.press(screen.getByRole(role, { name }));

describe('the place', () => {
  it('names the town as soon as five digits are saved, and only then goes on', async () => {
    const api = fakeApi();
    open('/quote/home');
    fireEvent.changeText(await screen.findByLabelText('ZIP code'), '0001');
    press('Next: kind of home');
    expect(await screen.findAllByText('Type the five digits of the ZIP')).toHaveLength(2);
    expect(api.saves).toEqual([]);
    fireEvent.changeText(screen.getByLabelText('ZIP code'), '00017');
    expect(await screen.findByText('Harrow Bend. We work there.')).toBeTruthy();
    // A second press this soon would be taken for a double tap.
    await act(() => jest.advanceTimersByTimeAsync(450));
    press('Next: kind of home');
    expect(await screen.findByText('What kind of home is it?')).toBeTruthy();
    expect(api.answers).toEqual({ zip: '00017' });
  });

  it('says calmly that we do not work somewhere, keeps an address, and offers no way on', async () => {
    fakeApi();
    open('/quote/home');
    fireEvent.changeText(await screen.findByLabelText('ZIP code'), '99999');
    expect(await screen.findByText('We do not work in 99999 yet')).toBeTruthy();
    expect(screen.queryByRole('button', { name: /^Next/ })).toBeNull();
    fireEvent.changeText(screen.getByLabelText('E-mail'), 'maren@example.com');
    press('Tell me if you come here');
    expect(await screen.findByText(/We write to maren@example.com once/)).toBeTruthy();
  });
});

describe('answers', () => {
  it('are saved as they are given, and Next asks for those that are missing', async () => {
    const api = fakeApi({ zip: '00017' });
    open('/quote/home?part=kind');
    fireEvent.press(await screen.findByRole('radio', { name: 'House' }));
    await waitFor(() => expect(api.answers.homeKind).toBe('house'));
    press('Next: age and size');
    expect(await screen.findByText('Two answers to fix')).toBeTruthy();
    expect(screen.getAllByText('Do you own it: pick an answer').length).toBe(2);
  });

  it('stay on the screen when the server is away, and arrive when it is back', async () => {
    const api = fakeApi({ zip: '00017' });
    open('/quote/home?part=kind');
    await screen.findByRole('radio', { name: 'House' });
    await waitFor(() => expect(screen.getByText(/Step 1 of 7/)).toBeTruthy());
    api.down = 1;
    press('House', 'radio');
    expect(await screen.findByText(/No connection. Your answers are kept/)).toBeTruthy();
    expect(screen.getByRole('radio', { name: 'House' })).toBeChecked();
    press('Try now');
    await waitFor(() => expect(api.answers.homeKind).toBe('house'));
  });

  it('out of their limits are never sent', async () => {
    const api = fakeApi({ ...home, ...car, ...panel, loads: {} });
    open('/quote/garage');
    fireEvent.changeText(await screen.findByLabelText('Width, left to right'), '500');
    fireEvent(screen.getByLabelText('Width, left to right'), 'blur');
    expect(await screen.findByText('60 ft at most')).toBeTruthy();
    fireEvent.changeText(screen.getByLabelText('Width, left to right'), '20');
    await waitFor(() => expect(api.answers.roomWidthFt).toBe(20));
    expect(api.saves).toEqual([{ roomWidthFt: 20 }]);
  });
});

it('stops at a danger with a number to call and a way out, and still lets one go on', async () => {
  fakeApi({ ...home, ...car });
  open('/quote/panel?part=odd');
  fireEvent.press(await screen.findByRole('checkbox', { name: 'Buzzing' }));
  expect(await screen.findByText('Leave the panel alone')).toBeTruthy();
  expect(screen.getByRole('link', { name: 'Call 555-0142' })).toBeTruthy();
  expect(screen.getByRole('link', { name: 'I’ll stop here' })).toBeTruthy();
  press('Next: where it is');
  expect(await screen.findByText('Where is the panel?')).toBeTruthy();
});

it('leads to the first open step when a later one is opened', async () => {
  fakeApi(home);
  open('/quote/garage');
  expect(await screen.findByText('How fast can your car take power at home?')).toBeTruthy();
});

it('says "No" for every load that was left alone once one goes on', async () => {
  const api = fakeApi({ ...home, ...car, ...panel });
  open('/quote/loads');
  fireEvent.press(await screen.findByRole('checkbox', { name: /^Range, oven\. No/ }));
  await waitFor(() => expect(api.answers.loads).toEqual({ range: { present: true, amount: null } }));
  press('Next: garage');
  await waitFor(() => expect(api.answers.loads).toMatchObject({ range: { present: true }, spa: { present: false, amount: null } }));
});

it('mails a link to finish later and says where it went and until when', async () => {
  fakeApi();
  open('/quote/home');
  fireEvent.press(await screen.findByRole('button', { name: 'Finish later' }));
  fireEvent.changeText(screen.getByLabelText('E-mail'), 'maren@example.com');
  press('Send me the link');
  expect(await screen.findByText(/m•••@example.com\. It opens your answers on any device until Thu, June 11/)).toBeTruthy();
});

it('says plainly when the answers are not held here any more', async () => {
  const api = fakeApi({ zip: '00017' });
  open('/quote/home?part=kind');
  await screen.findByText('What kind of home is it?');
  await waitFor(() => expect(screen.getByText(/Step 1 of 7/)).toBeTruthy());
  api.gone = true;
  fireEvent.press(await screen.findByRole('radio', { name: 'House' }));
  expect(await screen.findByText('These answers are not open here any more')).toBeTruthy();
  expect(screen.getByRole('link', { name: 'Open a saved job' })).toBeTruthy();
});
