export const dynamic = 'force-dynamic';

/** A handler that does nothing: what the benchmark measures all others against. */
export function GET(): Response {
  return Response.json({ status: 'floor' });
}

/** The same for a post. */
export function POST(): Response {
  return Response.json({ status: 'floor' });
}
