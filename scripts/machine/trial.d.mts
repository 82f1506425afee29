import type { Server } from './postgres.mjs';
import type { RunningSite, startSite } from './site.mjs';

export interface TrialDatabase {
  readonly database: { readonly app: string; readonly owner: string; readonly superuser: string };
  readonly server: () => Server;
  readonly kill: () => Promise<void>;
  readonly start: () => Promise<void>;
  readonly close: () => Promise<void>;
}

export function makeTrialDatabase(
  name: string,
  settings?: Record<string, string>,
): Promise<TrialDatabase>;

export interface Trial {
  readonly address: string;
  readonly ownAddress: string;
  readonly env: Record<string, string>;
  readonly database: TrialDatabase['database'];
  readonly distDir: string;
  readonly password: string;
  readonly server: () => Server;
  readonly startSite: (
    at?: string,
    more?: Partial<Parameters<typeof startSite>[0]>,
  ) => Promise<RunningSite>;
  readonly killDatabase: () => Promise<void>;
  readonly startDatabase: () => Promise<void>;
  readonly close: () => Promise<void>;
}

export function makeTrial(
  name: string,
  options?: {
    settings?: Record<string, string>;
    address?: string;
    mailUrl?: string;
    demo?: boolean;
  },
): Promise<Trial>;
