import { parsePhoneNumberFromString } from 'libphonenumber-js/max'
import { z } from 'zod'

const SHAPE = 'Write the number with its country code, as +1 505 555 0142.'

/**
 * A phone number as people write it, read to E.164 (`+15055550142`). It must begin with the country code
 * (`+` or `00`): an area may reach over a border, so none is guessed. A number that its country's plan has no room
 * for is refused; one that merely looks unused is not (`looksUnused`).
 */
export const phoneNumberSchema = z
  .string({ error: SHAPE })
  .max(40, SHAPE)
  .transform((text, context) => {
    const number = parsePhoneNumberFromString(text.trim().replace(/^00/, '+'))
    if (number?.isPossible() && !number.ext) return String(number.number)
    context.addIssue({ code: 'custom', message: SHAPE })
    return z.NEVER
  })

/** A number that its country has not given out, as far as is known: worth a second look, no more. */
export function looksUnused(e164: string): boolean {
  return parsePhoneNumberFromString(e164)?.isValid() !== true
}

/** `+1 505 555 0142`, for reading. */
export function spacedNumber(e164: string): string {
  return parsePhoneNumberFromString(e164)?.formatInternational() ?? e164
}
