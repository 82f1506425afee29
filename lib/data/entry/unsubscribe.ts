import 'server-only';
import { createHmac, timingSafeEqual } from 'node:crypto';
import { row, transact } from '@/lib/db/query';
import { siteEnvironment } from '@/lib/env';
import { recordAudit } from '../audit';
import { isId } from '../class-right';
import type { UnsubscribeProof } from './proof';

/** Where a reader can ask for no more letters: on a page, and by one click of a mail program. */
export interface UnsubscribeAddresses {
  readonly page: string;
  readonly oneClick: string;
}

/** The two addresses for a person; the token in them is signed, does this one thing, and stays good. */
export function unsubscribeAddresses(personId: string): UnsubscribeAddresses {
  const { address } = siteEnvironment();
  const token = `${personId}.${signatureOf(personId)}`;
  return {
    page: `${address}/unsubscribe/${token}`,
    oneClick: `${address}/api/unsubscribe/${token}`,
  };
}

/** Whether the person of this token gets letters about classes; null for a token that is none. */
export async function findSubscription(proof: UnsubscribeProof): Promise<boolean | null> {
  const personId = personOf(proof.token);
  if (personId === null) return null;
  const found = await row<{ wants: boolean }>(
    'select wants_class_mail as wants from people where id = $1 and erased_at is null',
    [personId],
  );
  return found?.wants ?? null;
}

/** Ends letters about classes for the person of this token. False for a token that is none. */
export async function unsubscribe(proof: UnsubscribeProof, now: Date): Promise<boolean> {
  const personId = personOf(proof.token);
  if (personId === null) return false;
  return transact(async (transaction) => {
    const found = await row<{ wanted: boolean }>(
      `update people p set wants_class_mail = false, updated_at = $2
       from (select id, wants_class_mail from people where id = $1 for update) before
       where p.id = before.id and p.erased_at is null
       returning before.wants_class_mail as wanted`,
      [personId, now],
      transaction,
    );
    if (found === null) return false;
    if (found.wanted) {
      await recordAudit(
        {
          actorId: personId,
          action: 'class mail ended',
          objectKind: 'person',
          objectId: personId,
        },
        transaction,
      );
    }
    return true;
  });
}

function personOf(token: string): string | null {
  const [personId = '', signature = '', ...more] = token.split('.');
  if (more.length > 0 || !isId(personId)) return null;
  const [given, right] = [signature, signatureOf(personId)].map((text) => Buffer.from(text));
  if (given === undefined || right === undefined || given.length !== right.length) return null;
  return timingSafeEqual(given, right) ? personId : null;
}

function signatureOf(personId: string): string {
  return createHmac('sha256', siteEnvironment().secret)
    .update(`unsubscribe:${personId}`)
    .digest('base64url');
}
