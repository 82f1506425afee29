import 'server-only';

/**
 * The right to a class's records, as a condition on `g` (class_groups): an instructor of it, or
 * the administrator. `$1` is the class, `$2` the person, `$3` whether they administer.
 */
export const staffOfClass = `
  g.id = $1 and ($3::boolean or exists (
    select 1 from memberships mine
    where mine.class_id = g.id and mine.person_id = $2 and mine.role = 'instructor'
      and mine.left_at is null))`;

/** The same right where something is changed: a class that is put away can only be read. */
export const staffOfOpenClass = `${staffOfClass} and g.archived_at is null`;

/** The values for `staffOfClass`. */
export function staffValues(
  viewer: { readonly personId: string; readonly isAdministrator: boolean },
  classId: string,
): [string, string, boolean] {
  return [classId, viewer.personId, viewer.isAdministrator];
}

const uuid = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** Whether an id out of an address can be looked up at all; the database refuses any other. */
export function isId(text: string): boolean {
  return uuid.test(text);
}
