export type MailSettings = { smtpPort: number; pagePort: number }

function port(name: string, text: string | undefined, otherwise: number): number {
  if (text === undefined || text === '') return otherwise
  const value = Number(text)
  if (!Number.isInteger(value) || value < 0 || value > 65_535) {
    throw new Error(`${name} must be a port number, not "${text}"`)
  }
  return value
}

export function readMailSettings(env: Record<string, string | undefined>): MailSettings {
  return {
    smtpPort: port('FAKE_SMTP_PORT', env.FAKE_SMTP_PORT, 4025),
    pagePort: port('FAKE_PORT', env.FAKE_PORT, 4026),
  }
}
