import type { Migration } from '@/lib/db/migration';

/** A comment is on an attempt, or on what a learner did for an assignment as a whole. */
export const widenComments: Migration = {
  async up(database) {
    await database.run('alter table comments add column learner_id uuid references learners (id)');
    await database.run(
      'update comments set learner_id = a.learner_id from attempts a where a.id = attempt_id',
    );
    await database.run(`
      alter table comments
        alter column learner_id set not null,
        alter column attempt_id drop not null,
        add column assignment_id uuid references assignments (id),
        add constraint comments_about_one_thing
          check (num_nonnulls(attempt_id, assignment_id) = 1)`);
    // What a learner has been told, the latest first; Today asks for what is unread.
    await database.run('create index comments_learner on comments (learner_id, created_at desc)');
    // How often the markings of a class were overridden is asked with every look at its progress.
    await database.run('create index overrides_class on overrides (class_id)');
  },
  async down(database) {
    await database.run('drop index overrides_class');
    await database.run('delete from comments where attempt_id is null');
    await database.run(`
      alter table comments
        drop constraint comments_about_one_thing,
        drop column assignment_id,
        drop column learner_id,
        alter column attempt_id set not null`);
  },
};
