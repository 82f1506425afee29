import {
  anyStaff,
  forEverybody,
  forSignedIn,
  only,
  staffOfTheClass,
  type PageRow,
} from './endpoint';

/** Every page, and what asking for it comes to for each person. */
export const pages: readonly PageRow[] = [
  { kind: 'page', route: '/', outcome: forEverybody('shown') },
  { kind: 'page', route: '/for-instructors', outcome: forEverybody('shown') },
  { kind: 'page', route: '/forgotten', outcome: forEverybody('shown') },
  { kind: 'page', route: '/lessons', outcome: forEverybody('shown') },
  {
    kind: 'page',
    route: '/lessons/[unit]/[lesson]',
    at: () => '/lessons/drawing-and-copying/trammel-and-oval',
    outcome: forEverybody('shown'),
  },
  { kind: 'page', route: '/by-motion', outcome: forEverybody('shown') },
  { kind: 'page', route: '/sign-in', outcome: forSignedIn('sent on', 'shown') },
  { kind: 'page', route: '/sign-out', outcome: forSignedIn('shown', 'sent on') },
  { kind: 'page', route: '/home', outcome: forSignedIn('sent on', 'sign in') },
  { kind: 'page', route: '/today', outcome: forSignedIn('shown', 'sign in') },
  { kind: 'page', route: '/feedback', outcome: forSignedIn('shown', 'sign in') },
  { kind: 'page', route: '/account', outcome: forSignedIn('shown', 'sign in') },
  {
    kind: 'page',
    route: '/set-password/[token]',
    at: ({ passwordLink }) => `/set-password/${passwordLink}`,
    outcome: forEverybody('shown'),
  },
  { kind: 'page', route: '/classes', outcome: forSignedIn('shown', 'sign in') },
  {
    kind: 'page',
    route: '/classes/[id]',
    at: ({ classId }) => `/classes/${classId}`,
    outcome: only(staffOfTheClass, 'shown', 'missing', 'sign in'),
    holds: ({ canaries }) => canaries.classmateName.text,
  },
  {
    kind: 'page',
    route: '/classes/[id]',
    at: () => '/classes/not-an-id',
    outcome: forSignedIn('missing', 'sign in'),
  },
  ...(['work', 'work/new', 'sticking-points', 'people', 'settings'] as const).map(
    (section): PageRow => ({
      kind: 'page',
      route: `/classes/[id]/${section}`,
      at: ({ classId }) => `/classes/${classId}/${section}`,
      outcome: only(staffOfTheClass, 'shown', 'missing', 'sign in'),
      holds: ({ canaries }) =>
        section === 'people' ? canaries.classmateName.text : canaries.className.text,
    }),
  ),
  {
    kind: 'page',
    route: '/classes/[id]/work/[assignmentId]',
    at: ({ classId, assignmentId }) => `/classes/${classId}/work/${assignmentId}`,
    outcome: only(staffOfTheClass, 'shown', 'missing', 'sign in'),
    holds: ({ canaries }) => canaries.classmateName.text,
  },
  {
    kind: 'page',
    route: '/classes/[id]/work/[assignmentId]',
    at: ({ otherClassId, assignmentId }) => `/classes/${otherClassId}/work/${assignmentId}`,
    outcome: forSignedIn('missing', 'sign in'),
  },
  {
    kind: 'page',
    route: '/classes/[id]/learners/[learnerId]',
    at: ({ classId, learnerId }) => `/classes/${classId}/learners/${learnerId}`,
    outcome: only(staffOfTheClass, 'shown', 'missing', 'sign in'),
    holds: ({ canaries }) => canaries.learnerName.text,
  },
  {
    // A learner of this class, looked for in another: not there, whoever asks.
    kind: 'page',
    route: '/classes/[id]/learners/[learnerId]',
    at: ({ otherClassId, learnerId }) => `/classes/${otherClassId}/learners/${learnerId}`,
    outcome: forSignedIn('missing', 'sign in'),
  },
  {
    kind: 'page',
    route: '/classes/[id]/attempts/[attemptId]',
    at: ({ classId, attemptId }) => `/classes/${classId}/attempts/${attemptId}`,
    outcome: only(staffOfTheClass, 'shown', 'missing', 'sign in'),
    holds: ({ canaries }) => canaries.answer.text,
  },
  {
    kind: 'page',
    route: '/classes/[id]/attempts/[attemptId]',
    at: ({ otherClassId, attemptId }) => `/classes/${otherClassId}/attempts/${attemptId}`,
    outcome: forSignedIn('missing', 'sign in'),
  },
  {
    kind: 'page',
    route: '/exercises',
    outcome: only(anyStaff, 'shown', 'forbidden', 'sign in'),
  },
  {
    kind: 'page',
    route: '/exercises/[id]/key',
    at: () => '/exercises/pins-for-an-oval/key',
    outcome: only(anyStaff, 'shown', 'missing', 'sign in'),
    holds: () => 'set the halves',
  },
  {
    kind: 'page',
    route: '/people',
    outcome: only(['administrator'], 'shown', 'forbidden', 'sign in'),
    holds: ({ canaries }) => canaries.learnerAddress.text,
  },
  {
    kind: 'page',
    route: '/people/[id]',
    at: ({ learnerPersonId }) => `/people/${learnerPersonId}`,
    outcome: only(['administrator'], 'shown', 'missing', 'sign in'),
    holds: ({ canaries }) => canaries.learnerAddress.text,
  },
];
