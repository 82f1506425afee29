import { createHash } from 'node:crypto';
import { writeCalendar } from '@/lib/calendar/write-calendar';
import { now } from '@/lib/clock';
import { findCalendarFeed } from '@/lib/data/entry/calendar-feed';
import { handleOpen } from '../../_http/handle';
import { privateHeaders, problem } from '../../_http/problem';

interface Context {
  params: Promise<{ secret: string }>;
}

/** Due dates for a calendar program; the secret in the address is the proof. */
export async function GET(request: Request, { params }: Context): Promise<Response> {
  return handleOpen(async () => {
    const { secret } = await params;
    const events = await findCalendarFeed({ by: 'feed', secret }, now());
    if (events === null) return problem(404, 'There is no such calendar.');
    const body = writeCalendar(events);
    const etag = `"${createHash('sha256').update(body).digest('base64url')}"`;
    const headers = {
      ...privateHeaders,
      // Kept by the calendar program alone, which asks each time whether it still holds.
      'Cache-Control': 'private, no-cache',
      ETag: etag,
      'Referrer-Policy': 'no-referrer',
    };
    if (knows(request, etag)) return new Response(null, { status: 304, headers });
    return new Response(body, {
      headers: {
        ...headers,
        'Content-Type': 'text/calendar; charset=utf-8',
        'Content-Disposition': 'inline; filename="hornbeam.ics"',
      },
    });
  });
}

/** Whether the asker names this version; the comparison is the weak one (RFC 9110, 13.1.2). */
function knows(request: Request, etag: string): boolean {
  const known = request.headers.get('if-none-match') ?? '';
  return known.split(',').some((one) => one.trim().replace(/^W\//, '') === etag);
}
