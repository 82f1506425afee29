import { randomUUID } from 'node:crypto';
import { unsubscribeAddresses } from '@/lib/data/entry/unsubscribe';
import { models } from '@/models';
import {
  forEverybody,
  forSignedIn,
  only,
  type ActionRow,
  type HandlerRow,
  type PageRow,
} from './endpoint';
import type { Planted } from './planted';

/** Where a learner can end letters, whoever holds the letter. */
const unsubscribePath = ({ learnerPersonId }: Planted) =>
  new URL(unsubscribeAddresses(learnerPersonId).page).pathname;

/** Pages of being told: the administrator's log, and what a letter's own address leads to. */
export const pagesOfBeingTold: readonly PageRow[] = [
  {
    kind: 'page',
    route: '/mail',
    outcome: only(['administrator'], 'shown', 'forbidden', 'sign in'),
    holds: () => 'Address, or part of it',
  },
  {
    kind: 'page',
    route: '/unsubscribe/[token]',
    at: unsubscribePath,
    outcome: forEverybody('shown'),
    holds: () => 'No more of these',
  },
  {
    kind: 'page',
    route: '/unsubscribe/[token]',
    at: () => '/unsubscribe/of-nobody',
    outcome: forEverybody('missing'),
  },
];

/** Handlers that carry their own proof and speak to programs of others, in forms of others; what they do with one that is good is in their own tests. */
export const handlersOfBeingTold: readonly HandlerRow[] = [
  {
    kind: 'handler',
    method: 'GET',
    route: '/api/calendar/[secret]',
    at: () => '/api/calendar/of-nobody',
    outcome: forEverybody(404),
    foreign: true,
  },
  {
    kind: 'handler',
    method: 'GET',
    route: '/api/unsubscribe/[token]',
    at: () => '/api/unsubscribe/of-nobody',
    outcome: forEverybody(303),
    foreign: true,
  },
  {
    // RFC 8058 has mail programs send a form of their own, from anywhere; JSON is not it.
    kind: 'handler',
    method: 'POST',
    route: '/api/unsubscribe/[token]',
    at: () => '/api/unsubscribe/of-nobody',
    body: () => ({}),
    outcome: forEverybody(422),
    foreign: true,
  },
];

/** A letter that was sent, fresh for every call. */
async function newSentLetter(): Promise<string> {
  const id = randomUUID();
  const now = new Date();
  await models().Letter.create({
    id,
    messageId: `<${id}@workshop.example>`,
    kind: 'password-changed',
    toAddress: 'nobody@workshop.example',
    data: {},
    state: 'sent',
    sentAt: now,
    createdAt: now,
  });
  return id;
}

/** Server actions of being told. */
export const actionsOfBeingTold: readonly ActionRow[] = [
  {
    kind: 'action',
    file: 'app/mail/actions.ts',
    name: 'sendAgain',
    on: () => '/mail',
    bound: async () => [await newSentLetter()],
    form: () => ({}),
    outcome: only(['administrator'], 'done', 'refused', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/unsubscribe/[token]/actions.ts',
    name: 'endClassMail',
    on: unsubscribePath,
    bound: () => ['of-nobody'],
    form: () => ({}),
    outcome: forEverybody('refused'),
  },
  {
    kind: 'action',
    file: 'app/account/_components/mail-actions.ts',
    name: 'saveMailPreference',
    on: () => '/account',
    form: () => ({ classMail: 'yes' }),
    outcome: forSignedIn('done', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/account/_components/calendar-actions.ts',
    name: 'makeCalendar',
    on: () => '/account',
    form: () => ({}),
    outcome: forSignedIn('done', 'sign in'),
  },
  {
    kind: 'action',
    file: 'app/account/_components/calendar-actions.ts',
    name: 'endCalendar',
    on: () => '/account',
    form: () => ({}),
    outcome: forSignedIn('done', 'sign in'),
  },
];
