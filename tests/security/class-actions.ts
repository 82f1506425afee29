import { randomUUID } from 'node:crypto';
import { forSignedIn, only, staffOfTheClass, type ActionOutcome, type ActionRow } from './endpoint';
import type { Planted } from './planted';

const page =
  (section: string) =>
  ({ classId }: Planted) =>
    `/classes/${classId}/${section}`;
const bound = ({ classId }: Planted) => [classId];
const byStaff = only<ActionOutcome>(staffOfTheClass, 'done', 'refused', 'sign in');
const byAdministrator = only<ActionOutcome>([], 'refused', 'refused', 'sign in');

const workForm = ({ dueOn }: Planted) => ({
  exercise: 'pins-for-an-oval',
  for: 'everybody',
  opensOn: '',
  opensTime: '',
  dueOn,
  dueTime: '18:30',
  attemptsAllowed: '',
  counting: 'best',
  lateWork: 'marked',
  note: '',
  version: '0',
});

/** Every server action of a class's own pages. */
export const classActions: readonly ActionRow[] = [
  {
    kind: 'action',
    file: 'app/classes/[id]/work/actions.ts',
    name: 'setWork',
    on: page('work/new'),
    bound,
    form: workForm,
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/work/actions.ts',
    name: 'changeWork',
    on: ({ classId, assignmentId }) => `/classes/${classId}/work/${assignmentId}`,
    bound: async ({ classId, newAssignment }) => [classId, await newAssignment()],
    form: workForm,
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/work/actions.ts',
    name: 'giveTime',
    on: ({ classId, assignmentId }) => `/classes/${classId}/work/${assignmentId}`,
    bound: async ({ classId, newAssignment }) => [classId, await newAssignment()],
    form: ({ learnerId }) => ({ learnerId, dueOn: '2099-12-31', dueTime: '' }),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/work/actions.ts',
    name: 'takeTimeBack',
    on: ({ classId, assignmentId }) => `/classes/${classId}/work/${assignmentId}`,
    bound: async ({ classId, learnerId, newExtension }) => [
      classId,
      await newExtension(),
      learnerId,
    ],
    form: () => ({}),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/work/actions.ts',
    name: 'withdrawWork',
    on: page('work'),
    bound: async ({ classId, newAssignment }) => [classId, await newAssignment()],
    form: () => ({}),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/people/actions.ts',
    name: 'putIn',
    on: page('people'),
    bound,
    form: ({ addressOfNobody }) => ({ email: addressOfNobody, role: 'learner' }),
    outcome: byAdministrator,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/people/actions.ts',
    name: 'takeOut',
    on: page('people'),
    bound: async ({ classId, newMember }) => [classId, await newMember()],
    form: () => ({ evenTheLast: 'no' }),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/people/actions.ts',
    name: 'renewWord',
    on: page('people'),
    bound,
    form: () => ({}),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/people/actions.ts',
    name: 'letJoin',
    on: page('people'),
    bound: async ({ newClass }) => [await newClass({ joiningWord: randomUUID() }), true],
    form: () => ({}),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/settings/actions.ts',
    name: 'changeClass',
    on: page('settings'),
    bound,
    form: () => ({
      name: 'Canaryclass Harbour',
      timeZone: 'Europe/London',
      startsOn: '',
      endsOn: '',
    }),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/settings/actions.ts',
    name: 'putAway',
    on: page('settings'),
    bound: async ({ newClass }) => [await newClass({})],
    form: () => ({}),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/settings/actions.ts',
    name: 'takeBack',
    on: page('settings'),
    bound: async ({ newClass }) => [await newClass({ archivedAt: new Date() })],
    form: () => ({}),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/attempts/[attemptId]/actions.ts',
    name: 'comment',
    on: ({ classId, attemptId }) => `/classes/${classId}/attempts/${attemptId}`,
    bound: ({ classId, attemptId }) => [classId, attemptId],
    form: () => ({ body: 'Look at the second pin again.' }),
    outcome: byStaff,
  },
  {
    kind: 'action',
    file: 'app/classes/[id]/learners/[learnerId]/actions.ts',
    name: 'commentOnWork',
    on: ({ classId, learnerId }) => `/classes/${classId}/learners/${learnerId}`,
    bound: ({ classId, learnerId, assignmentId }) => [classId, learnerId, assignmentId],
    form: () => ({ body: 'Good joints; bring the strip.' }),
    outcome: byStaff,
  },
  {
    // Nothing is changed, since it stands so already: refused for everybody, and for others as missing.
    kind: 'action',
    file: 'app/classes/[id]/attempts/[attemptId]/actions.ts',
    name: 'markOtherwise',
    on: ({ classId, attemptId }) => `/classes/${classId}/attempts/${attemptId}`,
    bound: ({ classId, attemptId }) => [classId, attemptId],
    form: () => ({ verdict: 'wrong', reason: 'As it was marked.' }),
    outcome: byAdministrator,
  },
  {
    kind: 'action',
    file: 'app/feedback/actions.ts',
    name: 'haveRead',
    on: () => '/feedback',
    form: () => ({}),
    outcome: forSignedIn<ActionOutcome>('done', 'sign in'),
  },
];
