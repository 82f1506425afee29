import type { Client } from 'pg';
import type { Transaction } from 'sequelize';
import { database } from './connection';
import type { Values } from './query';

/**
 * A statement that is asked so often that each connection keeps its plan, under its name. A name
 * belongs to one text for good.
 */
export interface Prepared {
  readonly name: string;
  readonly text: string;
}

/**
 * The first row of a prepared statement, or null. It goes straight to the driver: no instance, no
 * rewriting of the text, no planning after the first few times. Errors are the driver's own.
 */
export async function preparedRow<Row extends object>(
  statement: Prepared,
  values: Values,
  transaction?: Transaction,
): Promise<Row | null> {
  const query = { ...statement, values: [...values] };
  const within = transaction && connectionOf(transaction);
  if (within) return firstOf<Row>(await within.query<Row>(query));
  const { connectionManager } = database();
  const connection = await connectionManager.getConnection({ type: 'read' });
  try {
    return firstOf<Row>(await clientOf(connection).query<Row>(query));
  } finally {
    connectionManager.releaseConnection(connection);
  }
}

function firstOf<Row>({ rows }: { readonly rows: readonly Row[] }): Row | null {
  return rows[0] ?? null;
}

/** The pool hands out the driver's own clients, which its types do not say. */
function clientOf(connection: object): Client {
  return connection as Client;
}

function connectionOf(transaction: Transaction): Client {
  const connection: unknown = Reflect.get(transaction, 'connection');
  if (typeof connection !== 'object' || connection === null) {
    throw new Error('preparedRow: the transaction has no connection any more');
  }
  return clientOf(connection);
}
