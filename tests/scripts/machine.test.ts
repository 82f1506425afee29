import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { sourcesFingerprint } from '../../scripts/machine/build.mjs';
import {
  freePort,
  isPortFree,
  requireFolder,
  requireNode,
  root,
  runsIn,
} from '../../scripts/machine/node.mjs';
import { findServer } from '../../scripts/machine/postgres.mjs';
import { requireRoom } from '../../scripts/machine/say.mjs';

/** Runs one of the project's commands and gives what it printed, whatever it exits with. */
function runCommand(args: readonly string[], env: Record<string, string>) {
  return new Promise<{ code: number | null; text: string }>((resolve) => {
    const child = spawn(process.execPath, args, { cwd: root, env: { ...process.env, ...env } });
    let text = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream.on('data', (chunk: Buffer) => {
        text += chunk.toString();
      });
    }
    child.once('exit', (code) => {
      resolve({ code, text });
    });
  });
}

describe('what a machine must bring', () => {
  it.each(['18.20.4', '20.18.3', '22.12.0'])('Node.js %s is refused by name', (version) => {
    expect(() => {
      requireNode(version);
    }).toThrow(`Hornbeam runs on Node.js 20 (20.19 or later); this is ${version}.`);
  });

  it('takes the Node.js that the packages were tried with', () => {
    expect(() => {
      requireNode('20.20.2');
    }).not.toThrow();
  });

  it('refuses a folder that cannot be made', () => {
    const folder = mkdtempSync(path.join(tmpdir(), 'hornbeam-'));
    const file = path.join(folder, 'a-file');
    writeFileSync(file, '');
    expect(() => {
      requireFolder(path.join(file, 'inside'));
    }).toThrow(/cannot be written/);
    rmSync(folder, { recursive: true });
  });

  it('refuses to begin where the disk would fill', () => {
    expect(() => {
      requireRoom(root, 1e9);
    }).toThrow(/MB are free on the disk .* nothing was changed/s);
  });

  it('finds no server where there is none', () => {
    expect(findServer('/nowhere')).toBeNull();
  });
});

describe('ports', () => {
  it('tells a taken port from a free one and finds another', async () => {
    const server = createServer();
    await new Promise<void>((resolve) => {
      server.listen(0, '127.0.0.1', resolve);
    });
    const { port } = server.address() as AddressInfo;
    expect(await isPortFree(port)).toBe(false);
    expect(await freePort(port)).not.toBe(port);
    await new Promise((resolve) => {
      server.close(resolve);
    });
    expect(await isPortFree(port)).toBe(true);
  });
});

describe('a process that an earlier run left', () => {
  it('is known by the folder it works in, not by its number alone', () => {
    expect(runsIn(process.pid, process.cwd())).toBe(true);
    expect(runsIn(process.pid, '/')).toBe(false);
    expect(runsIn(2 ** 30, root)).toBe(false);
  });
});

describe('the fingerprint of the sources', () => {
  it('is the same for the same sources', () => {
    expect(sourcesFingerprint()).toBe(sourcesFingerprint());
    expect(sourcesFingerprint()).toMatch(/^[0-9a-f]{64}$/);
  });
});

describe('the commands', () => {
  it('say plainly that a restore replaces everything, and do nothing without a yes', async () => {
    const none = await runCommand(['scripts/restore.mjs'], {});
    expect(none).toMatchObject({ code: 1, text: expect.stringContaining('Which backup?') });
    const missing = await runCommand(['scripts/restore.mjs', 'no-such.dump', '--yes'], {});
    expect(missing.text).toContain('There is no file');
    const unsaid = await runCommand(['scripts/restore.mjs', 'package.json'], {});
    expect(unsaid.text).toContain('Say so with --yes');
  });

  it('name what is malformed in the environment before anything is touched', async () => {
    const { code, text } = await runCommand(
      ['--conditions=react-server', '--import', 'tsx', 'scripts/migrate.ts'],
      { DATABASE_URL: 'mysql://somewhere' },
    );
    expect(code).toBe(1);
    expect(text).toContain('DATABASE_URL');
    expect(text).not.toContain('somewhere');
  });
});
