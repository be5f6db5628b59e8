import { mkdirSync } from 'node:fs'
import path from 'node:path'
import { PGlite, type PGliteOptions } from '@electric-sql/pglite'
import { drizzle as drizzlePg } from 'drizzle-orm/node-postgres'
import { migrate as migratePg } from 'drizzle-orm/node-postgres/migrator'
import { drizzle as drizzlePglite, type PgliteDatabase } from 'drizzle-orm/pglite'
import { migrate as migratePglite } from 'drizzle-orm/pglite/migrator'
import { Pool } from 'pg'
import { assertOutside, guarded, insideTransaction } from './guard'
import { tables } from './tables'

export type Database = PgliteDatabase<typeof tables>
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0]
/** What a query reads or writes through: the database, or the transaction one is inside of. */
export type Handle = Database | Transaction

/** SQL as the queue wants it run. */
export type QueueSql = {
  executeSql(text: string, values?: unknown[]): Promise<{ rows: never[] }>
}

export type Store = {
  kind: 'pglite' | 'postgres'
  db: Database
  /** The only way into a transaction: inside it, `db` and `queueSql` throw. */
  transaction<T>(work: (tx: Transaction) => Promise<T>): Promise<T>
  queueSql: QueueSql
  migrate(): Promise<void>
  /** CHECKPOINT and VACUUM (ANALYZE): the embedded database does neither by itself. */
  keepHouse(): Promise<void>
  close(): Promise<void>
}

const migrationsFolder = path.join(process.cwd(), 'db', 'migrations')
const MIGRATION_LOCK = 7_420_011

type Client = { query(text: string, values?: unknown[]): Promise<{ rows: unknown[] }> }

/** The queue's SQL through a transaction's own client. `session.client` is Drizzle's inside: only here. */
export function queueSqlOf(tx: Transaction): QueueSql {
  const client = (tx as unknown as { session: { client: Client } }).session.client
  return {
    executeSql: (text, values) => client.query(text, values) as Promise<{ rows: never[] }>,
  }
}

function transactionOf(db: Database): Store['transaction'] {
  return async (work) => {
    assertOutside()
    return db.transaction((tx) => insideTransaction(() => work(tx)))
  }
}

/** Opens (or makes) the embedded database in a folder, or in memory when none is given. */
export async function openPglite(
  dataDirectory?: string,
  options: PGliteOptions = {},
): Promise<Store> {
  if (dataDirectory) mkdirSync(dataDirectory, { recursive: true, mode: 0o700 })
  const pglite = await PGlite.create({
    ...(dataDirectory ? { dataDir: dataDirectory } : {}),
    ...options,
  })
  const client = guarded(pglite, ['query', 'exec', 'sql', 'transaction'])
  const db = drizzlePglite(client, { schema: tables })
  const queueSql: QueueSql = {
    async executeSql(text, values) {
      if (values?.length) return (await client.query(text, values)) as { rows: never[] }
      try {
        return ((await client.exec(text)).at(-1) ?? { rows: [] }) as { rows: never[] }
      } catch (error) {
        // A failed "BEGIN; …; COMMIT;" would leave the only connection in a dead transaction.
        await client.exec('ROLLBACK').catch(() => undefined)
        throw error
      }
    },
  }
  return {
    kind: 'pglite',
    db,
    transaction: transactionOf(db),
    queueSql,
    migrate: () => migratePglite(db, { migrationsFolder }),
    async keepHouse() {
      await client.exec('CHECKPOINT')
      await client.exec('VACUUM (ANALYZE)')
    },
    close: () => pglite.close(),
  }
}

/** Opens a PostgreSQL database by its address. Migrations of several processes wait for each other. */
export function openPostgres(url: string, onIdleError: (error: Error) => void): Store {
  const pool = new Pool({ connectionString: url, max: 10, connectionTimeoutMillis: 10_000 })
  pool.on('error', onIdleError)
  const client = guarded(pool, ['query', 'connect'])
  const db = drizzlePg(client, { schema: tables }) as unknown as Database
  return {
    kind: 'postgres',
    db,
    transaction: transactionOf(db),
    queueSql: {
      executeSql: (text, values) =>
        client.query(text, values) as unknown as Promise<{ rows: never[] }>,
    },
    async migrate() {
      const lock = await client.connect()
      try {
        await lock.query('select pg_advisory_lock($1)', [MIGRATION_LOCK])
        await migratePg(drizzlePg(lock, { schema: tables }), { migrationsFolder })
      } finally {
        await lock.query('select pg_advisory_unlock($1)', [MIGRATION_LOCK])
        lock.release()
      }
    },
    async keepHouse() {
      await client.query('ANALYZE')
    },
    close: () => pool.end(),
  }
}
