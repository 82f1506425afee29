import { existsSync } from 'node:fs';
import { installDebian } from './debian.mjs';

/** How Debian's Chromium is started: without a window, and without asking the network for anything. */
export const chromiumLaunch = {
  executablePath: '/usr/bin/chromium',
  args: [
    '--headless',
    '--no-sandbox',
    '--disable-gpu',
    '--disable-quic',
    '--no-first-run',
    '--disable-background-networking',
    '--disable-component-update',
    '--disable-sync',
  ],
};

/** Installs Chromium from Debian's packages where there is none. */
export function requireChromium() {
  if (!existsSync(chromiumLaunch.executablePath)) installDebian(['chromium'], 'Chromium');
}
