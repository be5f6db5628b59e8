import { z } from 'zod'
import { endpoint } from './endpoint'
import { languageSchema } from './language'
import { phoneNumberSchema } from './phone-number'

const shortText = (words: string) =>
  z.string({ error: words }).trim().min(1, words).max(80, 'At most 80 characters.')

const whoSchema = z.object({
  name: shortText('Write the family’s name.'),
  areaId: z.string({ error: 'Choose an area.' }).min(1, 'Choose an area.'),
  place: z.string().trim().max(200, 'At most 200 characters.').default(''),
  language: languageSchema,
  people: z
    .number({ error: 'Write how many people.' })
    .int('Write a whole number.')
    .min(1, 'At least one person.')
    .max(60, 'At most 60 people.'),
  infant: z.boolean().default(false),
  pregnant: z.boolean().default(false),
  elderly: z.boolean().default(false),
  ill: z.boolean().default(false),
  sourceClass: z.enum(['clear', 'cloudy', 'very cloudy'], { error: 'Say how their water looks.' }),
})

const phoneEntrySchema = z.object({
  number: phoneNumberSchema,
  answeredBy: z.string().trim().max(80, 'At most 80 characters.').default(''),
})

/** How and by whom the family said yes to texts; null while nobody has, and then nothing is sent. */
const consentSchema = z
  .object({ how: shortText('Say how it was given.'), by: shortText('Say who gave it.') })
  .nullable()
  .default(null)

const readingSchema = z
  .object({
    minutes: z
      .number({ error: 'Write minutes, as 4 or 4.5.' })
      .min(0.25, 'At least a quarter of a minute.')
      .max(600, 'At most 600 minutes.'),
    celsius: z
      .number({ error: 'Write degrees.' })
      .min(0, 'Water under 0 °C is ice.')
      .max(45, 'At most 45 °C.')
      .nullable()
      .default(null),
  })
  .nullable()
  .default(null)

export const householdInputSchema = whoSchema.extend({
  phones: z
    .array(phoneEntrySchema)
    .min(1, 'Write a phone number.')
    .max(3, 'At most three phones.')
    .refine(
      (phones) => new Set(phones.map(({ number }) => number)).size === phones.length,
      'Two of these are the same number.',
    ),
  consent: consentSchema,
  kit: z.object({
    modelId: z.string({ error: 'Choose a kit.' }).min(1, 'Choose a kit.'),
    handedOverOn: z.iso.date({ error: 'Write the day as 2026-03-01.' }),
  }),
  reading: readingSchema,
})

export type HouseholdInput = z.output<typeof householdInputSchema>

export const householdChangeSchema = whoSchema.omit({ areaId: true }).extend({
  phone: phoneEntrySchema,
  /** Only asked when the number is a new one. */
  consent: consentSchema,
})

export type HouseholdChange = z.output<typeof householdChangeSchema>

const enteredSchema = z.object({
  ok: z.literal(true),
  householdId: z.string(),
  kitId: z.string(),
  kitNumber: z.number(),
  phoneId: z.string(),
  /** What is worth a second look: a shared phone, a number that looks unused, no consent. */
  notes: z.array(z.string()),
})

export type EnteredHousehold = z.infer<typeof enteredSchema>

const changedSchema = z.object({
  ok: z.literal(true),
  householdId: z.string(),
  phoneId: z.string(),
  notes: z.array(z.string()),
})

export type ChangedHousehold = z.infer<typeof changedSchema>

export const enterHouseholdApi = endpoint({
  method: 'post',
  path: '/api/households',
  act: 'enter households',
  summary: 'Enter a household with its people, phones, consent, kit and first flow reading',
  body: householdInputSchema,
  response: enteredSchema,
})

export const changeHouseholdApi = endpoint({
  method: 'put',
  path: '/api/households/{id}',
  act: 'enter households',
  summary: 'Change who lives there, their language and the phone that texts go to',
  body: householdChangeSchema,
  response: changedSchema,
})

export const reinstatePhoneApi = endpoint({
  method: 'post',
  path: '/api/phones/{id}/reinstate',
  act: 'enter households',
  summary: 'Text a suspended phone again, after talking to the family',
  body: z.object({ how: shortText('Say who was talked to, and how.') }),
  response: z.object({ ok: z.literal(true), phoneId: z.string() }),
})
