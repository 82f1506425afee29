import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type axeCore from 'axe-core';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { expect } from 'vitest';
import { chromiumLaunch } from '../../scripts/machine/chromium.mjs';
import { site } from './site';

const axeSource = readFileSync(
  createRequire(import.meta.url).resolve('axe-core/axe.min.js'),
  'utf8',
);

export const widths = { phone: 390, tablet: 820, desktop: 1440 } as const;
export type Theme = 'light' | 'dark';

export function launchBrowser(): Promise<Browser> {
  return chromium.launch(chromiumLaunch);
}

/** A visitor: one browser context, and everything that went wrong in its pages. */
export interface Visitor {
  readonly context: BrowserContext;
  readonly page: Page;
  /** Policy violations, uncaught errors and error messages of the console, in order. */
  readonly troubles: string[];
  readonly close: () => Promise<void>;
}

interface VisitorOptions {
  readonly width?: number;
  readonly height?: number;
  readonly theme?: Theme;
  readonly reducedMotion?: boolean;
  readonly touch?: boolean;
  /** Refusals that the test provokes itself, such as a 401 told in the console. */
  readonly expected?: readonly RegExp[];
}

export async function openVisitor(
  browser: Browser,
  options: VisitorOptions = {},
): Promise<Visitor> {
  const context = await browser.newContext({
    baseURL: site().address,
    viewport: { width: options.width ?? widths.desktop, height: options.height ?? 900 },
    colorScheme: options.theme ?? 'light',
    reducedMotion: options.reducedMotion ? 'reduce' : 'no-preference',
    hasTouch: options.touch ?? false,
    locale: 'en-GB',
    timezoneId: 'Europe/London',
  });
  const troubles: string[] = [];
  const note = (trouble: string) => {
    if (!options.expected?.some((pattern) => pattern.test(trouble))) troubles.push(trouble);
  };
  await context.exposeFunction('noteTrouble', note);
  await context.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', (event) => {
      const tell = (window as unknown as { noteTrouble: (text: string) => void }).noteTrouble;
      tell(`policy: ${event.violatedDirective} ${event.blockedURI} ${event.sourceFile ?? ''}`);
    });
  });
  const page = await context.newPage();
  page.on('pageerror', (error) => {
    note(`error: ${error.message}`);
  });
  page.on('console', (message) => {
    if (message.type() === 'error') note(`console: ${message.text()} ${message.location().url}`);
  });
  return {
    context,
    page,
    troubles,
    close: async () => {
      await context.close();
      expect(troubles, 'policy violations and errors in the page').toEqual([]);
    },
  };
}

/** Signs in through the form, as a person would. */
export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}

/** Every violation of WCAG 2.2 A and AA (target size included) that axe finds in the page. */
export async function accessibilityViolations(page: Page): Promise<string[]> {
  await page.evaluate(axeSource);
  return page.evaluate(async () => {
    const { axe } = window as unknown as { axe: typeof axeCore };
    const found = await axe.run(document, {
      runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'],
    });
    return found.violations.map(
      ({ id, help, nodes }) =>
        `${id}: ${help}: ${nodes
          .slice(0, 3)
          .map((node) => node.target.join(' '))
          .join(', ')}`,
    );
  });
}

/** True if nothing makes the page wider than its window. */
export function fitsItsWidth(page: Page): Promise<boolean> {
  return page.evaluate(
    () => document.documentElement.scrollWidth <= document.documentElement.clientWidth,
  );
}
