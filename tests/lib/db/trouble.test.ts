import { ConnectionAcquireTimeoutError, ConnectionRefusedError, DatabaseError } from 'sequelize';
import { describe, expect, it } from 'vitest';
import { troubleOf } from '@/lib/db/trouble';

function refusedWith(code: string): DatabaseError {
  return new DatabaseError(Object.assign(new Error('refused'), { code, sql: 'insert …' }));
}

// SQLSTATE codes: PostgreSQL 15's manual, appendix A.
describe('troubleOf', () => {
  it.each([
    ['53100', 'full'],
    ['53200', 'busy'],
    ['53300', 'busy'],
    ['40001', 'busy'],
    ['40P01', 'busy'],
    ['55P03', 'busy'],
    ['57P01', 'away'],
    ['57P03', 'away'],
    ['08006', 'away'],
    ['ECONNREFUSED', 'away'],
    ['23505', null],
    ['42P01', null],
  ] as const)('reads SQLSTATE %s as %s', (code, trouble) => {
    expect(troubleOf(refusedWith(code))).toBe(trouble);
  });

  it('reads a code on the error itself, as the driver throws it', () => {
    expect(troubleOf(Object.assign(new Error('full'), { code: '53100' }))).toBe('full');
  });

  it("knows the pool's own refusals", () => {
    expect(troubleOf(new ConnectionAcquireTimeoutError(new Error('late')))).toBe('busy');
    expect(troubleOf(new ConnectionRefusedError(new Error('nobody')))).toBe('away');
  });

  it('takes nothing else for trouble of the database', () => {
    expect(troubleOf(new TypeError('a bug'))).toBeNull();
    expect(troubleOf('53100')).toBeNull();
    expect(troubleOf(null)).toBeNull();
  });
});
