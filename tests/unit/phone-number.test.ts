import { describe, expect, it } from 'vitest'
import { looksUnused, phoneNumberSchema, spacedNumber } from '@/lib/schemas/phone-number'

describe('a phone number as people write it', () => {
  it.each([
    ['+1 505 555 0142', '+15055550142'],
    ['  +1 (505) 555-0142 ', '+15055550142'],
    ['001 505 555 0142', '+15055550142'],
    ['+880 1711-123456', '+8801711123456'],
  ])('%s is %s', (written, e164) => {
    expect(phoneNumberSchema.parse(written)).toBe(e164)
  })

  it.each([
    ['no country code', '505 555 0142'],
    ['too short', '+1 505 55'],
    ['too long', '+1 505 555 0142 99'],
    ['an extension', '+1 505 555 0142 ext 4'],
    ['words', 'the neighbour'],
    ['nothing', ''],
  ])('is refused with %s', (_what, written) => {
    expect(phoneNumberSchema.safeParse(written).success).toBe(false)
  })

  it('that its country has not given out is taken but looks unused', () => {
    expect(phoneNumberSchema.parse('+1 200 555 0142')).toBe('+12005550142')
    expect(looksUnused('+12005550142')).toBe(true)
    expect(looksUnused('+15055550142')).toBe(false)
  })

  it('is spaced for reading', () => {
    expect(spacedNumber('+15055550142')).toBe('+1 505 555 0142')
  })
})
