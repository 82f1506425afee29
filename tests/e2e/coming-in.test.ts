import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, openVisitor, signIn, type Visitor } from '../support/browser';
import { nextLink } from '../support/caught-letters';
import { demo, password } from '../support/people';
import { records } from '../support/records';

/** Coming in and staying in control, by letters that are caught on the way. */
const own = 'four planed oak boards';
const next = 'five turned beech knobs';
const invited = 'wenche@harbour.example';
const joined = 'ylva@harbour.example';
const word = 'rowan-spokeshave-0417';
let browser: Browser;
let instructor: Visitor;

beforeAll(async () => {
  browser = await launchBrowser();
  instructor = await openVisitor(browser);
  await records('update class_groups set joining_word = $2, joining_open = true where name = $1', [
    demo.className,
    word,
  ]);
});
afterAll(async () => {
  await instructor.close();
  await browser.close();
});

/** Opens the page of who is in the instructor's class. */
async function openPeople() {
  const [found] = await records<{ id: string }>('select id from class_groups where name = $1', [
    demo.className,
  ]);
  await instructor.page.goto(`/classes/${found?.id}/people`, { waitUntil: 'networkidle' });
}

describe('coming in', () => {
  it('an instructor looks through a list, invites who can be, and nobody before that', async () => {
    const { page } = instructor;
    await signIn(page, demo.instructor, password);
    await openPeople();
    await page
      .getByLabel('E-mail, one or many')
      .fill(`Wenche Berg <${invited}>\nnot an address\n${demo.learner}`);
    await page.getByRole('button', { name: 'Invite', exact: true }).click();
    await page.getByText('1 person can be invited. Nobody is yet.').waitFor();
    const lines = page.getByRole('table', { name: 'Lines that need a look' });
    expect(await lines.getByRole('row').nth(1).innerText()).toMatch(/2\s+not an address/);
    expect(await lines.getByRole('row').nth(2).innerText()).toMatch(/3.+in the class already/s);
    expect(await records('select 1 from invitations where email = $1', [invited])).toEqual([]);
    await page.getByRole('button', { name: 'Invite this one' }).click();
    await page.getByText('One letter is on the way.').waitFor();
    const listed = page.getByRole('row').filter({ hasText: invited });
    expect(await listed.innerText()).toContain('invited');
  });

  it('the letter leads to a name and a password, and those to Today', async () => {
    const visitor = await openVisitor(browser, { width: 390 });
    const { page } = visitor;
    const link = await nextLink(invited);
    await page.goto(link, { waitUntil: 'networkidle' });
    expect(await page.locator('meta[name=referrer]').getAttribute('content')).toBe('strict-origin');
    await page.getByLabel('A password').fill('password password');
    await page.getByRole('button', { name: 'Come in' }).click();
    await page.getByText(/too many people use that one/i).waitFor();
    expect(await page.getByLabel('Your name').inputValue()).toBe('Wenche Berg');
    await page.getByLabel('A password').fill(own);
    await page.getByRole('button', { name: 'Come in' }).click();
    await page.waitForURL('**/today');
    await page.goto(link);
    expect(await page.locator('h1').innerText()).toBe('This link is used up');
    await visitor.close();
    await openPeople();
    const row = instructor.page.getByRole('row').filter({ hasText: invited });
    expect(await row.innerText()).toContain('joined');
  });

  it('the joining word brings a letter, and the letter brings somebody in', async () => {
    const visitor = await openVisitor(browser);
    const { page } = visitor;
    await page.goto('/join', { waitUntil: 'networkidle' });
    await page.getByLabel('Joining word').fill('Rowan Spokeshave 0417');
    await page.getByLabel('Your name').fill('Ylva Moe');
    await page.getByLabel('E-mail').fill(joined);
    await page.getByRole('button', { name: 'Send me the letter' }).click();
    await page.getByText(/If a class is open to that word/).waitFor();
    await page.goto(await nextLink(joined), { waitUntil: 'networkidle' });
    await page.getByLabel('A password').fill(own);
    await page.getByRole('button', { name: 'Come in' }).click();
    await page.waitForURL('**/today');
    await visitor.close();
  });
});

describe('staying in control', () => {
  it('a forgotten password is replaced by letter', async () => {
    const visitor = await openVisitor(browser);
    const { page } = visitor;
    await page.goto('/forgotten', { waitUntil: 'networkidle' });
    await page.getByLabel('E-mail').fill(joined);
    await page.getByRole('button', { name: 'Send me the letter' }).click();
    await page.getByText(/has an account here/).waitFor();
    await page.goto(await nextLink(joined), { waitUntil: 'networkidle' });
    await page.getByLabel('New password').fill(next);
    await page.getByRole('button', { name: 'Set the password' }).click();
    await page.getByText('Your password is set.').waitFor();
    await signIn(page, joined, next);
    await visitor.close();
  });

  it('a sign-in elsewhere is ended, and what was being typed there is not lost', async () => {
    const here = await openVisitor(browser);
    const there = await openVisitor(browser);
    await signIn(here.page, joined, next);
    await signIn(there.page, joined, next);
    await there.page.goto('/account', { waitUntil: 'networkidle' });
    await here.page.goto('/account', { waitUntil: 'networkidle' });
    const others = here.page.getByRole('button', { name: 'End it' });
    for (let left = await others.count(); left > 0; left -= 1) {
      await others.first().click();
      await expect.poll(() => others.count()).toBe(left - 1);
    }
    await there.page.getByLabel('Name', { exact: true }).fill('Ylva Moe the Second');
    await there.page.getByRole('button', { name: 'Save', exact: true }).first().click();
    await there.page.waitForURL('**/sign-in?**');
    await there.page.getByLabel('E-mail').fill(joined);
    await there.page.getByLabel('Password', { exact: true }).fill(next);
    await there.page.getByRole('button', { name: 'Sign in' }).click();
    await there.page.waitForURL('**/account');
    const name = there.page.getByLabel('Name', { exact: true });
    await expect.poll(() => name.inputValue()).toBe('Ylva Moe the Second');
    await there.page.getByRole('button', { name: 'Sign out everywhere' }).click();
    await there.page.waitForURL('**/sign-in**');
    await here.page.goto('/today');
    expect(here.page.url()).toContain('/sign-in');
    await here.close();
    await there.close();
  });
});
