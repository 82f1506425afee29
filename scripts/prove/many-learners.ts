import type pg from 'pg';
import { exercises, lessons } from '@/content/exercises/registry';

/** Ten thousand learners and two hundred exercises, in one class of five hundred and many of twenty-five. */
export const learnerCount = 10_000;
export const exerciseCount = 200;
export const bigClass = 500;
export const smallClass = 25;

/** The exercises of the lessons, and as many more without a lesson as there must be. */
function exerciseRows() {
  const real = lessons.flatMap(({ id, exercises: own }) =>
    own.map((exerciseId) => ({
      id: exerciseId,
      lesson: id as string | null,
      skills: exercises.get(exerciseId)?.skills ?? [],
    })),
  );
  const more = Array.from({ length: exerciseCount - real.length }, (_, n) => ({
    id: `exercise-${n}`,
    lesson: null,
    skills: [`skill-${n}`],
  }));
  return [...real, ...more].map((one, position) => ({ ...one, position }));
}

/**
 * Fills an empty database by SQL alone, an attempt a learner and exercise, exercise after exercise as
 * classes work, so that a learner's rows lie far apart. All of the lessons are set to the class of
 * five hundred, and all two hundred exercises to every class of twenty-five.
 */
export async function makeManyLearners(client: pg.Client): Promise<void> {
  // Keys that point elsewhere are right by construction; looking each up would take minutes.
  await client.query("set session_replication_role = 'replica'");
  await client.query(
    `create temp table wanted as select * from jsonb_to_recordset($1::jsonb)
     e (id text, lesson text, skills jsonb, position int)`,
    [JSON.stringify(exerciseRows())],
  );
  for (const statement of statements) await client.query(statement);
  await client.query('vacuum (analyze)');
}

const everyTurn = `
  from wanted e cross join generate_series(1, ${learnerCount}) l
  cross join lateral (select l || '-' || e.position as turn,
    now() - interval '60 days' + e.position * interval '6 hours' + l * interval '1 second' as at) t`;

const classOf = `case when l <= ${bigClass} then 0 else 1 + (l - ${bigClass} - 1) / ${smallClass} end`;
const classes = 1 + (learnerCount - bigClass) / smallClass;

const statements = [
  `insert into people (id, name, email)
   select md5('person' || l)::uuid, 'Learner ' || l, 'learner-' || l || '@many.example'
   from generate_series(0, ${learnerCount}) l`,
  `insert into learners (id, person_id)
   select md5('learner' || l)::uuid, md5('person' || l)::uuid
   from generate_series(0, ${learnerCount}) l`,
  `insert into class_groups (id, name)
   select md5('class' || c)::uuid, 'Class ' || c from generate_series(0, ${classes - 1}) c`,
  `insert into memberships (class_id, person_id, role)
   select md5('class' || ${classOf})::uuid, md5('person' || l)::uuid, 'learner'
   from generate_series(1, ${learnerCount}) l
   union all
   select md5('class' || c)::uuid, md5('person0')::uuid, 'instructor'
   from generate_series(0, ${classes - 1}) c`,
  `insert into assignments (id, class_id, opens_at, due_at, set_by)
   select md5('assignment' || c)::uuid, md5('class' || c)::uuid, now() - interval '61 days',
     now() - interval '20 days', md5('person0')::uuid
   from generate_series(0, ${classes - 1}) c`,
  `insert into assignment_items (id, assignment_id, position, lesson_id, exercise_id)
   select md5('item' || c || '-' || e.position)::uuid, md5('assignment' || c)::uuid, e.position,
     e.lesson, e.id
   from generate_series(0, ${classes - 1}) c cross join wanted e
   where c > 0 or e.lesson is not null`,
  `insert into rounds (id, learner_id, exercise_id, definition_version, units, seed, variant, shown,
     opened_at, closed_at)
   select md5('round' || turn)::uuid, md5('learner' || l)::uuid, e.id, 1, 'metric', 1, '{}', '{}',
     at - interval '5 minutes', at ${everyTurn}`,
  `insert into attempts (id, round_id, learner_id, exercise_id, response, marking, verdict, credit,
     unaided, closes_round, created_at)
   select md5('attempt' || turn)::uuid, md5('round' || turn)::uuid, md5('learner' || l)::uuid, e.id,
     '{}', '{}', case (l + e.position) % 3 when 0 then 'wrong' else 'right' end, 1, true, true, at
   ${everyTurn}`,
  `insert into counted_attempts (item_id, learner_id, n, attempt_id, late)
   select md5('item' || ${classOf} || '-' || e.position)::uuid, md5('learner' || l)::uuid, 1,
     md5('attempt' || turn)::uuid, at > now() - interval '20 days'
   ${everyTurn} where l > ${bigClass} or e.lesson is not null`,
  `insert into skill_facts (round_id, skill, learner_id, closed_at, was_right, unaided, attempts)
   select md5('round' || turn)::uuid, s.skill, md5('learner' || l)::uuid, at,
     (l + e.position) % 3 > 0, true, 1
   ${everyTurn} cross join lateral jsonb_array_elements_text(e.skills) s (skill)`,
];
