import { getLead, listLeads } from '../../../shared/api/desk';
import { saveAnswers } from '../../../shared/api/intakes';
import { apiAddress, newIdempotencyKey, NetworkError, ProblemError, problemByField, request } from '../../../components/api/client';

const answer = (status: number, body: unknown) => {
  const text = body === undefined ? '' : typeof body === 'string' ? body : JSON.stringify(body);
  const fetched = jest.fn().mockResolvedValue({ status, text: () => Promise.resolve(text) });
  jest.spyOn(globalThis, 'fetch').mockImplementation(fetched);
  return fetched;
};

describe('calls of the API', () => {
  it('fills the address from params and query', () => {
    expect(apiAddress('/leads/{id}', { id: 'a/b' })).toBe('/api/leads/a%2Fb');
    expect(apiAddress('/leads', undefined, { search: 'oak & elm', stage: undefined, cursor: '' })).toBe('/api/leads?search=oak+%26+elm');
  });
  it('sends the body as JSON, with the key of the attempt', async () => {
    const fetched = answer(200, { version: 2 });
    await expect(request(saveAnswers, { body: { answers: { zip: '00017' } }, idempotencyKey: 'k', keepalive: true })).resolves.toEqual({ version: 2 });
    expect(fetched).toHaveBeenCalledWith('/api/intakes/current/answers', expect.objectContaining({ method: 'PATCH', body: '{"answers":{"zip":"00017"}}', keepalive: true }));
    expect(fetched.mock.calls[0]?.[1]).toMatchObject({ headers: { 'Idempotency-Key': 'k', 'Content-Type': 'application/json' } });
  });
  // Shape: RFC 9457 with errors[].pointer (RFC 6901), as shared/problem.ts declares it.
  it('turns a problem document into its error, field by field', async () => {
    answer(422, { type: '/problems/validation', title: 'Some answers need another look', status: 422, errors: [{ pointer: '/answers/zip', detail: 'Type the five digits of the ZIP' }] });
    const error: unknown = await request(saveAnswers, { body: { answers: { zip: 'x' } } }).catch((caught: unknown) => caught);
    expect(error).toBeInstanceOf(ProblemError);
    expect(problemByField(error)).toEqual({ zip: 'Type the five digits of the ZIP' });
  });
  it('makes a calm problem of an answer that is none', async () => {
    answer(502, '<html>bad gateway</html>');
    await expect(request(listLeads, { query: {} })).rejects.toMatchObject({ status: 502, problem: { title: 'Something went wrong on our side' } });
  });
  it('tells no answer from a refusal', async () => {
    jest.spyOn(globalThis, 'fetch').mockRejectedValue(new TypeError('Failed to fetch'));
    await expect(request(getLead, { params: { id: '7' } })).rejects.toBeInstanceOf(NetworkError);
  });
  it('makes a new key for each attempt', () => {
    const keys = new Set(Array.from({ length: 50 }, newIdempotencyKey));
    expect(keys.size).toBe(50);
    expect([...keys][0]).toMatch(/^[0-9a-f]{32}$/);
  });
});
