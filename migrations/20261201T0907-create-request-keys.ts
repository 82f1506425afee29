import type { Migration } from '@/lib/db/migration';

/** Which answer a repeated request is to have; forgotten after some weeks, unlike attempts. */
export const createRequestKeys: Migration = {
  async up(database) {
    await database.run(`
      create table request_keys (
        learner_id uuid not null references learners (id),
        key uuid not null,
        body_hash text not null,
        attempt_id uuid not null references attempts (id),
        answer jsonb not null,
        created_at timestamptz not null default now(),
        primary key (learner_id, key)
      )`);
    // The tidying job removes the oldest.
    await database.run('create index request_keys_age on request_keys (created_at)');
  },
  async down(database) {
    await database.run('drop table request_keys');
  },
};
