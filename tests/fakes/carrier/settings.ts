export type Settings = {
  port: number
  accountSid: string
  authToken: string
  /** Key pair that may be used instead of the account's token; empty when there is none. */
  apiKeySid: string
  apiKeySecret: string
  /** Numbers the account owns; the first is used when a service sends. */
  senders: string[]
  messagingServiceSid: string
  inboundUrl: string
  /** Called when the inbound address fails; empty when there is none. */
  inboundFallbackUrl: string
  clockFile: string
  storeFile: string
  phonesFile: string
  segmentsPerSecond: number
  /** Time on the air between "sent" and "delivered". */
  airMilliseconds: number
  /** How late the numbers ending in 0193 get their texts. */
  lateMilliseconds: number
  /** Id and secret for webhooks signed with a shared key, used when the fault `shared-key` is set. */
  sharedKeyId: string
  sharedKey: string
  /** Beginnings of numbers the account may text; anything else is refused with 21408. */
  regions: string[]
  /** Sends OptOutType with keywords, as the carrier does once its advanced opt-out is on. */
  advancedOptOut: boolean
}

const defaultRegions = '+1,+33,+34,+44,+49,+61,+880'

function list(text: string): string[] {
  return text
    .split(',')
    .map((part) => part.trim())
    .filter((part) => part !== '')
}

function positive(name: string, text: string): number {
  const value = Number(text)
  if (!(value > 0)) throw new Error(`${name} must be a number above 0, not "${text}"`)
  return value
}

/** Reads the fake's own environment. Throws with one clear line when a value cannot be meant. */
export function readSettings(env: Record<string, string | undefined>): Settings {
  const value = (name: string, otherwise: string) => env[name] || otherwise
  return {
    port: positive('FAKE_PORT', value('FAKE_PORT', '4010')),
    accountSid: value('FAKE_ACCOUNT_SID', `AC${'0'.repeat(31)}1`),
    authToken: value('FAKE_AUTH_TOKEN', 'practice-token'),
    apiKeySid: value('FAKE_API_KEY_SID', ''),
    apiKeySecret: value('FAKE_API_KEY_SECRET', ''),
    senders: list(value('FAKE_FROM', '+15005550006')),
    messagingServiceSid: value('FAKE_MESSAGING_SERVICE_SID', ''),
    inboundUrl: value('FAKE_INBOUND_URL', 'http://127.0.0.1:3000/api/sms/inbound#rc=5&rp=all'),
    inboundFallbackUrl: value('FAKE_INBOUND_FALLBACK_URL', ''),
    clockFile: value('FAKE_CLOCK_FILE', ''),
    storeFile: value('FAKE_STORE_FILE', ''),
    phonesFile: value('FAKE_PHONES_FILE', ''),
    segmentsPerSecond: positive(
      'FAKE_SEGMENTS_PER_SECOND',
      value('FAKE_SEGMENTS_PER_SECOND', '10'),
    ),
    airMilliseconds: positive('FAKE_AIR_MILLISECONDS', value('FAKE_AIR_MILLISECONDS', '700')),
    lateMilliseconds: positive('FAKE_LATE_MILLISECONDS', value('FAKE_LATE_MILLISECONDS', '20000')),
    sharedKeyId: value('FAKE_SHARED_KEY_ID', 'practice-key'),
    sharedKey: value('FAKE_SHARED_KEY', 'practice-shared-key'),
    regions: list(value('FAKE_REGIONS', defaultRegions)),
    advancedOptOut: value('FAKE_ADVANCED_OPT_OUT', 'off') === 'on',
  }
}
