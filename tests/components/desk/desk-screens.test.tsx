import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act, fireEvent, screen, waitFor, within } from '@testing-library/react-native';
import { Slot } from 'expo-router';
import { renderRouter } from 'expo-router/testing-library';
import { DeskLayout } from '../../../components/desk/desk-layout';
import { LeadScreen } from '../../../components/desk/lead-screen';
import { LeadsScreen } from '../../../components/desk/leads-screen';
import { SignInScreen } from '../../../components/desk/sign-in-screen';
import { fakeDesk, lead, row } from './fake-desk';

function open(address: string) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false, gcTime: Infinity }, mutations: { retry: false } } });
  const Root = () => <QueryClientProvider client={client}><Slot /></QueryClientProvider>;
  return renderRouter(
    { _layout: Root, 'desk/_layout': DeskLayout, 'desk/sign-in': SignInScreen, 'desk/leads/index': LeadsScreen, 'desk/leads/[id]': LeadScreen },
    { initialUrl: address },
  );
}
const press = (name: string | RegExp, role: 'button' | 'combobox' | 'option' = 'button') => fireEvent.press(screen.getByRole(role, { name }));
/** Longer than the 400 ms within which a second press counts as a double tap; renderRouter's clock is a fake one. */
const waitABit = () => act(() => { jest.advanceTimersByTime(500); });
const leadPath = `/desk/leads/${lead().id}`;

describe('the door', () => {
  it('nobody sees a lead without signing in, and signing in leads on to it; a wrong password keeps what was typed', async () => {
    fakeDesk({ role: null });
    const router = open(leadPath);
    fireEvent.changeText(await screen.findByLabelText('E-mail'), 'iris@example.com');
    fireEvent.changeText(screen.getByLabelText('Password'), 'wrong');
    press('Sign in');
    expect(await screen.findByText('That e-mail and password do not match. Check both and try again.')).toBeTruthy();
    expect(screen.getByLabelText('E-mail').props.value).toBe('iris@example.com');
    fireEvent.changeText(screen.getByLabelText('Password'), 'right');
    waitABit();
    press('Sign in');
    expect(await screen.findByRole('heading', { name: 'Maren Oakes' })).toBeTruthy();
    expect(router.getPathname()).toBe(leadPath);
  });

  it('an empty form is not sent and says what is missing', async () => {
    const desk = fakeDesk({ role: null });
    open('/desk/sign-in');
    await screen.findByLabelText('E-mail');
    press('Sign in');
    expect(await screen.findByText('Two answers to fix')).toBeTruthy();
    expect(desk.changes).toEqual([]);
  });

  it('signing out ends the session with its CSRF token and shows no lead any more', async () => {
    const desk = fakeDesk({ rows: [row(1)] });
    open('/desk/leads');
    await screen.findByText('Homeowner 1');
    press('Sign out');
    expect(await screen.findByRole('heading', { name: 'Sign in to the desk' })).toBeTruthy();
    expect(screen.queryByText('Homeowner 1')).toBeNull();
    expect(desk.changes.map(({ call, headers }) => [call, headers.get('X-CSRF-Token')])).toEqual([['DELETE /api/session', 'token-1']]);
  });
});

