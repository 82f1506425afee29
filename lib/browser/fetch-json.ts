import { NetworkAway, readProblem } from './problem';

/** How to ask: a `body` makes it a POST of JSON. */
export interface Asking {
  readonly body?: unknown;
  readonly idempotencyKey?: string;
  readonly signal?: AbortSignal;
}

/**
 * Asks one of our own addresses for JSON, with the session's cookie.
 *
 * The answer is trusted to have the shape `T`, since the same schemas type the handler.
 * @throws Problem for an error answer, NetworkAway when none came.
 */
export async function fetchJson<T>(path: string, asking: Asking = {}): Promise<T> {
  const response = await send(path, asking);
  if (!response.ok) throw await readProblem(response);
  try {
    return (await response.json()) as T;
  } catch (cause) {
    throw new NetworkAway('The answer broke off.', { cause });
  }
}

async function send(path: string, { body, idempotencyKey, signal }: Asking): Promise<Response> {
  const headers = new Headers({ Accept: 'application/json' });
  if (body !== undefined) headers.set('Content-Type', 'application/json');
  if (idempotencyKey !== undefined) headers.set('Idempotency-Key', idempotencyKey);
  try {
    return await fetch(path, {
      method: body === undefined ? 'GET' : 'POST',
      credentials: 'same-origin',
      cache: 'no-store',
      headers,
      body: body === undefined ? undefined : JSON.stringify(body),
      signal,
    });
  } catch (cause) {
    if (signal?.aborted === true) throw cause;
    throw new NetworkAway('No answer came.', { cause });
  }
}
