import 'server-only';
import { rows } from '@/lib/db/query';
import { migrations } from '@/lib/db/migrations';
import type { JobProof } from './proof';

/** Whether the database answers within a second and has had exactly the code's migrations. */
export async function isDatabaseReady(_proof: JobProof): Promise<boolean> {
  try {
    const applied = await Promise.race([
      rows<{ name: string }>('select name from migrations order by name'),
      new Promise<null>((resolve) => setTimeout(resolve, 1_000, null)),
    ]);
    return (
      applied !== null &&
      applied.map(({ name }) => name).join() === migrations.map(({ name }) => name).join()
    );
  } catch {
    return false;
  }
}
