import { spawn, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import {
  accessSync,
  constants,
  existsSync,
  mkdirSync,
  readFileSync,
  readlinkSync,
  writeFileSync,
} from 'node:fs';
import { createServer } from 'node:net';
import path from 'node:path';
import { Remedy, say } from './say.mjs';

export const root = path.resolve(import.meta.dirname, '../..');

/** Node.js 20 from 20.19 on: the version that the locked packages were tried with. */
export function requireNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number);
  if (major !== 20 || minor < 19) {
    throw new Remedy(
      `Hornbeam runs on Node.js 20 (20.19 or later); this is ${version}.`,
      'Install Node.js 20 and run the command again.',
    );
  }
}

/** Makes `folder` and makes sure that it can be written. */
export function requireFolder(folder) {
  try {
    mkdirSync(folder, { recursive: true });
    accessSync(folder, constants.W_OK);
  } catch {
    throw new Remedy(
      `The folder ${folder} cannot be written.`,
      'Give this account the right to write there, or move the checkout to a folder of its own.',
    );
  }
}

/** Runs a command to its end and throws a plain sentence if it fails. */
export function run(command, args, { env, quiet = false, what = command } = {}) {
  const done = spawnSync(command, args, {
    cwd: root,
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', ...env },
    stdio: quiet ? ['ignore', 'pipe', 'pipe'] : ['ignore', 'inherit', 'inherit'],
    encoding: 'utf8',
  });
  if (done.error) throw done.error;
  if (done.status !== 0) {
    const told = quiet ? `\n${done.stdout}${done.stderr}` : '';
    throw new Remedy(`${what} did not succeed.${told}`, 'See the lines above for the reason.');
  }
  return done.stdout;
}

/** Runs one of our TypeScript entry points to its end. */
export function runEntry(script, { env, args = [], what, quiet } = {}) {
  return run(process.execPath, ['--conditions=react-server', '--import', 'tsx', script, ...args], {
    env,
    what,
    quiet,
  });
}

/** Starts a child that is ended with us; `ended` resolves with its exit code. */
export function startChild(command, args, { env, stdio = 'inherit', folder = root } = {}) {
  const child = spawn(command, args, {
    cwd: folder,
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', ...env },
    stdio: ['ignore', stdio, stdio],
    // A group of its own: Ctrl-C reaches us alone, and we end the children in order.
    detached: true,
  });
  const ended = new Promise((resolve) => {
    child.once('exit', (code, signal) => resolve(code ?? signal));
    child.once('error', (error) => resolve(error));
  });
  return { child, ended };
}

/** Ends a child politely, then firmly. */
export async function stopChild({ child, ended }, graceMs = 15_000) {
  if (child.exitCode !== null || child.signalCode !== null) return;
  child.kill('SIGTERM');
  const timer = setTimeout(() => child.kill('SIGKILL'), graceMs);
  await ended;
  clearTimeout(timer);
}

/** Installs the locked packages, if what is installed is not what the lock says. */
export function installPackages() {
  const lock = createHash('sha256')
    .update(readFileSync(path.join(root, 'package-lock.json')))
    .digest('hex');
  const stamp = path.join(root, 'node_modules/.hornbeam-lock');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lock) return;
  say('Installing the locked packages …');
  run('npm', ['ci', '--no-audit', '--no-fund', '--include=dev', '--loglevel=error'], {
    what: 'Installing the packages (npm ci)',
  });
  writeFileSync(stamp, lock);
}

export function isPortFree(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(false));
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** A port of loopback that nobody uses; `wanted` if it is free. */
export async function freePort(wanted = 0) {
  if (wanted !== 0 && (await isPortFree(wanted))) return wanted;
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port: 0, host: '127.0.0.1' }, () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}

export function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

/** True if a process works in this folder: a number alone may have passed to somebody else's process. */
export function runsIn(pid, folder) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`) === folder;
  } catch {
    return false;
  }
}
