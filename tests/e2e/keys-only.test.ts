import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exercises } from '@/content/exercises/registry';
import { shownOptions } from '@/lib/marking/mark-choice';
import { lessonPath, openExercise, setByNotches, wantedOfBench } from '../support/answering';
import { launchBrowser, openVisitor, signIn, type Visitor } from '../support/browser';
import { demo, password } from '../support/people';
import { keyOf, openVariant } from '../support/records';

/** Answering without a pointer: the fields, the options and the button, reached and used by keys. */
describe('an exercise answered by keys alone', () => {
  const person = demo.secondLearner;
  let browser: Browser;
  let visitor: Visitor;
  let page: Page;

  beforeAll(async () => {
    browser = await launchBrowser();
    visitor = await openVisitor(browser, { reducedMotion: true });
    page = visitor.page;
    await signIn(page, person, password);
  });
  afterAll(async () => {
    await visitor.close();
    await browser.close();
  });

  /** Goes on by Tab until the focus is on `target`; gives up after more stops than a page has. */
  const tabTo = async (target: Locator) => {
    for (let stop = 0; stop < 200; stop += 1) {
      if (await target.evaluate((node) => node === document.activeElement)) return;
      await page.keyboard.press('Tab');
    }
    throw new Error('The control was never reached by Tab.');
  };
  const begin = async (exerciseId: string) => {
    const section = await openExercise(page, exerciseId);
    await section.evaluate((node) => {
      node.setAttribute('tabindex', '-1');
      (node as HTMLElement).focus();
    });
    return section;
  };

  it('numbers: typed, sent by Enter, the focus stays, the marking is said', async () => {
    await page.goto(lessonPath('trammel-and-oval'), { waitUntil: 'networkidle' });
    const section = await begin('pins-for-an-oval');
    const { key } = keyOf(await openVariant(person, 'pins-for-an-oval'));
    let last: Locator | null = null;
    for (const part of key.parts) {
      last = section.getByLabel(part.label, { exact: true });
      await tabTo(last);
      await page.keyboard.type('1');
    }
    await page.keyboard.press('Enter');
    const said = section.getByRole('status').filter({ hasText: /✕/ });
    await said.first().waitFor();
    expect(await last?.evaluate((node) => node === document.activeElement)).toBe(true);
    for (const part of key.parts) {
      const field = section.getByLabel(part.label, { exact: true });
      await field.focus();
      await page.keyboard.press('Control+a');
      await page.keyboard.type(part.answer);
    }
    await page.keyboard.press('Enter');
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
  });

  it('a guess, signed out: picked by Space, committed by Enter, and the bench turns', async () => {
    const guest = await openVisitor(browser, { reducedMotion: true });
    await guest.page.goto(lessonPath('trammel-and-oval'), { waitUntil: 'networkidle' });
    const guess = guest.page.locator('#guess');
    await guess.getByRole('radio').first().focus();
    await guest.page.keyboard.press('Space');
    await guest.page.keyboard.press('Tab');
    const button = guess.getByRole('button', { name: 'That is my guess' });
    expect(await button.evaluate((node) => node === document.activeElement)).toBe(true);
    await guest.page.keyboard.press('Enter');
    await guest.page.locator('#try').getByRole('slider').first().waitFor();
    await guest.close();
  });

  it('a choice: picked by Space, checked by Enter on the button', async () => {
    await page.goto(lessonPath('train-of-toothed-wheels'), { waitUntil: 'networkidle' });
    const id = 'which-train-for-the-lantern';
    const section = await begin(id);
    const variant = await openVariant(person, id);
    const part = exercises.get(id)?.parts.find(({ kind }) => kind === 'choice');
    if (part?.kind !== 'choice') throw new Error(`${id} asks for no choice.`);
    const right = shownOptions(part, variant).find(({ option }) =>
      part.answer(variant).includes(option),
    );
    const radio = section.getByRole('radio', { name: right?.label ?? '', exact: true });
    await radio.focus();
    await page.keyboard.press('Space');
    expect(await radio.isChecked()).toBe(true);
    await tabTo(section.getByRole('button', { name: /^Check/ }));
    await page.keyboard.press('Enter');
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
  });

  it('a hint: asked for by keys, and read', async () => {
    const section = await begin('lantern-wheel');
    const hint = section.getByRole('button', { name: /hint/i }).first();
    await tabTo(hint);
    await page.keyboard.press('Enter');
    const { key } = keyOf(await openVariant(person, 'lantern-wheel'));
    await section.getByText(key.hints[0] ?? '-').waitFor();
  });

  it('a setting: brought there by arrow keys, checked by Enter on the button', async () => {
    await page.goto(lessonPath('pantograph'), { waitUntil: 'networkidle' });
    const id = 'copy-at-three-to-two';
    const section = await begin(id);
    await setByNotches(section, await wantedOfBench(person, id), async (label, way) => {
      await section.getByRole('spinbutton', { name: label, exact: true }).focus();
      await page.keyboard.press(way === 'more' ? 'ArrowUp' : 'ArrowDown');
    });
    await tabTo(section.getByRole('button', { name: /^Check/ }));
    await page.keyboard.press('Enter');
    await section.getByRole('button', { name: 'New numbers' }).waitFor();
  });

  it('a design: chosen by arrow keys and typed', async () => {
    const section = await begin('sign-for-the-board');
    const form = section.locator('form');
    for (const select of await form.locator('select').all()) {
      await tabTo(select);
      await page.keyboard.press('ArrowDown');
      expect(await select.inputValue()).not.toBe('');
    }
    for (const field of await form.locator('fieldset input[type="text"]').all()) {
      await tabTo(field);
      await page.keyboard.type('100');
    }
    await tabTo(section.getByRole('button', { name: /^Check/ }));
    await page.keyboard.press('Enter');
    await section.getByRole('status').filter({ hasText: /[✓✕]/ }).first().waitFor();
  });

  it('the worked solution: asked for, confirmed in the same place, and read', async () => {
    const section = await begin('how-large-the-copy');
    const { key } = keyOf(await openVariant(person, 'how-large-the-copy'));
    await tabTo(section.getByRole('button', { name: 'Worked solution' }));
    await page.keyboard.press('Enter');
    await tabTo(section.getByRole('button', { name: /^Yes, show it/ }));
    await page.keyboard.press('Enter');
    await section.getByText(key.solution[0] ?? '-', { exact: true }).waitFor();
  });
});
