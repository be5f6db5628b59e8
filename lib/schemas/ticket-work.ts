import { z } from 'zod'
import { endCauses } from '@/lib/domain/end-causes'
import { replyKinds } from '@/lib/domain/slip-words'
import { endpoint } from './endpoint'
import { ticketSheetSchema } from './ticket'

/** Which state of the ticket the person saw: an act on an older one is refused. */
const seen = { version: z.number().int().min(1) }

const bodySchema = z
  .string()
  .trim()
  .min(1, 'Write something.')
  .max(800, 'That is too long to text.')

const minutesSchema = z
  .number({ error: 'Give the minutes as a number.' })
  .positive('Minutes are above 0.')
  .max(600, 'That is more than ten hours.')

const answers = [
  'done',
  'not done',
  'cured',
  'partly',
  'not cured',
  'yes',
  'no',
  'choice-1',
  'choice-2',
  'choice-3',
  'no answer',
] as const

const workedSchema = z.object({ ok: z.literal(true), ticketId: z.string(), version: z.number() })

export type WorkedView = z.infer<typeof workedSchema>

export const ticketSheetApi = endpoint({
  method: 'get',
  path: '/api/tickets/{id}',
  act: 'work tickets',
  summary: 'All that is known of a ticket; `step` shows another step than the one proposed',
  query: z.object({ step: z.string().max(40).optional() }),
  response: ticketSheetSchema,
})

function work<const Name extends string, Body extends z.ZodRawShape>(
  name: Name,
  summary: string,
  body: Body,
) {
  return endpoint({
    method: 'post',
    path: `/api/tickets/{id}/${name}`,
    act: 'work tickets',
    summary,
    body: z.object({ ...seen, ...body }),
    response: workedSchema,
  })
}

export const takeApi = work('take', 'Take a ticket that nobody has', {})

export const handOnApi = work('hand-on', 'Hand it to a colleague, or null: back to the shift', {
  staffId: z.string().nullable(),
})

export const sendStepApi = work('send-step', 'Send a step, in its wording or in your own words', {
  stepId: z.string().max(40),
  body: bodySchema.optional(),
})

export const writeApi = work('write', 'Write to the household in your own words', {
  body: bodySchema,
})

export const noteAnswerApi = work('note-answer', 'Note an answer that was given by phone', {
  stepId: z.string().max(40),
  answer: z.enum(answers),
  minutes: minutesSchema.optional(),
  celsius: z.number().min(0, 'Water is above 0 °C.').max(60, 'No water is that warm.').optional(),
})

export const nameTroubleApi = work('name-trouble', 'Say what their words are about', {
  trouble: z.enum(['slow', 'no flow', 'unwell', 'danger sign', 'unsafe']),
})

export const promisePartApi = work('promise-part', 'Promise the part of a stage', {
  position: z.union([z.literal(1), z.literal(2), z.literal(3)]),
})

export const handOverApi = work('hand-over', 'The promised part is with the family and fitted', {})

export const bookVisitApi = work('book-visit', 'Book a visit', {
  dueOn: z.iso.date('Give the day.'),
  why: z.string().trim().min(1, 'Say what the visitor is to do.').max(300),
})

export const noteVisitApi = work('note-visit', 'Note what a visitor saw', {
  flowing: z.boolean(),
  note: z.string().trim().max(500).default(''),
})

export const stopUsingApi = work('stop-using', 'Take the filter out of use', {})

export const endApi = work('end', 'End the ticket, with what cured it or why no more is to do', {
  end: z.enum(['flowing', 'retired', 'withdrawn']),
  cause: z.enum(endCauses),
})

export const readAsApi = endpoint({
  method: 'post',
  path: '/api/texts/{id}/read-as',
  act: 'work tickets',
  summary: 'Correct what a reply was taken to mean; the first reading stays beside it',
  body: z.object({ kind: z.enum(replyKinds), minutes: minutesSchema.optional() }),
  response: z.object({ ok: z.literal(true), textId: z.string() }),
})

export const ticketEndpoints = [
  ticketSheetApi,
  takeApi,
  handOnApi,
  sendStepApi,
  writeApi,
  noteAnswerApi,
  nameTroubleApi,
  promisePartApi,
  handOverApi,
  bookVisitApi,
  noteVisitApi,
  stopUsingApi,
  endApi,
  readAsApi,
]
