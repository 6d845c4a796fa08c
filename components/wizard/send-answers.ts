import type { QueryClient } from '@tanstack/react-query';
import { saveAnswers } from '../../shared/api/intakes';
import type { Answers } from '../../shared/wizard/index';
import { isProblem, problemByField, request } from '../api/client';
import { keepNewer } from '../api/use-intake';
import type { SendResult } from './answer-queue';

/** One attempt to save; takes over the intake that comes back, with the range that follows from the answers. */
export async function sendAnswers(client: QueryClient, answers: Answers, leaving: boolean): Promise<SendResult> {
  try {
    keepNewer(client, await request(saveAnswers, { body: { answers }, keepalive: leaving }));
    return { kind: 'saved' };
  } catch (error) {
    if (isProblem(error, 401, 404, 410)) return { kind: 'gone' };
    if (!isProblem(error, 400, 422)) return { kind: 'failed' };
    return { kind: 'refused', fields: refusedFields(error, answers) };
  }
}

/** Which of the sent answers were refused, and why. When the server names none of them, all are. */
function refusedFields(error: unknown, sent: Answers): Readonly<Record<string, string>> {
  const problem = isProblem(error) ? error.problem : null;
  const named = (problem?.errors ?? []).flatMap(({ pointer, detail }) => {
    const id = pointer.split('/')[2];
    return id !== undefined && id in sent ? [[id, detail] as const] : [];
  });
  if (named.length > 0) return Object.fromEntries(named.reverse());
  const words = problemByField(error)[''] ?? problem?.detail ?? 'This answer could not be kept. Pick or type it again.';
  return Object.fromEntries(Object.keys(sent).map((id) => [id, words]));
}
