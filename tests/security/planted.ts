import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import { createAttempt } from '@/lib/data/attempts';
import { giveExtension } from '@/lib/data/extensions';
import { createPasswordLink } from '@/lib/data/people';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { makeClass, makeViewer, mustOpen, setExercise, signInAs } from '../support/workshop';
import type { Person } from './endpoint';

/** Text that stands in the records once, and who may ever be shown it. */
export interface Canary {
  readonly text: string;
  readonly mayBeSeenBy: readonly Person[];
}

/** A workshop with one of each person, and something of everybody's that the others may not see. */
export interface Planted {
  /** The `Cookie` header of each person. */
  readonly cookies: Readonly<Record<Person, string>>;
  readonly viewers: Readonly<Record<Exclude<Person, 'anonymous' | 'disabled account'>, Viewer>>;
  readonly classId: string;
  readonly otherClassId: string;
  readonly learnerId: string;
  readonly learnerPersonId: string;
  /** Work that is set to the class. */
  readonly assignmentId: string;
  /** An answer of the learner of the class, which counts for it. */
  readonly attemptId: string;
  /** Rounds of the learner of the class: one that stays open, one whose solution may be shown. */
  readonly round: { readonly exerciseId: string; readonly roundId: string };
  readonly roundToShow: { readonly exerciseId: string; readonly roundId: string };
  /** The secret of a link to set a password, of somebody outside the seven. */
  readonly passwordLink: string;
  readonly addressOfNobody: string;
  readonly dueOn: string;
  readonly canaries: Readonly<Record<string, Canary>> & {
    readonly className: Canary;
    readonly classmateName: Canary;
    readonly learnerName: Canary;
    readonly learnerAddress: Canary;
    readonly answer: Canary;
  };
  /** Fresh ones for an action that uses them up. */
  readonly newAddress: () => string;
  readonly newAssignment: () => Promise<string>;
  /** Work for which the learner of the class has been given more time. */
  readonly newExtension: () => Promise<string>;
  readonly newMember: () => Promise<string>;
  readonly newDisabled: () => Promise<string>;
  /** Somebody invited into the class an hour ago. */
  readonly newInvitation: () => Promise<string>;
  /** Another class of the instructor of the class, in this state. */
  readonly newClass: (state: { archivedAt?: Date; joiningWord?: string }) => Promise<string>;
}

/** Read by every number part, and never right: the rounds stay open. */
export const wrongResponse = { answers: { eastWest: '9876.5 mm', northSouth: '9876.5 mm' } };

const classStaff = ['instructor of the class', 'administrator'] as const;

/** Plants the workshop in the database that the environment names. */
export async function plantWorkshop(): Promise<Planted> {
  const classId = await makeClass('Canaryclass Harbour');
  const otherClassId = await makeClass('Canaryclass Quay');
  const learner = await makeViewer('Canarylearner Lena', [[classId, 'learner']]);
  const classmate = await makeViewer('Canarymate Carl', [[classId, 'learner']]);
  const viewers = {
    'learner of the class': learner,
    'learner of another': await makeViewer('Canarystranger Stella', [[otherClassId, 'learner']]),
    'instructor of the class': await makeViewer('Canaryteacher Iris', [[classId, 'instructor']]),
    'instructor of another': await makeViewer('Canaryother Otto', [[otherClassId, 'instructor']]),
    administrator: await makeViewer('Canaryadmin Ada', [], true),
  };
  const instructor = viewers['instructor of the class'];
  const newAssignment = async () => {
    const itemId = await setExercise(classId, instructor, 'pins-for-an-oval');
    const item = await models().AssignmentItem.findByPk(itemId, { rejectOnEmpty: true });
    return item.assignmentId;
  };
  await setExercise(classId, instructor, 'oval-from-pins');
  const round = await mustOpen(learner, 'oval-from-pins');
  const roundToShow = await mustOpen(learner, 'pins-for-an-oval');
  const answered = await createAttempt(
    learner,
    { roundId: round.roundId, response: plantedResponse },
    randomUUID(),
  );
  if (answered.outcome !== 'kept') throw new Error(`plantWorkshop: ${answered.outcome}`);
  const newMember = async () => {
    const { personId } = await makeViewer('Canarytarget Tess', [[classId, 'learner']]);
    return personId;
  };
  return {
    viewers,
    cookies: await signEverybodyIn(viewers, classId),
    classId,
    otherClassId,
    learnerId: learner.learnerId,
    learnerPersonId: learner.personId,
    attemptId: answered.reply.attempt.attemptId,
    round: { exerciseId: 'oval-from-pins', roundId: round.roundId },
    roundToShow: { exerciseId: 'pins-for-an-oval', roundId: roundToShow.roundId },
    passwordLink: await linkOf(viewers.administrator, await makeViewer('Canarylink Leo', [])),
    addressOfNobody: 'nobody@workshop.example',
    dueOn: new Date(Date.now() + 7 * 86_400_000).toISOString().slice(0, 10),
    canaries: await canariesOf(learner, classmate),
    newAddress: () => `made-${randomUUID()}@workshop.example`,
    assignmentId: await newAssignment(),
    newAssignment,
    newExtension: async () => {
      const assignmentId = await newAssignment();
      await giveExtension(instructor, classId, assignmentId, {
        learnerId: learner.learnerId,
        dueOn: '2099-12-31',
        dueTime: '',
      });
      return assignmentId;
    },
    newMember,
    newClass: async (state) => {
      const { ClassGroup, Membership } = models();
      const { id } = await ClassGroup.create({ name: 'Canaryclass Spare', ...state });
      const { personId } = instructor;
      await Membership.create({ classId: id, personId, role: 'instructor' });
      return id;
    },
    newInvitation: async () => {
      const sentAt = new Date(Date.now() - 3_600_000);
      const made = await models().Invitation.create({
        classId,
        role: 'learner',
        email: `asked-${randomUUID()}@workshop.example`,
        invitedBy: instructor.personId,
        sentAt,
        expiresAt: new Date(Date.now() + 86_400_000),
      });
      return made.id;
    },
    newDisabled: async () => {
      const personId = await newMember();
      await models().Person.update({ disabledAt: new Date() }, { where: { id: personId } });
      return personId;
    },
  };
}

