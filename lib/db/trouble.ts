import { BaseError } from 'sequelize';

/** Why the database cannot serve just now, when it is not the request's fault. */
export type Trouble = 'full' | 'away' | 'busy';

/**
 * Which passing trouble of the database an error tells of, or null when it tells of something else.
 *
 * Source: PostgreSQL's error codes (appendix A of its manual): classes 53 and 57P are the server's
 * resources and its shutting down, class 08 the connection, 40001, 40P01 and 55P03 a conflict with others.
 *
 * @example troubleOf(error) // 'full' for SQLSTATE 53100
 */
export function troubleOf(error: unknown): Trouble | null {
  const code = codeOf(error);
  if (code === '53100') return 'full';
  if (code !== null && /^(08...|57P0.|ECONN\w+|EPIPE)$/.test(code)) return 'away';
  if (code !== null && /^(53...|40001|40P01|55P03|57014)$/.test(code)) return 'busy';
  if (!(error instanceof BaseError)) return null;
  if (error.name === 'SequelizeConnectionAcquireTimeoutError') return 'busy';
  return error.name.startsWith('SequelizeConnection') ? 'away' : null;
}

/** True when somebody else came first: a row was there already, or one that it points to is gone. */
export function isOvertaken(error: unknown): boolean {
  const code = codeOf(error);
  return code === '23505' || code === '23503';
}

function codeOf(error: unknown): string | null {
  if (!(error instanceof Error)) return null;
  for (const one of [error, Reflect.get(error, 'original'), error.cause]) {
    const code: unknown = one instanceof Error ? Reflect.get(one, 'code') : null;
    if (typeof code === 'string') return code;
  }
  return null;
}
