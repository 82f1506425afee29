import type { Migration } from '@/lib/db/migration';

/** Identity, and the opaque key under which a person's work is kept. */
export const createPeople: Migration = {
  async up(database) {
    await database.run(`
      create table people (
        id uuid primary key default gen_random_uuid(),
        email text,
        email_confirmed_at timestamptz,
        name text not null,
        password_hash text,
        password_set_at timestamptz,
        time_zone text not null default 'Europe/London',
        units text not null default 'metric',
        paper text not null default 'a4',
        reduced_motion boolean not null default false,
        is_administrator boolean not null default false,
        disabled_at timestamptz,
        erased_at timestamptz,
        created_at timestamptz not null default now(),
        updated_at timestamptz not null default now(),
        constraint people_email_is_lower_case check (email = lower(email)),
        constraint people_email_or_erased check (email is not null or erased_at is not null),
        constraint people_name_length check (char_length(name) <= 120),
        constraint people_units check (units in ('metric', 'inch')),
        constraint people_paper check (paper in ('a4', 'a3', 'letter', 'tabloid'))
      )`);
    // Signing in looks a person up by address; an address belongs to one account.
    await database.run('create unique index people_email on people (email)');
    await database.run(`
      create table learners (
        id uuid primary key default gen_random_uuid(),
        person_id uuid references people (id),
        created_at timestamptz not null default now()
      )`);
    // A person has one key; erasure empties it, and the work under the key stays.
    await database.run('create unique index learners_person on learners (person_id)');
  },
  async down(database) {
    await database.run('drop table learners');
    await database.run('drop table people');
  },
};
