import { statfsSync } from 'node:fs';

/** A reason to stop that a person can act on: what is the matter, and the remedy. */
export class Remedy extends Error {
  constructor(matter, remedy) {
    super(`${matter}\n  ${remedy}`);
    this.name = 'Remedy';
  }
}

export function say(line = '') {
  process.stdout.write(`${line}\n`);
}

/** Prints what went wrong, plainly for a `Remedy` and in full for a surprise. */
export function complain(error) {
  const full = diskRemedy(error) ?? error;
  process.stderr.write(
    full instanceof Remedy
      ? `\n${full.message}\n`
      : `\n${full instanceof Error ? full.stack : full}\n`,
  );
}

/** A full disk looks different everywhere; it is told in one way. */
function diskRemedy(error) {
  const text = error instanceof Error ? error.message : String(error);
  if (error?.code !== 'ENOSPC' && !/no space left on device/i.test(text)) return null;
  return new Remedy(
    'The disk is full.',
    'Free some space and start again; what was stored before is untouched.',
  );
}

/** Refuses to begin on a disk that would fill half-way. */
export function requireRoom(folder, megabytes) {
  const { bavail, bsize } = statfsSync(folder);
  const free = Math.floor((bavail * bsize) / 1e6);
  if (free < megabytes) {
    throw new Remedy(
      `Only ${free} MB are free on the disk that holds ${folder}; ${megabytes} MB are needed.`,
      'Free some space and start again; nothing was changed.',
    );
  }
}
