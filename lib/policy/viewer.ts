/** What a person is in a class. */
export type Role = 'learner' | 'instructor';

/** One class that the viewer is in now. */
export interface Membership {
  readonly classId: string;
  readonly role: Role;
}

/** Who asks: every function of lib/data takes it first. */
export interface Viewer {
  readonly personId: string;
  /** The opaque key under which this person's own work is kept. */
  readonly learnerId: string;
  readonly name: string;
  readonly isAdministrator: boolean;
  readonly units: 'metric' | 'inch';
  readonly timeZone: string;
  /** Whether they want less to move, whatever their device says. */
  readonly reducedMotion: boolean;
  readonly sessionId: string;
  readonly memberships: readonly Membership[];
}

/** Whether the viewer learns in any class, or in none at all and so for themselves. */
export function isLearner(viewer: Viewer): boolean {
  return viewer.memberships.some(({ role }) => role === 'learner') || !isStaff(viewer);
}

/** Whether the viewer teaches a class, whichever it is. */
export function isInstructor(viewer: Viewer): boolean {
  return viewer.memberships.some(({ role }) => role === 'instructor');
}

/** Whether the viewer teaches or administers. */
export function isStaff(viewer: Viewer): boolean {
  return viewer.isAdministrator || isInstructor(viewer);
}
