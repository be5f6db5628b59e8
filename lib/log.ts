import pino from 'pino'

/** The server's log, one JSON line an event. Never a body, a number, a name or a secret. */
export const log = pino({
  base: null,
  redact: {
    paths: [
      'authorization',
      'password',
      'token',
      'body',
      'e164',
      '*.authorization',
      '*.password',
      '*.token',
    ],
    censor: '[cut]',
  },
})

/**
 * A fault in words that may stand in a log. A failed query tells its statement and the database's reason, never
 * the values it was asked with: they are numbers, names and what families wrote.
 */
export function faultWords(fault: unknown): string {
  // Drizzle's message ends with the values; the driver's own, its cause, has none.
  if (fault instanceof Error && 'params' in fault && 'query' in fault && fault.cause) {
    return `A query failed: ${String(fault.query)}; ${faultWords(fault.cause)}`
  }
  if (!(fault instanceof Error)) return String(fault)
  return fault.name === 'Error' ? fault.message : `${fault.name}: ${fault.message}`
}
