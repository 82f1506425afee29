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

/** What only one bench has: its tray, its fixed pin. */
describe('parts that are put and pins that are moved', () => {
  let browser: Browser;
  let visitor: Visitor;
  let page: Page;

  beforeAll(async () => {
    browser = await launchBrowser();
    visitor = await openVisitor(browser, { height: 1600, reducedMotion: true });
    page = visitor.page;
  });
  afterAll(async () => {
    await visitor.close();
    await browser.close();
  });

  const open = async (lessonId: string) => {
    await page.goto(lessonPath(lessonId), { waitUntil: 'networkidle' });
    await page.getByRole('button', { name: 'Just show me' }).click();
    const bench = page.locator('#try section').first();
    await bench.locator('[data-live=true]').waitFor();
    await bench.evaluate((node) => node.scrollIntoView());
    return bench;
  };
  const pull = async (from: Place, to: Place) => {
    await page.mouse.move(from.x, from.y);
    await page.mouse.down();
    await page.mouse.move((from.x + to.x) / 2, (from.y + to.y) / 2, { steps: 4 });
    await page.mouse.move(to.x, to.y, { steps: 4 });
    await page.mouse.up();
  };

  it('a wheel comes from the tray on to an arbor by a pull, by presses and by keys', async () => {
    const bench = await open('train-of-toothed-wheels');
    const middle = bench.getByRole('spinbutton', { name: 'Arbor 2', exact: true });
    const wheel = (teeth: number) => bench.getByRole('button', { name: `wheel of ${teeth} teeth` });
    const drawing = bench.getByRole('img').first();
    const overMiddle = await placeIn(drawing, 0.5, 0.35);
    await pull(await placeIn(wheel(24), 0.5, 0.5), overMiddle);
    await expect.poll(() => middle.inputValue()).toBe('24');
    await wheel(60).click();
    await page.mouse.click(overMiddle.x, overMiddle.y);
    await expect.poll(() => middle.inputValue()).toBe('60');
    await wheel(36).focus();
    await page.keyboard.press('Enter');
    await bench.getByRole('button', { name: 'Arbor 2', exact: true }).focus();
    await page.keyboard.press('Enter');
    await expect.poll(() => middle.inputValue()).toBe('36');
    // One wheel alone between two: the lantern does not notice.
    expect(await bench.getByText(/One turn of it for 1 turn of the crank/).count()).toBe(1);
  });

  it('the fixed pin is pulled over the board, and set by its figures', async () => {
    const bench = await open('pantograph');
    const east = bench.getByRole('spinbutton', { name: 'Drawing, east of the fixed pin' });
    const before = Number(await east.getAttribute('aria-valuenow'));
    const pin = await bench.evaluate((node) => {
      const label = [...node.querySelectorAll('text')].find(
        ({ textContent }) => textContent === 'fixed',
      );
      const box = label?.getBoundingClientRect();
      // The word stands 30 px under the pin.
      return box ? { x: box.x + box.width / 2, y: box.y + box.height / 2 - 30 } : null;
    });
    if (!pin) throw new Error('The drawing names no fixed pin.');
    await pull(pin, { x: pin.x - 40, y: pin.y });
    await expect
      .poll(async () => Number(await east.getAttribute('aria-valuenow')))
      .toBeGreaterThan(before);
    await east.fill('150');
    await east.press('Enter');
    await expect.poll(() => east.inputValue()).toBe('150');
    await expect.poll(() => bench.getByText(/its middle 150\.0 mm east/).count()).toBe(1);
  });
});

interface Place {
  readonly x: number;
  readonly y: number;
}

async function placeIn(locator: Locator, across: number, down: number): Promise<Place> {
  const box = await locator.boundingBox();
  if (!box) throw new Error('It is not to be seen.');
  return { x: box.x + across * box.width, y: box.y + down * box.height };
}
