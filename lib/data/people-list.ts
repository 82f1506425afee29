import 'server-only';
import { rows } from '@/lib/db/query';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';
import { isId } from './class-right';

/** A person as the administrator sees them. */
export interface PersonListed {
  readonly personId: string;
  readonly name: string;
  readonly email: string | null;
  readonly isAdministrator: boolean;
  readonly disabled: boolean;
  /** Whether they have set a password, and so can sign in. */
  readonly hasPassword: boolean;
  readonly lastSeenAt: string | null;
  readonly classes: readonly {
    readonly classId: string;
    readonly name: string;
    readonly role: 'learner' | 'instructor';
  }[];
}

/** Which people are looked for. */
export interface PeopleFilter {
  /** Part of a name or an address. */
  readonly search?: string;
  readonly standing?: 'administrator' | 'instructor' | 'learner' | 'disabled' | 'no password';
  /** Which page of fifty, from 1. */
  readonly page?: number;
}

/** A page of people, and how many fit in all. */
export interface PeoplePage {
  readonly people: readonly PersonListed[];
  readonly total: number;
  readonly pages: number;
}

export const peopleOnPage = 50;

/** Everybody, by name, for the administrator; nobody for anybody else. Three parts, one query. */
export function listPeople(viewer: Viewer): Promise<PersonListed[]> {
  return people(viewer, 'true', []);
}

/** One page of the people looked for, by name; nobody for anybody but the administrator. */
export async function findPeople(
  viewer: Viewer,
  { search = '', standing, page = 1 }: PeopleFilter = {},
): Promise<PeoplePage> {
  const fits = `($2 = '' or strpos(lower(p.name), lower($2)) > 0 or strpos(p.email, lower($2)) > 0)
    and ${standing === undefined ? 'true' : standings[standing]}`;
  const [counted] = await rows<{ total: number }>(
    `select count(*)::int as total from people p
     where $1::boolean and p.erased_at is null and ${fits}`,
    [can(viewer, 'look after people'), search.trim()],
  );
  const total = counted?.total ?? 0;
  const pages = Math.max(1, Math.ceil(total / peopleOnPage));
  const skipped = (Math.min(Math.max(1, page), pages) - 1) * peopleOnPage;
  return {
    people: await people(viewer, fits, [search.trim()], `limit ${peopleOnPage} offset ${skipped}`),
    total,
    pages,
  };
}

/** One person, for the administrator; null for anybody else and for somebody who is not there. */
export async function findPerson(viewer: Viewer, personId: string): Promise<PersonListed | null> {
  if (!isId(personId)) return null;
  const [person] = await people(viewer, 'p.id = $2::uuid', [personId]);
  return person ?? null;
}

const teachesOrLearns = (role: string) => `exists (
  select 1 from memberships m
  where m.person_id = p.id and m.left_at is null and m.role = '${role}')`;

const standings: Readonly<Record<NonNullable<PeopleFilter['standing']>, string>> = {
  administrator: 'p.is_administrator',
  instructor: teachesOrLearns('instructor'),
  learner: teachesOrLearns('learner'),
  disabled: 'p.disabled_at is not null',
  'no password': 'p.password_hash is null',
};

/** `$1` is the right; the condition and what follows the order are of this file. */
async function people(
  viewer: Viewer,
  condition: string,
  values: readonly unknown[],
  part = '',
): Promise<PersonListed[]> {
  const found = await rows<Omit<PersonListed, 'lastSeenAt'> & { lastSeenAt: Date | null }>(
    `select p.id as "personId", p.name, p.email, p.is_administrator as "isAdministrator",
       p.disabled_at is not null as disabled, p.password_hash is not null as "hasPassword",
       (select max(s.last_seen_at) from sessions s where s.person_id = p.id) as "lastSeenAt",
       coalesce((
         select json_agg(json_build_object('classId', g.id, 'name', g.name, 'role', m.role)
           order by g.name)
         from memberships m join class_groups g on g.id = m.class_id and g.archived_at is null
         where m.person_id = p.id and m.left_at is null), '[]') as classes
     from people p
     where $1::boolean and p.erased_at is null and ${condition}
     order by p.name, p.id ${part}`,
    [can(viewer, 'look after people'), ...values],
  );
  return found.map((one) => ({ ...one, lastSeenAt: one.lastSeenAt?.toISOString() ?? null }));
}
