import type { ChildProcess } from 'node:child_process';

export interface RunningSite {
  readonly address: string;
  readonly child: ChildProcess;
  readonly ended: Promise<unknown>;
  readonly log: () => string;
  readonly stop: () => Promise<void>;
  readonly kill: () => Promise<void>;
}

export function siteEnvironment(options: {
  database: { readonly app: string; readonly owner: string };
  address: string;
  distDir: string;
  mailUrl?: string;
  secret?: string;
}): Record<string, string>;
export function freeAddress(): Promise<string>;
export function startSite(options: {
  address: string;
  env: Record<string, string>;
  mode?: 'start' | 'dev';
  stdio?: 'inherit' | 'pipe' | 'ignore';
  folder?: string;
  nodeOptions?: readonly string[];
}): RunningSite;
export function untilReady(site: Pick<RunningSite, 'address' | 'ended' | 'log'>): Promise<void>;
