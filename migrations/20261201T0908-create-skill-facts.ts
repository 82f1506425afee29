import type { Migration } from '@/lib/db/migration';

/**
 * What a closed round showed of each skill. Whether a peg is home is never stored: it is worked
 * out from these facts, and from the due times, by the rule in lib/retention.
 */
export const createSkillFacts: Migration = {
  async up(database) {
    await database.run(`
      create table skill_facts (
        round_id uuid not null references rounds (id),
        skill text not null,
        learner_id uuid not null references learners (id),
        closed_at timestamptz not null,
        was_right boolean not null,
        unaided boolean not null,
        attempts integer not null,
        primary key (round_id, skill),
        constraint skill_facts_attempts check (attempts >= 0)
      )`);
    // Pegs: a learner's latest closed rounds, skill by skill.
    await database.run(`
      create index skill_facts_learner on skill_facts (learner_id, skill, closed_at desc)
      include (was_right, unaided)`);
    await database.run(`
      create table due_skills (
        learner_id uuid not null references learners (id),
        skill text not null,
        due_at timestamptz not null,
        updated_at timestamptz not null default now(),
        primary key (learner_id, skill)
      )`);
  },
  async down(database) {
    await database.run('drop table due_skills');
    await database.run('drop table skill_facts');
  },
};
