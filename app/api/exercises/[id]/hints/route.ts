import { takeHint } from '@/lib/data/rounds';
import { helpRequestSchema } from '@/lib/schemas/round';
import { handleWrite } from '../../../_http/handle';
import { json, problem } from '../../../_http/problem';

interface Context {
  params: Promise<{ id: string }>;
}

/** Records that one more hint was taken, and answers the round with it. */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  return handleWrite(request, helpRequestSchema, async (viewer, { roundId }) => {
    const round = await takeHint(viewer, id, roundId);
    return round === null ? problem(404, 'There is no such round.') : json(round);
  });
}
