import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exercises } from '@/content/exercises/registry';
import { shownOptions } from '@/lib/marking/mark-choice';
import { lessonPath, openExercise, setByNotches, wantedOfBench } from '../support/answering';
import { launchBrowser, openVisitor, signIn, type Visitor } from '../support/browser';
import { demo, password } from '../support/people';
import { keyOf, openVariant } from '../support/records';

/** Answering without a keyboard: every option, notch, hint and solution by single presses. */
describe('an exercise answered by clicks alone', () => {
  const person = demo.secondLearner;
  let browser: Browser;
  let visitor: Visitor;
  let page: Page;

  beforeAll(async () => {
    browser = await launchBrowser();
    visitor = await openVisitor(browser, { reducedMotion: true, touch: true, width: 390 });
    page = visitor.page;
    await signIn(page, person, password);
  });
  afterAll(async () => {
    await visitor.close();
    await browser.close();
  });

  const check = (section: ReturnType<Page['locator']>) =>
    section.getByRole('button', { name: /^Check/ }).click();

  it('a choice: the option and the button', async () => {
    await page.goto(lessonPath('pantograph'), { waitUntil: 'networkidle' });
    const id = 'which-copies-true';
    const section = await openExercise(page, id);
    const variant = await openVariant(person, id);
    const part = exercises.get(id)?.parts.find(({ kind }) => kind === 'choice');
    if (part?.kind !== 'choice') throw new Error(`${id} asks for no choice.`);
    const wanted = part.answer(variant);
    for (const { option, label } of shownOptions(part, variant)) {
      if (wanted.includes(option)) {
        await section.getByText(label, { exact: true }).first().click();
      }
    }
    await check(section);
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
  });

  it('a setting: notch by notch', async () => {
    const id = 'copy-at-three-to-two';
    const section = await openExercise(page, id);
    await setByNotches(section, await wantedOfBench(person, id), (label, way) =>
      section.getByRole('button', { name: `${label}: ${way}`, exact: true }).click(),
    );
    await check(section);
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
  });

  // Figures need letters of some kind: who has no keyboard has one on the screen, and it types into
  // the field that was pressed last.
  it('numbers: each field is pressed, its figure goes there, and the button sends them', async () => {
    const id = 'reach-and-tremor';
    const section = await openExercise(page, id);
    const { key } = keyOf(await openVariant(person, id));
    for (const part of key.parts) {
      const field = section.getByLabel(part.label, { exact: true });
      await field.click();
      expect(await field.evaluate((node) => node === document.activeElement)).toBe(true);
      expect((await field.boundingBox())?.height).toBeGreaterThanOrEqual(44);
      await page.keyboard.insertText(part.answer);
    }
    await check(section);
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
  });

  it('a guess, signed out: an option and the button, and the bench turns', async () => {
    const guest = await openVisitor(browser, { reducedMotion: true, touch: true, width: 390 });
    await guest.page.goto(lessonPath('pantograph'), { waitUntil: 'networkidle' });
    const guess = guest.page.locator('#guess');
    await guess.locator('label').filter({ hasText: 'upright' }).first().click();
    await guess.getByRole('button', { name: 'That is my guess' }).click();
    await guest.page.locator('#try').getByRole('slider').first().waitFor();
    await guest.close();
  });

  it('a hint, pressed twice in a hurry, is one hint', async () => {
    const id = 'reach-and-tremor';
    const section = await openExercise(page, id);
    const { key } = keyOf(await openVariant(person, id));
    await section.getByRole('button', { name: 'First hint' }).dblclick();
    await section.getByText(key.hints[0] ?? '-').waitFor();
    expect(await section.getByText('Second hint:').count()).toBe(0);
    await section.getByRole('button', { name: 'Second hint' }).waitFor();
  });

  it('the worked solution: asked for, and confirmed', async () => {
    const id = 'holes-for-a-scale';
    const section = await openExercise(page, id);
    const { key } = keyOf(await openVariant(person, id));
    await section.getByRole('button', { name: 'Worked solution' }).click();
    await section.getByRole('button', { name: /^Yes, show it/ }).click();
    await section.getByText(key.solution[0] ?? '-', { exact: true }).waitFor();
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
  });
});
