import type { Migration } from '@/lib/db/migration';

/** One learner's turn at one exercise, with the numbers as they were drawn. */
export const createRounds: Migration = {
  async up(database) {
    await database.run(`
      create table rounds (
        id uuid primary key default gen_random_uuid(),
        learner_id uuid not null references learners (id),
        exercise_id text not null,
        definition_version integer not null,
        units text not null,
        seed bigint not null,
        variant jsonb not null,
        shown jsonb not null,
        opened_at timestamptz not null default now(),
        hints_taken smallint not null default 0,
        solution_seen_at timestamptz,
        closed_at timestamptz,
        constraint rounds_units check (units in ('metric', 'inch')),
        constraint rounds_hints_taken check (hints_taken between 0 and 3),
        constraint rounds_close_later check (closed_at >= opened_at),
        constraint rounds_solution_closes check (solution_seen_at is null or closed_at is not null)
      )`);
    // One open round a learner, exercise and unit system: the promise that parallel opens meet.
    await database.run(`
      create unique index rounds_open on rounds (learner_id, exercise_id, units)
      where closed_at is null`);
    // A learner's rounds at an exercise, the latest first; also where they were last.
    await database.run('create index rounds_learner on rounds (learner_id, opened_at desc)');
  },
  async down(database) {
    await database.run('drop table rounds');
  },
};
