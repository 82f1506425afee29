import type { Migration } from '@/lib/db/migration';

/** Who has been in a class, those who left among them. */
export const indexMembershipsByClass: Migration = {
  async up(database) {
    // The page of who is in a class shows those who left; every other index is of those who stay.
    await database.run(
      'create index memberships_class on memberships (class_id, person_id, left_at desc)',
    );
  },
  async down(database) {
    await database.run('drop index memberships_class');
  },
};
