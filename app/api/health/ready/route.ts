import { isDatabaseReady } from '@/lib/data/entry/health';
import { json, problem } from '../../_http/problem';

export const dynamic = 'force-dynamic';

/** The database answers and has the shape that this code expects. */
export async function GET(): Promise<Response> {
  const ready = await isDatabaseReady({ by: 'job', job: 'health' });
  return ready ? json({ status: 'ready' }) : problem(503, 'The database is not ready.');
}
