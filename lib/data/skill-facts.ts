import 'server-only';
import type { ExerciseDefinition } from '@/lib/marking/definition';
import type { SkillRound } from './pegs';
import type { KeptMarking } from './round-record';

/**
 * What a round shows of each skill when it closes: right when all the parts that show the skill
 * were right in the last attempt. A prediction shows none: it is there to be wrong.
 */
export function factsOf(
  definition: ExerciseDefinition,
  last: KeptMarking | undefined,
  unaided: boolean,
  now: Date,
): SkillRound[] {
  if (definition.kind === 'prediction') return [];
  return definition.skills.map((skill) => ({
    skill,
    closedAt: now.toISOString(),
    right: last?.skills.some((one) => one.skill === skill && one.right) ?? false,
    unaided,
  }));
}

/**
 * Writes facts down with the number of attempts that the round took: `$1` the round, `$2` the
 * learner, `$3` the time, `$4` the facts as JSON.
 */
export const insertFactsSql = `
  insert into skill_facts (round_id, learner_id, closed_at, skill, was_right, unaided, attempts)
  select $1, $2, $3, f.skill, f."right", f.unaided,
    (select count(*) from attempts a where a.round_id = $1)
  from jsonb_to_recordset($4::jsonb) as f (skill text, "right" boolean, unaided boolean)
  returning skill`;
