import 'server-only';
import { stringify } from 'csv-stringify/sync';
import { now as presentTime } from '@/lib/clock';
import { rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { ownRecordRules } from './own-record-rules';
import { hasGivenPassword } from './password-given';

/** Everything that is kept of somebody, part by part. */
export interface OwnRecords {
  readonly writtenAt: string;
  readonly parts: Readonly<Record<string, readonly object[]>>;
}

/**
 * Everything that is kept under the viewer's person and learner keys, as it is stored; what would give
 * an open round's answer away is left out until the round is closed. Null when the password was given
 * too long ago.
 */
export async function takeOwnRecords(
  viewer: Viewer,
  now: Date = presentTime(),
): Promise<OwnRecords | null> {
  if (!(await hasGivenPassword(viewer, now))) return null;
  return transact(async (transaction) => {
    const parts: Record<string, readonly object[]> = {};
    for (const { part, sql } of ownRecordRules) {
      parts[part] = await rows(sql, [viewer.personId, viewer.learnerId], transaction);
    }
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'own records taken away',
        objectKind: 'person',
        objectId: viewer.personId,
      },
      transaction,
    );
    return { writtenAt: now.toISOString(), parts };
  });
}

/** One part of the records as CSV, with a line of names above; a cell never begins a formula. */
export function asCsv(part: readonly object[]): string {
  const [first] = part;
  return stringify(
    part.map((line) =>
      Object.fromEntries(Object.entries(line).map(([name, value]) => [name, cell(value)])),
    ),
    { header: first !== undefined, bom: true, escape_formulas: true, record_delimiter: 'windows' },
  );
}

function cell(value: unknown): string {
  if (value === null || value === undefined) return '';
  if (value instanceof Date) return value.toISOString();
  return typeof value === 'object' ? JSON.stringify(value) : String(value);
}
