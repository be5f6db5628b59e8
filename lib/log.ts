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
