import type { Migration } from '@/lib/db/migration';

/** Whether somebody wants letters about their classes; what their account needs always comes. */
export const addMailPreference: Migration = {
  async up(database) {
    await database.run(
      'alter table people add column wants_class_mail boolean not null default true',
    );
  },
  async down(database) {
    await database.run('alter table people drop column wants_class_mail');
  },
};
