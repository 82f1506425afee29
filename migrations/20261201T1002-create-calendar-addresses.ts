import type { Migration } from '@/lib/db/migration';

/** The secret address of a person's calendar feed, known by its hash; renewing it ends the old one. */
export const createCalendarAddresses: Migration = {
  async up(database) {
    await database.run(`
      create table calendar_addresses (
        person_id uuid primary key references people (id),
        secret_hash text not null,
        made_at timestamptz not null default now()
      )`);
    // A feed is found by the hash of the secret in its address.
    await database.run(
      'create unique index calendar_addresses_secret on calendar_addresses (secret_hash)',
    );
  },
  async down(database) {
    await database.run('drop table calendar_addresses');
  },
};
