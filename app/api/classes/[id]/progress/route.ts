import { findClassProgress } from '@/lib/data/class-progress';
import { findClassVersion } from '@/lib/data/class-version';
import { handleRead } from '../../../_http/handle';
import { privateHeaders, problem } from '../../../_http/problem';

interface Context {
  params: Promise<{ id: string }>;
}

/** The last answer for each class, with its version; whoever gets it has passed the version's right. */
const answered = new Map<string, { readonly version: string; readonly body: string }>();
const mostAnswered = 50;

/**
 * The progress of a class, for its instructors and the administrator. Conditional: a page that has
 * the present version is told so, and nothing is read but the version.
 */
export async function GET(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  return handleRead(async (viewer) => {
    const version = await findClassVersion(viewer, id);
    if (version === null) return problem(404, 'There is no such class.');
    const headers = { ...privateHeaders, ETag: `"${version}"` };
    if (request.headers.get('if-none-match') === headers.ETag) {
      return new Response(null, { status: 304, headers });
    }
    const known = answered.get(id);
    const body =
      known?.version === version ? known.body : JSON.stringify(await findClassProgress(viewer, id));
    keep(id, version, body);
    return new Response(body, { headers: { ...headers, 'Content-Type': 'application/json' } });
  });
}

function keep(classId: string, version: string, body: string): void {
  answered.delete(classId);
  answered.set(classId, { version, body });
  const [oldest] = answered.keys();
  if (answered.size > mostAnswered && oldest !== undefined) answered.delete(oldest);
}
