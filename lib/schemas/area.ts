import { z } from 'zod'
import { endpoint } from './endpoint'
import { holidaySchema, holidaysSchema } from './holiday'
import { languageSchema } from './language'

/** Zones by name only: a bare offset knows nothing of daylight saving. */
function isTimeZone(name: string): boolean {
  if (!/^[A-Za-z]/.test(name)) return false
  try {
    new Intl.DateTimeFormat('en', { timeZone: name })
    return true
  } catch {
    return false
  }
}

const clockSchema = z
  .string({ error: 'Write an hour as 08:00.' })
  .regex(/^([01]\d|2[0-3]):[0-5]\d$|^24:00$/, 'Write an hour as 08:00.')

const celsiusSchema = z
  .number({ error: 'Write whole degrees.' })
  .int('Write whole degrees.')
  .min(0, 'Water under 0 °C is ice.')
  .max(45, 'At most 45 °C.')

export const areaInputSchema = z
  .object({
    name: z
      .string({ error: 'Write a name.' })
      .trim()
      .min(1, 'Write a name.')
      .max(60, 'At most 60 characters.'),
    timeZone: z.string({ error: 'Choose a time zone.' }).refine(isTimeZone, 'Choose a time zone.'),
    language: languageSchema,
    windowOpens: clockSchema,
    windowCloses: clockSchema,
    sundaysOff: z.boolean(),
    holidays: holidaysSchema,
    altitudeMetres: z
      .number({ error: 'Write metres above the sea.' })
      .int('Write whole metres.')
      .min(-430, 'No land lies lower than −430 m.')
      .max(6000, 'At most 6000 m.'),
    wetMonths: z.array(z.number().int().min(1).max(12)),
    monthCelsius: z.array(celsiusSchema).length(12, 'Write all twelve months.'),
    depotId: z.string({ error: 'Choose a depot.' }).min(1, 'Choose a depot.'),
  })
  .refine((area) => area.windowOpens < area.windowCloses, {
    path: ['windowCloses'],
    message: 'The window must close after it opens.',
  })

export type AreaInput = z.output<typeof areaInputSchema>

export const areaSchema = z.object({
  id: z.string(),
  name: z.string(),
  timeZone: z.string(),
  language: languageSchema,
  windowOpens: z.string(),
  windowCloses: z.string(),
  sundaysOff: z.boolean(),
  holidays: z.array(holidaySchema),
  altitudeMetres: z.number(),
  wetMonths: z.array(z.number()),
  monthCelsius: z.array(z.number()),
  depotId: z.string(),
  depotName: z.string(),
  households: z.number(),
})

export type Area = z.infer<typeof areaSchema>

export const areaListSchema = z.object({ areas: z.array(areaSchema) })
export type AreaList = z.infer<typeof areaListSchema>

const keptSchema = z.object({ ok: z.literal(true), areaId: z.string() })

export const listAreasApi = endpoint({
  method: 'get',
  path: '/api/areas',
  act: 'see households',
  summary: 'Every area with its window, its depot and how many households it has',
  response: areaListSchema,
})

export const enterAreaApi = endpoint({
  method: 'post',
  path: '/api/areas',
  act: 'set up areas',
  summary: 'Enter an area',
  body: areaInputSchema,
  response: keptSchema,
})

export const changeAreaApi = endpoint({
  method: 'put',
  path: '/api/areas/{id}',
  act: 'set up areas',
  summary: 'Change an area',
  body: areaInputSchema,
  response: keptSchema,
})

export const areaEndpoints = [listAreasApi, enterAreaApi, changeAreaApi]
