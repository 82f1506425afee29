import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { simpleParser, type ParsedMail } from 'mailparser';
import { startMailCatcher } from '../../scripts/fakes/mail.mjs';

/** A mail server of one test file's own, and what it has caught. */
export interface CaughtMail {
  readonly url: string;
  readonly page: string;
  /** Everything caught so far, the earliest first. */
  readonly all: () => Promise<ParsedMail[]>;
  readonly raw: () => string[];
  readonly close: () => Promise<void>;
}

export async function catchMail(): Promise<CaughtMail> {
  const folder = mkdtempSync(path.join(tmpdir(), 'hornbeam-mail-'));
  const catcher = await startMailCatcher(folder, { smtpPort: 0, pagePort: 0 });
  const raw = () =>
    readdirSync(folder)
      .filter((name) => name.endsWith('.eml'))
      .sort()
      .map((name) => readFileSync(path.join(folder, name), 'utf8'));
  return {
    url: catcher.url,
    page: catcher.page,
    raw,
    all: () => Promise.all(raw().map((text) => simpleParser(text))),
    close: async () => {
      await catcher.stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
