import { openRound } from '@/lib/data/rounds';
import { roundRequestSchema } from '@/lib/schemas/round';
import { handleWrite } from '../../../_http/handle';
import { json, problem } from '../../../_http/problem';

interface Context {
  params: Promise<{ id: string }>;
}

/** Opens the round of whoever asks, or answers the one that is open. */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  return handleWrite(request, roundRequestSchema, async (viewer, { units }) => {
    const round = await openRound(viewer, { exerciseId: id, units });
    return round === null ? problem(404, 'There is no such exercise.') : json(round);
  });
}
