import { beforeEach, describe, expect, test } from 'vitest'
import { phones } from '@/db/schema/household'
import { faultWords } from '@/lib/log'
import { testDeps, type TestDeps } from '../factories/deps'

const number = '+12025550101'

let deps: TestDeps

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
})

async function faultOf(work: Promise<unknown>): Promise<unknown> {
  return work.then(
    () => {
      throw new Error('It did not fail.')
    },
    (fault: unknown) => fault,
  )
}

describe('a fault in the log', () => {
  test('of a query tells what failed and why, and no number', async () => {
    const row = { e164: number, createdAt: 0 }
    await deps.store.db.insert(phones).values(row)
    const fault = await faultOf(Promise.resolve(deps.store.db.insert(phones).values(row)))
    // The driver's own words hold it: were that mended there, this would have nothing to do.
    expect(String(fault)).toContain(number)
    const words = faultWords(fault)
    expect(words).toContain('insert into "phones"')
    expect(words).toContain('duplicate key')
    expect(words).not.toContain(number.slice(-7))
  })

  test.each([
    [new Error('The store is closed.'), 'The store is closed.'],
    [new TypeError('x is not a function'), 'TypeError: x is not a function'],
    ['thrown bare', 'thrown bare'],
  ])('of another kind is in its own words: %s', (fault, words) => {
    expect(faultWords(fault)).toBe(words)
  })
})
