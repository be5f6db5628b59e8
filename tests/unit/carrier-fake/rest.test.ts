import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import {
  accountSid,
  phone,
  sender,
  serviceSid,
  startRig,
  type Json,
  type Named,
  type Rig,
} from './rig'

const inAnHour = (rig: Rig) => new Date(rig.clock.now() + 3_600_000).toISOString()

describe('the REST interface', () => {
  let rig: Rig
  beforeEach(async () => {
    rig = await startRig()
  })
  afterEach(() => rig.close())

  it.each<[string, Record<string, string>, number]>([
    ['no recipient', { To: '' }, 21604],
    ['a recipient that is no number', { To: '12' }, 21211],
    ['a recipient outside the numbering plan', { To: '+11235550100' }, 21211],
    ['no sender', { From: '' }, 21603],
    ['a sender that is no number', { From: 'desk' }, 21212],
    ['a sender of somebody else', { From: '+12125550199' }, 21606],
    ['an unknown service', { MessagingServiceSid: `MG${'0'.repeat(32)}` }, 21701],
    ['no words', { Body: '' }, 21602],
    ['1601 characters', { Body: 'a'.repeat(1601) }, 21617],
    ['a picture without an address', { MediaUrl: 'cat.png' }, 21620],
    ['a callback without a host', { StatusCallback: 'status' }, 21609],
    ['a callback with an underscore', { StatusCallback: 'http://my_desk/x' }, 21609],
    [
      'a callback over 4000 characters',
      { StatusCallback: `http://a.b/${'x'.repeat(4000)}` },
      21609,
    ],
    ['an hour without a date', { ScheduleType: 'fixed' }, 35111],
    ['a validity of nothing', { ValidityPeriod: '0' }, 90007],
    ['a validity beyond ten hours', { ValidityPeriod: '36001' }, 90007],
    ['a region that is not enabled', { To: '+8613800138000' }, 21408],
    ['a landline', { To: '+13055550196' }, 21614],
    ['test recipient 1', { To: '+15005550001' }, 21211],
    ['test recipient 2', { To: '+15005550002' }, 21612],
    ['test recipient 3', { To: '+15005550003' }, 21408],
    ['test recipient 4', { To: '+15005550004' }, 21610],
    ['test recipient 9', { To: '+15005550009' }, 21614],
    ['test sender 1', { From: '+15005550001' }, 21212],
    ['test sender 7', { From: '+15005550007' }, 21606],
    ['test sender 8', { From: '+15005550008' }, 21611],
  ])('refuses %s', async (_name, form, code) => {
    const { response, body } = await rig.rest('POST', '/Messages.json', {
      To: phone,
      From: sender,
      Body: 'Hello',
      ...form,
    })
    expect(response.status).toBe(400)
    expect(body).toMatchObject({ code, status: 400 })
    expect(body.more_info).toContain(String(code))
    expect((await rig.rest('GET', '/Messages.json')).body.messages).toEqual([])
  })

  it('names the first fault in the documented order when there are several', async () => {
    const { body } = await rig.rest('POST', '/Messages.json', { To: '12', Body: '' })
    expect(body.code).toBe(21211)
  })

  it.each([
    [299_000, 35114],
    [3_024_001_000, 35114],
  ])('refuses to schedule %s ms ahead', async (ahead, code) => {
    const SendAt = new Date(rig.clock.now() + ahead).toISOString()
    const form = { From: '', MessagingServiceSid: serviceSid, ScheduleType: 'fixed', SendAt }
    expect((await rig.send(form)).code).toBe(code)
  })

  it('schedules for a service only', async () => {
    expect((await rig.send({ ScheduleType: 'fixed', SendAt: inAnHour(rig) })).code).toBe(35118)
  })

  it('asks who is there, and knows nothing of other accounts', async () => {
    const path = `${rig.running.origin}/2010-04-01/Accounts/${accountSid}/Messages.json`
    const nobody = await fetch(path)
    expect(nobody.status).toBe(401)
    expect(await nobody.json()).toMatchObject({ code: 20003, status: 401 })
    expect((await rig.rest('GET', '/Messages/SM0.json')).body).toMatchObject({ code: 20404 })
  })

  it('lists newest first, in pages that hold still while new texts come in', async () => {
    const sids: unknown[] = []
    for (let n = 0; n < 5; n++) sids.unshift((await rig.send({ Body: `text ${n}` })).sid)
    const first = (await rig.rest('GET', '/Messages.json?PageSize=2')).body
    await rig.send({ Body: 'in between' })
    const seen = (first.messages as Json[]).map((message) => message.sid)
    let next = first.next_page_uri
    while (typeof next === 'string') {
      const path = next.split(accountSid)[1] ?? ''
      const page = (await rig.rest('GET', path)).body
      seen.push(...(page.messages as Json[]).map((message) => message.sid))
      next = page.next_page_uri
    }
    expect(seen).toEqual(sids)
  })

  it('filters by number and by day of sending, and never shows unsent texts for a date', async () => {
    const other = '+12125550124'
    await rig.send()
    await rig.send({ To: other })
    await rig.forward(5_000)
    const unsent = await rig.send()
    const list = async (query: string) =>
      ((await rig.rest('GET', `/Messages.json?${query}`)).body.messages as Json[]).length
    expect(await list('')).toBe(3)
    expect(await list(`To=${encodeURIComponent(other)}`)).toBe(1)
    expect(await list(`From=${encodeURIComponent(sender)}`)).toBe(3)
    expect(await list('DateSent=2026-03-02')).toBe(2)
    expect(await list('DateSent=2026-03-03')).toBe(0)
    expect(await list('DateSent%3E=2026-03-02T06:00:02Z')).toBe(1)
    expect(await list('DateSent%3C=2026-03-01')).toBe(0)
    expect(unsent.date_sent).toBeNull()
  })

  it('redacts and deletes what has ended, and the phone still shows it', async () => {
    const { sid } = await rig.send()
    const early = await rig.rest('POST', `/Messages/${sid}.json`, { Body: '' })
    expect(early.response.status).toBe(400)
    await rig.forward(5_000)
    const redacted = await rig.rest('POST', `/Messages/${sid}.json`, { Body: '' })
    expect(redacted.body.body).toBe('')
    expect((await rig.rest('DELETE', `/Messages/${sid}.json`)).response.status).toBe(204)
    expect((await rig.fetchMessage(sid)).code).toBe(20404)
    const { texts } = (await rig.practice('GET', `/phones/${phone}`)).body
    expect(texts).toMatchObject([{ sid, body: 'Wash the filter today.', state: 'deleted' }])
  })

  it('cannot call back what is already on its way', async () => {
    const { sid } = await rig.send()
    const late = await rig.rest('POST', `/Messages/${sid}.json`, { Status: 'canceled' })
    expect(late.response.status).toBe(400)
  })

  it('gives media behind a password, on another host that wants none', async () => {
    const base64 = Buffer.from('a picture').toString('base64')
    const media = [{ contentType: 'image/png', base64 }]
    const { sid } = (await rig.practice('POST', '/inbound', { from: phone, body: '', media })).body
    const list = (await rig.rest('GET', `/Messages/${sid}/Media.json`)).body.media_list as Named[]
    const path = `/Messages/${sid}/Media/${list[0]?.sid}`
    const { response } = await rig.rest('GET', path)
    expect(response.status).toBe(307)
    const location = response.headers.get('location') ?? ''
    expect(new URL(location).host).not.toBe(new URL(rig.running.origin).host)
    expect(await (await fetch(location)).text()).toBe('a picture')
    const forwarded = await fetch(location, { headers: { authorization: 'Basic eDp5' } })
    expect(forwarded.status).toBe(400)
    expect((await rig.rest('DELETE', path)).response.status).toBe(204)
    expect((await rig.rest('GET', path)).response.status).toBe(404)
  })
})
