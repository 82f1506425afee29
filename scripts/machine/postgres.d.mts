import type { ChildProcess } from 'node:child_process';

export interface Server {
  readonly child: ChildProcess;
  readonly ended: Promise<unknown>;
  readonly port: number;
  readonly bin: string;
  readonly password: string;
}
type Address = Pick<Server, 'port' | 'bin' | 'password'>;

export function findServer(base?: string): string | null;
export function requireServer(): string;
export function clusterFolder(wanted: string): string;
export function makeCluster(bin: string, folder: string, password: string): void;
export function stopLeftServer(bin: string, folder: string): boolean;
export function startServer(
  bin: string,
  folder: string,
  options: { port: number; password: string; settings?: Record<string, string> },
): Promise<Server>;
export function stopServer(server: Server): Promise<void>;
export function sql(
  server: Address,
  text: string,
  options?: { database?: string; variables?: Record<string, string> },
): string;
export function makeRoles(
  server: Address,
  passwords: { ownerPassword: string; appPassword: string },
): void;
export function makeDatabase(server: Address, name: string): boolean;
export function databaseUrl(
  server: Pick<Server, 'port'>,
  role: string,
  password: string,
  database: string,
): string;
