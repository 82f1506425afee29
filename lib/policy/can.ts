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
  'see answers and slips': ['any instructor', 'administrator'],
  'see a class': ['learner', 'instructor', 'administrator'],
  'see who is in a class': ['instructor', 'administrator'],
  'see the progress of a class': ['instructor', 'administrator'],
  "see a learner's attempts": ['instructor', 'administrator'],
  'set work for a class': ['instructor', 'administrator'],
  'change a class': ['administrator'],
  'change who is in a class': ['administrator'],
  'look after people': ['administrator'],
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
