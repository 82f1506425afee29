import type { Migration } from '@/lib/db/migration';

/** Single-use links: a first or forgotten password, and an address to be confirmed. */
export const createOneTimeLinks: Migration = {
  async up(database) {
    await database.run(`
      create table one_time_links (
        id uuid primary key default gen_random_uuid(),
        person_id uuid not null references people (id),
        purpose text not null,
        secret_hash text not null,
        new_email text,
        made_by uuid references people (id),
        created_at timestamptz not null default now(),
        expires_at timestamptz not null,
        used_at timestamptz,
        constraint one_time_links_purpose
          check (purpose in ('set-password', 'confirm-address', 'change-address')),
        constraint one_time_links_new_email
          check ((purpose = 'change-address') = (new_email is not null)),
        constraint one_time_links_expire_later check (expires_at > created_at)
      )`);
    // A link is found by the hash of its secret.
    await database.run('create unique index one_time_links_secret on one_time_links (secret_hash)');
    // A new link ends the unused ones of the same person and purpose.
    await database.run(
      'create index one_time_links_unused on one_time_links (person_id, purpose) where used_at is null',
    );
  },
  async down(database) {
    await database.run('drop table one_time_links');
  },
};
