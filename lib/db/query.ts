import { QueryTypes, type Transaction } from 'sequelize';
import { database } from './connection';

/** Values for `$1`, `$2` … of a statement. */
export type Values = readonly unknown[];

/** The rows of a statement, with its columns as they are named in it. */
export async function rows<Row extends object>(
  sql: string,
  values: Values = [],
  transaction?: Transaction,
): Promise<Row[]> {
  return database().query<Row>(sql, {
    bind: [...values],
    type: QueryTypes.SELECT,
    raw: true,
    transaction,
  });
}

/** The first row of a statement, or null. */
export async function row<Row extends object>(
  sql: string,
  values: Values = [],
  transaction?: Transaction,
): Promise<Row | null> {
  const [first] = await rows<Row>(sql, values, transaction);
  return first ?? null;
}

/** Runs the work in one transaction, which it hands on; rolls back when the work throws. */
export async function transact<Result>(
  work: (transaction: Transaction) => Promise<Result>,
): Promise<Result> {
  return database().transaction(work);
}
