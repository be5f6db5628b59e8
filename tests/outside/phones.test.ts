import googlePhones from 'google-libphonenumber'
import { describe, expect, it } from 'vitest'
import { looksUnused, phoneNumberSchema } from '@/lib/schemas/phone-number'
import { seeded } from '../factories/seeded'

/*
 * CHECKS.md section 11, phones. Oracle: google-libphonenumber 3.2.47. E.164 must be equal; validity may
 * differ on a handful, since the two packages carry metadata of different days.
 */
const oracle = googlePhones.PhoneNumberUtil.getInstance()
const { E164 } = googlePhones.PhoneNumberFormat

const bases = [
  '+12025550101',
  '+447700900123',
  '+61491570156',
  '+33639980012',
  '+254712345678',
  '+8801712345678',
  '+50937001234',
  '+919876543210',
  '+524771234567',
  '+2348031234567',
  '+5511961234567',
  '+4915228817386',
]

/** One to three digits changed, dropped or doubled. */
function mutated(next: () => number): string {
  const digits = (bases[Math.floor(next() * bases.length)] ?? '').split('')
  const times = 1 + Math.floor(next() * 3)
  for (let time = 0; time < times; time++) {
    const at = 2 + Math.floor(next() * (digits.length - 2))
    const kind = Math.floor(next() * 3)
    if (kind === 0) digits[at] = String(Math.floor(next() * 10))
    else if (kind === 1) digits.splice(at, 1)
    else digits.splice(at, 0, digits[at] ?? '0')
  }
  return digits.join('')
}

function judged(text: string) {
  try {
    const number = oracle.parse(text)
    return { e164: oracle.format(number, E164), isValid: oracle.isValidNumber(number) }
  } catch {
    return null
  }
}

describe('numbers against another reader of the same plan', () => {
  it('gives the same E.164 and nearly always the same validity on 20,000 mutated numbers', () => {
    const next = seeded(20_261_201)
    let compared = 0
    let unlike = 0
    for (let time = 0; time < 20_000; time++) {
      const text = mutated(next)
      const ours = phoneNumberSchema.safeParse(text)
      const theirs = judged(text)
      if (!ours.success || !theirs) continue
      compared += 1
      expect(ours.data).toBe(theirs.e164)
      if (looksUnused(ours.data) === theirs.isValid) unlike += 1
    }
    expect(compared).toBeGreaterThan(10_000)
    expect(unlike).toBeLessThanOrEqual(20)
  }, 120_000)
})
