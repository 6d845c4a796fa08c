import { leadStages, type Lead, type LeadRow, type LeadStage } from '../../../shared/api/desk';
import type { Role } from '../../../shared/roles';

/** People, streets and prices of the shared design pictures, all invented. */
export const row = (n: number, change: Partial<LeadRow> = {}): LeadRow => ({
  id: `00000000-0000-4000-8000-00000000${String(1000 + n)}`, jobNumber: 1000 + n, name: `Homeowner ${n}`, town: 'Harrow Bend', work: 'Wall charger, 60 A', workNote: '32 ft, EMT',
  lowCents: 164_000, highCents: 208_000, firmCents: null, stage: 'check-photos', dueAt: null, timeNote: '4 photos', assignee: null, depositPaid: true,
  createdAt: '2026-05-11T15:00:00Z', ...change,
});

export const lead = (change: Partial<Lead> = {}): Lead => ({
  ...row(47, { name: 'Maren Oakes' }), version: 3, email: 'maren@example.com', phone: '555-0117', street: '12 Tanner’s Row', contactWays: ['email'],
  consentAt: '2026-05-11T15:00:00Z', facts: [], photos: [], quote: null, optionId: null, deposit: null, differences: [], history: [], moves: ['waiting-on-photo', 'closed'], ...change,
});

export interface FakeDesk {
  role: Role | null;
  rows: LeadRow[];
  lead: Lead;
  /** How many of the next calls are refused as stale. */
  stale: number;
  down: boolean;
  /** Method, address and headers of every call but reading. */
  readonly changes: { readonly call: string; readonly headers: Headers; readonly body: unknown }[];
}

const PAGE = 2;
const password = 'right';

/** The desk's API in memory: sign-in, a list in pages of two, one lead. */
export function fakeDesk(change: Partial<FakeDesk> = {}): FakeDesk {
  const desk: FakeDesk = { role: 'estimator', rows: [], lead: lead(), stale: 0, down: false, changes: [], ...change };
  const reply = (status: number, body?: unknown) => Promise.resolve({ status, text: () => Promise.resolve(body === undefined ? '' : JSON.stringify(body)) } as Response);
  const refuse = (status: number, detail: string) => reply(status, { type: '/problems/x', title: 'Refused', status, detail });
  const session = () => ({ name: 'Iris Vale', email: 'iris@example.com', role: desk.role, csrfToken: 'token-1' });

  jest.spyOn(globalThis, 'fetch').mockImplementation((input, init) => {
    const url = new URL(String(input), 'http://desk.example.com');
    const method = init?.method ?? 'GET';
    const body: unknown = init?.body ? JSON.parse(String(init.body)) : undefined;
    if (url.pathname === '/api/company') return reply(200, { name: 'Alder & Finch Electric' });
    if (desk.down) return Promise.reject(new TypeError('Failed to fetch'));
    if (method !== 'GET') desk.changes.push({ call: `${method} ${url.pathname}`, headers: new Headers(init?.headers), body });
    if (url.pathname === '/api/session' && method === 'POST') {
      if ((body as { password: string }).password !== password) return refuse(401, 'E-mail or password is not right.');
      desk.role = 'estimator';
      return reply(200, session());
    }
    if (desk.role === null) return refuse(401, 'Sign in to go on');
    if (url.pathname === '/api/session') {
      if (method === 'GET') return reply(200, session());
      desk.role = null;
      return reply(204);
    }
    if (url.pathname === '/api/leads') return reply(200, list(desk.rows, url.searchParams));
    if (method === 'PATCH') {
      if (desk.stale > 0) {
        desk.stale -= 1;
        desk.lead = { ...desk.lead, version: desk.lead.version + 1 };
        return refuse(412, 'Someone moved this lead to “Needs a visit”.');
      }
      desk.lead = { ...desk.lead, version: desk.lead.version + 1, stage: (body as { stage: LeadStage }).stage };
    }
    return reply(200, desk.lead);
  });
  return desk;
}

function list(rows: readonly LeadRow[], query: URLSearchParams) {
  const searched = rows.filter((entry) => entry.name.toLowerCase().includes((query.get('search') ?? '').toLowerCase()));
  const fit = searched.filter((entry) => !query.get('stage') || entry.stage === query.get('stage'));
  const from = Number(query.get('cursor') ?? 0);
  const next = from + PAGE;
  return {
    leads: fit.slice(from, next), nextCursor: next < fit.length ? String(next) : null, total: fit.length,
    counts: leadStages.map((stage) => ({ stage, count: searched.filter((entry) => entry.stage === stage).length })),
  };
}
