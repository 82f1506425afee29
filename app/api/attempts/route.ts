import * as z from 'zod/mini';
import { takeAttempt } from '@/lib/data/attempt-allowance';
import { createAttempt, type AttemptOutcome } from '@/lib/data/attempts';
import { attemptRequestSchema } from '@/lib/schemas/round';
import { handleWrite } from '../_http/handle';
import { json, problem } from '../_http/problem';

const keySchema = z.uuid();

/**
 * Marks a response and keeps it. The `Idempotency-Key`, a UUID, makes a repeated request harmless:
 * it has the same one attempt and the same answer.
 */
export async function POST(request: Request): Promise<Response> {
  return handleWrite(request, attemptRequestSchema, async (viewer, body) => {
    const key = z.safeParse(keySchema, request.headers.get('idempotency-key'));
    if (!key.success) return problem(400, 'Send an Idempotency-Key, which is a UUID.');
    const allowed = await takeAttempt(viewer);
    if (!allowed.allowed) {
      return problem(429, 'That was too fast. Wait, and send it again under the same key.', {
        headers: { 'Retry-After': String(allowed.retryAfter) },
      });
    }
    return answer(await createAttempt(viewer, body, key.data.toLowerCase()));
  });
}

function answer(result: AttemptOutcome): Response {
  switch (result.outcome) {
    case 'kept':
      return json(result.reply, 201);
    case 'refused':
      return problem(422, result.errors.map(({ message }) => message).join(' '), {
        title: 'That cannot be read',
        errors: result.errors.map(({ key, message }) => ({ field: key, message })),
      });
    case 'no such round':
      return problem(404, 'There is no such round.');
    case 'round closed':
      return problem(409, 'This round is closed. Take another for new numbers.', {
        title: 'The round is closed',
      });
    case 'key used for another answer':
      return problem(422, 'This Idempotency-Key was sent with another answer before.');
  }
}