describe('leads', () => {
  const rows = [row(1), row(2, { stage: 'booked' }), row(3, { name: 'Wren Castellane' }), row(4, { lowCents: null, highCents: null, stage: 'needs-a-visit' })];

  it('come page by page, with how many of all are shown', async () => {
    fakeDesk({ rows });
    open('/desk/leads');
    expect(await screen.findByText('2 of 4 shown')).toBeTruthy();
    press('Show more');
    expect(await screen.findByText('4 leads')).toBeTruthy();
    expect(screen.getByText('Wren Castellane')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Show more' })).toBeNull();
  });

  it('are narrowed by the stage in the address, and a row keeps it for the way back', async () => {
    fakeDesk({ rows });
    const router = open('/desk/leads?stage=booked');
    expect(await screen.findByText('1 lead')).toBeTruthy();
    expect(screen.getByText('Homeowner 2')).toBeTruthy();
    expect(screen.queryByText('Homeowner 1')).toBeNull();
    fireEvent.press(screen.getByText('Homeowner 2'));
    fireEvent.press(await screen.findByRole('link', { name: 'Back to leads' }));
    await waitFor(() => expect(router.getSearchParams()).toEqual({ stage: 'booked' }));
  });

  it('are searched without the name getting into the address; no match offers the way back to all', async () => {
    fakeDesk({ rows });
    const router = open('/desk/leads');
    await screen.findByText('Homeowner 1');
    const box = screen.getByLabelText('Search leads by name, street or job number');
    fireEvent.changeText(box, 'wren ');
    expect(await screen.findByText('1 lead')).toBeTruthy();
    expect(box.props.value).toBe('wren ');
    expect(router.getSearchParams()).toEqual({});
    fireEvent.changeText(box, 'nobody');
    expect(await screen.findByText('No lead fits this')).toBeTruthy();
    press('Show all leads');
    expect(await screen.findByText('2 of 4 shown')).toBeTruthy();
    expect(screen.getByLabelText('Search leads by name, street or job number').props.value).toBe('');
  });

  it('say so when the server is away, and come when it is back', async () => {
    const desk = fakeDesk({ rows });
    open('/desk/leads');
    await screen.findByText('Homeowner 1');
    desk.down = true;
    press('Show more');
    expect(await screen.findByText('This did not load')).toBeTruthy();
    expect(screen.getByText('Homeowner 1')).toBeTruthy();
    desk.down = false;
    press('Try again');
    expect(await screen.findByText('4 leads')).toBeTruthy();
  });
});

describe('one lead', () => {
  const pick = (stage: string) => {
    press('Move to', 'combobox');
    press(stage, 'option');
  };

  it('moves with the version that was seen and the CSRF token', async () => {
    const desk = fakeDesk();
    open(leadPath);
    await screen.findByRole('heading', { name: 'Maren Oakes' });
    pick('Waiting on photo');
    press('Move to “Waiting on photo”');
    expect(await screen.findByText('Moved to “Waiting on photo”.')).toBeTruthy();
    const [change] = desk.changes;
    expect([change?.headers.get('If-Match'), change?.headers.get('X-CSRF-Token'), change?.body]).toEqual(['"3"', 'token-1', { stage: 'waiting-on-photo' }]);
  });

  it('when somebody was faster nothing moves, the note is kept, and the newest state lets it go on', async () => {
    const desk = fakeDesk({ stale: 1 });
    open(leadPath);
    await screen.findByRole('heading', { name: 'Maren Oakes' });
    pick('Waiting on photo');
    fireEvent.changeText(screen.getByLabelText('Note for the history'), 'Label is blurred');
    press('Move to “Waiting on photo”');
    expect(await screen.findByText('Someone else changed this first')).toBeTruthy();
    expect(screen.getByLabelText('Note for the history').props.value).toBe('Label is blurred');
    press('Show the newest');
    await waitFor(() => expect(screen.queryByText('Someone else changed this first')).toBeNull());
    waitABit();
    press('Move to “Waiting on photo”');
    expect(await screen.findByText('Moved to “Waiting on photo”.')).toBeTruthy();
    expect(desk.changes.map(({ headers }) => headers.get('If-Match'))).toEqual(['"3"', '"4"']);
  });

  it('shows no way to move it to whom the server allows none', async () => {
    fakeDesk({ role: 'sales', lead: lead({ moves: [] }) });
    open(leadPath);
    await screen.findByRole('heading', { name: 'Maren Oakes' });
    expect(screen.queryByRole('combobox', { name: 'Move to' })).toBeNull();
  });

  it('marks an answer that was changed after the price, and where each one is from', async () => {
    fakeDesk({
      lead: lead({
        facts: [{ name: 'mainBreakerAmps', label: 'Main breaker', words: '150 A', source: 'homeowner' }, { name: 'solarAmps', label: 'Solar', words: 'None', source: 'assumed' }],
        differences: [{ label: 'Main breaker', before: '200 A', after: '150 A' }],
      }),
    });
    open(leadPath);
    const facts = within(await screen.findByLabelText('Facts to check'));
    expect(facts.getByText('150 A')).toBeTruthy();
    expect(facts.getByText(/200 A/)).toBeTruthy();
    expect(facts.getByText('assumed')).toBeTruthy();
    expect(screen.getByText('1 of 2 assumed')).toBeTruthy();
  });
});
