import { siteEnvironment } from '@/lib/env';
import { problem } from './problem';

/**
 * Refuses a writing request that did not come from a page of this site, or null. A browser says
 * where it comes from in `Origin`; a request without it is refused too, since nothing of ours
 * sends one. `Sec-Fetch-Site` is believed where it is stricter.
 */
export function refuseForeignOrigin(request: Request): Response | null {
  const origin = request.headers.get('origin');
  const site = request.headers.get('sec-fetch-site');
  const ours = new URL(siteEnvironment().address).origin;
  if (origin !== ours || (site !== null && site !== 'same-origin')) {
    return problem(403, 'This can only be asked for by a page of this site.');
  }
  return null;
}

/** Refuses a body that is not declared as JSON, or null. */
export function refuseOtherContent(request: Request): Response | null {
  const type = request.headers.get('content-type') ?? '';
  return /^application\/json\s*(;|$)/i.test(type)
    ? null
    : problem(415, 'Send the body as application/json.');
}
