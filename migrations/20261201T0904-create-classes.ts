import type { Migration } from '@/lib/db/migration';

/** Classes, and who is in them as what. */
export const createClasses: Migration = {
  async up(database) {
    await database.run(`
      create table class_groups (
        id uuid primary key default gen_random_uuid(),
        name text not null,
        time_zone text not null default 'Europe/London',
        starts_on date,
        ends_on date,
        joining_word text,
        joining_open boolean not null default false,
        archived_at timestamptz,
        version integer not null default 0,
        created_at timestamptz not null default now(),
        updated_at timestamptz not null default now(),
        constraint class_groups_name_length check (char_length(name) between 1 and 120),
        constraint class_groups_dates check (ends_on >= starts_on),
        constraint class_groups_joining check (not joining_open or joining_word is not null)
      )`);
    // A joining word leads to one class.
    await database.run(
      'create unique index class_groups_joining_word on class_groups (joining_word)',
    );
    await database.run(`
      create table memberships (
        id uuid primary key default gen_random_uuid(),
        class_id uuid not null references class_groups (id),
        person_id uuid not null references people (id),
        role text not null,
        joined_at timestamptz not null default now(),
        left_at timestamptz,
        constraint memberships_role check (role in ('learner', 'instructor')),
        constraint memberships_leave_later check (left_at >= joined_at)
      )`);
    // A person is in a class once at a time, as one thing; also finds who is in the class.
    await database.run(
      'create unique index memberships_in_force on memberships (class_id, person_id) where left_at is null',
    );
    // Every request reads the memberships of the person who asks.
    await database.run(
      'create index memberships_person on memberships (person_id) where left_at is null',
    );
  },
  async down(database) {
    await database.run('drop table memberships');
    await database.run('drop table class_groups');
  },
};