/** A value that nobody else types; only its digits are looked for. */
const plantedResponse = { answers: { eastWest: '7654.321 mm', northSouth: '7654.321 mm' } };

async function canariesOf(learner: Viewer, classmate: Viewer): Promise<Planted['canaries']> {
  return {
    className: {
      text: 'Canaryclass Harbour',
      mayBeSeenBy: ['learner of the class', ...classStaff],
    },
    otherClassName: {
      text: 'Canaryclass Quay',
      mayBeSeenBy: ['learner of another', 'instructor of another', 'administrator'],
    },
    learnerName: { text: learner.name, mayBeSeenBy: ['learner of the class', ...classStaff] },
    learnerAddress: {
      text: await addressOf(learner),
      mayBeSeenBy: ['learner of the class', ...classStaff],
    },
    classmateName: { text: classmate.name, mayBeSeenBy: classStaff },
    classmateAddress: { text: await addressOf(classmate), mayBeSeenBy: classStaff },
    strangerName: {
      text: 'Canarystranger Stella',
      mayBeSeenBy: ['learner of another', 'instructor of another', 'administrator'],
    },
    answer: { text: '7654.321', mayBeSeenBy: ['learner of the class', ...classStaff] },
  };
}

async function linkOf(administrator: Viewer, { personId }: Viewer): Promise<string> {
  const link = await createPasswordLink(administrator, personId);
  return link?.split('/').at(-1) ?? '';
}

async function addressOf({ personId }: Viewer): Promise<string> {
  const { email } = await models().Person.findByPk(personId, { rejectOnEmpty: true });
  return email ?? '';
}

/** Everybody's cookie; the disabled account was signed in when it was disabled. */
async function signEverybodyIn(
  viewers: Planted['viewers'],
  classId: string,
): Promise<Planted['cookies']> {
  const disabled = await makeViewer('Canarydisabled Dora', [[classId, 'learner']]);
  const cookies = {
    anonymous: '',
    'learner of the class': await cookieOf(viewers['learner of the class'].personId),
    'learner of another': await cookieOf(viewers['learner of another'].personId),
    'instructor of the class': await cookieOf(viewers['instructor of the class'].personId),
    'instructor of another': await cookieOf(viewers['instructor of another'].personId),
    administrator: await cookieOf(viewers.administrator.personId),
    'disabled account': await cookieOf(disabled.personId),
  };
  await models().Person.update({ disabledAt: new Date() }, { where: { id: disabled.personId } });
  return cookies;
}

/** The cookie of a new session, as the browser would hold it. */
export async function cookieOf(personId: string): Promise<string> {
  const { secret } = await signInAs(personId);
  const token = await encode({
    token: { sid: secret },
    secret: process.env.NEXTAUTH_SECRET ?? '',
  });
  return `hornbeam-session=${token}`;
}
