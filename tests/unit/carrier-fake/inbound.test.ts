import { afterEach, describe, expect, it } from 'vitest'
import { accountSid, phone, sender, startDesk, startRig, type Json, type Rig } from './rig'

type Desk = Awaited<ReturnType<typeof startDesk>>

describe('texts that a phone writes', () => {
  let rig: Rig
  let desk: Desk
  afterEach(async () => {
    await rig.close()
    await desk.close()
  })

  const begin = async (
    answer?: Parameters<typeof startDesk>[0],
    changes: Parameters<typeof startRig>[0] = {},
  ) => {
    desk = await startDesk(answer)
    rig = await startRig({ inboundUrl: `${desk.origin}/inbound#rc=0`, ...changes })
  }
  const write = async (body: string, more: Json = {}) =>
    (await rig.practice('POST', '/inbound', { from: phone, body, wait: true, ...more })).body
  const onPhone = async () =>
    (await rig.practice('GET', `/phones/${phone}`)).body.texts as (Json & { body: string })[]
  const debuggerCodes = async () =>
    ((await rig.practice('GET', '/debugger')).body.entries as Json[]).map((entry) => entry.code)

  it('reach the desk with every documented parameter', async () => {
    await begin()
    const media = [{ contentType: 'image/jpeg', base64: 'AAAA' }]
    const { sid } = await write('it is slow', { media, extra: { FromCity: 'LOMA CLARA' } })
    expect(desk.heard[0]?.parameters).toMatchObject({
      MessageSid: sid,
      SmsSid: sid,
      SmsMessageSid: sid,
      AccountSid: accountSid,
      From: phone,
      To: sender,
      Body: 'it is slow',
      NumMedia: '1',
      NumSegments: '1',
      MediaContentType0: 'image/jpeg',
      SmsStatus: 'received',
      ApiVersion: '2010-04-01',
      FromCity: 'LOMA CLARA',
      FromCountry: 'US',
    })
    expect(desk.heard[0]?.parameters.MediaUrl0).toContain(`/Messages/${sid}/Media/ME`)
    expect(desk.heard[0]?.parameters.OptOutType).toBeUndefined()
    expect(await rig.fetchMessage(sid)).toMatchObject({ direction: 'inbound', status: 'received' })
  })

  it('are cut at 1600 characters, as the carrier puts no more together', async () => {
    await begin()
    await write('x'.repeat(1700))
    expect(desk.heard[0]?.parameters.Body).toHaveLength(1600)
  })

  it('get the answer of the desk back on the phone', async () => {
    const body =
      '<?xml version="1.0"?><Response><Message>One &amp; two</Message><Message><Body>Three</Body></Message></Response>'
    await begin(() => ({ body }))
    await write('hello')
    await rig.forward(5_000)
    expect((await onPhone()).map((text) => text.body)).toEqual(['hello', 'One & two', 'Three'])
  })

  it('follow a redirect of the desk', async () => {
    await begin((heard) => ({
      body:
        heard.path === '/inbound'
          ? '<Response><Redirect>/there</Redirect></Response>'
          : '<Response><Message>from there</Message></Response>',
    }))
    await write('hello')
    await rig.forward(5_000)
    expect(desk.heard.map((heard) => heard.path)).toEqual(['/inbound', '/there'])
    expect((await onPhone()).map((text) => text.body)).toEqual(['hello', 'from there'])
  })

  it.each([
    ['application/json', '{}', 12300],
    ['text/xml', '<Response><Message></Response>', 12100],
    ['text/xml', '<Reply/>', 12200],
    ['text/xml', '<Response><Dial/></Response>', 12200],
  ])('log an answer of %s "%s" as %s', async (type, body, code) => {
    await begin(() => ({ type, body }))
    await write('hello')
    expect(await debuggerCodes()).toEqual([code])
  })

  it('log 11200 when the desk fails', async () => {
    await begin(() => ({ status: 500 }))
    await write('hello')
    expect(await debuggerCodes()).toEqual([11200])
  })

  it('go to the fallback address when the desk fails', async () => {
    await begin((heard) => ({ status: heard.path === '/inbound' ? 500 : 200 }))
    rig.running.carrier.settings.inboundFallbackUrl = `${desk.origin}/fallback`
    await write('hello')
    expect(desk.heard.map((heard) => heard.path)).toEqual(['/inbound', '/fallback'])
    expect(desk.heard[1]?.parameters).toMatchObject({ Body: 'hello', ErrorCode: '11200' })
  })

  it('of the past stand on the phone in their order, without any call', async () => {
    await begin()
    const sid = `SM${'e5'.repeat(16)}`
    const at = rig.clock.now() - 86_400_000
    const texts = [
      { phone, way: 'written', body: 'done', at: at + 60_000 },
      { phone, way: 'received', body: 'Wash today', at, sid },
    ]
    await write('today')
    const added = await rig.practice('POST', '/history', { texts })
    expect(added.body.added).toBe(2)
    expect((await rig.practice('POST', '/history', { texts: [texts[1]] })).body.added).toBe(0)
    expect((await onPhone()).map((text) => text.body)).toEqual(['Wash today', 'done', 'today'])
    expect(await rig.fetchMessage(sid)).toMatchObject({ status: 'delivered' })
    expect(desk.heard).toHaveLength(1)
    const bad = await rig.practice('POST', '/history', { texts: [{ phone }] })
    expect(bad.response.status).toBe(400)
  })

  it.each([
    ['STOP', true],
    ['stop', true],
    [' Stop ', true],
    ['UNSUBSCRIBE', true],
    ['END', true],
    ['QUIT', true],
    ['STOPALL', true],
    ['REVOKE', true],
    ['OPTOUT', true],
    ['CANCEL', true],
    ['stop please', false],
    ['STOP.', false],
    ['it stopped', false],
    ['arrêt', false],
  ])('%s opts out: %s', async (word, out) => {
    await begin()
    await write(word)
    expect((await rig.send()).code).toBe(out ? 21610 : undefined)
    expect(desk.heard).toHaveLength(1)
    expect((await onPhone()).filter((text) => text.byCarrier)).toHaveLength(out ? 1 : 0)
  })

  it.each([
    ['START', undefined],
    ['UNSTOP', undefined],
    ['YES', undefined],
    ['begin', 21610],
  ])('after STOP, %s leaves %s in the way', async (word, code) => {
    await begin()
    await write('STOP')
    await write(word)
    expect((await rig.send()).code).toBe(code)
  })

  it('HELP is answered by the carrier, but not for somebody who opted out', async () => {
    await begin()
    await write('HELP')
    await write('STOP')
    await write('INFO')
    await write('STOP')
    const own = (await onPhone()).filter((text) => text.byCarrier)
    expect(own).toHaveLength(2)
    expect((await rig.rest('GET', '/Messages.json')).body.messages).toHaveLength(4)
  })

  it('a stop that comes while a text waits makes it fail with 21610', async () => {
    await begin()
    const service = {
      From: '',
      MessagingServiceSid: rig.running.carrier.settings.messagingServiceSid,
    }
    const { sid } = await rig.send(service)
    await write('STOP')
    await rig.forward(5_000)
    expect(await rig.fetchMessage(sid)).toMatchObject({ status: 'failed', error_code: 21610 })
  })

  it('on a toll-free sender YES does not bring anybody back, and the block is told later', async () => {
    const tollFree = '+18005550155'
    await begin(undefined, { senders: [tollFree] })
    await write('STOP')
    await write('YES')
    const { sid } = await rig.send({ From: tollFree })
    await rig.forward(5_000)
    expect(await rig.fetchMessage(sid)).toMatchObject({ status: 'failed', error_code: 30004 })
    await write('START')
    const again = await rig.send({ From: tollFree })
    await rig.forward(5_000)
    expect((await rig.fetchMessage(again.sid)).status).toBe('delivered')
  })

  it('say OptOutType with advanced opt-out only', async () => {
    await begin(undefined, { advancedOptOut: true })
    await write('STOP')
    await write('start')
    await write('hello')
    const types = desk.heard.map((heard) => heard.parameters.OptOutType)
    expect(types).toEqual(['STOP', 'START', undefined])
  })

  it('the thirty-first reply in 30 seconds between two numbers is stopped', async () => {
    await begin(() => ({ body: '<Response><Message>again</Message></Response>' }))
    for (let n = 0; n < 31; n++) await write('again')
    await rig.forward(120_000)
    const replies = (await onPhone()).filter((text) => text.way === 'received')
    expect(replies).toHaveLength(30)
    expect(await debuggerCodes()).toEqual([14107])
  })

  it('refuse a phone that cannot exist', async () => {
    await begin()
    const answer = await rig.practice('POST', '/inbound', { from: 'me', body: 'x' })
    expect(answer.response.status).toBe(400)
  })
})
