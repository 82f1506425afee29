import { randomUUID } from 'node:crypto';
import { exercises } from '@/content/exercises/registry';
import { closeDatabase } from '@/lib/db/connection';
import { row, rows } from '@/lib/db/query';
import { hashSecret, newSecret } from '@/lib/data/entry/secret';
import { findViewer } from '@/lib/data/entry/sessions';
import { openRound } from '@/lib/data/rounds';
import { forgetEnvironment } from '@/lib/env';
import type { Variant } from '@/lib/marking/definition';
import type { Role, Viewer } from '@/lib/policy/viewer';
import type { AttemptRequest, RoundView } from '@/lib/schemas/round';
import { models } from '@/models';
import { rightResponse, slippedResponse } from '../../scripts/demo/respond';
import { createTestDatabase, type TestDatabase } from './database';

/** A workshop with two classes, made afresh for one test file on a database of its own. */
export interface Workshop {
  readonly database: TestDatabase;
  readonly harbour: string;
  readonly quay: string;
  /** Learns at the harbour. */
  readonly learner: Viewer;
  /** Learns at the harbour too. */
  readonly classmate: Viewer;
  /** Learns at the quay. */
  readonly stranger: Viewer;
  /** Teaches at the harbour. */
  readonly instructor: Viewer;
  /** Teaches at the quay. */
  readonly otherInstructor: Viewer;
  readonly administrator: Viewer;
  readonly close: () => Promise<void>;
}

/** Names a fresh copy of the migrated template in the environment. */
export function takeTestDatabase(): TestDatabase {
  const database = createTestDatabase();
  process.env.DATABASE_URL = database.app;
  process.env.DATABASE_MIGRATION_URL = database.owner;
  process.env.NEXTAUTH_URL = 'http://127.0.0.1:5455';
  process.env.NEXTAUTH_SECRET = 'a secret of the tests, long enough to be taken';
  process.env.SMTP_URL = 'smtp://127.0.0.1:1';
  process.env.MAIL_FROM = 'Hornbeam <hornbeam@localhost>';
  forgetEnvironment();
  return database;
}

/** Opens the workshop; call it in `beforeAll`, and `close` in `afterAll`. */
export async function openWorkshop(): Promise<Workshop> {
  const database = takeTestDatabase();
  const harbour = await makeClass('The harbour');
  const quay = await makeClass('The quay');
  return {
    database,
    harbour,
    quay,
    learner: await makeViewer('Lena Learner', [[harbour, 'learner']]),
    classmate: await makeViewer('Carl Classmate', [[harbour, 'learner']]),
    stranger: await makeViewer('Stella Stranger', [[quay, 'learner']]),
    instructor: await makeViewer('Iris Instructor', [[harbour, 'instructor']]),
    otherInstructor: await makeViewer('Otto Other', [[quay, 'instructor']]),
    administrator: await makeViewer('Ada Administrator', [], true),
    close: async () => {
      await closeDatabase();
      database.drop();
    },
  };
}

/** Makes a class of this name. */
export async function makeClass(name: string): Promise<string> {
  const made = await models().ClassGroup.create({ name, timeZone: 'Europe/London' });
  return made.id;
}

/** Makes a person with their key and memberships, and looks them up by a session like a request. */
export async function makeViewer(
  name: string,
  memberships: readonly (readonly [string, Role])[],
  isAdministrator = false,
): Promise<Viewer> {
  const { Person, Learner, Membership } = models();
  const email = `${name.split(' ')[0]?.toLowerCase()}-${randomUUID().slice(0, 8)}@workshop.example`;
  const person = await Person.create({ name, email, isAdministrator });
  await Learner.create({ personId: person.id });
  await Membership.bulkCreate(
    memberships.map(([classId, role]) => ({ classId, role, personId: person.id })),
  );
  const { viewer } = await signInAs(person.id);
  return viewer;
}

/** Opens a session for a person without a password, and answers its secret with the viewer. */
export async function signInAs(personId: string): Promise<{ secret: string; viewer: Viewer }> {
  const secret = newSecret();
  const now = new Date();
  await models().Session.create({
    secretHash: hashSecret(secret),
    personId,
    idleMinutes: 60,
    createdAt: now,
    lastSeenAt: now,
    expiresAt: new Date(now.getTime() + 3_600_000),
  });
  const viewer = await findViewer({ by: 'session', secret }, now);
  if (viewer === null) throw new Error(`signInAs: ${personId} has no session`);
  return { secret, viewer };
}

/** Sets one exercise to a class, as the instructor would. */
export async function setExercise(
  classId: string,
  setBy: Viewer,
  exerciseId: string,
  rules: {
    attemptsAllowed?: number;
    dueAt?: Date;
    opensAt?: Date;
    lateWork?: 'marked' | 'closed';
  } = {},
): Promise<string> {
  const { Assignment, AssignmentItem } = models();
  const opensAt = rules.opensAt ?? new Date(Date.now() - 86_400_000);
  const dueAt = rules.dueAt ?? new Date(Date.now() + 7 * 86_400_000);
  const made = await Assignment.create({
    classId,
    setBy: setBy.personId,
    ...rules,
    opensAt,
    dueAt,
  });
  const item = await AssignmentItem.create({ assignmentId: made.id, position: 0, exerciseId });
  return item.id;
}

/** Opens a round that must be there. */
export async function mustOpen(
  viewer: Viewer,
  exerciseId: string,
  now = new Date(),
): Promise<RoundView> {
  const round = await openRound(viewer, { exerciseId }, now);
  if (round === null) throw new Error(`mustOpen: ${exerciseId} is not there`);
  return round;
}

/** What somebody would send who gets the round right, or makes a known slip. */
export async function requestFor(
  roundId: string,
  how: 'right' | 'slipped',
): Promise<AttemptRequest> {
  const kept = await row<{ exerciseId: string; variant: Variant }>(
    'select exercise_id as "exerciseId", variant from rounds where id = $1',
    [roundId],
  );
  const definition = kept === null ? undefined : exercises.get(kept.exerciseId);
  if (kept === null || definition === undefined) throw new Error(`requestFor: no round ${roundId}`);
  const response =
    how === 'right'
      ? rightResponse(definition, kept.variant)
      : slippedResponse(definition, kept.variant, 0);
  if (response === null) throw new Error(`requestFor: ${kept.exerciseId} has no slip`);
  return JSON.parse(JSON.stringify({ roundId, response })) as AttemptRequest;
}

/** How many rows a table has, under a condition. */
export async function countRows(table: string, condition = 'true', values: unknown[] = []) {
  const [counted] = await rows<{ n: number }>(
    `select count(*)::int as n from ${table} where ${condition}`,
    values,
  );
  return counted?.n ?? 0;
}
