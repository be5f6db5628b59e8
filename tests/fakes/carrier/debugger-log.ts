import type { Carrier } from './carrier'

const meanings: Record<number, string> = {
  11200: 'the desk could not be reached or did not answer 2xx',
  11243: 'the retry settings in the webhook address cannot be read',
  12100: 'the answer is not well-formed XML',
  12200: 'the answer is XML but not what was expected',
  12300: 'the answer has the wrong content type',
  14107: 'too many replies between two numbers in 30 seconds',
}

const keptEntries = 500

export function logProblem(
  carrier: Carrier,
  entry: { code: number; sid: string | null; detail: string },
): void {
  const log = carrier.state.debuggerLog
  log.push({ at: carrier.clock.now(), text: meanings[entry.code] ?? 'unknown', ...entry })
  if (log.length > keptEntries) log.splice(0, log.length - keptEntries)
  carrier.changed()
}
