import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { readEnvironment, type EnvironmentValues } from '@/lib/schemas/environment'

const secret = 'a secret that nobody must ever see printed'

const real: EnvironmentValues = {
  PUBLIC_BASE_URL: 'https://desk.example/',
  NEXTAUTH_SECRET: secret,
  TWILIO_ACCOUNT_SID: `AC${'0'.repeat(32)}`,
  TWILIO_AUTH_TOKEN: 'token',
  TWILIO_FROM: '+15005550006',
}

const practice: EnvironmentValues = {
  ...real,
  TWILIO_API_BASE_URL: 'http://127.0.0.1:4010',
  PRACTICE_CLOCK: 'on',
}

function problemsOf(values: EnvironmentValues): readonly string[] {
  const reading = readEnvironment(values)
  return reading.ok ? [] : reading.problems
}

describe('settings that stand', () => {
  test('the least that a real programme needs, with defaults for the rest', () => {
    expect(readEnvironment(real)).toEqual({
      ok: true,
      env: {
        port: 3000,
        publicBaseUrl: 'https://desk.example',
        dataDir: '.data',
        databaseUrl: null,
        suppressionKey: secret,
        sessionSecret: secret,
        carrier: {
          accountSid: `AC${'0'.repeat(32)}`,
          authToken: 'token',
          previousAuthToken: null,
          from: '+15005550006',
          messagingServiceSid: null,
          apiBaseUrl: null,
        },
        mail: null,
        jobs: true,
        practiceClock: false,
      },
    })
  })

  test.each(['http://127.0.0.1:4010', 'http://localhost:4010', 'http://[::1]:4010'])(
    'the practice clock beside the loopback address %s',
    (address) => {
      expect(problemsOf({ ...practice, TWILIO_API_BASE_URL: address })).toEqual([])
    },
  )

  test('a messaging service in place of a number', () => {
    const values = { ...real, TWILIO_FROM: '', TWILIO_MESSAGING_SERVICE_SID: `MG${'a'.repeat(32)}` }
    expect(problemsOf(values)).toEqual([])
  })

  test('jobs in another process, on a server database', () => {
    const values = { ...real, JOBS: 'off', DATABASE_URL: 'postgresql://desk@127.0.0.1/desk' }
    expect(readEnvironment(values)).toMatchObject({ ok: true, env: { jobs: false } })
  })

  test('mail when both its settings are there', () => {
    const values = {
      ...real,
      SMTP_URL: 'smtp://127.0.0.1:4025',
      MAIL_FROM: 'desk@rillpost.example',
    }
    expect(readEnvironment(values)).toMatchObject({
      ok: true,
      env: { mail: { smtpUrl: 'smtp://127.0.0.1:4025', from: 'desk@rillpost.example' } },
    })
  })
})

test('numbers that opted out are keyed by their own secret, or else by the session secret', () => {
  const own = 'k'.repeat(40)
  const keyOf = (values: EnvironmentValues) => {
    const read = readEnvironment(values)
    return read.ok ? read.env.suppressionKey : null
  }
  expect(keyOf({ ...real, SUPPRESSION_KEY: own })).toBe(own)
  expect(keyOf(real)).toBe(real.NEXTAUTH_SECRET)
})

