import type { Migration } from '@/lib/db/migration';

/**
 * What is set to a class, exercise by exercise (a lesson is set as all of its exercises), and
 * which attempts count for it.
 */
export const createAssignments: Migration = {
  async up(database) {
    await database.run(`
      create table assignments (
        id uuid primary key default gen_random_uuid(),
        class_id uuid not null references class_groups (id),
        note text not null default '',
        for_chosen_learners boolean not null default false,
        opens_at timestamptz not null default now(),
        due_at timestamptz not null,
        attempts_allowed integer,
        counting text not null default 'best',
        late_work text not null default 'marked',
        set_by uuid not null references people (id),
        withdrawn_at timestamptz,
        version integer not null default 0,
        created_at timestamptz not null default now(),
        updated_at timestamptz not null default now(),
        constraint assignments_note_length check (char_length(note) <= 2000),
        constraint assignments_due_later check (due_at > opens_at),
        constraint assignments_attempts_allowed check (attempts_allowed between 1 and 100),
        constraint assignments_counting check (counting in ('best', 'latest')),
        constraint assignments_late_work check (late_work in ('marked', 'closed'))
      )`);
    // What is set to a class, by due time.
    await database.run('create index assignments_class on assignments (class_id, due_at)');
    await database.run(`
      create table assignment_items (
        id uuid primary key default gen_random_uuid(),
        assignment_id uuid not null references assignments (id),
        position integer not null,
        lesson_id text,
        exercise_id text not null,
        constraint assignment_items_once unique (assignment_id, exercise_id)
      )`);
    // An attempt looks for every item that asks for its exercise.
    await database.run('create index assignment_items_exercise on assignment_items (exercise_id)');
    await database.run(`
      create table assignment_learners (
        assignment_id uuid not null references assignments (id),
        learner_id uuid not null references learners (id),
        primary key (assignment_id, learner_id)
      )`);
    await database.run(`
      create table extensions (
        assignment_id uuid not null references assignments (id),
        learner_id uuid not null references learners (id),
        due_at timestamptz not null,
        given_by uuid not null references people (id),
        created_at timestamptz not null default now(),
        primary key (assignment_id, learner_id)
      )`);
    await database.run(`
      create table counted_attempts (
        item_id uuid not null references assignment_items (id),
        learner_id uuid not null references learners (id),
        n integer not null,
        attempt_id uuid not null references attempts (id),
        late boolean not null,
        primary key (item_id, learner_id, n),
        constraint counted_attempts_once unique (item_id, attempt_id),
        constraint counted_attempts_n check (n >= 1)
      )`);
    // Whether an instructor may see an attempt is asked by attempt.
    await database.run('create index counted_attempts_attempt on counted_attempts (attempt_id)');
  },
  async down(database) {
    for (const table of [
      'counted_attempts',
      'extensions',
      'assignment_learners',
      'assignment_items',
      'assignments',
    ]) {
      await database.run(`drop table ${table}`);
    }
  },
};
