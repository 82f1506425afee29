import 'server-only';

/** One part of somebody's own records: from which columns it follows, and how it is read. */
export interface OwnRecordRule {
  readonly part: string;
  /** The columns that name the person or the learner, as `table.column`. */
  readonly keys: readonly string[];
  /** `$1` is the person, `$2` the learner; both are used, so that one call serves all. */
  readonly sql: string;
}

const both = '$1::uuid is not null and $2::uuid is not null';

/** What somebody takes away. A test holds this list against the keys in the database. */
export const ownRecordRules: readonly OwnRecordRule[] = [
  {
    part: 'profile',
    keys: ['learners.person_id'],
    sql: `select p.name, p.email, p.email_confirmed_at as "addressConfirmedAt",
        p.password_set_at as "passwordSetAt", p.time_zone as "timeZone", p.units, p.paper,
        p.reduced_motion as "reducedMotion", p.wants_class_mail as "wantsClassMail",
        p.is_administrator as "isAdministrator", p.created_at as "createdAt"
      from people p where p.id = $1 and ${both}`,
  },
  {
    part: 'memberships',
    keys: ['memberships.person_id'],
    sql: `select g.name as "class", m.role, m.joined_at as "joinedAt", m.left_at as "leftAt"
      from memberships m join class_groups g on g.id = m.class_id
      where m.person_id = $1 and ${both} order by m.joined_at`,
  },
  {
    part: 'invitations',
    keys: ['invitations.accepted_by', 'invitations.invited_by'],
    sql: `select g.name as "class", i.role, i.email, i.created_at as "invitedAt",
        i.accepted_at as "acceptedAt", i.invited_by = $1 as "byYou"
      from invitations i left join class_groups g on g.id = i.class_id
      where (i.accepted_by = $1 or i.invited_by = $1) and ${both} order by i.created_at`,
  },
  {
    part: 'sessions',
    keys: ['sessions.person_id'],
    sql: `select s.device, s.created_at as "signedInAt", s.last_seen_at as "lastSeenAt",
        s.ended_at as "endedAt", s.expires_at as "expiresAt"
      from sessions s where s.person_id = $1 and ${both} order by s.created_at`,
  },
  {
    part: 'links',
    keys: ['one_time_links.person_id', 'one_time_links.made_by'],
    sql: `select o.purpose, o.new_email as "newAddress", o.created_at as "madeAt",
        o.expires_at as "expiresAt", o.used_at as "usedAt"
      from one_time_links o where (o.person_id = $1 or o.made_by = $1) and ${both}
      order by o.created_at`,
  },
  {
    part: 'letters',
    keys: ['letters.person_id'],
    sql: `select l.kind, l.to_address as "to", l.state, l.created_at as "writtenAt",
        l.sent_at as "sentAt"
      from letters l where l.person_id = $1 and ${both} order by l.created_at`,
  },
  {
    part: 'calendar',
    keys: ['calendar_addresses.person_id'],
    sql: `select c.made_at as "addressMadeAt"
      from calendar_addresses c where c.person_id = $1 and ${both}`,
  },
  {
    part: 'assignmentsForYou',
    keys: ['assignment_learners.learner_id', 'extensions.learner_id', 'extensions.given_by'],
    sql: `select g.name as "class", a.due_at as "dueAt", e.due_at as "extendedTo"
      from assignments a join class_groups g on g.id = a.class_id
      left join assignment_learners c on c.assignment_id = a.id and c.learner_id = $2
      left join extensions e on e.assignment_id = a.id and (e.learner_id = $2 or e.given_by = $1)
      where (c.learner_id is not null or e.assignment_id is not null) and ${both}
      order by a.due_at`,
  },
  {
    part: 'assignmentsSetByYou',
    keys: ['assignments.set_by'],
    sql: `select g.name as "class", a.note, a.opens_at as "opensAt", a.due_at as "dueAt",
        a.created_at as "setAt"
      from assignments a join class_groups g on g.id = a.class_id
      where a.set_by = $1 and ${both} order by a.created_at`,
  },
  {
    part: 'rounds',
    keys: ['rounds.learner_id'],
    sql: `select r.exercise_id as exercise, r.units, r.opened_at as "openedAt",
        r.hints_taken as "hintsTaken", r.solution_seen_at as "solutionSeenAt",
        r.closed_at as "closedAt",
        case when r.closed_at is not null then r.variant end as variant
      from rounds r where r.learner_id = $2 and ${both} order by r.opened_at`,
  },
  {
    part: 'attempts',
    keys: ['attempts.learner_id', 'counted_attempts.learner_id', 'request_keys.learner_id'],
    sql: `select a.exercise_id as exercise, a.answered_at as "answeredAt",
        a.created_at as "sentAt", a.verdict, a.credit, a.unaided, a.response,
        case when r.closed_at is not null then a.marking end as marking,
        exists (select 1 from counted_attempts c where c.attempt_id = a.id) as "forAnAssignment",
        coalesce((select bool_or(c.late) from counted_attempts c where c.attempt_id = a.id), false)
          as late
      from attempts a join rounds r on r.id = a.round_id
      where a.learner_id = $2 and ${both} order by a.created_at`,
  },
  {
    part: 'skills',
    keys: ['skill_facts.learner_id', 'due_skills.learner_id'],
    sql: `select f.skill, f.closed_at as "closedAt", f.was_right as "wasRight", f.unaided,
        f.attempts,
        (select d.due_at from due_skills d where d.learner_id = f.learner_id and d.skill = f.skill)
          as "dueAt"
      from skill_facts f where f.learner_id = $2 and ${both} order by f.closed_at`,
  },
  {
    part: 'comments',
    keys: ['comments.author_id', 'comments.learner_id'],
    sql: `select a.exercise_id as exercise, g.name as "class", c.body,
        c.created_at as "writtenAt", c.read_at as "readAt", c.author_id = $1 as "byYou"
      from comments c
      join class_groups g on g.id = c.class_id
      left join attempts a on a.id = c.attempt_id
      where (c.author_id = $1 or c.learner_id = $2 or a.learner_id = $2) and ${both}
      order by c.created_at`,
  },
  {
    part: 'overrides',
    keys: ['overrides.author_id'],
    sql: `select a.exercise_id as exercise, o.verdict, o.reason, o.created_at as "madeAt",
        o.author_id = $1 as "byYou"
      from overrides o join attempts a on a.id = o.attempt_id
      where (o.author_id = $1 or a.learner_id = $2) and ${both} order by o.created_at`,
  },
  {
    part: 'audit',
    keys: ['audit_entries.actor_id'],
    sql: `select e.at, e.action, e.object_kind as "about", e.actor_id = $1 as "byYou"
      from audit_entries e
      where (e.actor_id = $1
        or (e.object_kind = 'person' and e.object_id = $1::text)
        or (e.object_kind = 'learner' and e.object_id = $2::text)) and ${both}
      order by e.id`,
  },
];
