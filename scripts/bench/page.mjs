import { readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { chromium } from 'playwright-core';
import { chromiumLaunch } from '../machine/chromium.mjs';
import { root } from '../machine/node.mjs';

const zipped = (body) => gzipSync(body, { level: 6 }).length;

/** The script that every page of the framework loads, before any of ours. */
function frameworkBase(distDir) {
  const manifest = JSON.parse(
    readFileSync(path.join(root, distDir, 'build-manifest.json'), 'utf8'),
  );
  const files = [...manifest.rootMainFiles, ...(manifest.polyfillFiles ?? [])];
  return files.reduce((sum, file) => sum + zipped(readFileSync(path.join(root, distDir, file))), 0);
}

/** Gzipped client script of each page once it has settled, and what of it is not the framework's. */
export async function benchWeight({ address, distDir, pages }) {
  const browser = await chromium.launch(chromiumLaunch);
  const base = frameworkBase(distDir);
  const rows = [];
  for (const [name, url] of Object.entries(pages)) {
    const page = await browser.newPage();
    const bodies = [];
    page.on('response', (response) => {
      if (response.request().resourceType() === 'script') bodies.push(response.body());
    });
    await page.goto(`${address}${url}`, { waitUntil: 'networkidle' });
    const sizes = (await Promise.all(bodies)).map(zipped);
    const total = sizes.reduce((sum, size) => sum + size, 0);
    rows.push({ name, total, ours: total - base });
    await page.close();
  }
  await browser.close();
  return { base, rows };
}

/**
 * Work a frame of a running bench: every callback of requestAnimationFrame is timed and summed by
 * frame, ours and the canvas library's alike. With `slow`, the processor is throttled so many times.
 */
export async function benchFrames({ address, url, start, frames = 300, slow = 1 }) {
  const browser = await chromium.launch(chromiumLaunch);
  const page = await browser.newPage({ viewport: { width: 1280, height: 900 } });
  await page.addInitScript(() => {
    const original = window.requestAnimationFrame.bind(window);
    window.frameWork = new Map();
    window.requestAnimationFrame = (callback) =>
      original((time) => {
        const begun = performance.now();
        callback(time);
        window.frameWork.set(time, (window.frameWork.get(time) ?? 0) + performance.now() - begun);
      });
  });
  await page.goto(`${address}${url}`, { waitUntil: 'networkidle' });
  if (slow > 1) {
    const session = await page.context().newCDPSession(page);
    await session.send('Emulation.setCPUThrottlingRate', { rate: slow });
  }
  await start(page);
  await page.evaluate(() => window.frameWork.clear());
  await page.waitForFunction((count) => window.frameWork.size >= count, frames, {
    timeout: 60_000,
  });
  const work = await page.evaluate(() => [...window.frameWork.values()]);
  await browser.close();
  work.sort((a, b) => a - b);
  const at = (share) => work[Math.floor(share * (work.length - 1))];
  return { frames: work.length, p50: at(0.5), p95: at(0.95), most: at(1) };
}
