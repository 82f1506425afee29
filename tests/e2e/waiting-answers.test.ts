import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { answerRightly, lessonPath, openExercise } from '../support/answering';
import { launchBrowser, openVisitor, signIn, type Visitor } from '../support/browser';
import { demo, password } from '../support/people';
import { records } from '../support/records';

describe('an answer given while the network is away', () => {
  const exercise = 'lantern-wheel';
  const person = demo.secondLearner;
  let browser: Browser;
  let visitor: Visitor;

  const attempts = () =>
    records(
      `select a.id from attempts a join learners l on l.id = a.learner_id join people p on p.id = l.person_id
       where p.email = $1 and a.exercise_id = $2`,
      [person, exercise],
    );

  beforeAll(async () => {
    browser = await launchBrowser();
    visitor = await openVisitor(browser, { expected: [/ERR_INTERNET_DISCONNECTED/] });
    await signIn(visitor.page, person, password);
  });
  afterAll(async () => {
    await visitor.close();
    await browser.close();
  });

  it('waits on the device, survives the network and is sent once', async () => {
    const { page, context } = visitor;
    await page.goto(lessonPath('train-of-toothed-wheels'), { waitUntil: 'networkidle' });
    const section = await openExercise(page, exercise);
    const before = (await attempts()).length;
    await context.setOffline(true);
    await answerRightly(section, person, exercise);
    await section.getByText('waits on this device').waitFor();
    expect(await attempts()).toHaveLength(before);
    await context.setOffline(false);
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
    expect(await attempts()).toHaveLength(before + 1);
    await page.reload({ waitUntil: 'networkidle' });
    expect(await attempts()).toHaveLength(before + 1);
  });
});
