import type { Migration } from '@/lib/db/migration';

/** What people say about an attempt afterwards; the attempt itself stays as it was. */
export const createReviews: Migration = {
  async up(database) {
    await database.run(`
      create table comments (
        id uuid primary key default gen_random_uuid(),
        attempt_id uuid not null references attempts (id),
        class_id uuid not null references class_groups (id),
        author_id uuid not null references people (id),
        body text not null,
        read_at timestamptz,
        created_at timestamptz not null default now(),
        constraint comments_body_length check (char_length(body) between 1 and 4000)
      )`);
    // The comments under an attempt.
    await database.run('create index comments_attempt on comments (attempt_id, created_at)');
    await database.run(`
      create table overrides (
        id uuid primary key default gen_random_uuid(),
        attempt_id uuid not null references attempts (id),
        class_id uuid not null references class_groups (id),
        author_id uuid not null references people (id),
        verdict text not null,
        reason text not null,
        created_at timestamptz not null default now(),
        constraint overrides_verdict check (verdict in ('right', 'partly', 'wrong')),
        constraint overrides_reason_length check (char_length(reason) between 1 and 2000)
      )`);
    // The latest override of an attempt is the one that holds.
    await database.run('create index overrides_attempt on overrides (attempt_id, created_at desc)');
  },
  async down(database) {
    await database.run('drop table overrides');
    await database.run('drop table comments');
  },
};
