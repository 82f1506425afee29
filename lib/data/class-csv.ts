import 'server-only';
import { stringify } from 'csv-stringify/sync';
import { transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { findClassProgress } from './class-progress';

/**
 * The progress of a class as CSV, one line a learner and exercise, for its staff; null for anybody
 * else. A cell that a spreadsheet would take for a formula is guarded. Taking it away is audited.
 */
export async function exportClassProgress(viewer: Viewer, classId: string): Promise<string | null> {
  const progress = await findClassProgress(viewer, classId);
  if (progress === null) return null;
  await transact((transaction) =>
    recordAudit(
      {
        actorId: viewer.personId,
        action: 'class progress exported',
        objectKind: 'class',
        objectId: classId,
        classId,
      },
      transaction,
    ),
  );
  const titles = new Map(
    progress.lessons.flatMap(({ exercises }) =>
      exercises.map(({ exerciseId, title }) => [exerciseId, title] as const),
    ),
  );
  const lines = progress.learners.flatMap(({ name, lessons }) =>
    lessons.flatMap(({ lessonId, exercises }) =>
      exercises.map(({ exerciseId, mark, attempts, late, overridden }) => [
        name,
        progress.lessons.find((lesson) => lesson.lessonId === lessonId)?.title ?? lessonId,
        titles.get(exerciseId) ?? exerciseId,
        mark === 'none' ? 'not begun' : mark,
        attempts,
        late ? 'late' : '',
        overridden ? 'marked otherwise' : '',
      ]),
    ),
  );
  const head = ['Learner', 'Lesson', 'Exercise', 'Mark', 'Attempts', 'Late', 'Override'];
  return stringify([head, ...lines], { escape_formulas: true, record_delimiter: 'windows' });
}
