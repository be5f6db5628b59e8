import { z } from 'zod'
import { columnSchema } from './column'
import { languageSchema } from './language'
import { slipPageSchema } from './slip'

const likelihood = z.enum(['likely', 'possible', 'unlikely'])
const position = z.union([z.literal(1), z.literal(2), z.literal(3)])
const beadSchema = z.enum(['ring', 'half', 'full', 'broken'])

const ticketColumnSchema = columnSchema.extend({
  suspects: z.array(z.object({ position, word: likelihood })),
  labels: z.array(
    z.object({
      at: z.union([z.literal('container'), position, z.literal('vessel')]),
      title: z.string(),
      word: likelihood.optional(),
      odds: z.string().optional(),
      notes: z.array(z.string()),
    }),
  ),
  /** How the last reading is judged, against what, and at which temperature. */
  verdict: z.string().nullable(),
  /** Where the odds began; null where nothing is walked. */
  oddsFrom: z.string().nullable(),
  /** Suspects that have no place in the drawing, what is ruled out. */
  also: z.string().nullable(),
})

export type TicketColumn = z.infer<typeof ticketColumnSchema>

/** What would be sent now, word for word. */
const previewSchema = z.discriminatedUnion('ok', [
  z.object({
    ok: z.literal(true),
    text: z.string(),
    language: languageSchema,
    /** The same in the staff's language; null where it is theirs already. */
    staffText: z.string().nullable(),
  }),
  z.object({ ok: z.literal(false), reason: z.string() }),
])

export type Preview = z.infer<typeof previewSchema>

const answerSchema = z.object({
  answer: z.string(),
  label: z.string(),
  /** A figure comes with it: the minutes of a bottle. */
  withMinutes: z.boolean(),
})

const stepSchema = z.object({
  id: z.string(),
  name: z.string(),
  /** `Step 2 · a cure, about 4 minutes of their time`. */
  lead: z.string(),
  why: z.string(),
  preview: previewSchema,
  answers: z.array(answerSchema),
  /** When it went and how far it has come, while its answer is awaited. */
  awaited: z.string().nullable(),
})

export type StepView = z.infer<typeof stepSchema>

/** What is the matter for a person to decide now. */
const nowSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('step'), step: stepSchema }),
  /** The walk has come to its end; what it points to and why. */
  z.object({ kind: z.literal('end'), title: z.string(), why: z.string() }),
  /** Words that nobody understood. */
  z.object({ kind: z.literal('words'), words: z.string().nullable() }),
  /** Fixed answers went; a person does all that follows. */
  z.object({ kind: z.literal('danger') }),
  z.object({ kind: z.literal('silent') }),
  z.object({ kind: z.literal('ended'), title: z.string(), why: z.string() }),
])

export type TicketNow = z.infer<typeof nowSchema>

const causesSchema = z.array(z.object({ cause: z.string(), words: z.string() }))

export const ticketSheetSchema = z.object({
  id: z.string(),
  version: z.number(),
  /** The sentence of harm, in the reader's own language. */
  title: z.string(),
  titleLanguage: languageSchema,
  /** What it is about, in a word or two. */
  trouble: z.string(),
  waited: z.string(),
  since: z.string(),
  isDanger: z.boolean(),
  isOpen: z.boolean(),
  household: z.object({
    id: z.string(),
    house: z.string(),
    area: z.string(),
    language: languageSchema,
  }),
  /** `me` is who looks at the sheet. */
  holder: z.object({
    kind: z.enum(['nobody', 'you', 'another']),
    words: z.string(),
    me: z.string(),
  }),
  column: ticketColumnSchema,
  now: nowSchema,
  /** Fixed texts that went for this trouble. */
  fixed: z.array(z.object({ name: z.string(), receipt: beadSchema, receiptWords: z.string() })),
  otherSteps: z.array(z.object({ id: z.string(), name: z.string(), lead: z.string() })),
  people: z.array(z.string()),
  careful: z.array(z.string()),
  owed: z.object({
    promise: z.string().nullable(),
    visit: z.string().nullable(),
    depot: z.string(),
  }),
  ifThisFails: z.string().nullable(),
  /** Troubles that would weigh more than this one: what the words may be about. */
  mayBe: z.array(z.object({ trouble: z.string(), words: z.string() })),
  stages: z.array(z.object({ position, words: z.string() })),
  causes: z.object({ flowing: causesSchema, retired: causesSchema, withdrawn: causesSchema }),
  colleagues: z.array(z.object({ staffId: z.string(), words: z.string() })),
  visitOn: z.object({ first: z.string(), usual: z.string() }),
  history: z.array(z.object({ n: z.number(), when: z.string(), words: z.string() })),
  slips: slipPageSchema,
})

export type TicketSheetView = z.infer<typeof ticketSheetSchema>
