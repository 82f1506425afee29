import { forEverybody, forSignedIn, type ActionRow, type PageRow } from './endpoint';

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
];

const byLink = { on: () => '/invitation/of-nobody', bound: () => ['of-nobody'] } as const;

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
];
