import { randomBytes } from 'node:crypto'
import { chmodSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'

const accountSid = `AC${'0'.repeat(32)}`
const practiceNumber = '+15005550006'

/** The ports of the practice programs. Each has a variable, for a machine where one is taken. */
export function practicePorts(environment = process.env) {
  return {
    desk: Number(environment.PORT || 3000),
    carrier: Number(environment.PRACTICE_CARRIER_PORT || 4010),
    smtp: Number(environment.PRACTICE_SMTP_PORT || 4025),
    mail: Number(environment.PRACTICE_MAIL_PORT || 4026),
  }
}

/** Makes a folder that only its owner can enter: it holds names, numbers and keys. */
export function privateFolder(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  chmodSync(folder, 0o700)
  return folder
}

/** The keys of this practice desk, made once: a session signed yesterday is still good today. */
export function practiceKeys(folder) {
  const file = path.join(folder, 'practice-keys.json')
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'))
  const keys = {
    sessionSecret: randomBytes(33).toString('base64'),
    carrierToken: randomBytes(16).toString('hex'),
  }
  writeFileSync(file, JSON.stringify(keys), { mode: 0o600 })
  return keys
}

/**
 * The desk's settings in practice. Every setting of the desk is named, the unused ones as empty: a `.env` for the
 * real programme that lies beside must not leak into the demo.
 */
export function deskEnvironment({ dataFolder, ports, keys }) {
  return {
    ...process.env,
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    BIND_ADDRESS: '127.0.0.1',
    PORT: String(ports.desk),
    PUBLIC_BASE_URL: `http://127.0.0.1:${ports.desk}`,
    NEXTAUTH_URL: `http://127.0.0.1:${ports.desk}`,
    DATA_DIR: dataFolder,
    DATABASE_URL: '',
    NEXTAUTH_SECRET: keys.sessionSecret,
    SUPPRESSION_KEY: '',
    TWILIO_ACCOUNT_SID: accountSid,
    TWILIO_AUTH_TOKEN: keys.carrierToken,
    TWILIO_AUTH_TOKEN_PREVIOUS: '',
    TWILIO_FROM: practiceNumber,
    TWILIO_MESSAGING_SERVICE_SID: '',
    TWILIO_API_BASE_URL: `http://127.0.0.1:${ports.carrier}`,
    SMTP_URL: `smtp://127.0.0.1:${ports.smtp}`,
    MAIL_FROM: 'desk@rillpost.example',
    JOBS: 'on',
    PRACTICE_CLOCK: 'on',
  }
}

export function carrierEnvironment({ dataFolder, ports, keys }) {
  return {
    ...process.env,
    FAKE_PORT: String(ports.carrier),
    FAKE_ACCOUNT_SID: accountSid,
    FAKE_AUTH_TOKEN: keys.carrierToken,
    FAKE_FROM: practiceNumber,
    // The fragment asks for five tries on any failure; it is neither sent nor signed.
    FAKE_INBOUND_URL: `http://127.0.0.1:${ports.desk}/api/sms/inbound#rc=5&rp=all`,
    FAKE_CLOCK_FILE: path.join(dataFolder, 'practice-clock.json'),
    FAKE_STORE_FILE: path.join(dataFolder, 'carrier.json'),
    FAKE_PHONES_FILE: path.join(dataFolder, 'phones.json'),
  }
}

export function mailEnvironment({ ports }) {
  return {
    ...process.env,
    FAKE_SMTP_PORT: String(ports.smtp),
    FAKE_PORT: String(ports.mail),
  }
}
