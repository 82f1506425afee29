import { site } from './site';

/** A session gained as a form would gain it, for asking without a browser. */
export interface Session {
  readonly cookie: string;
}

export const nobody: Session = { cookie: '' };

export async function openSession(email: string, password: string): Promise<Session> {
  const { address } = site();
  const jar = new Map<string, string>();
  const keep = (answer: Response) => {
    for (const line of answer.headers.getSetCookie()) {
      const pair = line.split(';')[0] ?? '';
      jar.set(pair.slice(0, pair.indexOf('=')), pair.slice(pair.indexOf('=') + 1));
    }
  };
  const cookie = () => [...jar].map(([name, value]) => `${name}=${value}`).join('; ');
  const first = await fetch(`${address}/api/auth/csrf`);
  keep(first);
  const { csrfToken } = (await first.json()) as { csrfToken: string };
  const answer = await fetch(`${address}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: {
      'content-type': 'application/x-www-form-urlencoded',
      origin: address,
      cookie: cookie(),
    },
    body: new URLSearchParams({ csrfToken, email, password, json: 'true' }),
  });
  keep(answer);
  if (!answer.ok) throw new Error(`${email} was refused: ${answer.status}`);
  return { cookie: cookie() };
}

export async function closeSession({ cookie }: Session): Promise<void> {
  const { address } = site();
  const first = await fetch(`${address}/api/auth/csrf`, { headers: { cookie } });
  const { csrfToken } = (await first.json()) as { csrfToken: string };
  const fresh = first.headers.getSetCookie().map((line) => line.split(';')[0]);
  await fetch(`${address}/api/auth/signout`, {
    method: 'POST',
    redirect: 'manual',
    headers: {
      'content-type': 'application/x-www-form-urlencoded',
      origin: address,
      cookie: [cookie, ...fresh].filter(Boolean).join('; '),
    },
    body: new URLSearchParams({ csrfToken, json: 'true' }),
  });
}

/**
 * Asks for a path as this session, following nothing but the framework's own step: a router's request
 * without its mark in the address is sent on to the address that has it.
 */
export async function ask(
  session: Session,
  path: string,
  init: RequestInit = {},
): Promise<Response> {
  const once = (address: string) =>
    fetch(address, {
      redirect: 'manual',
      ...init,
      headers: { cookie: session.cookie, ...init.headers },
    });
  const answer = await once(`${site().address}${path}`);
  const onward = answer.headers.get('location');
  if (onward === null || !onward.includes('_rsc')) return answer;
  return once(new URL(onward, site().address).href);
}

/** Posts JSON as the site's own pages do. */
export function post(session: Session, path: string, body: unknown, headers: HeadersInit = {}) {
  return ask(session, path, {
    method: 'POST',
    headers: {
      'content-type': 'application/json',
      origin: site().address,
      ...Object.fromEntries(new Headers(headers)),
    },
    body: JSON.stringify(body),
  });
}
