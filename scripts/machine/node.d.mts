import type { ChildProcess } from 'node:child_process';

export interface Child {
  readonly child: ChildProcess;
  readonly ended: Promise<unknown>;
}

export const root: string;
export function requireNode(version?: string): void;
export function requireFolder(folder: string): void;
export function run(
  command: string,
  args: readonly string[],
  options?: { env?: Record<string, string>; quiet?: boolean; what?: string },
): string;
export function runEntry(
  script: string,
  options?: {
    env?: Record<string, string>;
    args?: readonly string[];
    what?: string;
    quiet?: boolean;
  },
): string;
export function startChild(
  command: string,
  args: readonly string[],
  options?: {
    env?: Record<string, string | undefined>;
    stdio?: 'inherit' | 'pipe' | 'ignore';
    folder?: string;
  },
): Child;
export function stopChild(child: Child, graceMs?: number): Promise<void>;
export function installPackages(): void;
export function isPortFree(port: number, host?: string): Promise<boolean>;
export function freePort(wanted?: number): Promise<number>;
export function isAlive(pid: number): boolean;
export function runsIn(pid: number, folder: string): boolean;
