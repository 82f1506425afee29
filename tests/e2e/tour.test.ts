import { mkdirSync } from 'node:fs';
import path from 'node:path';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  accessibilityViolations,
  fitsItsWidth,
  launchBrowser,
  openVisitor,
  signIn,
  widths,
  type Theme,
} from '../support/browser';
import { demo, password } from '../support/people';
import { screens, type Person } from './screens';

/**
 * Every screen as each kind of person sees it. A picture of each is kept for looking at; each must be
 * free of what axe finds, fit its width and break no policy. `HORNBEAM_TOUR=whole` takes every width
 * in both themes; otherwise the phone in light and the desktop in dark.
 */
const whole = process.env.HORNBEAM_TOUR === 'whole';
const looks: readonly { readonly width: number; readonly theme: Theme }[] = whole
  ? Object.values(widths).flatMap((width) => [
      { width, theme: 'light' as const },
      { width, theme: 'dark' as const },
    ])
  : [
      { width: widths.phone, theme: 'light' },
      { width: widths.desktop, theme: 'dark' },
    ];
const pictures = path.join(import.meta.dirname, 'pictures');
const addresses: Readonly<Record<Exclude<Person, 'nobody'>, string>> = {
  learner: demo.learner,
  instructor: demo.instructor,
  administrator: demo.administrator,
};

describe.each(looks)('the tour at $width px in $theme', ({ width, theme }) => {
  let browser: Browser;

  beforeAll(async () => {
    mkdirSync(pictures, { recursive: true });
    browser = await launchBrowser();
  });
  afterAll(async () => {
    await browser.close();
  });

  it.each(['nobody', 'learner', 'instructor', 'administrator'] as const)(
    'shows %s every screen without a violation',
    { timeout: 600_000 },
    async (person) => {
      const visitor = await openVisitor(browser, {
        width,
        theme,
        reducedMotion: true,
        // A refused sign-in and pages that are not there, which the tour goes to on purpose.
        expected: [/status of 40[14]/],
      });
      const { page } = visitor;
      if (person !== 'nobody') await signIn(page, addresses[person], password);
      const found: string[] = [];
      for (const screen of screens.filter(({ by }) => by.includes(person))) {
        await page.goto(screen.path, { waitUntil: 'networkidle' });
        await screen.prepare?.(page);
        const name = `${screen.name}-${person}-${width}-${theme}.png`;
        await page.screenshot({ path: path.join(pictures, name), fullPage: true });
        const violations = await accessibilityViolations(page);
        found.push(...violations.map((violation) => `${screen.name}: ${violation}`));
        if (!(await fitsItsWidth(page))) found.push(`${screen.name}: wider than ${width} px`);
        const headings = await page.locator('h1').count();
        if (headings !== 1) found.push(`${screen.name}: ${headings} first headings`);
      }
      expect(found).toEqual([]);
      await visitor.close();
    },
  );
});
