import {
  forEverybody,
  forSignedIn,
  only,
  staffOfTheClass,
  type ActionRow,
  type HandlerRow,
  type PageRow,
} from './endpoint';

/** Pages of coming in: nobody needs to be known for them, and what a link leads to is its own proof. */
export const pagesOfComingIn: readonly PageRow[] = [
  { kind: 'page', route: '/join', outcome: forEverybody('shown') },
  {
    kind: 'page',
    route: '/invitation/[token]',
    at: () => '/invitation/of-nobody',
    outcome: forEverybody('shown'),
    holds: () => 'This link is used up',
  },
  {
    kind: 'page',
    route: '/confirm-address/[token]',
    at: () => '/confirm-address/of-nobody',
    outcome: forEverybody('shown'),
    holds: () => 'This link is used up',
  },
  ...['/people/new', '/people/invitations', '/audit'].map((route): PageRow => ({
    kind: 'page',
    route,
    outcome: only(['administrator'], 'shown', 'forbidden', 'sign in'),
  })),
];

/** Files to be taken away; they are for people, and no part of the API that is described. */
export const filesToTakeAway: readonly HandlerRow[] = [
  {
    kind: 'handler',
    method: 'GET',
    route: '/api/account/records',
    outcome: forSignedIn(200, 401),
    foreign: true,
  },
  {
    kind: 'handler',
    method: 'GET',
    route: '/api/audit',
    outcome: only(['administrator'], 200, 404, 401),
    foreign: true,
  },
];

const byLink = { on: () => '/invitation/of-nobody', bound: () => ['of-nobody'] } as const;

const onPeopleOfClass = {
  on: ({ classId }: { readonly classId: string }) => `/classes/${classId}/people`,
};

/** Server actions of coming in: what is asked of whom is the same, whoever is signed in. */
export const actionsOfComingIn: readonly ActionRow[] = [
  {
    kind: 'action',
    file: 'app/forgotten/actions.ts',
    name: 'askReset',
    on: () => '/forgotten',
    form: ({ newAddress }) => ({ email: newAddress() }),
    outcome: forEverybody('done'),
  },
  {
    kind: 'action',
    file: 'app/join/actions.ts',
    name: 'askToComeIn',
    on: () => '/join',
    form: ({ newAddress }) => ({
      word: 'no-such-word-0000',
      name: 'Made Matrix',
      email: newAddress(),
    }),
    outcome: forEverybody('done'),
  },
  {
    kind: 'action',
    file: 'app/join/actions.ts',
    name: 'joinAtOnce',
    on: () => '/join',
    form: () => ({ word: 'no-such-word-0000' }),
    outcome: forSignedIn('refused', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/invitation/[token]/actions.ts',
    name: 'comeIn',
    ...byLink,
    form: () => ({ name: 'Made Matrix', password: 'seven dovetails in oak' }),
    outcome: forEverybody('refused'),
  },
  {
    kind: 'action',
    file: 'app/invitation/[token]/actions.ts',
    name: 'acceptHere',
    ...byLink,
    form: () => ({}),
    outcome: forSignedIn('refused', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/confirm-address/[token]/actions.ts',
    name: 'confirmAddress',
    on: () => '/confirm-address/of-nobody',
    bound: () => ['of-nobody'],
    form: () => ({}),
    outcome: forEverybody('refused'),
  },
  {
    kind: 'action',
    file: 'app/_components/inviting/actions.ts',
    name: 'lookThrough',
    ...onPeopleOfClass,
    bound: ({ classId }) => [classId],
    form: ({ newAddress }) => ({ list: newAddress(), role: 'learner' }),
    outcome: only(staffOfTheClass, 'done', 'refused', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/_components/inviting/actions.ts',
    name: 'inviteAll',
    ...onPeopleOfClass,
    bound: ({ classId }) => [classId],
    form: ({ newAddress }) => ({
      people: JSON.stringify([{ line: 1, email: newAddress(), name: null }]),
      role: 'learner',
    }),
    outcome: only(staffOfTheClass, 'done', 'refused', 'sign in'),
  },
  ...['sendAgain', 'withdraw'].map((name): ActionRow => ({
    kind: 'action',
    file: 'app/_components/inviting/actions.ts',
    name,
    ...onPeopleOfClass,
    bound: async ({ newInvitation }) => [await newInvitation()],
    form: () => ({}),
    outcome: only(staffOfTheClass, 'done', 'refused', 'sign in'),
  })),
];

/** Server actions of one's own account, and of the administrator on somebody's. */
export const actionsOfAccounts: readonly ActionRow[] = [
  {
    kind: 'action',
    file: 'app/_components/password-gate-actions.ts',
    name: 'givePasswordAgain',
    on: () => '/account',
    form: () => ({ password: 'not the one' }),
    outcome: forSignedIn('refused', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/account/actions.ts',
    name: 'saveAddress',
    on: () => '/account',
    form: () => ({ email: 'not an address' }),
    outcome: forSignedIn('refused', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/account/session-actions.ts',
    name: 'endSession',
    on: () => '/account',
    bound: ({ classId }) => [classId],
    form: () => ({}),
    outcome: forSignedIn('refused', 'sign in'),
  },
  {
    // Without the form's own word nobody is signed out: the matrix goes on with these sign-ins.
    kind: 'action',
    file: 'app/account/session-actions.ts',
    name: 'signOutEverywhere',
    on: () => '/account',
    form: () => ({}),
    outcome: forSignedIn('refused', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/people/actions.ts',
    name: 'makeAdmin',
    on: () => '/people',
    bound: async ({ newMember }) => [await newMember()],
    form: () => ({}),
    outcome: only(['administrator'], 'done', 'refused', 'sign in'),
  },
  {
    // Somebody who is no administrator cannot be made one no longer.
    kind: 'action',
    file: 'app/people/actions.ts',
    name: 'unmakeAdmin',
    on: () => '/people',
    bound: async ({ newMember }) => [await newMember()],
    form: () => ({}),
    outcome: forSignedIn('refused', 'sign in'),
  },
];
