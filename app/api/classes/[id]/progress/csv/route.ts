import { exportClassProgress } from '@/lib/data/class-csv';
import { handleRead } from '../../../../_http/handle';
import { privateHeaders, problem } from '../../../../_http/problem';

interface Context {
  params: Promise<{ id: string }>;
}

/** The progress of a class as a CSV file, for its instructors and the administrator. */
export async function GET(_request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  return handleRead(async (viewer) => {
    const csv = await exportClassProgress(viewer, id);
    if (csv === null) return problem(404, 'There is no such class.');
    return new Response(csv, {
      headers: {
        ...privateHeaders,
        'Content-Type': 'text/csv; charset=utf-8',
        'Content-Disposition': 'attachment; filename="class-progress.csv"',
      },
    });
  });
}
