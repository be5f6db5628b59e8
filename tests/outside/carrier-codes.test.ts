import { describe, expect, it } from 'vitest'
import { classOf, statusRank, type RefusalClass } from '@/lib/domain/carrier-code'

/*
 * CHECKS.md section 11. The carrier's error dictionary and its page on the status of a message, read in copies. The
 * classes are ours: what its words on each code mean for the desk.
 */
describe('an error code of the carrier', () => {
  it.each<[string, RefusalClass, string]>([
    ['20429', 'later', 'too many requests at once'],
    ['21611', 'later', 'the queue of the sender is full'],
    ['30001', 'later', 'the queue of the service is full'],
    ['30003', 'later', 'the handset is off or out of reach'],
    ['30008', 'later', 'unknown error'],
    ['30022', 'later', 'the rate of the campaign'],
    ['30023', 'later', 'the daily cap of the campaign'],
    ['63038', 'later', 'the daily limit of the account'],
    ['21612', 'never', 'no route to this phone'],
    ['21614', 'never', 'not a mobile number'],
    ['21635', 'never', 'a landline'],
    ['30006', 'never', 'a landline or a carrier out of reach'],
    ['21610', 'opted out', 'the recipient opted out'],
    ['30004', 'opted out', 'the message was blocked'],
    ['21211', 'gone', 'no valid number'],
    ['30005', 'gone', 'unknown handset'],
    ['20003', 'our fault', 'wrong credentials'],
    ['21408', 'our fault', 'the country is not enabled'],
    ['21617', 'our fault', 'longer than 1,600 characters'],
    ['30007', 'our fault', 'filtered as spam: never tried again by itself'],
    ['99999', 'our fault', 'a code that is in no dictionary'],
  ])('%s is %s: %s', (code, expected) => {
    expect(classOf(code)).toBe(expected)
  })
})

describe('the status of a text', () => {
  it('only ever goes forward, and its ends are all as far', () => {
    const way = ['accepted', 'queued', 'sending', 'sent', 'delivered', 'read']
    const ranks = way.map(statusRank)
    expect(ranks).toEqual(ranks.toSorted((one, other) => one - other))
    expect(new Set(ranks).size).toBe(way.length)
    const ends = ['delivered', 'undelivered', 'failed', 'canceled']
    expect(new Set(ends.map(statusRank)).size).toBe(1)
    expect(statusRank('scheduled')).toBe(statusRank('accepted'))
  })

  it('that nobody has heard of moves nothing', () => {
    expect(statusRank('on a donkey')).toBeLessThan(statusRank('accepted'))
  })
})
