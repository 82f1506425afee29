import { randomUUID } from 'node:crypto';
import * as z from 'zod/mini';
import { currentViewer } from '@/lib/auth/viewer';
import { troubleOf, type Trouble } from '@/lib/db/trouble';
import type { Viewer } from '@/lib/policy/viewer';
import { refuseForeignOrigin, refuseOtherContent } from './guard';
import { problem } from './problem';

/** The largest body that is read: answers are short. */
const LARGEST_BODY = 64 * 1024;

/** Answers a request that carries its own proof, whoever sends it; surprises are logged under an id. */
export async function handleOpen(work: () => Promise<Response>): Promise<Response> {
  return guarded(work);
}

/** Answers a reading request for a signed-in person; surprises are logged under an id. */
export async function handleRead(work: (viewer: Viewer) => Promise<Response>): Promise<Response> {
  return guarded(async () => {
    const viewer = await currentViewer();
    return viewer === null ? problem(401, 'Sign in first.') : work(viewer);
  });
}

/**
 * Answers a writing request: where it comes from → who asks → what is sent (an unknown key is an
 * error) → the work itself.
 */
export async function handleWrite<Schema extends z.ZodMiniType>(
  request: Request,
  schema: Schema,
  work: (viewer: Viewer, body: z.output<Schema>) => Promise<Response>,
): Promise<Response> {
  return guarded(async () => {
    const refused = refuseForeignOrigin(request) ?? refuseOtherContent(request);
    if (refused) return refused;
    const viewer = await currentViewer();
    if (viewer === null) return problem(401, 'Sign in first.');
    const body = await readBody(request);
    if (body instanceof Response) return body;
    const parsed = z.safeParse(schema, body.value);
    if (!parsed.success) {
      return problem(422, 'Some of it is missing or not as expected.', {
        errors: parsed.error.issues.map((issue) => ({
          field: issue.path.map(String).join('.'),
          message: issue.message,
        })),
      });
    }
    return work(viewer, parsed.data);
  });
}

async function readBody(request: Request): Promise<{ value: unknown } | Response> {
  if (Number(request.headers.get('content-length') ?? 0) > LARGEST_BODY) return problem(413);
  const text = await request.text();
  if (text.length > LARGEST_BODY) return problem(413);
  try {
    return { value: JSON.parse(text) as unknown };
  } catch {
    return problem(400, 'The body is not JSON.');
  }
}

/** What a person is told when the database cannot serve just now, and in how many seconds to ask again. */
const troubles: Readonly<Record<Trouble, readonly [sentence: string, retryAfter: number]>> = {
  full: [
    'The disk that keeps the records is full. Nothing was stored and nothing is damaged: tell whoever runs the machine, and send it again afterwards.',
    60,
  ],
  away: ['The records cannot be reached just now. Nothing was stored: try again in a moment.', 5],
  busy: ['Too many are asking at once. Nothing was stored: try again in a moment.', 2],
};

/**
 * No surprise leaves as a stack trace: it is logged, and the person is told its id. The log gets the
 * stack alone, since a database error also carries the values of its statement.
 */
async function guarded(work: () => Promise<Response>): Promise<Response> {
  try {
    return await work();
  } catch (error) {
    const id = randomUUID();
    console.error(`[${id}]`, error instanceof Error ? error.stack : error);
    const trouble = troubleOf(error);
    if (trouble === null)
      return problem(500, 'Try again; if it happens again, tell us this number.', { id });
    const [sentence, retryAfter] = troubles[trouble];
    return problem(503, sentence, { id, headers: { 'Retry-After': String(retryAfter) } });
  }
}
