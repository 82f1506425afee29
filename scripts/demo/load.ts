import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { createAssignment } from '@/lib/data/assignments';
import { hashPassword } from '@/lib/data/entry/password';
import { row } from '@/lib/db/query';
import type { Role, Viewer } from '@/lib/policy/viewer';
import { dateIn } from '@/lib/clock';
import { models } from '@/models';
import { liveThrough } from './history';
import { fileLetters } from './letters';
import {
  demoAddress,
  demoAdministrator,
  demoClasses,
  demoDomain,
  demoInstructors,
  demoPassword,
  type DemoClass,
  type DemoPerson,
} from './people.data';

const DAY = 86_400_000;
const timeZone = 'Europe/London';

/** What the database holds before anything is loaded. */
export type Contents = 'nothing' | 'the demo data' | 'part of the demo data' | 'records';

/** Looks whether demo data may be loaded; the administrator is the last that loading makes. */
export async function contents(): Promise<Contents> {
  const counts = await row<{ people: number; demo: number; complete: boolean }>(
    `select count(*)::int as people, (count(*) filter (where email like $1))::int as demo,
       coalesce(bool_or(email = $2), false) as complete from people`,
    [`%@${demoDomain}`, demoAddress(demoAdministrator.name)],
  );
  if (counts === null || counts.people === 0) return 'nothing';
  if (counts.complete) return 'the demo data';
  return counts.demo === counts.people ? 'part of the demo data' : 'records';
}

/** Clears what a load that was interrupted has left, as the owner: the application may not. */
export async function clearPart(ownerUrl: string): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query('truncate people, class_groups restart identity cascade');
  } finally {
    await client.end();
  }
}

/** Loads the workshop on the harbour, with several weeks that end at `now`. */
export async function loadDemo(now: Date): Promise<void> {
  const passwordHash = await hashPassword(demoPassword);
  const began = new Date(now.getTime() - 45 * DAY);
  const viewers = new Map<string, Viewer>();
  const everybody = [...demoInstructors, ...demoClasses.flatMap(({ learners }) => learners)];
  for (const person of everybody) {
    viewers.set(person.name, await makePerson(person, passwordHash, began));
  }
  const lives = [];
  for (const [index, demoClass] of demoClasses.entries()) {
    await makeClass(demoClass, viewers, began, now);
    for (const [place, learner] of demoClass.learners.entries()) {
      const viewer = viewers.get(learner.name);
      if (viewer === undefined) continue;
      const seed = 1000 * (index + 1) + place;
      lives.push({ viewer, manner: learner.manner, seed, set: demoClass.set });
    }
  }
  await Promise.all(lives.map((life) => liveThrough(life, now)));
  await fileLetters(now);
  await makePerson(demoAdministrator, passwordHash, began, true);
}

async function makePerson(
  { name, units = undefined }: DemoPerson,
  passwordHash: string,
  at: Date,
  isAdministrator = false,
): Promise<Viewer> {
  const { Person, Learner } = models();
  const person = await Person.create({
    name,
    email: demoAddress(name),
    emailConfirmedAt: at,
    passwordHash,
    passwordSetAt: at,
    timeZone,
    units: units ?? 'metric',
    isAdministrator,
    createdAt: at,
  });
  const learner = await Learner.create({ personId: person.id, createdAt: at });
  return {
    personId: person.id,
    learnerId: learner.id,
    name,
    isAdministrator,
    units: units ?? 'metric',
    timeZone,
    reducedMotion: false,
    sessionId: randomUUID(),
    memberships: [],
  };
}

async function makeClass(
  demoClass: DemoClass,
  viewers: ReadonlyMap<string, Viewer>,
  began: Date,
  now: Date,
): Promise<void> {
  const { ClassGroup, Membership } = models();
  const made = await ClassGroup.create({
    name: demoClass.name,
    timeZone,
    startsOn: dateIn(timeZone, began),
    createdAt: began,
  });
  const join = (names: readonly string[], role: Role) =>
    names.flatMap((name) => {
      const personId = viewers.get(name)?.personId;
      return personId === undefined ? [] : [{ classId: made.id, personId, role, joinedAt: began }];
    });
  await Membership.bulkCreate([
    ...join(demoClass.instructors, 'instructor'),
    ...join(
      [...demoClass.learners.map(({ name }) => name), ...(demoClass.alsoLearns ?? [])],
      'learner',
    ),
  ]);
  const instructor = viewers.get(demoClass.instructors[0] ?? '');
  if (instructor === undefined) throw new Error(`loadDemo: nobody teaches ${demoClass.name}`);
  for (const work of demoClass.set) {
    const setAt = new Date(now.getTime() - work.daysAgo * DAY);
    const dueOn = dateIn(timeZone, new Date(setAt.getTime() + work.dueInDays * DAY));
    await createAssignment(
      instructor,
      made.id,
      { lessons: work.lessons, exercises: work.exercises ?? [], dueOn, note: work.note },
      setAt,
    );
  }
}
