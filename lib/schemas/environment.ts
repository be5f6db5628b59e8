import { z } from 'zod'

/** Settings of one process, as they come from outside: names to values. */
export type EnvironmentValues = Readonly<Record<string, string | undefined>>

export type CarrierSettings = {
  accountSid: string
  authToken: string
  /** The token before the present one: while a change is under way the carrier may still sign with it. */
  previousAuthToken: string | null
  /** Exactly one of `from` and `messagingServiceSid` is set. */
  from: string | null
  messagingServiceSid: string | null
  /** Null means the carrier's own address. */
  apiBaseUrl: string | null
}

export type Environment = {
  port: number
  /** Absolute, without a slash at the end. */
  publicBaseUrl: string
  dataDir: string
  /** Null means the embedded database in `dataDir`. */
  databaseUrl: string | null
  sessionSecret: string
  /** Keys the hashes of numbers that opted out; the session secret where none is set. */
  suppressionKey: string
  carrier: CarrierSettings
  /** Null means that no mail is sent. */
  mail: { smtpUrl: string; from: string } | null
  /** Whether this process runs jobs itself. */
  jobs: boolean
  practiceClock: boolean
}

export type EnvironmentReading =
  { ok: true; env: Environment } | { ok: false; problems: readonly string[] }

const shortestSecret = 32

// Messages carry the variable's name and what is wanted, never what was given: a value may be a secret.
function wanted(name: string, what: string) {
  return { error: `${name} must be ${what}.` }
}

function url(name: string, protocols: readonly string[], what: string) {
  return z
    .string({ error: `${name} is missing: it must be ${what}.` })
    .refine((text) => protocols.includes(urlOf(text)?.protocol ?? ''), wanted(name, what))
}

const variables = z.object({
  PORT: z.string().refine(isPort, wanted('PORT', 'a number from 1 to 65535')).default('3000'),
  PUBLIC_BASE_URL: url(
    'PUBLIC_BASE_URL',
    ['http:', 'https:'],
    'the absolute address under which the desk is reached, such as https://desk.example',
  ).refine((text) => !/[?#]/.test(text), {
    error: 'PUBLIC_BASE_URL must have neither a query nor a fragment.',
  }),
  DATA_DIR: z.string().default('.data'),
  DATABASE_URL: url(
    'DATABASE_URL',
    ['postgres:', 'postgresql:'],
    'a postgresql:// address',
  ).optional(),
  NEXTAUTH_SECRET: z
    .string({ error: 'NEXTAUTH_SECRET is missing: it signs the sign-in of every member of staff.' })
    .min(shortestSecret, wanted('NEXTAUTH_SECRET', `at least ${shortestSecret} characters long`)),
  SUPPRESSION_KEY: z
    .string()
    .min(shortestSecret, wanted('SUPPRESSION_KEY', `at least ${shortestSecret} characters long`))
    .optional(),
  TWILIO_ACCOUNT_SID: z
    .string({ error: 'TWILIO_ACCOUNT_SID is missing.' })
    .regex(/^AC[0-9a-f]{32}$/i, wanted('TWILIO_ACCOUNT_SID', 'AC and 32 hexadecimal digits')),
  // With an empty token a signature made with an empty key would pass as the carrier's.
  TWILIO_AUTH_TOKEN: z.string({
    error: 'TWILIO_AUTH_TOKEN is missing or empty: without it no webhook can be trusted.',
  }),
  TWILIO_AUTH_TOKEN_PREVIOUS: z.string().optional(),
  TWILIO_FROM: z
    .string()
    .regex(
      /^\+[1-9]\d{6,14}$/,
      wanted('TWILIO_FROM', 'a number in E.164 form, such as +15005550006'),
    )
    .optional(),
  TWILIO_MESSAGING_SERVICE_SID: z
    .string()
    .regex(
      /^MG[0-9a-f]{32}$/i,
      wanted('TWILIO_MESSAGING_SERVICE_SID', 'MG and 32 hexadecimal digits'),
    )
    .optional(),
  TWILIO_API_BASE_URL: url(
    'TWILIO_API_BASE_URL',
    ['http:', 'https:'],
    'an absolute address',
  ).optional(),
  SMTP_URL: url('SMTP_URL', ['smtp:', 'smtps:'], 'an smtp:// or smtps:// address').optional(),
  MAIL_FROM: z.string().regex(/@/, wanted('MAIL_FROM', 'an e-mail address')).optional(),
  JOBS: z.enum(['on', 'off'], wanted('JOBS', 'on or off')).default('on'),
  PRACTICE_CLOCK: z.enum(['on', 'off'], wanted('PRACTICE_CLOCK', 'on or off')).default('off'),
})

