import type { PersonListed } from '@/lib/data/people-list';

/** How somebody's account stands, in words. */
export function standingOf(
  person: Pick<PersonListed, 'disabled' | 'hasPassword' | 'isAdministrator'>,
): string {
  if (person.disabled) return 'disabled';
  if (!person.hasPassword) return 'no password yet';
  return person.isAdministrator ? 'administrator' : 'in use';
}
