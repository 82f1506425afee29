import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { simpleParser } from 'mailparser';
import { site } from './site';

const read = new Set<string>();

/**
 * The path of the link in the next letter to an address that the stand-in for a mail server has
 * caught; a letter is read once.
 */
export async function nextLink(email: string): Promise<string> {
  for (let turn = 0; turn < 300; turn += 1) {
    const link = await look(email);
    if (link !== null) return link;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new Error(`No letter with a link came to ${email} within a minute.`);
}

async function look(email: string): Promise<string | null> {
  for (const name of readdirSync(site().mailFolder).sort()) {
    if (!name.endsWith('.eml') || read.has(name)) continue;
    const letter = await simpleParser(readFileSync(path.join(site().mailFolder, name)));
    const to = [letter.to ?? []].flat().flatMap(({ value }) => value);
    const link = /\/(?:invitation|set-password|confirm-address)\/[\w-]{43}/.exec(letter.text ?? '');
    if (!link || !to.some(({ address }) => address === email)) continue;
    read.add(name);
    return link[0];
  }
  return null;
}
