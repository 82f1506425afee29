/** What a migration may do: run statements, inside the transaction that the migrator opened. */
export interface MigrationContext {
  run(sql: string): Promise<void>;
}

/** One change to the shape of the database, and the way back. */
export interface Migration {
  up(database: MigrationContext): Promise<void>;
  down(database: MigrationContext): Promise<void>;
}
