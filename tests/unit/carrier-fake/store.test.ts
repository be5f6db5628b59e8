import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { createClock } from '@/tests/fakes/carrier/clock'
import { createShelf } from '@/tests/fakes/carrier/phones-file'
import { readSettings } from '@/tests/fakes/carrier/settings'
import { phone, startRig } from './rig'

describe('what the carrier fake keeps in files', () => {
  let folder: string
  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'carrier-fake-'))
  })
  afterEach(() => rmSync(folder, { recursive: true }))

  it('survives a restart: phones, opt-outs, and texts still on their way', async () => {
    const storeFile = path.join(folder, 'sub', 'store.json')
    const first = await startRig({ storeFile })
    await first.practice('POST', '/inbound', { from: '+12125550124', body: 'STOP' })
    const { sid } = await first.send()
    await first.close()
    const second = await startRig({ storeFile })
    expect((await second.send({ To: '+12125550124' })).code).toBe(21610)
    await second.forward(10_000)
    expect((await second.fetchMessage(sid)).status).toBe('delivered')
    expect((await second.practice('GET', `/phones/${phone}`)).body.texts).toMatchObject([{ sid }])
    await second.close()
  })

  it('writes soon after a change, without being asked', async () => {
    const storeFile = path.join(folder, 'store.json')
    const rig = await startRig({ storeFile })
    const { sid } = await rig.send()
    await expect.poll(() => readFileSync(storeFile, 'utf8'), { timeout: 3_000 }).toContain(sid)
    await rig.close()
  })

  it('refuses to start over a store it cannot read, and leaves it alone', async () => {
    const storeFile = path.join(folder, 'store.json')
    writeFileSync(storeFile, '{ half')
    await expect(startRig({ storeFile })).rejects.toThrow('FAKE_STORE_FILE cannot be read')
    expect(readFileSync(storeFile, 'utf8')).toBe('{ half')
  })

  it('a reset forgets everything', async () => {
    const rig = await startRig()
    await rig.send()
    await rig.practice('POST', '/reset')
    expect((await rig.rest('GET', '/Messages.json')).body.messages).toEqual([])
    await rig.close()
  })

  it('reads the clock file again when it changes, and keeps the last good one', () => {
    const file = path.join(folder, 'clock.json')
    const clock = createClock(file)
    const offset = () => Math.round((clock.now() - Date.now()) / 1000)
    expect(offset()).toBe(0)
    writeFileSync(file, '{"offsetMilliseconds":86400000}')
    expect(offset()).toBe(86_400)
    writeFileSync(file, '{"offsetMilli')
    expect(offset()).toBe(86_400)
    writeFileSync(file, '{"offsetMilliseconds":-5000}')
    expect(offset()).toBe(-5)
    rmSync(file)
    expect(offset()).toBe(0)
  })

  it('reads the shelf again when its file changes', () => {
    const file = path.join(folder, 'phones.json')
    const shelf = createShelf(file)
    expect(shelf()).toEqual([])
    writeFileSync(file, '[{"number":"+12125550100","label":"Orellana house","language":"es"},{}]')
    const orellana = {
      number: '+12125550100',
      label: 'Orellana house',
      language: 'es',
      timeZone: '',
    }
    expect(shelf()).toEqual([orellana])
    writeFileSync(file, 'oh')
    expect(shelf()).toEqual([orellana])
  })

  it('says which setting cannot be meant', () => {
    expect(() => readSettings({ FAKE_SEGMENTS_PER_SECOND: 'fast' })).toThrow(
      'FAKE_SEGMENTS_PER_SECOND must be a number above 0, not "fast"',
    )
    expect(readSettings({}).segmentsPerSecond).toBe(10)
  })
})
