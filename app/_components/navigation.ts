/** What the navigation needs to know of the person who looks at it. */
export interface NavigationViewer {
  readonly isAdministrator: boolean;
  readonly memberships: readonly { readonly role: 'learner' | 'instructor' }[];
}

/** One way from here to there. */
export interface NavigationLink {
  readonly href: string;
  readonly label: string;
}

const today: NavigationLink = { href: '/today', label: 'Today' };
const lessons: NavigationLink = { href: '/lessons', label: 'Lessons' };
const byMotion: NavigationLink = { href: '/by-motion', label: 'By motion' };
const classes: NavigationLink = { href: '/classes', label: 'Classes' };
const people: NavigationLink = { href: '/people', label: 'People' };
const mail: NavigationLink = { href: '/mail', label: 'Mail' };
const audit: NavigationLink = { href: '/audit', label: 'Audit log' };
const forInstructors: NavigationLink = { href: '/for-instructors', label: 'For instructors' };

/** True for somebody who teaches one class at least. */
export function teaches(viewer: NavigationViewer): boolean {
  return viewer.memberships.some((membership) => membership.role === 'instructor');
}

/** True for somebody who learns in one class at least, or who is in no class and has no other work here. */
export function learns(viewer: NavigationViewer): boolean {
  if (viewer.memberships.some((membership) => membership.role === 'learner')) return true;
  return !viewer.isAdministrator && !teaches(viewer);
}

/** Where somebody lands after signing in. */
export function homeOf(viewer: NavigationViewer): string {
  if (learns(viewer)) return today.href;
  return teaches(viewer) ? classes.href : people.href;
}

/**
 * The links of the header: they follow what somebody does here, and show only what works.
 *
 * @example linksFor(null).map((link) => link.label) // ['Lessons', 'By motion', 'For instructors']
 */
export function linksFor(viewer: NavigationViewer | null): readonly NavigationLink[] {
  if (viewer === null) return [lessons, byMotion, forInstructors];
  const links: NavigationLink[] = [];
  if (viewer.isAdministrator) links.push(people);
  if (viewer.isAdministrator || teaches(viewer)) links.push(classes);
  if (viewer.isAdministrator) links.push(mail, audit);
  if (learns(viewer)) links.unshift(today);
  return [...links, lessons, byMotion];
}

/** True where the page shown lies at or under the link. */
export function isCurrent(href: string, pathname: string): boolean {
  return pathname === href || pathname.startsWith(`${href}/`);
}
