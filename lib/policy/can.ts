import type { Role, Viewer } from './viewer';

/** What somebody is, when they ask to do something with a class or with the whole workshop. */
export type Standing = 'signed in' | Role | 'any instructor' | 'administrator';

/**
 * Who may do what, one line a right. `learner` and `instructor` are standings in the class that the
 * question names; the others hold everywhere.
 */
export const rights = {
  'answer exercises': ['signed in'],
  'see their own progress': ['signed in'],
  'change their own account': ['signed in'],
  'take away their own records': ['signed in'],
  'join a class by its word': ['signed in'],
  'see answers and slips': ['any instructor', 'administrator'],
  'see a class': ['learner', 'instructor', 'administrator'],
  'see who is in a class': ['instructor', 'administrator'],
  'see the progress of a class': ['instructor', 'administrator'],
  'see where a class is stuck': ['instructor', 'administrator'],
  'take away the progress of a class': ['instructor', 'administrator'],
  "see a learner's attempts": ['instructor', 'administrator'],
  "comment on a learner's work": ['instructor', 'administrator'],
  'override a marking': ['instructor', 'administrator'],
  'set work for a class': ['instructor', 'administrator'],
  'give a learner more time': ['instructor', 'administrator'],
  'make a class': ['administrator'],
  'change a class': ['instructor', 'administrator'],
  'change who is in a class': ['administrator'],
  'take somebody out of a class': ['instructor', 'administrator'],
  'invite people to a class': ['instructor', 'administrator'],
  'invite an instructor to a class': ['administrator'],
  'open a class to its joining word': ['instructor', 'administrator'],
  'invite people to the workshop': ['administrator'],
  'look after people': ['administrator'],
  'make somebody an administrator': ['administrator'],
  'see what was mailed': ['administrator'],
  'read the audit log': ['administrator'],
} as const satisfies Readonly<Record<string, readonly Standing[]>>;

/** Something that may be allowed or not. */
export type Action = keyof typeof rights;

/**
 * Whether the viewer may do it, in the class named when the right belongs to one. It decides what is
 * offered; the queries of lib/data carry the same right in their `where`.
 *
 * @example can(viewer, 'set work for a class', classId)
 */
export function can(viewer: Viewer | null, action: Action, classId?: string): boolean {
  if (viewer === null) return false;
  const allowed: readonly Standing[] = rights[action];
  return allowed.some((standing) => stands(viewer, standing, classId));
}

function stands(viewer: Viewer, standing: Standing, classId: string | undefined): boolean {
  switch (standing) {
    case 'signed in':
      return true;
    case 'administrator':
      return viewer.isAdministrator;
    case 'any instructor':
      return viewer.memberships.some(({ role }) => role === 'instructor');
    case 'learner':
    case 'instructor':
      return viewer.memberships.some((one) => one.role === standing && one.classId === classId);
  }
}
