import type { Migration } from '@/lib/db/migration';

/** Responses with their markings. The application may add to them and read them, nothing else. */
export const createAttempts: Migration = {
  async up(database) {
    await database.run(`
      create table attempts (
        id uuid primary key default gen_random_uuid(),
        round_id uuid not null references rounds (id),
        learner_id uuid not null references learners (id),
        exercise_id text not null,
        response jsonb not null,
        marking jsonb not null,
        verdict text not null,
        credit double precision not null,
        unaided boolean not null,
        closes_round boolean not null,
        answered_at timestamptz,
        created_at timestamptz not null default now(),
        constraint attempts_verdict check (verdict in ('right', 'partly', 'wrong')),
        constraint attempts_credit check (credit between 0 and 1)
      )`);
    // The attempts of a round, in order.
    await database.run('create index attempts_round on attempts (round_id, created_at)');
    // A learner's work on an exercise, the latest first.
    await database.run(
      'create index attempts_learner on attempts (learner_id, exercise_id, created_at desc)',
    );
  },
  async down(database) {
    await database.run('drop table attempts');
  },
};
