import { afterEach, describe, expect, it } from 'vitest'
import { validateRequest, getSignatureAlgorithm } from 'twilio/lib/webhooks/webhooks'
import { readConnectionSettings } from '@/tests/fakes/carrier/connection-settings'
import {
  accountSid,
  authToken,
  phone,
  sender,
  startDesk,
  startRig,
  type Heard,
  type Rig,
} from './rig'

type Desk = Awaited<ReturnType<typeof startDesk>>

describe('webhooks', () => {
  let rig: Rig
  let desk: Desk
  afterEach(async () => {
    await rig.close()
    await desk.close()
  })

  const receipts = async (fragment = '', fault?: Record<string, unknown>) => {
    if (fault) await rig.practice('POST', '/faults', fault)
    const StatusCallback = `${desk.origin}/receipt?a=attempt-1${fragment}`
    const created = await rig.send({ StatusCallback })
    await rig.forward(1_500)
    await rig.forward(1_000)
    return created
  }
  const begin = async (answer?: Parameters<typeof startDesk>[0]) => {
    desk = await startDesk(answer)
    rig = await startRig()
  }
  const isGenuine = (heard: Heard, token = authToken) =>
    validateRequest(
      token,
      String(heard.headers['x-twilio-signature']),
      `${desk.origin}${heard.path}`,
      heard.parameters,
    )

  it('tells of sent and delivered, signed, without the fragment', async () => {
    await begin()
    const created = await receipts('#rc=2&rp=all')
    expect(desk.heard.map((heard) => heard.parameters.MessageStatus)).toEqual(['sent', 'delivered'])
    for (const heard of desk.heard) {
      expect(heard.path).toBe('/receipt?a=attempt-1')
      expect(isGenuine(heard)).toBe(true)
      expect(isGenuine(heard, 'another token')).toBe(false)
      expect(heard.parameters).toMatchObject({
        MessageSid: created.sid,
        SmsSid: created.sid,
        AccountSid: accountSid,
        From: sender,
        To: phone,
        ApiVersion: '2010-04-01',
      })
    }
    expect(desk.heard[1]?.parameters.RawDlrDoneDate).toBe('2603020600')
  })

  it('tells the error code of a text that did not arrive', async () => {
    await begin()
    await rig.send({ To: '+13055550194', StatusCallback: `${desk.origin}/r` })
    await rig.forward(3_000)
    const last = desk.heard.find((heard) => heard.parameters.MessageStatus === 'undelivered')
    expect(last?.parameters.ErrorCode).toBe('30005')
  })

  it('does not try again after a 500 unless asked to, and logs 11200', async () => {
    await begin(() => ({ status: 500 }))
    await receipts()
    expect(desk.heard).toHaveLength(2)
    const { entries } = (await rig.practice('GET', '/debugger')).body
    expect(entries).toMatchObject([{ code: 11200 }, { code: 11200 }])
  })

  it('tries again as often as the address allows, always with the same token', async () => {
    await begin((_heard, count) => ({ status: count <= 2 ? 503 : 200 }))
    await rig.send({ StatusCallback: `${desk.origin}/r#rc=5&rp=4xx,5xx` })
    await rig.forward(1_000)
    expect(desk.heard).toHaveLength(3)
    const tokens = desk.heard.map((heard) => heard.headers['i-twilio-idempotency-token'])
    expect(new Set(tokens).size).toBe(1)
    await rig.forward(1_000)
    expect(desk.heard[3]?.headers['i-twilio-idempotency-token']).not.toBe(tokens[0])
  })

  it('gives up when the retries are used up', async () => {
    await begin(() => ({ status: 404 }))
    await rig.send({ StatusCallback: `${desk.origin}/r#rc=2&rp=all` })
    await rig.forward(1_000)
    expect(desk.heard).toHaveLength(3)
  })

  it('stops waiting at the read timeout of the address', async () => {
    await begin(() => ({ hang: true }))
    const before = Date.now()
    await rig.send({ StatusCallback: `${desk.origin}/r#rt=150&rc=1&rp=rt&tt=600` })
    await rig.forward(1_000)
    expect(desk.heard).toHaveLength(2)
    expect(Date.now() - before).toBeLessThan(1_500)
  })

  it('logs 11243 for a retry policy it cannot read', async () => {
    await begin()
    await receipts('#rp=sometimes')
    const { entries } = (await rig.practice('GET', '/debugger')).body
    expect(entries).toMatchObject([{ code: 11243 }, { code: 11243 }])
  })

  it('calls no host but this machine', async () => {
    await begin()
    await rig.send({ StatusCallback: 'http://desk.example/r#rc=0' })
    await rig.forward(1_000)
    const { entries } = (await rig.practice('GET', '/debugger')).body
    expect(entries).toMatchObject([{ code: 11200, detail: expect.stringContaining('loopback') }])
  })

  it('can repeat, drop, and bring receipts in the wrong order', async () => {
    await begin()
    await receipts('', { kind: 'duplicate' })
    expect(desk.heard.map((heard) => heard.parameters.MessageStatus)).toEqual([
      'sent',
      'sent',
      'delivered',
    ])
    desk.heard.length = 0
    await receipts('', { kind: 'drop' })
    expect(desk.heard.map((heard) => heard.parameters.MessageStatus)).toEqual(['delivered'])
    desk.heard.length = 0
    await rig.practice('POST', '/faults', { kind: 'reorder', delayMilliseconds: 150 })
    await rig.send({ StatusCallback: `${desk.origin}/r` })
    await rig.forward(3_000)
    expect(desk.heard.map((heard) => heard.parameters.MessageStatus)).toEqual(['delivered', 'sent'])
  })

  it('can sign wrongly, and with a shared key that the header names', async () => {
    await begin()
    await receipts('', { kind: 'wrong-signature' })
    expect(desk.heard.map((heard) => isGenuine(heard))).toEqual([false, true])
    desk.heard.length = 0
    await receipts('', { kind: 'shared-key' })
    const heard = desk.heard[0]
    const settings = String(heard?.headers['x-twilio-webhooks-signature-settings'])
    expect(settings).toBe('key=practice-key,algorithm=HMAC_SHA256')
    const valid = validateRequest(
      'practice-shared-key',
      String(heard?.headers['x-twilio-signature']),
      `${desk.origin}${heard?.path}`,
      heard?.parameters ?? {},
      getSignatureAlgorithm(settings) ?? undefined,
    )
    expect(valid).toBe(true)
  })

  it('can add a parameter nobody announced, still rightly signed, and change the case of headers', async () => {
    await begin()
    await receipts('', { kind: 'extra-parameter', next: 2 })
    expect(desk.heard[0]?.parameters.PracticeExtra).toBeDefined()
    expect(desk.heard.every((heard) => isGenuine(heard))).toBe(true)
    desk.heard.length = 0
    await receipts('', { kind: 'upper-case-headers' })
    await receipts('', { kind: 'lower-case-headers' })
    const names = desk.heard.map((heard) => heard.rawHeaders)
    expect(names[0]).toContain('X-TWILIO-SIGNATURE')
    expect(names[1]).toContain('X-Twilio-Signature')
    expect(names[2]).toContain('x-twilio-signature')
    expect(desk.heard.every((heard) => isGenuine(heard))).toBe(true)
  })
})

describe('the fragment of a webhook address', () => {
  it('has the documented defaults', () => {
    expect(readConnectionSettings('http://a/b?c=d')).toEqual({
      url: 'http://a/b?c=d',
      connectMilliseconds: 5_000,
      readMilliseconds: 15_000,
      totalMilliseconds: 15_000,
      retries: 1,
      retryOn: ['ct'],
      unreadable: false,
    })
  })

  it('is read inside its ranges only', () => {
    const read = readConnectionSettings('http://a/b#rc=9&ct=50&rt=200&tt=99999&rp=all')
    expect(read).toMatchObject({ retries: 1, connectMilliseconds: 5_000, readMilliseconds: 200 })
    expect(read).toMatchObject({ totalMilliseconds: 15_000, retryOn: ['4xx', '5xx', 'ct', 'rt'] })
  })
})
