import { NetworkAway, readProblem } from './problem';

/** What the server said, with the tag under which it knows it. */
export interface Kept<Value> {
  readonly tag: string | null;
  readonly value: Value;
}

/**
 * Asks one of our own addresses whether it has anything new since `kept`, which comes back itself
 * when it has not.
 * @throws Problem for an error answer, NetworkAway when none came.
 */
export async function fetchIfChanged<Value>(
  path: string,
  kept: Kept<Value> | undefined,
  signal?: AbortSignal,
): Promise<Kept<Value>> {
  const headers = new Headers({ Accept: 'application/json' });
  if (kept?.tag) headers.set('If-None-Match', kept.tag);
  const response = await ask(path, headers, signal);
  if (response.status === 304 && kept !== undefined) return kept;
  if (!response.ok) throw await readProblem(response);
  try {
    return { tag: response.headers.get('ETag'), value: (await response.json()) as Value };
  } catch (cause) {
    throw new NetworkAway('The answer broke off.', { cause });
  }
}

async function ask(path: string, headers: Headers, signal?: AbortSignal): Promise<Response> {
  try {
    return await fetch(path, { credentials: 'same-origin', cache: 'no-store', headers, signal });
  } catch (cause) {
    if (signal?.aborted === true) throw cause;
    throw new NetworkAway('No answer came.', { cause });
  }
}
