import { spawn } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { sql } from 'drizzle-orm'
import { afterEach, describe, expect, test, vi } from 'vitest'
import { OutsideTransactionError } from '@/db/guard'
import { lockDataFolder } from '@/db/lock'
import { startQueue } from '@/jobs/boss'
import { emptyStore } from '../factories/store'

const quiet = { error: () => undefined }
const folders: string[] = []

function newFolder(): string {
  const folder = mkdtempSync(path.join(tmpdir(), 'rillpost-traps-'))
  folders.push(folder)
  return folder
}

afterEach(() => {
  vi.unstubAllEnvs()
  for (const folder of folders.splice(0)) rmSync(folder, { recursive: true, force: true })
})

describe('the transaction guard', () => {
  test('inside a transaction the database itself is refused, and afterwards it works again', async () => {
    const store = await emptyStore()
    const reaching = store.transaction(() => store.db.execute(sql`select 1`))
    await expect(reaching).rejects.toMatchObject({ cause: new OutsideTransactionError() })
    await expect(
      store.transaction((tx) => tx.execute(sql`select 1 as one`)),
    ).resolves.toMatchObject({
      rows: [{ one: 1 }],
    })
  })

  test('a transaction inside a transaction is refused', async () => {
    const store = await emptyStore()
    const nested = store.transaction(() => store.transaction(() => Promise.resolve(1)))
    await expect(nested).rejects.toThrow(OutsideTransactionError)
  })

  test('enqueueing outside the transaction’s handle is refused', async () => {
    const store = await emptyStore()
    const queue = await startQueue(store, quiet, false)
    await expect(store.transaction(() => queue.wake('wake-texts'))).rejects.toThrow(
      OutsideTransactionError,
    )
    await queue.stop()
  })
})

describe('the queue', () => {
  test('a job enqueued in a transaction that fails is not there', async () => {
    const store = await emptyStore()
    const queue = await startQueue(store, quiet, false)
    const failing = store.transaction(async (tx) => {
      await queue.add(tx, 'send-text', { textId: 'lost' })
      throw new Error('and the transaction fails')
    })
    await expect(failing).rejects.toThrow('fails')
    expect((await queue.depth())['send-text']).toBe(0)
    await queue.stop()
  })

  test('one failing job of a batch does not have the others done again', async () => {
    const store = await emptyStore()
    const queue = await startQueue(store, quiet, false)
    for (const textId of ['one', 'bad', 'two']) {
      await store.transaction((tx) => queue.add(tx, 'send-text', { textId }))
    }
    const done: string[] = []
    await queue.work('send-text', ({ textId }) => {
      done.push(textId)
      return textId === 'bad' ? Promise.reject(new Error('bad')) : Promise.resolve()
    })
    const { rows } = await vi.waitFor(
      async () => {
        const found = await store.db.execute(
          sql`select data->>'textId' as text, state::text from pgboss.job where name = 'send-text' order by 1`,
        )
        expect(found.rows.map(({ state }) => state)).not.toContain('created')
        expect(found.rows.map(({ state }) => state)).not.toContain('active')
        return found
      },
      { timeout: 20_000, interval: 100 },
    )
    expect(rows).toEqual([
      { text: 'bad', state: 'retry' },
      { text: 'one', state: 'completed' },
      { text: 'two', state: 'completed' },
    ])
    expect(done.toSorted()).toEqual(['bad', 'one', 'two'])
    await queue.stop()
  })
})

describe('the data folder', () => {
  test('is refused to a second owner, who is told the first one’s process', async () => {
    const folder = newFolder()
    const unlock = await lockDataFolder(folder)
    await expect(lockDataFolder(folder)).rejects.toThrow(`already open in process ${process.pid}`)
    unlock()
  })

  test('is free again after its owner was killed', async () => {
    const folder = newFolder()
    const script = `import { lockDataFolder } from '@/db/lock'; await lockDataFolder(${JSON.stringify(folder)}); console.log('held'); setInterval(() => {}, 1000)`
    const owner = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', script])
    await new Promise((resolve) => owner.stdout.once('data', resolve))
    await expect(lockDataFolder(folder)).rejects.toThrow(`already open in process ${owner.pid}`)
    const gone = new Promise((resolve) => owner.once('exit', resolve))
    owner.kill('SIGKILL')
    await gone
    const unlock = await lockDataFolder(folder)
    unlock()
  })
})

describe('the database', () => {
  test('is checkpointed and vacuumed on request, with data in it', async () => {
    const store = await emptyStore()
    await store.db.execute(
      sql`insert into settings (key, value, set_at) values ('kept', '1', now())`,
    )
    await store.keepHouse()
    const { rows } = await store.db.execute(sql`select value from settings where key = 'kept'`)
    expect(rows).toEqual([{ value: 1 }])
  })

  test('is not opened while the desk is being built', async () => {
    vi.stubEnv('NEXT_PHASE', 'phase-production-build')
    const { getDeps } = await import('@/lib/deps')
    await expect(getDeps()).rejects.toThrow('while the desk was being built')
  })
})
