import { randomBytes } from 'node:crypto'

export type SidPrefix = 'SM' | 'MM' | 'ME' | 'NO'

/** Two letters and 32 hexadecimal digits, as every resource of the carrier is named. */
export function newSid(prefix: SidPrefix): string {
  return prefix + randomBytes(16).toString('hex')
}
