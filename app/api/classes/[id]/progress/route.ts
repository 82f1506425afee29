import { findClassProgress } from '@/lib/data/class-progress';
import { hideNames } from '@/lib/data/hidden-names';
import { findClassVersion } from '@/lib/data/class-version';
import type { Viewer } from '@/lib/policy/viewer';
import { handleRead } from '../../../_http/handle';
import { privateHeaders, problem } from '../../../_http/problem';

interface Context {
  params: Promise<{ id: string }>;
}

/** The last answer for each class, with names and without, with its version; whoever gets it has passed the version's right. */
const answered = new Map<string, { readonly version: string; readonly body: string }>();
const mostAnswered = 50;

/**
 * The progress of a class, for its instructors and the administrator. Conditional: a page that has
 * the present version is told so, and nothing is read but the version. `?names=hidden` leaves out
 * everything that tells who is who.
 */
export async function GET(request: Request, { params }: Context): Promise<Response> {
  const { id } = await params;
  const names = new URL(request.url).searchParams.get('names') ?? 'shown';
  return handleRead(async (viewer) => {
    if (names !== 'shown' && names !== 'hidden') {
      return problem(422, 'Names are “shown” or “hidden”.');
    }
    const version = await findClassVersion(viewer, id);
    if (version === null) return problem(404, 'There is no such class.');
    const headers = { ...privateHeaders, ETag: `"${version}-${names}"` };
    if (request.headers.get('if-none-match') === headers.ETag) {
      return new Response(null, { status: 304, headers });
    }
    const key = `${id} ${names}`;
    const known = answered.get(key);
    const body = known?.version === version ? known.body : await write(viewer, id, names);
    keep(key, version, body);
    return new Response(body, { headers: { ...headers, 'Content-Type': 'application/json' } });
  });
}

async function write(viewer: Viewer, id: string, names: 'shown' | 'hidden'): Promise<string> {
  const progress = await findClassProgress(viewer, id);
  return JSON.stringify(progress !== null && names === 'hidden' ? hideNames(progress) : progress);
}

function keep(key: string, version: string, body: string): void {
  answered.delete(key);
  answered.set(key, { version, body });
  const [oldest] = answered.keys();
  if (answered.size > mostAnswered && oldest !== undefined) answered.delete(oldest);
}
