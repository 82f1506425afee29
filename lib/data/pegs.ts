import 'server-only';
import { exercises, lessons, skills } from '@/content/exercises/registry';
import { pegOf, type ClosedRound, type Peg } from '@/lib/retention/peg';
import type { PegView } from '@/lib/schemas/round';

/** A closed round of one skill, as the record has it. */
export interface SkillRound extends ClosedRound {
  readonly skill: string;
}

/**
 * The closed rounds of each of a learner's skills that a peg looks at, which are the last four;
 * `learner` and `wanted` are SQL, for the learner and for the set of skills.
 */
export function lastRoundsOf(learner: string, wanted: string): string {
  return `
    select f.skill, f.closed_at as "closedAt", f.was_right as right, f.unaided, f.attempts
    from ${wanted} wanted (skill)
    cross join lateral (
      select * from skill_facts s
      where s.learner_id = ${learner} and s.skill = wanted.skill
      order by s.closed_at desc limit 4) f`;
}

/** The same for the learner `$1` and the skills `$2`. */
export const lastRoundsSql = lastRoundsOf('$1', 'unnest($2::text[])');

/** A row of these, as the driver or as JSON gives it. */
export interface LastRoundRow {
  readonly skill: string;
  readonly closedAt: Date | string;
  readonly right: boolean;
  readonly unaided: boolean;
  readonly attempts: number;
}

/** The rows as the peg rule reads them. */
export function skillRounds(found: readonly LastRoundRow[]): SkillRound[] {
  return found.map((one) => ({ ...one, closedAt: new Date(one.closedAt).toISOString() }));
}

/** For each exercise the skills of its lesson, in their order. */
export const skillsByExercise: Readonly<Record<string, readonly string[]>> = Object.fromEntries(
  [...exercises.values()].map(({ id, lesson }) => [id, skillsOfLesson(lesson)]),
);

/** The pegs of these skills, in their order. */
export function pegViews(
  ids: readonly string[],
  rounds: readonly SkillRound[],
  timeZone: string,
  now: Date,
): PegView[] {
  return ids.map((skill) => {
    const own = rounds.filter((round) => round.skill === skill);
    return viewOf(skill, pegOf({ rounds: own, due: null, now: now.toISOString(), timeZone }));
  });
}

/** A peg with its skill's name. */
export function viewOf(skill: string, peg: Peg): PegView {
  return { skill, name: skillName(skill), ...peg };
}

/** What a skill is called. */
export function skillName(skill: string): string {
  return skills.get(skill)?.name ?? skill;
}

/** The skills of a lesson, in its order. */
export function skillsOfLesson(lessonId: string): readonly string[] {
  return lessons.find(({ id }) => id === lessonId)?.skills ?? [];
}
