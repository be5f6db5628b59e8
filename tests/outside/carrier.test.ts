import twilio from 'twilio'
import type { RequestOptions } from 'twilio/lib/base/RequestClient'
import type { ValidateFunction } from 'ajv'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { signWebhook } from '@/tests/fakes/carrier/signature'
import { readSettings } from '@/tests/fakes/carrier/settings'
import { startCarrier, type RunningCarrier } from '@/tests/fakes/carrier/start'
import { carrierDescription, createChecks } from './carrier-description'

// Source: vectors of the carrier's own Python library tests (CHECKS.md section 11, MESSAGING.md section 2).
describe('the signature that the fake writes', () => {
  const secret = '12345'
  const url = 'https://mycompany.com/myapp.php?foo=1&bar=2'
  const call: [string, string][] = [
    ['Digits', '1234'],
    ['To', '+18005551212'],
    ['CallSid', 'CA1234567890ABCDE'],
    ['From', '+14158675309'],
    ['Caller', '+14158675309'],
  ]

  it.each([
    ['as published', url, 'RSOYDt4T1cUTdK1PDd93/VVr8B8='],
    ['a fragment is not signed', `${url}#rc=5&rp=all`, 'RSOYDt4T1cUTdK1PDd93/VVr8B8='],
    ['port 443', url.replace('.com/', '.com:443/'), 'kvajT1Ptam85bY51eRf/AJRuM3w='],
    [
      'http and port 1234',
      url.replace('https', 'http').replace('.com/', '.com:1234/'),
      'Zmvh+3yNM1Phv2jhDCwEM3q5ebU=',
    ],
    [
      'http and port 80',
      url.replace('https', 'http').replace('.com/', '.com:80/'),
      '0ZXoZLH/DfblKGATFgpif+LLRf4=',
    ],
  ])('%s', (_name, address, expected) => {
    expect(signWebhook({ secret, url: address, parameters: call })).toBe(expected)
  })

  it('counts repeated values of a name once, in their order', () => {
    const parameters: [string, string][] = [
      ['Sid', 'CA123'],
      ['SidAccount', 'AC123'],
      ['Digits', '5678'],
      ['Digits', '1234'],
      ['Digits', '1234'],
    ]
    expect(signWebhook({ secret, url, parameters })).toBe('IK+Dwps556ElfBT0I3Rgjkr1wJU=')
  })

  it('signs the address alone when the body is JSON', () => {
    const hash = '0a1ff7634d9ab3b95db5c9a2dfe9416e41502b283a80c7cf19632632f96e6620'
    const signed = signWebhook({ secret, url: `${url}&bodySHA256=${hash}`, parameters: [] })
    expect(signed).toBe('a9nBmqA0ju/hNViExpshrM61xv4=')
  })

  it('with a shared key (computed with the SDK 6.3.1, not published)', () => {
    const signed = signWebhook({ secret, url, parameters: call, algorithm: 'sha256' })
    expect(signed).toBe('033hgUJA9M/hXIZsYjwkerEP/DBm35nEri5FhCYjA5s=')
  })
})

const accountSid = `AC${'c3'.repeat(16)}`
const authToken = 'a-token-for-the-contract'
const from = '+15005550006'
const to = '+12125550150'
const base = '/2010-04-01/Accounts/{AccountSid}'