/**
 * Reads the settings of a process, or says everything that is wrong with them: one line each, ready to print, and
 * never with a value in it. An empty value is the same as none.
 */
export function readEnvironment(values: EnvironmentValues): EnvironmentReading {
  const given = Object.fromEntries(
    Object.entries(values).filter(([, value]) => value !== undefined && value.trim() !== ''),
  )
  const parsed = variables.safeParse(given)
  const problems = [
    ...(parsed.success ? [] : parsed.error.issues.map((issue) => issue.message)),
    ...contradictions(given),
  ]
  if (!parsed.success || problems.length > 0) return { ok: false, problems }
  return { ok: true, env: shape(parsed.data) }
}

/** Settings that are each right but cannot stand together. */
function contradictions(given: EnvironmentValues): string[] {
  return [
    ...senderContradictions(given),
    ...practiceContradictions(given),
    ...otherContradictions(given),
  ]
}

function senderContradictions(given: EnvironmentValues): string[] {
  if (given.TWILIO_FROM && given.TWILIO_MESSAGING_SERVICE_SID) {
    return ['TWILIO_FROM and TWILIO_MESSAGING_SERVICE_SID are both set: keep one of them.']
  }
  if (!given.TWILIO_FROM && !given.TWILIO_MESSAGING_SERVICE_SID) {
    return ['TWILIO_FROM or TWILIO_MESSAGING_SERVICE_SID must be set: texts need a sender.']
  }
  return []
}

function practiceContradictions(given: EnvironmentValues): string[] {
  if (given.PRACTICE_CLOCK !== 'on') return []
  const problems: string[] = []
  if (!isLoopback(given.TWILIO_API_BASE_URL)) {
    problems.push(
      'PRACTICE_CLOCK is on, but TWILIO_API_BASE_URL is not a loopback address: the clock may never move with a real carrier.',
    )
  }
  if (given.DATABASE_URL) {
    problems.push(
      'PRACTICE_CLOCK is on, but DATABASE_URL is set: the clock may only move with the embedded database.',
    )
  }
  return problems
}

function otherContradictions(given: EnvironmentValues): string[] {
  const problems: string[] = []
  if (given.SMTP_URL && !given.MAIL_FROM) {
    problems.push('SMTP_URL is set, but MAIL_FROM is missing: mail needs a sender.')
  }
  if (given.MAIL_FROM && !given.SMTP_URL) {
    problems.push('MAIL_FROM is set, but SMTP_URL is missing: no mail could leave.')
  }
  if (given.JOBS === 'off' && !given.DATABASE_URL) {
    problems.push(
      'JOBS is off, but DATABASE_URL is not set: the embedded database has one process only, so nothing would run the jobs.',
    )
  }
  return problems
}

function shape(read: z.output<typeof variables>): Environment {
  return {
    port: Number(read.PORT),
    publicBaseUrl: read.PUBLIC_BASE_URL.replace(/\/+$/, ''),
    dataDir: read.DATA_DIR,
    databaseUrl: read.DATABASE_URL ?? null,
    sessionSecret: read.NEXTAUTH_SECRET,
    suppressionKey: read.SUPPRESSION_KEY ?? read.NEXTAUTH_SECRET,
    carrier: {
      accountSid: read.TWILIO_ACCOUNT_SID,
      authToken: read.TWILIO_AUTH_TOKEN,
      previousAuthToken: read.TWILIO_AUTH_TOKEN_PREVIOUS ?? null,
      from: read.TWILIO_FROM ?? null,
      messagingServiceSid: read.TWILIO_MESSAGING_SERVICE_SID ?? null,
      apiBaseUrl: read.TWILIO_API_BASE_URL?.replace(/\/+$/, '') ?? null,
    },
    mail: read.SMTP_URL && read.MAIL_FROM ? { smtpUrl: read.SMTP_URL, from: read.MAIL_FROM } : null,
    jobs: read.JOBS === 'on',
    practiceClock: read.PRACTICE_CLOCK === 'on',
  }
}

function isPort(text: string): boolean {
  return /^\d{1,5}$/.test(text) && Number(text) >= 1 && Number(text) <= 65535
}

function isLoopback(address: string | undefined): boolean {
  const host = address === undefined ? undefined : urlOf(address)?.hostname
  return host === 'localhost' || host === '[::1]' || /^127(\.\d{1,3}){3}$/.test(host ?? '')
}

function urlOf(text: string): URL | null {
  return URL.canParse(text) ? new URL(text) : null
}
