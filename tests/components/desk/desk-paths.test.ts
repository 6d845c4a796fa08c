import { pathAfterSignIn, signInPath } from '../../../components/desk/desk-paths';
import { filtersInAddress, readFilters } from '../../../components/desk/lead-filters';
import { deskScale } from '../../../components/desk/desk-scale';

it.each(['/desk/leads', '/desk/leads/6f1c?stage=booked'])('signing in leads on to %s', (path) => {
  const { searchParams } = new URL(signInPath(path), 'http://desk.example.com');
  expect(pathAfterSignIn(searchParams.get('next') ?? undefined)).toBe(path);
});

// Addresses that leave the desk or the site: open redirects, after OWASP's cheat sheet on unvalidated redirects (from memory).
it.each([undefined, '', 'https://evil.example.com', '//evil.example.com', '/\\evil.example.com', '/quote/home', '/desk/sign-in', '/desk/..//evil.example.com:80', 'javascript:alert(1)'])(
  'signing in never leads to %s', (next) => expect(pathAfterSignIn(next)).toBe('/desk/leads'),
);

it('filters survive the address, and what it does not know counts as not given', () => {
  const params = Object.fromEntries(new URLSearchParams(filtersInAddress({ stage: 'booked', sort: 'name' })));
  expect(readFilters(params)).toEqual({ stage: 'booked', sort: 'name' });
  expect(filtersInAddress({ stage: undefined, sort: 'due' })).toBe('');
  expect(readFilters({ stage: 'nowhere', sort: ['name', 'due'] })).toEqual({ stage: undefined, sort: 'due' });
});

// The desk's tape of the shared design picture shows $1,640 to $2,080 on a section that includes $1,500 and $2,500.
it('the tape’s section has room on both sides', () => {
  const { fromCents, toCents } = deskScale(164_000, 208_000);
  expect(fromCents).toBeLessThanOrEqual(150_000);
  expect(toCents).toBeGreaterThanOrEqual(250_000);
});
