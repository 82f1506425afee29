import 'server-only';
import { cookies, headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { cache } from 'react';
import { now } from '@/lib/clock';
import { findViewer } from '@/lib/data/entry/sessions';
import type { Viewer } from '@/lib/policy/viewer';
import { readSessionSecret, sessionCookieName } from './cookie';

/** The header in which `proxy.ts` notes the path of a document. */
export const pathHeader = 'x-hornbeam-path';

/** Who asks, looked up in the sessions once a request; null when nobody is signed in. */
export const currentViewer = cache(async (): Promise<Viewer | null> => {
  if (isFormOfUnknownOrigin(await headers())) return null;
  const jar = await cookies();
  const secret = await readSessionSecret(jar.get(sessionCookieName())?.value);
  return secret === null ? null : findViewer({ by: 'session', secret }, now());
});

/**
 * A form or server action that does not say where it comes from: every browser says it. The framework
 * refuses those from elsewhere by itself, and lets these pass.
 */
function isFormOfUnknownOrigin(sent: Pick<Headers, 'get' | 'has'>): boolean {
  const isForm =
    sent.has('next-action') ||
    /^(multipart\/form-data|application\/x-www-form-urlencoded)\b/i.test(
      sent.get('content-type') ?? '',
    );
  return isForm && !sent.has('origin');
}

/** Who asks; somebody who is not signed in is sent to sign in, and comes back here afterwards. */
export async function requireViewer(): Promise<Viewer> {
  const viewer = await currentViewer();
  if (viewer !== null) return viewer;
  const path = (await headers()).get(pathHeader);
  redirect(path === null ? '/sign-in' : `/sign-in?from=${encodeURIComponent(path)}`);
}
