import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { lessons } from '@/content/exercises/registry';
import { lessonPath } from '../support/answering';
import { launchBrowser, openVisitor, type Visitor } from '../support/browser';

/** Every control of every bench, once by keys alone and once by clicks alone, signed out. */
describe.each(lessons.map(({ id }) => id))('the bench of %s', (lessonId) => {
  let browser: Browser;
  let visitor: Visitor;
  let page: Page;
  let bench: Locator;

  beforeAll(async () => {
    browser = await launchBrowser();
    visitor = await openVisitor(browser);
    page = visitor.page;
    await page.goto(lessonPath(lessonId), { waitUntil: 'networkidle' });
    bench = page.locator('#try section, #try figure, #try [aria-labelledby]').first();
  });
  afterAll(async () => {
    await visitor.close();
    await browser.close();
  });

  const drive = () => bench.getByRole('spinbutton').first();
  const button = (name: string) => bench.getByRole('button', { name, exact: true });
  const value = async () => Number(await drive().getAttribute('aria-valuenow'));

  it('stands still and gives nothing away until somebody has guessed or asks to be shown', async () => {
    expect(await bench.getByRole('slider').count()).toBe(0);
    await page.getByRole('button', { name: 'Just show me' }).click();
    await bench.getByRole('slider').first().waitFor();
  });

  it('is driven, stepped, run, paused, undone and sent back by clicks alone', async () => {
    const start = await value();
    await button('Step').click();
    const stepped = await value();
    expect(stepped).not.toBe(start);
    await button('Undo').click();
    expect(await value()).toBe(start);
    await bench
      .getByRole('button', { name: /: more$/ })
      .first()
      .click();
    expect(await value()).not.toBe(start);
    const run = bench.getByRole('button', { name: /^(Turn|Lead)$/ });
    await run.click();
    await button('Pause').waitFor();
    const running = await value();
    await expect.poll(value).not.toBe(running);
    await button('Pause').click();
    await run.waitFor();
    const paused = await value();
    await button('Back to the start').click();
    expect(await value()).toBe(start);
    expect(paused).not.toBe(start);
    for (const name of ['Tracing', 'Dimensions']) {
      const box = bench.getByRole('checkbox', { name });
      await box.click();
      expect(await box.isChecked()).toBe(false);
      await box.click();
    }
    await button('Fit').click();
  });

  it('is driven and set by keys alone, and lets the focus go on', async () => {
    await button('Back to the start').click();
    const start = await value();
    await drive().focus();
    await page.keyboard.press('ArrowUp');
    expect(await value()).not.toBe(start);
    await bench.getByRole('slider').first().focus();
    const before = await value();
    await page.keyboard.press('ArrowRight');
    await page.keyboard.press('ArrowRight');
    expect(await value()).not.toBe(before);
    await page.keyboard.press('Tab');
    const inside = await bench.evaluate((node) => node.contains(document.activeElement));
    expect(inside).toBe(true);
    const run = bench.getByRole('button', { name: /^(Turn|Lead)$/ });
    await run.focus();
    await page.keyboard.press('Enter');
    await button('Pause').waitFor();
    await page.keyboard.press('Enter');
    await run.waitFor();
  });

  it('says in words and in a table what the drawing shows', async () => {
    const words = bench.locator('p').filter({ hasText: /\d/ });
    expect(await words.count()).toBeGreaterThan(0);
    await bench.getByText('Plot and numbers').click();
    await bench.getByRole('table').first().waitFor();
    const drawing = bench.getByRole('img').first();
    expect(await drawing.getAttribute('aria-labelledby')).not.toBeNull();
  });

  it('does not run by itself where less motion is wanted', async () => {
    const still = await openVisitor(browser, { reducedMotion: true });
    await still.page.goto(lessonPath(lessonId), { waitUntil: 'networkidle' });
    await still.page.getByRole('button', { name: 'Just show me' }).click();
    const own = still.page.locator('#try');
    await own.getByRole('slider').first().waitFor();
    await own.getByRole('button', { name: 'Step', exact: true }).click();
    const frames = await still.page.evaluate(
      () =>
        new Promise<number>((resolve) => {
          let asked = 0;
          const original = window.requestAnimationFrame.bind(window);
          window.requestAnimationFrame = (callback) => {
            asked += 1;
            return original(callback);
          };
          setTimeout(() => {
            window.requestAnimationFrame = original;
            resolve(asked);
          }, 500);
        }),
    );
    expect(frames).toBeLessThan(3);
    await still.close();
  });
});
