import { showSolution } from '@/lib/data/rounds';
import { helpRequestSchema } from '@/lib/schemas/round';
import { handleWrite } from '../../../_http/handle';
import { json, problem } from '../../../_http/problem';

interface Context {
  params: Promise<{ id: string }>;
}

/** Shows the worked solution of a round, which closes it. */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  return handleWrite(request, helpRequestSchema, async (viewer, { roundId }) => {
    const round = await showSolution(viewer, id, roundId);
    return round === null ? problem(404, 'There is no such round.') : json(round);
  });
}
