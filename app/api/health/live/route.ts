import { json } from '../../_http/problem';

export const dynamic = 'force-dynamic';

/** The process answers; nothing else is asked. */
export function GET(): Response {
  return json({ status: 'live' });
}
