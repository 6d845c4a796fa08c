import { answersPatchSchema, type Intake } from '../../../shared/api/intakes';
import type { LiveRange } from '../../../shared/quote';

const company = {
  name: 'Alder & Finch Electric', phone: '555-0142', licence: 'Demo', postalAddress: 'Demo', email: 'office@example.com',
  towns: [{ name: 'Harrow Bend', zips: ['00017', '00018'] }], openingLowCents: 95_000, openingHighCents: 435_000, depositCents: 15_000, demo: true,
};
const noRange: LiveRange = { outcome: 'too-early', lowCents: null, highCents: null, optionTitle: null, narrowing: [], flags: [], load: null, plan: null, planProblems: [] };

export interface FakeApi {
  readonly answers: Record<string, unknown>;
  /** Bodies of every save that arrived. */
  readonly saves: Record<string, unknown>[];
  /** How many of the next calls find no server. */
  down: number;
  gone: boolean;
  range: LiveRange;
}

/** The API of one intake in memory, validating as the server does. Answers of the real endpoints' shapes; homes invented. */
export function fakeApi(answers: Record<string, unknown> = {}, range: LiveRange = noRange): FakeApi {
  const api: FakeApi = { answers: { ...answers }, saves: [], down: 0, gone: false, range };
  let version = 0;
  const intake = (): Intake => ({
    version, answers: { ...api.answers }, town: api.answers.zip === '00017' ? 'Harrow Bend' : null, served: typeof api.answers.zip === 'string' ? api.answers.zip === '00017' : null,
    photos: [], range: api.range, stage: 'open', savedTo: null,
  });
  const reply = (status: number, body: unknown) => Promise.resolve({ status, text: () => Promise.resolve(body === undefined ? '' : JSON.stringify(body)) } as Response);
  const refuse = (status: number, errors?: unknown) => reply(status, { type: '/problems/x', title: 'Refused', status, errors });

  jest.spyOn(globalThis, 'fetch').mockImplementation((input, init) => {
    const [path, method] = [String(input), init?.method ?? 'GET'];
    if (path === '/api/company') return reply(200, company);
    if (api.down > 0) {
      api.down -= 1;
      return Promise.reject(new TypeError('Failed to fetch'));
    }
    if (api.gone) return refuse(404);
    if (path === '/api/intakes/current/answers' && method === 'PATCH') {
      const body: unknown = JSON.parse(String(init?.body));
      const parsed = answersPatchSchema.safeParse(body);
      if (!parsed.success) return refuse(422, parsed.error.issues.map((issue) => ({ pointer: `/${issue.path.join('/')}`, detail: issue.message })));
      api.saves.push(parsed.data.answers);
      for (const [id, value] of Object.entries(parsed.data.answers)) {
        if (value === null) delete api.answers[id];
        else api.answers[id] = value;
      }
      version += 1;
      return reply(200, intake());
    }
    if (path === '/api/outside-area') return reply(204, undefined);
    if (path === '/api/intakes/current/finish-later') return reply(200, { sentTo: 'm•••@example.com', openUntil: '2026-06-11T17:00:00Z' });
    return reply(200, intake());
  });
  return api;
}
