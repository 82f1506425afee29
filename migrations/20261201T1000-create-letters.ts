import type { Migration } from '@/lib/db/migration';

/**
 * Letters to people: what waits to be sent and the log of what was. A row is written in the
 * transaction that causes it; it never holds the secret of a link, only the link's id.
 */
export const createLetters: Migration = {
  async up(database) {
    await database.run(`
      create table letters (
        id uuid primary key,
        message_id text not null,
        kind text not null,
        to_address text not null,
        person_id uuid references people (id),
        data jsonb not null,
        once_key text,
        again_of uuid references letters (id) on delete set null,
        state text not null default 'waiting',
        tries integer not null default 0,
        last_error text,
        created_at timestamptz not null default now(),
        send_after timestamptz not null default now(),
        tried_at timestamptz,
        sent_at timestamptz,
        constraint letters_kind_length check (char_length(kind) between 1 and 40),
        constraint letters_address_is_one_line check (to_address !~ '[[:cntrl:][:space:]]'),
        constraint letters_state check (state in ('waiting', 'sent', 'failed', 'dropped')),
        constraint letters_sent_at check ((state = 'sent') = (sent_at is not null)),
        constraint letters_reason check (state not in ('failed', 'dropped') or last_error is not null)
      )`);
    // The same cause writes one letter, however often it is met.
    await database.run('create unique index letters_once on letters (once_key)');
    // The administrator reads the log from the latest backwards, page by page.
    await database.run('create index letters_created on letters (created_at desc, id desc)');
    // What waits or has failed is looked for among very many that were sent.
    await database.run(`
      create index letters_unsent on letters (state, created_at desc, id desc)
      where state <> 'sent'`);
    // What was written to somebody, for their own records.
    await database.run('create index letters_person on letters (person_id)');
  },
  async down(database) {
    await database.run('drop table letters');
  },
};
