import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { answerRightly, lessonPath, openExercise } from '../support/answering';
import { launchBrowser, openVisitor, signIn, type Visitor } from '../support/browser';
import { demo, password } from '../support/people';
import { keyOf, openVariant, records } from '../support/records';

/** The main job, once through: an account, a first wrong answer, the right one, and who sees it. */
describe('from an account to a marked answer that the instructor sees', () => {
  const email = 'wilma@harbour.example';
  const own = 'four planed oak boards';
  const path = lessonPath('trammel-and-oval');
  let browser: Browser;
  let learner: Visitor;

  beforeAll(async () => {
    browser = await launchBrowser();
    learner = await openVisitor(browser, { touch: true, width: 390 });
  });
  afterAll(async () => {
    await learner.close();
    await browser.close();
  });

  it('the administrator makes the account, puts it into a class and hands on a link that works once', async () => {
    const administrator = await openVisitor(browser);
    const { page } = administrator;
    await signIn(page, demo.administrator, password);
    await page.goto('/people/new', { waitUntil: 'networkidle' });
    await page.getByLabel('Name', { exact: true }).fill('Wilma Brandt');
    await page.getByLabel('E-mail').fill(email);
    await page.getByRole('button', { name: 'Make the account' }).click();
    const link = await page.getByText(/\/set-password\//).innerText();
    await page.goto('/classes', { waitUntil: 'networkidle' });
    await page.getByRole('link', { name: demo.className }).first().click();
    // The header leads to all people; the class's own page has to be there first.
    await page.getByRole('heading', { level: 1, name: demo.className }).waitFor();
    await page.getByRole('link', { name: 'People', exact: true }).last().click();
    await page.waitForURL(/\/classes\/[0-9a-f-]{36}\/people$/);
    await page.getByLabel('Who', { exact: true }).selectOption(email);
    await page.getByRole('button', { name: 'Put into the class' }).click();
    await page.getByText('Wilma Brandt').first().waitFor();
    await administrator.close();

    await learner.page.goto(new URL(link.trim()).pathname, { waitUntil: 'networkidle' });
    await learner.page.getByLabel('New password').fill(own);
    await learner.page.getByRole('button', { name: 'Set the password' }).click();
    await learner.page
      .getByRole('status')
      .filter({ hasText: /password/i })
      .first()
      .waitFor();
    await signIn(learner.page, email, own);
    await learner.page.goto(new URL(link.trim()).pathname);
    expect(await learner.page.locator('h1').innerText()).toMatch(/used up/);
  });

  it('the bench is locked until the guess is stored, and then turns', async () => {
    const { page } = learner;
    await page.goto(path, { waitUntil: 'networkidle' });
    const turn = page.locator('#try').getByRole('button', { name: 'Turn', exact: true });
    expect(await turn.count()).toBe(0);
    await page.locator('#guess').getByRole('radio').first().check();
    await page.getByRole('button', { name: 'That is my guess' }).click();
    await turn.waitFor();
    await page.getByRole('status').filter({ hasText: /./ }).first().waitFor();
    const stored = await records(
      `select 1 from attempts a join learners l on l.id = a.learner_id join people p on p.id = l.person_id
       where p.email = $1 and a.exercise_id = 'move-the-pen-out'`,
      [email],
    );
    expect(stored).toHaveLength(1);
  });

  it('a slip is named, nothing of the answer is in the page, and the right answer closes the round', async () => {
    const { page } = learner;
    const section = await openExercise(page, 'pins-for-an-oval');
    const { key } = keyOf(await openVariant(email, 'pins-for-an-oval'));
    const advice = key.parts.flatMap((part) => part.slips.map((slip) => slip.advice));
    const markup = await page.content();
    expect(advice.filter((words) => markup.includes(words))).toEqual([]);
    const slips = key.parts.map(({ slips: [first], label }) => ({ label, first }));
    for (const { label, first } of slips) {
      await section.getByLabel(label, { exact: true }).fill(first?.answer ?? '1');
    }
    await section.getByRole('button', { name: /^Check/ }).click();
    const told = section.getByRole('status').filter({ hasText: slips[0]?.first?.advice ?? '-' });
    await told.first().waitFor();
    await answerRightly(section, email, 'pins-for-an-oval');
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
  });

  it('the instructor of the class sees how the learner stands; another instructor does not', async () => {
    const instructor = await openVisitor(browser);
    await signIn(instructor.page, demo.instructor, password);
    await instructor.page.goto('/classes', { waitUntil: 'networkidle' });
    await instructor.page.getByRole('link', { name: demo.className }).first().click();
    await instructor.page
      .getByRole('link', { name: /Wilma Brandt/ })
      .first()
      .waitFor();
    const address = instructor.page.url();
    await instructor.close();

    const other = await openVisitor(browser, { expected: [/404/] });
    await signIn(other.page, demo.otherInstructor, password);
    const answer = await other.page.goto(address);
    expect(answer?.status()).toBe(404);
    expect(await other.page.content()).not.toContain('Wilma');
    await other.close();
  });
});
