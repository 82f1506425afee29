import type { Migration } from '@/lib/db/migration';

/** Links for an invitation, which may lead to nobody's account yet, and for a forgotten password. */
export const widenOneTimeLinks: Migration = {
  async up(database) {
    await database.run(`
      alter table one_time_links
        alter column person_id drop not null,
        add column invitation_id uuid references invitations (id),
        drop constraint one_time_links_purpose,
        add constraint one_time_links_purpose check (purpose in
          ('set-password', 'reset-password', 'confirm-address', 'change-address', 'invitation')),
        add constraint one_time_links_lead_somewhere check (
          case when purpose in ('invitation', 'confirm-address')
            then invitation_id is not null and person_id is null
            else invitation_id is null and person_id is not null end)`);
    // A new letter for an invitation ends the unused links of the earlier ones.
    await database.run(`
      create index one_time_links_unused_invitation on one_time_links (invitation_id)
        where used_at is null`);
  },
  async down(database) {
    await database.run(
      "delete from one_time_links where person_id is null or purpose = 'reset-password'",
    );
    await database.run(`
      alter table one_time_links
        drop constraint one_time_links_lead_somewhere,
        drop constraint one_time_links_purpose,
        drop column invitation_id,
        alter column person_id set not null,
        add constraint one_time_links_purpose
          check (purpose in ('set-password', 'confirm-address', 'change-address'))`);
  },
};
