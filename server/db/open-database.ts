import SqliteFile from 'better-sqlite3'
import {
  CamelCasePlugin,
  CompiledQuery,
  Kysely,
  SqliteDialect,
  SqliteDriver,
  type DatabaseConnection,
  type Driver,
  type SqliteDialectConfig,
  type Transaction,
} from 'kysely'
import type { Database } from './database.ts'

export type Db = Kysely<Database>
export type Trx = Transaction<Database>
/** For reading: inside a transaction or outside. */
export type Reader = Db | Trx

/** A write takes its lock at once: one that reads first and writes later would fail on a stale snapshot. */
class ImmediateDriver extends SqliteDriver {
  override async beginTransaction(connection: DatabaseConnection): Promise<void> {
    await connection.executeQuery(CompiledQuery.raw('begin immediate'))
  }
}

class ImmediateDialect extends SqliteDialect {
  readonly #config: SqliteDialectConfig

  constructor(config: SqliteDialectConfig) {
    super(config)
    this.#config = config
  }

  override createDriver(): Driver {
    return new ImmediateDriver(this.#config)
  }
}

/** Every fact about SQLite is here. The file is made when it is not there. */
export function openDatabase(file: string): Db {
  const database = new SqliteFile(file)
  database.pragma('journal_mode = WAL')
  // The build falls to NORMAL in WAL unless told: an acknowledged write must survive a power cut.
  database.pragma('synchronous = FULL')
  database.pragma('foreign_keys = ON')
  database.pragma('busy_timeout = 5000')
  database.pragma('trusted_schema = OFF')
  // Without it INSERT OR REPLACE deletes past the triggers that keep audit and ledger append-only.
  database.pragma('recursive_triggers = ON')
  return new Kysely<Database>({
    dialect: new ImmediateDialect({ database }),
    plugins: [new CamelCasePlugin()],
  })
}

/** All of it is kept, or nothing. Inside, use `trx` alone and wait for nothing but the database. */
export function write<T>(db: Db, work: (trx: Trx) => Promise<T>): Promise<T> {
  return db.transaction().execute(work)
}
