import { takeAudit } from '@/lib/data/audit-log';
import { auditQuerySchema } from '@/lib/schemas/audit';
import { handleRead } from '../_http/handle';
import { download, problem } from '../_http/problem';

/** The audit log as CSV, for the administrator; with the same query as its page. */
export async function GET(request: Request): Promise<Response> {
  return handleRead(async (viewer) => {
    const asked = auditQuerySchema.safeParse(
      Object.fromEntries(new URL(request.url).searchParams.entries()),
    );
    if (!asked.success) return problem(422, asked.error.issues[0]?.message);
    const { before: _before, ...filter } = asked.data;
    const content = await takeAudit(viewer, filter);
    return content === null
      ? problem(404, 'There is no such page.')
      : download(content, 'hornbeam-audit-log.csv', 'text/csv');
  });
}
