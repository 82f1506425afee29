import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exercises, lessons } from '@/content/exercises/registry';
import { answerRightly, lessonPath, openExercise } from '../support/answering';
import { launchBrowser, openVisitor, signIn, type Visitor } from '../support/browser';
import { demo, password } from '../support/people';

describe.each(lessons.map(({ id }) => id))('the exercises of %s', (lessonId) => {
  let browser: Browser;
  let visitor: Visitor;

  beforeAll(async () => {
    browser = await launchBrowser();
    visitor = await openVisitor(browser, { reducedMotion: true });
    await signIn(visitor.page, demo.learner, password);
    await visitor.page.goto(lessonPath(lessonId), { waitUntil: 'networkidle' });
  });
  afterAll(async () => {
    await visitor.close();
    await browser.close();
  });

  const answered = [...exercises.values()]
    .filter(({ lesson, kind }) => lesson === lessonId && kind !== 'prediction')
    .map(({ id }) => id);

  it.each(answered)('%s is solved through the page', async (exerciseId) => {
    const section = await openExercise(visitor.page, exerciseId);
    await answerRightly(section, demo.learner, exerciseId);
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
    expect(await section.getByRole('status').allInnerTexts()).toEqual(
      expect.arrayContaining([expect.stringContaining('✓')]),
    );
  });
});
