/**
 * An error answer of the server, as problem details (RFC 9457), turned into something that can be
 * said to a person.
 */
export class Problem extends Error {
  override readonly name = 'Problem';

  constructor(
    readonly status: number,
    readonly title: string,
    readonly detail: string | null,
    /** The number under which the server logged a surprise. */
    readonly logId: string | null = null,
  ) {
    super(detail ?? title);
  }
}

/** The server could not be reached at all: no network, or it is restarting. */
export class NetworkAway extends Error {
  override readonly name = 'NetworkAway';
}

/** True when nobody is signed in any more. */
export function isSignedOut(error: unknown): boolean {
  return error instanceof Problem && error.status === 401;
}

/**
 * True when the same request may succeed later as it stands: no network, a server that is busy or
 * restarting, or too many requests at once.
 */
export function isPassing(error: unknown): boolean {
  if (error instanceof NetworkAway) return true;
  if (!(error instanceof Problem)) return false;
  return error.status >= 500 || error.status === 429 || error.status === 408;
}

/** One or two plain sentences for a person: what happened and what to do. */
export function sentenceFor(error: unknown): string {
  if (error instanceof NetworkAway) {
    return 'The network is away just now. What you typed is still here: try again in a moment.';
  }
  if (!(error instanceof Problem)) {
    return 'Something went wrong in this page. What you typed is still here: reload and try again.';
  }
  if (error.status === 401) return 'Your session has ended. Sign in again to go on.';
  if (error.status === 403) return 'This is not yours to do.';
  if (error.status === 404) return 'This is not here any more, or is not yours to see.';
  if (error.status === 429) return 'That was too fast for us. Wait a minute and try again.';
  if (error.status === 503 && error.detail !== null) {
    return `${error.detail} What you typed is still here.`;
  }
  if (error.status >= 500) {
    const id = error.logId === null ? '' : ` Quote ${error.logId} if it goes on.`;
    return `Something broke on our side; nothing you typed is lost. Try again in a moment.${id}`;
  }
  return error.message;
}

function text(value: unknown): string | null {
  return typeof value === 'string' && value !== '' ? value : null;
}

/** Reads an error answer; anything that is not problem details still gives a usable problem. */
export async function readProblem(response: Response): Promise<Problem> {
  const body: unknown = await response.json().catch(() => null);
  const fields = typeof body === 'object' && body !== null ? { ...body } : {};
  const pick = (name: string) => text(Reflect.get(fields, name));
  return new Problem(
    response.status,
    pick('title') ?? 'That did not work',
    pick('detail'),
    pick('id'),
  );
}
