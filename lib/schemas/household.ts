import { z } from 'zod'
import { columnSchema } from './column'
import { endpoint } from './endpoint'
import { changeHouseholdApi, enterHouseholdApi, reinstatePhoneApi } from './household-entry'
import { languageSchema } from './language'
import { slipPageSchema } from './slip'

export const householdRowSchema = z.object({
  /** A household with two kits has two rows. */
  key: z.string(),
  householdId: z.string(),
  name: z.string(),
  area: z.string(),
  language: languageSchema,
  people: z.number(),
  kitNumber: z.number(),
  kitState: z.enum(['in use', 'out of service', 'retired']),
  column: columnSchema,
  phone: z.string().nullable(),
  /** Why no text may go, in words; null where one may. */
  silentBecause: z.string().nullable(),
  /** What comes next and when, as printed; null for a kit that is not in use. */
  nextDue: z.object({ words: z.string(), day: z.string(), overdue: z.boolean() }).nullable(),
  ticket: z.object({ id: z.string(), words: z.string() }).nullable(),
})

export type HouseholdRow = z.infer<typeof householdRowSchema>

export const householdListSchema = z.object({
  rows: z.array(householdRowSchema),
  total: z.number(),
  page: z.number(),
  pages: z.number(),
})

export type HouseholdList = z.infer<typeof householdListSchema>

export const householdQuerySchema = z.object({
  q: z.string().trim().max(80).default(''),
  page: z.coerce.number().int().min(1).max(10_000).catch(1).default(1),
})

export type HouseholdQuery = z.output<typeof householdQuerySchema>

const lifeEventSchema = z.object({
  id: z.string(),
  day: z.string(),
  beside: z.string().optional(),
  bead: z.enum(['ring', 'half', 'full', 'broken']),
  tone: z.enum(['water', 'clay']).optional(),
  title: z.string(),
  note: z.string().optional(),
})

const flowSchema = z.object({
  points: z.array(
    z.object({
      at: z.number(),
      litresPerHour: z.number(),
      errorLitresPerHour: z.number(),
      afterWash: z.boolean(),
      note: z.string().optional(),
    }),
  ),
  needLitresPerHour: z.number(),
  forecast: z.discriminatedUnion('kind', [
    z.object({ kind: z.literal('too few') }),
    z.object({ kind: z.literal('holds') }),
    z.object({
      kind: z.literal('falls'),
      onAt: z.number(),
      earliestAt: z.number(),
      latestAt: z.number().nullable(),
      perDay: z.number(),
    }),
  ]),
  forecastWords: z.string(),
})

export const kitViewSchema = z.object({
  id: z.string(),
  number: z.number(),
  model: z.string(),
  state: z.enum(['in use', 'out of service', 'retired']),
  column: columnSchema,
  past: z.array(lifeEventSchema),
  planned: z.array(lifeEventSchema),
  flow: flowSchema,
})

export type KitView = z.infer<typeof kitViewSchema>

export const phoneViewSchema = z.object({
  id: z.string(),
  number: z.string(),
  e164: z.string(),
  answeredBy: z.string(),
  /** Prompts go to this one. */
  first: z.boolean(),
  state: z.enum(['active', 'suspended', 'gone']),
  stateWhy: z.string(),
  consent: z.enum(['none', 'given', 'withdrawn']),
  silentBecause: z.string().nullable(),
  sharedWith: z.array(z.object({ id: z.string(), name: z.string() })),
  history: z.array(z.object({ n: z.number(), when: z.string(), words: z.string() })),
})

export type PhoneView = z.infer<typeof phoneViewSchema>

export const householdSheetSchema = z.object({
  id: z.string(),
  name: z.string(),
  place: z.string(),
  area: z.object({ id: z.string(), name: z.string(), timeZone: z.string() }),
  language: languageSchema,
  people: z.number(),
  infant: z.boolean(),
  pregnant: z.boolean(),
  elderly: z.boolean(),
  ill: z.boolean(),
  sourceClass: z.enum(['clear', 'cloudy', 'very cloudy']),
  litresPerDay: z.number(),
  enteredOn: z.string(),
  movedOn: z.string().nullable(),
  today: z.string(),
  phones: z.array(phoneViewSchema),
  kits: z.array(kitViewSchema),
  ticket: z.object({ id: z.string(), words: z.string() }).nullable(),
  slips: slipPageSchema,
})

export type HouseholdSheet = z.infer<typeof householdSheetSchema>

export const listHouseholdsApi = endpoint({
  method: 'get',
  path: '/api/households',
  act: 'see households',
  summary: 'Households by name, found by name, area, phone or kit number, 40 a page',
  query: householdQuerySchema,
  response: householdListSchema,
})

export const householdSheetApi = endpoint({
  method: 'get',
  path: '/api/households/{id}',
  act: 'see households',
  summary: 'All that is known of a household: people, phones, kits, flow, last texts',
  response: householdSheetSchema,
})

export const householdTextsApi = endpoint({
  method: 'get',
  path: '/api/households/{id}/texts',
  act: 'see households',
  summary: 'The texts with a household before a number, 50 a page',
  query: z.object({ before: z.coerce.number().int().min(1).optional() }),
  response: slipPageSchema,
})

export const householdEndpoints = [
  listHouseholdsApi,
  householdSheetApi,
  householdTextsApi,
  enterHouseholdApi,
  changeHouseholdApi,
  reinstatePhoneApi,
]
