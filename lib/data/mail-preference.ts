import 'server-only';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';

/** Whether the viewer gets letters about their classes. */
export async function wantsClassMail(viewer: Viewer): Promise<boolean> {
  const found = await row<{ wants: boolean }>(
    'select wants_class_mail as wants from people where id = $1',
    [viewer.personId],
  );
  return found?.wants ?? false;
}

/** Lets letters about classes come to the viewer, or ends them. */
export async function changeClassMail(viewer: Viewer, wants: boolean): Promise<void> {
  await transact(async (transaction) => {
    const changed = await rows(
      `update people set wants_class_mail = $2, updated_at = now()
       where id = $1 and wants_class_mail <> $2 returning id`,
      [viewer.personId, wants],
      transaction,
    );
    if (changed.length === 0) return;
    await recordAudit(
      {
        actorId: viewer.personId,
        action: wants ? 'class mail wanted' : 'class mail ended',
        objectKind: 'person',
        objectId: viewer.personId,
      },
      transaction,
    );
  });
}
