import { z } from 'zod'
import { endpoint } from './endpoint'

/** Why a word is no day: the calendar has none, or it is written otherwise. */
function noDay(given: unknown): string {
  const word = String(given)
  if (/^\d{4}-\d{2}-\d{2}$/.test(word)) return `There is no ${word}.`
  return `“${word}” is not a day written as 2026-12-25.`
}

/** A day without prompts. */
export const holidaySchema = z.object({
  on: z.iso.date({ error: ({ input }) => noDay(input) }),
  name: z
    .string()
    .trim()
    .max(60, { error: ({ input }) => `“${input as string}” is longer than 60 characters.` }),
})

/** An area's days without prompts; none twice. */
export const holidaysSchema = z
  .array(holidaySchema)
  .max(120, 'At most 120 days.')
  .superRefine((holidays, context) => {
    for (const [index, { on }] of holidays.entries()) {
      if (holidays.findIndex((holiday) => holiday.on === on) === index) continue
      context.addIssue({ code: 'custom', path: [index, 'on'], message: `${on} is there twice.` })
    }
  })

export const countriesSchema = z.object({
  countries: z.array(z.object({ code: z.string(), name: z.string() })),
})
export type Countries = z.infer<typeof countriesSchema>

export const publicHolidaysSchema = z.object({
  country: z.string(),
  /** From today to the end of next year, in order. */
  holidays: z.array(z.object({ on: z.string(), name: z.string() })),
})
export type PublicHolidays = z.infer<typeof publicHolidaysSchema>

export const listCountriesApi = endpoint({
  method: 'get',
  path: '/api/holidays',
  act: 'set up areas',
  summary: 'The countries whose public holidays are known',
  response: countriesSchema,
})

export const publicHolidaysApi = endpoint({
  method: 'get',
  path: '/api/holidays/{country}',
  act: 'set up areas',
  summary: 'A country’s public holidays that are still to come this year and next',
  response: publicHolidaysSchema,
})

export const holidayEndpoints = [listCountriesApi, publicHolidaysApi]