// Source: the published OpenAPI description, every property required and none extra.
describe('the contract, driven by the carrier’s own SDK', () => {
  let running: RunningCarrier
  let client: twilio.Twilio
  const checked: string[] = []
  let checks: ReturnType<typeof createChecks>
  const compiled = new Map<string, ValidateFunction>()

  function checkFor(method: string, path: string, status: number): [string, ValidateFunction] {
    if (status >= 400) return ['refusal', checks.refusal]
    const inside = path.replace(/^.*\/Accounts\/AC\w+/, '')
    const route = inside
      .replace(/\/Messages\/\w+\/Media\/\w+/, '/Messages/{MessageSid}/Media/{Sid}')
      .replace(/\/Messages\/\w+\/Media/, '/Messages/{MessageSid}/Media')
      .replace(/\/Messages\/(?!\{)\w+/, '/Messages/{Sid}')
    const full = inside === '.json' ? '/2010-04-01/Accounts/{Sid}.json' : `${base}${route}`
    const name = `${method} ${full} ${status}`
    const known = compiled.get(name) ?? checks.answer(full, method.toLowerCase(), String(status))
    compiled.set(name, known)
    return [name, known]
  }

  function check(method: string, uri: string, answer: { statusCode: number; body: unknown }) {
    // A page of a proxy has no form of its own, and 204 no body.
    if (answer.statusCode === 204 || String(answer.body).startsWith('<html>')) return
    const [name, validate] = checkFor(method, new URL(uri).pathname, answer.statusCode)
    const body: unknown = typeof answer.body === 'string' ? JSON.parse(answer.body) : answer.body
    if (!validate(body)) throw new Error(`${name}: ${JSON.stringify(validate.errors)}`)
    checked.push(name)
  }

  class Loopback extends twilio.RequestClient {
    override async request<T>(options: RequestOptions<T>) {
      const uri = new URL(options.uri)
      const origin = new URL(running.origin)
      uri.protocol = origin.protocol
      uri.host = origin.host
      const answer = await super.request<T>({ ...options, uri: uri.href })
      check(options.method, uri.href, answer)
      return answer
    }
  }

  const withToken = (token: string) =>
    twilio(accountSid, token, { httpClient: new Loopback({ timeout: 5_000 }) })
  const practice = (path: string, value: unknown) =>
    fetch(`${running.origin}/practice${path}`, { method: 'POST', body: JSON.stringify(value) })

  beforeAll(async () => {
    checks = createChecks(carrierDescription())
    running = await startCarrier({
      ...readSettings({}),
      port: 0,
      accountSid,
      authToken,
      senders: [from],
      inboundUrl: 'http://127.0.0.1:9/nobody#rc=0',
      segmentsPerSecond: 1_000,
      airMilliseconds: 1,
    })
    client = withToken(authToken)
  }, 180_000)
  afterAll(() => running?.close())

  it('creates and fetches a text', async () => {
    const created = await client.messages.create({
      to,
      from,
      body: 'Fill 1 litre, text the minutes.',
    })
    expect(created.status).toBe('queued')
    expect(created.dateCreated).toBeInstanceOf(Date)
    await expect
      .poll(async () => (await client.messages(created.sid).fetch()).status, { timeout: 5_000 })
      .toBe('delivered')
    const fetched = await client.messages(created.sid).fetch()
    expect(fetched.dateSent).toBeInstanceOf(Date)
    expect(fetched.numSegments).toBe('1')
  })

  it('describes a text that failed, and one that a phone wrote with a picture', async () => {
    const lost = await client.messages.create({ to: '+12125550194', from, body: 'Lost' })
    await expect
      .poll(async () => (await client.messages(lost.sid).fetch()).errorCode, { timeout: 5_000 })
      .toBe(30005)
    const media = [{ contentType: 'image/png', base64: 'AAAA' }]
    await practice('/inbound', { from: to, body: 'look', media })
    const [inbound] = await client.messages.list({ from: to })
    expect(inbound).toMatchObject({ direction: 'inbound', status: 'received', numMedia: '1' })
    const [picture] = await client.messages(inbound?.sid ?? '').media.list()
    const one = await client
      .messages(inbound?.sid ?? '')
      .media(picture?.sid ?? '')
      .fetch()
    expect(one.contentType).toBe('image/png')
  })

  it('lists over several pages, each text once', async () => {
    const other = '+12125550151'
    for (let n = 0; n < 5; n++) await client.messages.create({ to: other, from, body: `no ${n}` })
    const all = await client.messages.list({ to: other, pageSize: 2 })
    expect(all.map((message) => message.body)).toEqual(['no 4', 'no 3', 'no 2', 'no 1', 'no 0'])
    expect(await client.messages.list({ to: other, limit: 3 })).toHaveLength(3)
    const since = new Date(Date.now() - 60_000)
    await expect
      .poll(async () => (await client.messages.list({ to: other, dateSentAfter: since })).length)
      .toBe(5)
  })

  it('redacts, deletes, and tells of the account', async () => {
    const { sid } = await client.messages.create({ to, from, body: 'A secret' })
    await expect.poll(async () => (await client.messages(sid).fetch()).status).toBe('delivered')
    expect((await client.messages(sid).update({ body: '' })).body).toBe('')
    expect(await client.messages(sid).remove()).toBe(true)
    await expect(client.messages(sid).fetch()).rejects.toMatchObject({ status: 404, code: 20404 })
    expect((await client.api.v2010.accounts(accountSid).fetch()).status).toBe('active')
  })

  it('refuses in the form that the SDK reads', async () => {
    const create = (params: { to: string; from: string; body: string }, by = client) =>
      by.messages.create(params)
    await expect(create({ to: '12', from, body: 'x' })).rejects.toMatchObject({
      status: 400,
      code: 21211,
      moreInfo: expect.stringContaining('21211'),
    })
    await expect(create({ to, from, body: 'x' }, withToken('wrong'))).rejects.toMatchObject({
      status: 401,
      code: 20003,
    })
    await practice('/faults', { kind: 'too-many', retryAfterSeconds: 2 })
    await expect(create({ to, from, body: 'x' })).rejects.toMatchObject({
      status: 429,
      code: 20429,
    })
    await practice('/faults', { kind: 'error-500-before' })
    await expect(create({ to, from, body: 'x' })).rejects.toMatchObject({
      status: 500,
      code: 20500,
    })
    await practice('/faults', { kind: 'unavailable-503-before' })
    await expect(create({ to, from, body: 'x' })).rejects.toMatchObject({ status: 503 })
    await practice('/faults', { kind: 'reset-after' })
    await expect(create({ to, from, body: 'x' })).rejects.toMatchObject({ code: 'ECONNRESET' })
  })

  it('checked answers of every kind, so that none slipped by', () => {
    expect(new Set(checked)).toEqual(
      new Set([
        `post ${base}/Messages.json 201`,
        `get ${base}/Messages.json 200`,
        `get ${base}/Messages/{Sid}.json 200`,
        `post ${base}/Messages/{Sid}.json 200`,
        `get ${base}/Messages/{MessageSid}/Media.json 200`,
        `get ${base}/Messages/{MessageSid}/Media/{Sid}.json 200`,
        'get /2010-04-01/Accounts/{Sid}.json 200',
        'refusal',
      ]),
    )
  })
})
