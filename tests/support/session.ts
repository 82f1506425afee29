import { signInByForm } from '../../scripts/machine/sign-in.mjs';
import { site } from './site';

/** A session gained as a form would gain it, for asking without a browser. */
export interface Session {
  readonly cookie: string;
}

export async function openSession(email: string, password: string): Promise<Session> {
  return { cookie: await signInByForm(site().address, email, password) };
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
