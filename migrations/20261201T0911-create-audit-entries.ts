import type { Migration } from '@/lib/db/migration';

/** Who did what to whose records. The application may add to it and read it, nothing else. */
export const createAuditEntries: Migration = {
  async up(database) {
    await database.run(`
      create table audit_entries (
        id bigint generated always as identity primary key,
        at timestamptz not null default now(),
        actor_id uuid references people (id),
        action text not null,
        object_kind text not null,
        object_id text,
        class_id uuid references class_groups (id),
        detail jsonb not null default '{}',
        constraint audit_entries_action_length check (char_length(action) between 1 and 80)
      )`);
    // The administrator reads it from the latest backwards, by person or by object.
    await database.run('create index audit_entries_at on audit_entries (at desc)');
    await database.run('create index audit_entries_actor on audit_entries (actor_id, at desc)');
    await database.run(
      'create index audit_entries_object on audit_entries (object_kind, object_id, at desc)',
    );
  },
  async down(database) {
    await database.run('drop table audit_entries');
  },
};