describe('settings that are refused with one line each', () => {
  test.each<[string, EnvironmentValues, string]>([
    ['no public address', { ...real, PUBLIC_BASE_URL: undefined }, 'PUBLIC_BASE_URL is missing'],
    ['a relative public address', { ...real, PUBLIC_BASE_URL: '/desk' }, 'PUBLIC_BASE_URL must be'],
    [
      'a public address with a query',
      { ...real, PUBLIC_BASE_URL: 'https://a.example/?b' },
      'neither',
    ],
    ['no session secret', { ...real, NEXTAUTH_SECRET: '' }, 'NEXTAUTH_SECRET is missing'],
    ['a short session secret', { ...real, NEXTAUTH_SECRET: 'x'.repeat(31) }, 'at least 32'],
    [
      'a short suppression key',
      { ...real, SUPPRESSION_KEY: 'x'.repeat(31) },
      'SUPPRESSION_KEY must',
    ],
    ['no account', { ...real, TWILIO_ACCOUNT_SID: undefined }, 'TWILIO_ACCOUNT_SID is missing'],
    ['a wrong account', { ...real, TWILIO_ACCOUNT_SID: 'AC12' }, 'TWILIO_ACCOUNT_SID must be'],
    ['an empty token', { ...real, TWILIO_AUTH_TOKEN: '' }, 'TWILIO_AUTH_TOKEN is missing or empty'],
    [
      'a blank token',
      { ...real, TWILIO_AUTH_TOKEN: '  ' },
      'TWILIO_AUTH_TOKEN is missing or empty',
    ],
    ['no sender', { ...real, TWILIO_FROM: undefined }, 'must be set: texts need a sender'],
    [
      'two senders',
      { ...real, TWILIO_MESSAGING_SERVICE_SID: `MG${'a'.repeat(32)}` },
      'are both set: keep one',
    ],
    ['a sender that is no number', { ...real, TWILIO_FROM: 'Rillpost' }, 'TWILIO_FROM must be'],
    ['a port out of range', { ...real, PORT: '70000' }, 'PORT must be'],
    ['a port that is no number', { ...real, PORT: 'three' }, 'PORT must be'],
    ['another kind of database', { ...real, DATABASE_URL: 'mysql://a/b' }, 'DATABASE_URL must be'],
    ['mail without a sender', { ...real, SMTP_URL: 'smtp://127.0.0.1' }, 'MAIL_FROM is missing'],
    [
      'a mail sender without a server',
      { ...real, MAIL_FROM: 'a@b.example' },
      'SMTP_URL is missing',
    ],
    ['a word for the jobs', { ...real, JOBS: 'no' }, 'JOBS must be on or off'],
    [
      'jobs off on the embedded database',
      { ...real, JOBS: 'off' },
      'JOBS is off, but DATABASE_URL',
    ],
    [
      'the practice clock with the real carrier',
      { ...real, PRACTICE_CLOCK: 'on' },
      'PRACTICE_CLOCK',
    ],
    [
      'the practice clock with a carrier elsewhere',
      { ...practice, TWILIO_API_BASE_URL: 'https://127.0.0.1.example' },
      'is not a loopback address',
    ],
    [
      'the practice clock with a server database',
      { ...practice, DATABASE_URL: 'postgresql://a/b' },
      'PRACTICE_CLOCK is on, but DATABASE_URL is set',
    ],
  ])('%s', (_title, values, line) => {
    const problems = problemsOf(values)
    expect(problems).toHaveLength(1)
    expect(problems[0]).toContain(line)
  })

  test('several problems are told together', () => {
    expect(problemsOf({}).length).toBeGreaterThanOrEqual(4)
  })

  test('no line holds what was given', () => {
    const odd = 'zebra-71'
    const values = Object.fromEntries(namesInExample().map((name) => [name, odd]))
    const text = problemsOf(values).join('\n')
    expect(text).not.toBe('')
    expect(text).not.toContain(odd)
  })
})

test('the example file names every setting', () => {
  expect(namesInExample()).toEqual([
    'PORT',
    'BIND_ADDRESS',
    'PUBLIC_BASE_URL',
    'DATA_DIR',
    'DATABASE_URL',
    'NEXTAUTH_SECRET',
    'SUPPRESSION_KEY',
    'TWILIO_ACCOUNT_SID',
    'TWILIO_AUTH_TOKEN',
    'TWILIO_AUTH_TOKEN_PREVIOUS',
    'TWILIO_FROM',
    'TWILIO_MESSAGING_SERVICE_SID',
    'TWILIO_API_BASE_URL',
    'SMTP_URL',
    'MAIL_FROM',
    'JOBS',
    'PRACTICE_CLOCK',
  ])
})

function namesInExample(): string[] {
  const lines = readFileSync('.env.example', 'utf8').split('\n')
  return lines.flatMap((line) => /^#? ?([A-Z_]+)=/.exec(line)?.[1] ?? [])
}
