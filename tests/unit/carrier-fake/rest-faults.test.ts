import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { phone, sender, startRig, type Json, type Rig } from './rig'

describe('faults of the REST interface', () => {
  let rig: Rig
  beforeEach(async () => {
    rig = await startRig()
  })
  afterEach(() => rig.close())

  const stored = async () =>
    ((await rig.rest('GET', '/Messages.json')).body.messages as Json[]).length
  const create = () =>
    rig.rest('POST', '/Messages.json', { To: phone, From: sender, Body: 'Hello' })
  const order = (fault: Json) => rig.practice('POST', '/faults', fault)

  it.each([
    ['too-many', 429, 0],
    ['error-500-before', 500, 0],
    ['error-500-after', 500, 1],
    ['unavailable-503-before', 503, 0],
    ['unavailable-503-after', 503, 1],
  ])('%s answers %s and has stored %s', async (kind, status, count) => {
    await order({ kind, next: 1, retryAfterSeconds: 7 })
    const { response } = await create()
    expect(response.status).toBe(status)
    expect(await stored()).toBe(count)
    expect((await create()).response.status).toBe(201)
  })

  it('says how long to wait with 429, and nothing that a client can read with 503', async () => {
    await order({ kind: 'too-many', retryAfterSeconds: 7 })
    await order({ kind: 'unavailable-503-before' })
    expect((await create()).response.headers.get('retry-after')).toBe('7')
    expect((await create()).response.headers.get('content-type')).toBe('text/html')
  })

  it.each([
    ['reset-before', 0],
    ['reset-after', 1],
  ])('%s breaks the connection and has stored %s', async (kind, count) => {
    await order({ kind })
    await expect(create()).rejects.toThrow('fetch failed')
    expect(await stored()).toBe(count)
  })

  it.each([
    ['hang-before', 0],
    ['hang-after', 1],
  ])('%s never answers and has stored %s', async (kind, count) => {
    await order({ kind })
    const first = await Promise.race([
      create().catch(() => 'broken off'),
      new Promise((resolve) => {
        setTimeout(() => resolve('still waiting'), 250)
      }),
    ])
    expect(first).toBe('still waiting')
    expect(await stored()).toBe(count)
  })

  it('answers late but rightly', async () => {
    await order({ kind: 'slow', delayMilliseconds: 200 })
    const before = Date.now()
    expect((await create()).response.status).toBe(201)
    expect(Date.now() - before).toBeGreaterThanOrEqual(190)
  })

  it('counts faults down, lists what is left, and can be told to forget them', async () => {
    await order({ kind: 'too-many', next: 3 })
    await create()
    const listed = (await rig.practice('GET', '/faults')).body.faults
    expect(listed).toMatchObject([{ kind: 'too-many', on: 'create', left: 2 }])
    await rig.practice('DELETE', '/faults')
    expect((await create()).response.status).toBe(201)
  })

  it('leaves other calls and other phones alone', async () => {
    await order({ kind: 'error-500-before', on: 'list' })
    await order({ kind: 'too-many', phone: '+12125550177' })
    expect((await create()).response.status).toBe(201)
    expect((await rig.rest('GET', '/Messages.json')).response.status).toBe(500)
  })

  it('refuses a fault it does not know', async () => {
    expect((await order({ kind: 'storm' })).response.status).toBe(400)
    expect((await order({ kind: 'too-many', next: 0 })).response.status).toBe(400)
    expect((await order({ kind: 'too-many', on: 'tea' })).response.status).toBe(400)
  })
})
