export class Remedy extends Error {
  constructor(matter: string, remedy: string);
}
export function say(line?: string): void;
export function complain(error: unknown): void;
export function requireRoom(folder: string, megabytes: number): void;
