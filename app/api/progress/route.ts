import { listPegs } from '@/lib/data/progress';
import { handleRead } from '../_http/handle';
import { json } from '../_http/problem';

/** The pegs of whoever asks. */
export function GET(): Promise<Response> {
  return handleRead(async (viewer) => json({ pegs: await listPegs(viewer) }));
}
