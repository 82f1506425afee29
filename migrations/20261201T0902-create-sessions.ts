import type { Migration } from '@/lib/db/migration';

/** Sign-ins that are in force, looked up at every request. */
export const createSessions: Migration = {
  async up(database) {
    await database.run(`
      create table sessions (
        id uuid primary key default gen_random_uuid(),
        secret_hash text not null,
        person_id uuid not null references people (id),
        device text not null default '',
        created_at timestamptz not null default now(),
        last_seen_at timestamptz not null default now(),
        password_given_at timestamptz not null default now(),
        idle_minutes integer not null,
        expires_at timestamptz not null,
        ended_at timestamptz,
        constraint sessions_idle_minutes check (idle_minutes > 0),
        constraint sessions_device_length check (char_length(device) <= 200),
        constraint sessions_expire_later check (expires_at > created_at)
      )`);
    // Every request finds its session by the hash of the secret in its token.
    await database.run('create unique index sessions_secret on sessions (secret_hash)');
    // Listing and ending one's own sessions; ending all of a person's when they are disabled.
    await database.run(
      'create index sessions_person_in_force on sessions (person_id) where ended_at is null',
    );
  },
  async down(database) {
    await database.run('drop table sessions');
  },
};
