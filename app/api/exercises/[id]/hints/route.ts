import { takeHint } from '@/lib/data/rounds';
import { hintRequestSchema } from '@/lib/schemas/round';
import { handleWrite } from '../../../_http/handle';
import { json, problem } from '../../../_http/problem';

interface Context {
  params: Promise<{ id: string }>;
}

/** Records that a hint was taken, and answers the round with it. */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  return handleWrite(request, hintRequestSchema, async (viewer, { roundId, hint }) => {
    const round = await takeHint(viewer, id, roundId, hint);
    return round === null ? problem(404, 'There is no such round.') : json(round);
  });
}
