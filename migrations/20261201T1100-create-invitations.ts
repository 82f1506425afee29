import type { Migration } from '@/lib/db/migration';

/** Who was asked to come in: by an instructor, by the administrator, or by a joining word. */
export const createInvitations: Migration = {
  async up(database) {
    await database.run(`
      create table invitations (
        id uuid primary key default gen_random_uuid(),
        class_id uuid references class_groups (id),
        role text,
        email text not null,
        name text,
        invited_by uuid references people (id),
        joining_word text,
        created_at timestamptz not null default now(),
        sent_at timestamptz not null default now(),
        expires_at timestamptz not null,
        accepted_at timestamptz,
        accepted_by uuid references people (id),
        withdrawn_at timestamptz,
        constraint invitations_role check (role in ('learner', 'instructor')),
        constraint invitations_role_in_class check ((class_id is null) = (role is null)),
        constraint invitations_email_is_lower_case check (email = lower(email)),
        constraint invitations_email_length check (char_length(email) between 3 and 254),
        constraint invitations_name_length check (char_length(name) between 1 and 120),
        constraint invitations_come_from_somebody_or_a_word
          check ((invited_by is null) = (joining_word is not null)),
        constraint invitations_by_word_are_for_learners
          check (joining_word is null or role = 'learner'),
        constraint invitations_accepted_by_somebody
          check ((accepted_at is null) = (accepted_by is null)),
        constraint invitations_end_once check (accepted_at is null or withdrawn_at is null),
        constraint invitations_expire_later check (expires_at > created_at)
      )`);
    // An address is asked into a class once at a time; also lists who is asked into a class.
    await database.run(`
      create unique index invitations_open on invitations (class_id, email)
        nulls not distinct where accepted_at is null and withdrawn_at is null`);
    // The status list of a class, the latest first.
    await database.run('create index invitations_class on invitations (class_id, created_at desc)');
    // What is kept of a person, when they take their records away or are erased.
    await database.run('create index invitations_email on invitations (email)');
  },
  async down(database) {
    await database.run('drop table invitations');
  },
};
