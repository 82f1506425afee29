import 'server-only';
import { exercises, lessons, skills } from '@/content/exercises/registry';
import { now as presentTime } from '@/lib/clock';
import { rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import type { PegView } from '@/lib/schemas/round';
import { lastRoundsSql, pegViews, skillRounds, type LastRoundRow } from './pegs';

/** How the viewer stands with one exercise. */
export interface ExerciseStanding {
  readonly exerciseId: string;
  readonly title: string;
  /** The best attempt so far: `none` before the first. */
  readonly mark: 'none' | 'right' | 'partly' | 'wrong';
  readonly attempts: number;
  /** Whether a round is open, with an attempt or a hint or without. */
  readonly open: boolean;
}

/** How the viewer stands with a lesson. */
export interface LessonProgress {
  readonly lessonId: string;
  /** Whether the prediction is stored, which opens the bench. */
  readonly predicted: boolean;
  readonly pegs: readonly PegView[];
  readonly exercises: readonly ExerciseStanding[];
}

/** The pegs of every skill, lesson by lesson. */
export async function listPegs(viewer: Viewer, now: Date = presentTime()): Promise<PegView[]> {
  return pegsOf(viewer, [...skills.keys()], now);
}

/** How the viewer stands with a lesson; null when there is none of this name. */
export async function findLessonProgress(
  viewer: Viewer,
  lessonId: string,
  now: Date = presentTime(),
): Promise<LessonProgress | null> {
  const lesson = lessons.find(({ id }) => id === lessonId);
  if (lesson === undefined) return null;
  const [pegs, standings] = await Promise.all([
    pegsOf(viewer, lesson.skills, now),
    rows<StandingRow>(standingSql, [viewer.learnerId, [...lesson.exercises, lesson.prediction]]),
  ]);
  const found = new Map(standings.map((one) => [one.exerciseId, one]));
  return {
    lessonId,
    predicted: (found.get(lesson.prediction)?.attempts ?? 0) > 0,
    pegs,
    exercises: lesson.exercises.map((exerciseId) => ({
      exerciseId,
      title: exercises.get(exerciseId)?.title ?? exerciseId,
      mark: found.get(exerciseId)?.mark ?? 'none',
      attempts: found.get(exerciseId)?.attempts ?? 0,
      open: found.get(exerciseId)?.open ?? false,
    })),
  };
}

async function pegsOf(viewer: Viewer, ids: readonly string[], now: Date): Promise<PegView[]> {
  const found = await rows<LastRoundRow>(lastRoundsSql, [viewer.learnerId, [...ids]]);
  return pegViews(ids, skillRounds(found), viewer.timeZone, now);
}

interface StandingRow {
  readonly exerciseId: string;
  readonly mark: 'none' | 'right' | 'partly' | 'wrong';
  readonly attempts: number;
  readonly open: boolean;
}

const standingSql = `
  select r.exercise_id as "exerciseId", count(a.id)::int as attempts,
    bool_or(r.closed_at is null) as open,
    coalesce(min(a.verdict) filter (where a.verdict = 'right'),
      min(a.verdict) filter (where a.verdict = 'partly'), min(a.verdict), 'none') as mark
  from rounds r left join attempts a on a.round_id = r.id
  where r.learner_id = $1 and r.exercise_id = any($2::text[])
  group by r.exercise_id`;
