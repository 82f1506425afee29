import 'server-only';
import { randomInt } from 'node:crypto';
import { UniqueConstraintError } from 'sequelize';
import { row, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { isId, staffOfOpenClass, staffValues } from './class-right';
import { timbers, tools } from './joining-words.data';

/**
 * A new joining word: a timber, a tool and four digits. There are some fifty million of them; with
 * the throttle on trying, none is found by guessing.
 *
 * @example makeJoiningWord() // 'rowan-spokeshave-0417'
 */
export function makeJoiningWord(pick: (below: number) => number = randomInt): string {
  const one = timbers[pick(timbers.length)] ?? '';
  const other = tools[pick(tools.length)] ?? '';
  return `${one}-${other}-${String(pick(10_000)).padStart(4, '0')}`;
}

/**
 * Gives a class a new joining word, by one of its instructors or the administrator; the old one
 * leads nowhere from then on, and joining is open. Answers the word, or null when it cannot be done.
 */
export async function renewJoiningWord(viewer: Viewer, classId: string): Promise<string | null> {
  if (!isId(classId)) return null;
  for (let turn = 0; turn < 5; turn += 1) {
    try {
      return await writeWord(viewer, classId, makeJoiningWord());
    } catch (error) {
      // Another class has that word: take the next.
      if (!(error instanceof UniqueConstraintError)) throw error;
    }
  }
  throw new Error('renewJoiningWord: five words in turn belonged to other classes');
}

/** Opens or closes joining by the word that a class has. False when that cannot be done. */
export async function setJoining(viewer: Viewer, classId: string, open: boolean): Promise<boolean> {
  if (!isId(classId)) return false;
  const changed = await change(
    viewer,
    classId,
    'joining_open = $4',
    `g.joining_word is not null and g.joining_open <> $4`,
    open,
    open ? 'joining opened' : 'joining closed',
  );
  return changed !== null;
}

async function writeWord(viewer: Viewer, classId: string, word: string): Promise<string | null> {
  const changes = 'joining_word = $4, joining_open = true';
  return change(viewer, classId, changes, 'true', word, 'joining word renewed');
}

/** The audit log says that the word was renewed, never the word. */
async function change(
  viewer: Viewer,
  classId: string,
  changes: string,
  condition: string,
  value: string | boolean,
  action: 'joining word renewed' | 'joining opened' | 'joining closed',
): Promise<string | null> {
  return transact(async (transaction) => {
    const changed = await row<{ word: string }>(
      `update class_groups g set ${changes}, version = g.version + 1, updated_at = now()
       where ${staffOfOpenClass} and ${condition} returning g.joining_word as word`,
      [...staffValues(viewer, classId), value],
      transaction,
    );
    if (changed === null) return null;
    await recordAudit(
      {
        actorId: viewer.personId,
        action,
        objectKind: 'class',
        objectId: classId,
        classId,
      },
      transaction,
    );
    return changed.word;
  });
}
