import { readFileSync } from 'node:fs'
import { sql } from 'drizzle-orm'
import pg from 'pg'
import { openPglite, openPostgres, type Store } from '@/db/client'
import { databaseUrl } from '../setup/migrated-template'

// One database a worker, opened once (tests/vitest.config.ts): modules may be loaded again, the process not.
const shared = globalThis as typeof globalThis & { rillpostTestStore?: Promise<Store> }

async function openEmbedded(template: string): Promise<Store> {
  return openPglite(undefined, { loadDataDir: new Blob([readFileSync(template)]) })
}

async function openOnServer(serverUrl: string, template: string): Promise<Store> {
  const name = `rillpost_test_${process.pid}_${Date.now()}`
  const server = new pg.Client({ connectionString: serverUrl })
  await server.connect()
  await server.query(`create database ${name} template ${template}`)
  await server.end()
  return openPostgres(databaseUrl(serverUrl, name), () => undefined)
}

function open(): Promise<Store> {
  const { PGLITE_TEMPLATE, TEST_DATABASE_URL, TEST_TEMPLATE_DATABASE } = process.env
  if (TEST_DATABASE_URL && TEST_TEMPLATE_DATABASE) {
    return openOnServer(TEST_DATABASE_URL, TEST_TEMPLATE_DATABASE)
  }
  if (!PGLITE_TEMPLATE) throw new Error('No template: run under the integration project.')
  return openEmbedded(PGLITE_TEMPLATE)
}

/** Deleting is half the work of truncating here: that makes new files for every table and index. */
async function empty(store: Store): Promise<void> {
  const { rows: tables } = await store.db.execute<{ name: string }>(
    sql`select quote_ident(tablename) as name from pg_tables where schemaname = 'public'`,
  )
  const deletes = tables.map(({ name }) => `delete from ${name};`).join(' ')
  await store.db.execute(
    sql.raw(`do $$ begin
      set local session_replication_role = replica;
      ${deletes}
      delete from pgboss.job;
      perform setval(format('%I.%I', schemaname, sequencename)::regclass, 1, false)
        from pg_sequences where schemaname = 'public';
    end $$`),
  )
}

/** A migrated database with nothing in it: PGlite in memory, or PostgreSQL with `TEST_DATABASE_URL`. */
export async function emptyStore(): Promise<Store> {
  shared.rillpostTestStore ??= open()
  const store = await shared.rillpostTestStore
  await empty(store)
  return store
}
