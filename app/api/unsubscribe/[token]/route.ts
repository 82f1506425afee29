import { now } from '@/lib/clock';
import { unsubscribe } from '@/lib/data/entry/unsubscribe';
import { siteEnvironment } from '@/lib/env';
import { handleOpen } from '../../_http/handle';
import { json, problem } from '../../_http/problem';

interface Context {
  params: Promise<{ token: string }>;
}

/** The form that RFC 8058 has mail programs send is a few bytes long. */
const LARGEST_BODY = 4096;

/** Somebody has followed the address out of the letter's headers: they are shown the page. */
export async function GET(_request: Request, { params }: Context): Promise<Response> {
  const { token } = await params;
  const page = `${siteEnvironment().address}/unsubscribe/${encodeURIComponent(token)}`;
  return new Response(null, {
    status: 303,
    headers: { Location: page, 'Cache-Control': 'no-store', 'Referrer-Policy': 'no-referrer' },
  });
}

/**
 * One click in a mail program (RFC 8058). It comes from anywhere, without an Origin and without a
 * cookie: the signed token is the proof, and all that it can do is to end letters.
 */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  return handleOpen(async () => {
    const { token } = await params;
    if (!(await isOneClick(request))) {
      return problem(422, 'Send the form List-Unsubscribe=One-Click.');
    }
    const ended = await unsubscribe({ by: 'unsubscribe', token }, now());
    return ended ? json({ ended: true }) : problem(404, 'There is no such address.');
  });
}

async function isOneClick(request: Request): Promise<boolean> {
  if (Number(request.headers.get('content-length') ?? 0) > LARGEST_BODY) return false;
  try {
    return (await request.formData()).get('List-Unsubscribe') === 'One-Click';
  } catch {
    return false;
  }
}
