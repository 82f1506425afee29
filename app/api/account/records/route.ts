import * as z from 'zod/mini';
import { asCsv, takeOwnRecords } from '@/lib/data/own-records';
import { handleRead } from '../../_http/handle';
import { download, problem } from '../../_http/problem';

const querySchema = z.strictObject({ part: z.optional(z.literal('attempts')) });

/** Everything that is kept of whoever asks, as JSON; with `part=attempts` their attempts as CSV. */
export async function GET(request: Request): Promise<Response> {
  return handleRead(async (viewer) => {
    const query = querySchema.safeParse(
      Object.fromEntries(new URL(request.url).searchParams.entries()),
    );
    if (!query.success) return problem(422, 'Ask for everything, or for part=attempts.');
    const records = await takeOwnRecords(viewer);
    if (records === null) {
      return problem(403, 'Give your password again on the account page first.', {
        title: 'The password is wanted again',
      });
    }
    return query.data.part === undefined
      ? download(JSON.stringify(records, null, 2), 'hornbeam-records.json', 'application/json')
      : download(asCsv(records.parts.attempts ?? []), 'hornbeam-attempts.csv', 'text/csv');
  });
}
