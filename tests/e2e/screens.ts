import type { Page } from 'playwright-core';

export type Person = 'nobody' | 'learner' | 'instructor' | 'administrator';

/** One stop of the tour: where, who sees it, and what is done there before the picture. */
export interface Screen {
  readonly name: string;
  readonly path: string;
  readonly by: readonly Person[];
  readonly prepare?: (page: Page) => Promise<void>;
}

const everybody: readonly Person[] = ['nobody', 'learner', 'instructor', 'administrator'];
const known: readonly Person[] = ['learner', 'instructor', 'administrator'];
const lessons = [
  'toothed-wheels/train-of-toothed-wheels',
  'drawing-and-copying/trammel-and-oval',
  'drawing-and-copying/pantograph',
];

/** Opens the first link of the page whose address matches, as somebody looking for it would. */
const follow = (pattern: RegExp) => async (page: Page) => {
  const hrefs = await page
    .locator('main a[href]')
    .evaluateAll((links) => links.map((link) => link.getAttribute('href') ?? ''));
  const href = hrefs.find((candidate) => pattern.test(candidate));
  if (!href) throw new Error(`${page.url()} has no link that matches ${pattern}.`);
  await page.goto(href, { waitUntil: 'networkidle' });
};

const inTurn =
  (...steps: readonly ((page: Page) => Promise<void>)[]) =>
  async (page: Page) => {
    for (const step of steps) await step(page);
  };

const firstClass = follow(/^\/classes\/[0-9a-f-]{36}$/);

export const screens: readonly Screen[] = [
  { name: 'landing', path: '/', by: ['nobody', 'learner'] },
  { name: 'lessons', path: '/lessons', by: everybody },
  { name: 'by-motion', path: '/by-motion', by: ['nobody', 'learner'] },
  { name: 'for-instructors', path: '/for-instructors', by: ['nobody'] },
  { name: 'sign-in', path: '/sign-in', by: ['nobody'] },
  {
    name: 'sign-in-refused',
    path: '/sign-in',
    by: ['nobody'],
    prepare: async (page) => {
      await page.getByLabel('E-mail').fill('nobody@harbour.example');
      await page.getByLabel('Password', { exact: true }).fill('not the password');
      await page.getByRole('button', { name: 'Sign in' }).click();
      await page.getByRole('alert').first().waitFor();
    },
  },
  { name: 'forgotten', path: '/forgotten', by: ['nobody'] },
  { name: 'dead-link', path: '/set-password/not-a-link', by: ['nobody'] },
  { name: 'join', path: '/join', by: ['nobody', 'learner'] },
  { name: 'dead-invitation', path: '/invitation/not-a-link', by: ['nobody'] },
  { name: 'dead-change-of-address', path: '/confirm-address/not-a-link', by: ['nobody'] },
  { name: 'not-found', path: '/nowhere', by: ['nobody', 'learner'] },
  { name: 'asked-to-sign-in', path: '/today', by: ['nobody'] },
  ...lessons.map((lesson) => ({
    name: `lesson-${lesson.split('/')[1]}`,
    path: `/lessons/${lesson}`,
    by: ['nobody', 'learner', 'instructor'] as const,
  })),
  { name: 'today', path: '/today', by: ['learner'] },
  { name: 'feedback', path: '/feedback', by: ['learner'] },
  { name: 'account', path: '/account', by: known },
  {
    name: 'calendar-address',
    path: '/account',
    by: ['learner'],
    prepare: async (page) => {
      await page.getByRole('button', { name: /Make (the|a new) address/ }).click();
      await page.getByText('Copy it now').waitFor();
    },
  },
  { name: 'classes', path: '/classes', by: ['instructor', 'administrator'] },
  { name: 'class', path: '/classes', by: ['instructor'], prepare: firstClass },
  {
    name: 'class-of-administrator',
    path: '/classes',
    by: ['administrator'],
    prepare: firstClass,
  },
  ...['work', 'sticking-points', 'people', 'settings'].map((section) => ({
    name: `class-${section}`,
    path: '/classes',
    by: ['instructor'] as const,
    prepare: inTurn(firstClass, follow(new RegExp(`/${section}$`))),
  })),
  {
    name: 'class-set-work',
    path: '/classes',
    by: ['instructor'],
    prepare: inTurn(firstClass, follow(/\/work$/), follow(/\/work\/new$/)),
  },
  {
    name: 'class-change-work',
    path: '/classes',
    by: ['instructor'],
    prepare: inTurn(firstClass, follow(/\/work$/), follow(/\/work\/[0-9a-f-]{36}$/)),
  },
  {
    name: 'learner-in-class',
    path: '/classes',
    by: ['instructor'],
    prepare: inTurn(firstClass, follow(/\/learners\//)),
  },
  {
    name: 'attempt',
    path: '/classes',
    by: ['instructor'],
    prepare: inTurn(firstClass, follow(/\/learners\//), follow(/\/attempts\//)),
  },
  { name: 'exercises', path: '/exercises', by: ['instructor'] },
  { name: 'key', path: '/exercises', by: ['instructor'], prepare: follow(/\/key$/) },
  { name: 'people', path: '/people', by: ['administrator'] },
  { name: 'people-found', path: '/people?search=zz&standing=learner', by: ['administrator'] },
  { name: 'new-person', path: '/people/new', by: ['administrator'] },
  { name: 'invite-to-workshop', path: '/people/invitations', by: ['administrator'] },
  {
    name: 'list-looked-through',
    path: '/people/invitations',
    by: ['administrator'],
    prepare: async (page) => {
      await page
        .getByLabel('E-mail, one or many')
        .fill('Wenche Berg <wenche@new.example>\nola@new.example\nnot an address\nola@new.example');
      await page.getByRole('button', { name: 'Invite', exact: true }).click();
      await page.getByText('2 people can be invited').waitFor();
    },
  },
  { name: 'audit-log', path: '/audit', by: ['administrator'] },
  { name: 'mail', path: '/mail', by: ['administrator'] },
  { name: 'mail-failed', path: '/mail?state=failed', by: ['administrator'] },
  {
    name: 'person',
    path: '/people',
    by: ['administrator'],
    prepare: follow(/^\/people\/[0-9a-f-]{36}$/),
  },
];
