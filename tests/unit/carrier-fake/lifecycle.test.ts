import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { phone, serviceSid, startRig, type Rig } from './rig'

describe('the life of a text', () => {
  let rig: Rig
  beforeEach(async () => {
    rig = await startRig()
  })
  afterEach(() => rig.close())

  it('goes from queued to delivered and only then stands on the phone', async () => {
    const created = await rig.send()
    expect(created).toMatchObject({ status: 'queued', num_segments: '1', date_sent: null })
    await rig.forward(1)
    expect(await rig.fetchMessage(created.sid)).toMatchObject({ status: 'sending' })
    await rig.forward(999)
    expect(await rig.fetchMessage(created.sid)).toMatchObject({
      status: 'sent',
      date_sent: 'Mon, 02 Mar 2026 06:00:01 +0000',
    })
    expect((await rig.practice('GET', `/phones/${phone}`)).body.texts).toEqual([])
    await rig.forward(700)
    expect(await rig.fetchMessage(created.sid)).toMatchObject({ status: 'delivered' })
    const ledger = (await rig.practice('GET', `/phones/${phone}`)).body
    expect(ledger.texts).toMatchObject([
      { way: 'received', sid: created.sid, state: 'delivered', segments: 1, byCarrier: false },
    ])
  })

  it('says one segment a second for each sender, however many texts are waiting', async () => {
    const long = await rig.send({ Body: 'a'.repeat(161) })
    const next = await rig.send()
    await rig.forward(1999)
    expect((await rig.fetchMessage(long.sid)).status).toBe('sending')
    expect((await rig.fetchMessage(next.sid)).status).toBe('queued')
    await rig.forward(1)
    expect((await rig.fetchMessage(long.sid)).status).toBe('sent')
    expect((await rig.fetchMessage(next.sid)).status).toBe('sending')
    await rig.forward(1000)
    expect((await rig.fetchMessage(next.sid)).status).toBe('sent')
  })

  it('lets a text die in the queue when its validity ends before its turn', async () => {
    await rig.send({ Body: 'a'.repeat(1500) })
    const short = await rig.send({ ValidityPeriod: '5' })
    await rig.forward(5_000)
    expect(await rig.fetchMessage(short.sid)).toMatchObject({ status: 'failed', error_code: 30036 })
    await rig.forward(60_000)
    const ledger = (await rig.practice('GET', `/phones/${phone}`)).body
    expect(ledger.texts).toHaveLength(1)
    expect(ledger.notArrived).toMatchObject([{ sid: short.sid, errorCode: 30036 }])
  })

  it('takes a month forward in one step and still keeps the order of what happened', async () => {
    const first = await rig.send()
    const second = await rig.send()
    await rig.forward(30 * 86_400_000)
    const { texts } = (await rig.practice('GET', `/phones/${phone}`)).body
    expect(texts).toMatchObject([{ sid: first.sid }, { sid: second.sid }])
  })

  it('does not wait for a future that was lost when the clock is set back', async () => {
    await rig.forward(90 * 86_400_000)
    const created = await rig.send()
    await rig.forward(-60 * 86_400_000)
    await rig.forward(1_700)
    expect((await rig.fetchMessage(created.sid)).status).toBe('delivered')
  })

  it.each([
    ['0100', 'delivered', null, 1],
    ['0179', 'delivered', null, 1],
    ['0190', 'undelivered', 30003, 0],
    ['0191', 'failed', 30007, 0],
    ['0192', 'sent', null, 1],
    ['0193', 'sent', null, 0],
    ['0194', 'undelivered', 30005, 0],
    ['0195', 'undelivered', 30008, 1],
    ['0197', 'undelivered', 30006, 0],
    ['0198', 'undelivered', 30004, 0],
    ['0199', 'undelivered', 30003, 0],
  ])('555-%s ends as %s with %s', async (ending, status, code, onPhone) => {
    const to = `+1305555${ending}`
    const created = await rig.send({ To: to })
    await rig.forward(10_000)
    expect(await rig.fetchMessage(created.sid)).toMatchObject({ status, error_code: code })
    const { texts } = (await rig.practice('GET', `/phones/${to}`)).body
    expect(texts).toHaveLength(onPhone)
  })

  it('brings a late text after all, and every second one to a phone that is often off', async () => {
    const late = await rig.send({ To: '+13055550193' })
    await rig.send({ To: '+13055550199' })
    const again = await rig.send({ To: '+13055550199' })
    await rig.forward(30_000)
    expect((await rig.fetchMessage(late.sid)).status).toBe('delivered')
    expect((await rig.fetchMessage(again.sid)).status).toBe('delivered')
  })

  it('a service accepts first, without sender or segments, then queues', async () => {
    const created = await rig.send({ From: '', MessagingServiceSid: serviceSid })
    expect(created).toMatchObject({ status: 'accepted', from: null, num_segments: '0' })
    await rig.forward(100)
    expect(await rig.fetchMessage(created.sid)).toMatchObject({
      from: '+15005550006',
      num_segments: '1',
    })
    await rig.forward(3_000)
    expect((await rig.fetchMessage(created.sid)).status).toBe('delivered')
  })

  it('a service whose queue is over ten hours long fails with 30001, a number is refused at once', async () => {
    rig.running.carrier.state.busyUntil['+15005550006'] = rig.clock.now() + 36_001_000
    const { sid } = await rig.send({ From: '', MessagingServiceSid: serviceSid })
    await rig.forward(200)
    expect(await rig.fetchMessage(sid)).toMatchObject({ status: 'failed', error_code: 30001 })
    expect((await rig.send()).code).toBe(21611)
  })

  it('keeps a scheduled text until its hour, and forgets a canceled one', async () => {
    const SendAt = new Date(rig.clock.now() + 600_000).toISOString()
    const form = { From: '', MessagingServiceSid: serviceSid, ScheduleType: 'fixed', SendAt }
    const kept = await rig.send(form)
    const dropped = await rig.send(form)
    expect(kept.status).toBe('scheduled')
    await rig.rest('POST', `/Messages/${dropped.sid}.json`, { Status: 'canceled' })
    await rig.forward(599_000)
    expect((await rig.fetchMessage(kept.sid)).status).toBe('scheduled')
    await rig.forward(10_000)
    expect((await rig.fetchMessage(kept.sid)).status).toBe('delivered')
    expect((await rig.fetchMessage(dropped.sid)).status).toBe('canceled')
    expect((await rig.practice('GET', `/phones/${phone}`)).body.texts).toHaveLength(1)
  })
})
