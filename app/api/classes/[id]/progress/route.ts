import { findClassProgress } from '@/lib/data/class-progress';
import { handleRead } from '../../../_http/handle';
import { json, problem } from '../../../_http/problem';

interface Context {
  params: Promise<{ id: string }>;
}

/** The progress of a class, for its instructors and the administrator. */
export async function GET(_request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  return handleRead(async (viewer) => {
    const progress = await findClassProgress(viewer, id);
    return progress === null ? problem(404, 'There is no such class.') : json(progress);
  });
}
