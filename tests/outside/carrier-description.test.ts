import { beforeAll, describe, expect, it } from 'vitest'
import { carrierDescription, createChecks } from './carrier-description'

describe('the checks made from the carrier’s description', () => {
  let description: ReturnType<typeof carrierDescription>
  beforeAll(() => {
    description = carrierDescription()
  }, 180_000)

  it('see an answer that is a little off', () => {
    const validate = createChecks(description).answer(
      '/2010-04-01/Accounts/{AccountSid}/Messages.json',
      'post',
      '201',
    )
    const good = {
      account_sid: `AC${'c3'.repeat(16)}`,
      api_version: '2010-04-01',
      body: 'x',
      date_created: 'Mon, 02 Mar 2026 06:00:00 +0000',
      date_sent: null,
      date_updated: 'Mon, 02 Mar 2026 06:00:00 +0000',
      direction: 'outbound-api',
      error_code: null,
      error_message: null,
      from: '+15005550006',
      messaging_service_sid: null,
      num_media: '0',
      num_segments: '1',
      price: null,
      price_unit: 'USD',
      sid: `SM${'d4'.repeat(16)}`,
      status: 'queued',
      subresource_uris: { media: '/2010-04-01/x' },
      to: '+12125550150',
      uri: '/2010-04-01/x.json',
    }
    expect(validate(good)).toBe(true)
    const changes: [string, unknown][] = [
      ['num_segments', 1],
      ['error_code', '30005'],
      ['date_created', '2026-03-02T06:00:00Z'],
      ['status', 'flying'],
      ['sid', 'SM1'],
      ['surprise', 1],
      ['subresource_uris', { media: 7 }],
    ]
    const off = changes.map(([name, value]) => ({ ...good, [name]: value }))
    const { uri: _uri, ...withoutUri } = good
    expect([...off, withoutUri].filter((answer) => validate(answer))).toEqual([])
  })
})
