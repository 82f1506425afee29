import type { Migration } from '@/lib/db/migration';

/**
 * What happened for each skill in each round. Whether a peg is home is never stored: it is
 * worked out from these facts by the rule in lib/retention.
 */
export const createSkillFacts: Migration = {
  async up(database) {
    await database.run(`
      create table skill_facts (
        round_id uuid not null references rounds (id),
        skill text not null,
        learner_id uuid not null references learners (id),
        first_tried_at timestamptz not null,
        closed_at timestamptz,
        right_unaided boolean,
        primary key (round_id, skill),
        constraint skill_facts_outcome check ((closed_at is null) = (right_unaided is null))
      )`);
    // Pegs: a learner's latest closed rounds, skill by skill.
    await database.run(
      'create index skill_facts_learner on skill_facts (learner_id, skill, closed_at desc)',
    );
    await database.run(`
      create table refreshers (
        learner_id uuid not null references learners (id),
        skill text not null,
        memory jsonb not null,
        due_at timestamptz not null,
        updated_at timestamptz not null default now(),
        primary key (learner_id, skill)
      )`);
    // Today lists what is due.
    await database.run('create index refreshers_due on refreshers (learner_id, due_at)');
  },
  async down(database) {
    await database.run('drop table refreshers');
    await database.run('drop table skill_facts');
  },
};
