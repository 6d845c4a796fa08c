import { createHash } from 'node:crypto';
import type { RequestHandler } from 'express';
import { refuse } from './api-error';
import type { Store } from './state';

const hashOf = (value: unknown) => createHash('sha256').update(JSON.stringify(value)).digest('hex');

/**
 * Replays the first answer for a key that was seen, refuses the same key with other parameters, and refuses it while the first
 * call is still at work. A refusal of bad parameters is not kept. Source: the provider's documentation of idempotent requests
 * (from memory).
 */
export function idempotency({ state, save }: Store): RequestHandler {
  const atWork = new Set<string>();
  return (request, response, next) => {
    const key = request.get('idempotency-key');
    if (key === undefined || request.method !== 'POST') return next();
    const paramsHash = hashOf(request.body);
    const seen = state.replays[key];
    if (seen && (seen.path !== request.path || seen.paramsHash !== paramsHash)) {
      throw refuse(400, {
        type: 'idempotency_error',
        message: `Keys for idempotent requests can only be used with the same parameters they were first used with. Try using a key other than '${key}' if you meant to execute a different request.`,
      });
    }
    if (seen) {
      response.set('Idempotent-Replayed', 'true').set('Idempotency-Key', key).status(seen.status).type('json').send(seen.body);
      return;
    }
    if (atWork.has(key)) throw refuse(409, { type: 'idempotency_error', code: 'idempotency_key_in_use', message: 'There is currently another in-progress request using this key.' });
    atWork.add(key);
    response.once('close', () => atWork.delete(key));
    const json = response.json.bind(response);
    response.json = (body: unknown) => {
      if (response.statusCode === 200) {
        state.replays[key] = { path: request.path, paramsHash, status: 200, body: JSON.stringify(body) };
        save();
      }
      return json(body);
    };
    response.set('Idempotency-Key', key);
    next();
  };
}
