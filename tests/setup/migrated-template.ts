import { createHash } from 'node:crypto'
import {
  existsSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  renameSync,
  writeFileSync,
} from 'node:fs'
import path from 'node:path'
import { PGlite } from '@electric-sql/pglite'
import { drizzle as drizzlePg } from 'drizzle-orm/node-postgres'
import { migrate as migratePg } from 'drizzle-orm/node-postgres/migrator'
import { drizzle as drizzlePglite } from 'drizzle-orm/pglite'
import { migrate as migratePglite } from 'drizzle-orm/pglite/migrator'
import pg from 'pg'
import PgBoss from 'pg-boss'

const migrationsFolder = 'db/migrations'
const cacheFolder = 'node_modules/.cache/pglite-template'

/**
 * Prepares a migrated database, once, that every integration worker then copies.
 *
 * - always: `PGLITE_TEMPLATE` is the path of a dumped data folder for `PGlite.create({ loadDataDir })`;
 * - with `TEST_DATABASE_URL`: `TEST_TEMPLATE_DATABASE` is the name of a database on that server for
 *   `create database … template …`.
 */
export default async function setup(): Promise<void> {
  const key = templateKey()
  if (process.env.TEST_DATABASE_URL) {
    process.env.TEST_TEMPLATE_DATABASE = await postgresTemplate(process.env.TEST_DATABASE_URL, key)
    return
  }
  process.env.PGLITE_TEMPLATE = await pgliteTemplate(key)
}

/** Changes with the migrations and with the packages that shape the database's own files. */
function templateKey(): string {
  const hash = createHash('sha256')
  for (const name of ['@electric-sql/pglite', 'pg-boss']) {
    hash.update(readFileSync(`node_modules/${name}/package.json`))
  }
  for (const file of migrationFiles()) {
    hash.update(file).update(readFileSync(path.join(migrationsFolder, file)))
  }
  return hash.digest('hex').slice(0, 16)
}

function migrationFiles(): string[] {
  if (!existsSync(migrationsFolder)) return []
  return readdirSync(migrationsFolder)
    .filter((file) => file.endsWith('.sql'))
    .sort()
}

async function pgliteTemplate(key: string): Promise<string> {
  const file = path.resolve(cacheFolder, `${key}.tar`)
  if (existsSync(file)) return file
  const database = await PGlite.create()
  if (migrationFiles().length > 0)
    await migratePglite(drizzlePglite(database), { migrationsFolder })
  await database.exec(PgBoss.getConstructionPlans('pgboss'))
  await database.exec('checkpoint')
  const dump = await database.dumpDataDir('none')
  await database.close()
  mkdirSync(path.dirname(file), { recursive: true })
  // Renamed into place, so that a run cut short never leaves half a template.
  const unfinished = `${file}.${process.pid}`
  writeFileSync(unfinished, Buffer.from(await dump.arrayBuffer()))
  renameSync(unfinished, file)
  return file
}

async function postgresTemplate(serverUrl: string, key: string): Promise<string> {
  const name = `rillpost_template_${key}`
  const server = new pg.Client({ connectionString: serverUrl })
  await server.connect()
  try {
    // Rebuilt each run: a run cut short may have left a half-migrated one under this name.
    await server.query(`drop database if exists ${name} with (force)`)
    // The C locale sorts as the embedded database does, so lists are the same on both.
    await server.query(
      `create database ${name} template template0 encoding 'UTF8' lc_collate 'C.UTF-8' lc_ctype 'C.UTF-8'`,
    )
    await migrateTemplate(databaseUrl(serverUrl, name))
  } finally {
    await server.end()
  }
  return name
}

async function migrateTemplate(connectionString: string): Promise<void> {
  const client = new pg.Client({ connectionString })
  await client.connect()
  try {
    if (migrationFiles().length > 0) await migratePg(drizzlePg(client), { migrationsFolder })
    await client.query(PgBoss.getConstructionPlans('pgboss'))
  } finally {
    await client.end()
  }
}

/** The same server, another database. */
export function databaseUrl(serverUrl: string, name: string): string {
  const url = new URL(serverUrl)
  url.pathname = `/${name}`
  return url.toString()
}
