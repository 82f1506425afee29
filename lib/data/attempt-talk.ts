import 'server-only';

/** What somebody said about an attempt, or about work as a whole. */
export interface AttemptComment {
  readonly authorName: string;
  readonly body: string;
  readonly at: string;
  readonly readAt: string | null;
}

/** A marking otherwise than it was marked, with the reason. */
export interface AttemptOverride {
  readonly authorName: string;
  readonly verdict: 'right' | 'partly' | 'wrong';
  readonly reason: string;
  readonly at: string;
}

/** The comments of the class `g` on the attempt `a`, as JSON. */
export const commentsOf = `
  coalesce((
    select json_agg(json_build_object('authorName', p.name, 'body', c.body, 'at', c.created_at,
      'readAt', c.read_at) order by c.created_at)
    from comments c join people p on p.id = c.author_id
    where c.attempt_id = a.id and c.class_id = g.id), '[]')`;

/** The comments of the class `g` on what the learner `l` did for the assignment `s`, as JSON. */
export const commentsOnWork = `
  coalesce((
    select json_agg(json_build_object('authorName', p.name, 'body', c.body, 'at', c.created_at,
      'readAt', c.read_at) order by c.created_at)
    from comments c join people p on p.id = c.author_id
    where c.learner_id = l.id and c.assignment_id = s.id and c.class_id = g.id), '[]')`;

/** The overrides of the class `g` on the attempt `a`, as JSON. */
export const overridesOf = `
  coalesce((
    select json_agg(json_build_object('authorName', p.name, 'verdict', v.verdict,
      'reason', v.reason, 'at', v.created_at) order by v.created_at)
    from overrides v join people p on p.id = v.author_id
    where v.attempt_id = a.id and v.class_id = g.id), '[]')`;
