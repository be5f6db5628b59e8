import { z } from 'zod'
import { concepts } from '@/lib/domain/reply-words/concept'
import { endpoint } from './endpoint'
import { languageSchema } from './language'

const askedSchema = z.enum(['wash', 'change', 'flow', 'step', 'none'], {
  error: 'Choose what was asked.',
})

const addedWordSchema = z.object({
  id: z.string(),
  phrase: z.string(),
  /** Its meaning, in words. */
  meaning: z.string(),
  addedBy: z.string(),
  /** As printed: `12 Mar`, `2026`. */
  day: z.string(),
  year: z.string(),
  /** The text it was taken from. */
  from: z.string().nullable(),
  retiredBy: z.string().nullable(),
  retiredOn: z.string().nullable(),
})

const wordListSchema = z.object({
  name: z.string(),
  words: z.array(z.string()),
  /** So many more than are listed. */
  more: z.number(),
})

export const replyWordsSchema = z.object({
  language: languageSchema,
  groups: z.array(z.object({ name: z.string(), lists: z.array(wordListSchema) })),
  added: z.array(addedWordSchema),
  /** The last ones that were taken out of force. */
  retired: z.array(addedWordSchema),
})

const meaningSchema = z.object({ meaning: z.string(), sure: z.string() })

export const proposalSchema = z.object({
  textId: z.string(),
  /** Names the person's reading that was looked at. */
  readingN: z.number(),
  body: z.string(),
  language: languageSchema,
  asked: askedSchema,
  /** The day on which the person read it, as printed: `12 Mar`, `2026`. */
  day: z.string(),
  year: z.string(),
  desk: meaningSchema,
  person: z.object({ meaning: z.string(), by: z.string() }),
  /** With the words in force by now the desk reads it as the person did. */
  settledByNow: z.boolean(),
})

const proposalPageSchema = z.object({
  rows: z.array(proposalSchema),
  /** Ask for those before this number; null at the end of the list. */
  before: z.number().nullable(),
})

const effectSchema = z.object({
  looked: z.number(),
  changed: z.number(),
  /** Of these, how many spoke of a danger before and would no longer. */
  calmed: z.number(),
  some: z.array(
    z.object({ textId: z.string(), body: z.string(), before: z.string(), after: z.string() }),
  ),
})

export const triedReplySchema = z.object({
  reading: meaningSchema,
  /** What the word lists alone make of it. */
  byWords: z.string(),
  /** What texts like it have meant, the likeliest first. */
  byExamples: z.array(z.object({ meaning: z.string(), percent: z.number() })),
  /** The text as the desk cuts it. */
  words: z.array(
    z.object({ text: z.string(), kind: z.enum(['word', 'number', 'break']), known: z.boolean() }),
  ),
  /** What was found, as places in `words`: `from` up to, not including, `to`. */
  found: z.array(
    z.object({
      from: z.number(),
      to: z.number(),
      meaning: z.string(),
      denied: z.boolean(),
      guessed: z.boolean(),
      /** One of the programme's own words. */
      added: z.boolean(),
    }),
  ),
  unknownWords: z.array(z.string()),
  /** Of the words on trial those that may not be added; the reading is without them. */
  refused: z.array(z.object({ phrase: z.string(), reason: z.string() })),
  /** What the words on trial change in texts that are stored; null where none is on trial. */
  effect: effectSchema.nullable(),
})

export type ReplyWords = z.infer<typeof replyWordsSchema>
export type AddedWordView = z.infer<typeof addedWordSchema>
export type Proposal = z.infer<typeof proposalSchema>
export type ProposalPage = z.infer<typeof proposalPageSchema>
export type TriedReply = z.infer<typeof triedReplySchema>

const newWordsSchema = z
  .array(
    z.object({
      phrase: z.string().trim().min(1, 'Mark the words.').max(80, 'At most 80 letters.'),
      concept: z.enum(concepts, { error: 'Choose a meaning.' }),
    }),
  )
  .max(6, 'At most six at a time.')

const tryReplySchema = z.object({
  language: languageSchema,
  text: z
    .string()
    .trim()
    .min(1, 'Write a text to try.')
    .max(800, 'That is longer than a text can be.'),
  asked: askedSchema,
  words: newWordsSchema.default([]),
})

const addWordsSchema = z.object({
  language: languageSchema,
  words: newWordsSchema.min(1, 'Mark the words first.'),
  /** The proposal they come from. */
  proposal: z.object({ textId: z.string().max(60), readingN: z.number().int() }).optional(),
})

export type TryReply = z.output<typeof tryReplySchema>
export type NewWord = TryReply['words'][number]
export type AddWords = z.output<typeof addWordsSchema>

const act = 'set reply words'

/** What the page is asked for: a language, and from where on the proposals are listed. */
export const replyWordsQuerySchema = z.object({
  language: languageSchema.default('en'),
  before: z.coerce.number().int().min(1).optional(),
})

export const replyWordsApi = endpoint({
  method: 'get',
  path: '/api/reply-words',
  act,
  summary:
    'The words that the desk knows in a language, by what they mean, with the programme’s own',
  query: replyWordsQuerySchema.pick({ language: true }),
  response: replyWordsSchema,
})

export const tryReplyApi = endpoint({
  method: 'post',
  path: '/api/reply-words/try',
  act,
  summary: 'How the desk reads a text, with words on trial; changes nothing',
  body: tryReplySchema,
  response: triedReplySchema,
})

export const addWordsApi = endpoint({
  method: 'post',
  path: '/api/reply-words/add',
  act,
  summary: 'Give words a meaning from the next text on, and with that settle a proposal',
  body: addWordsSchema,
  response: z.object({ ok: z.literal(true), added: z.number() }),
})

export const retireWordApi = endpoint({
  method: 'post',
  path: '/api/reply-words/added/{id}/retire',
  act,
  summary: 'Take one of the programme’s own words out of force',
  response: z.object({ ok: z.literal(true), wordId: z.string() }),
})

export const proposalsApi = endpoint({
  method: 'get',
  path: '/api/reply-words/proposals',
  act,
  summary: 'Texts that a person read otherwise than the desk, newest first',
  query: replyWordsQuerySchema.pick({ before: true }),
  response: proposalPageSchema,
})

export const setAsideApi = endpoint({
  method: 'post',
  path: '/api/reply-words/proposals/{id}/set-aside',
  act,
  summary: 'Put a proposal away without adding a word',
  body: z.object({ readingN: z.number().int() }),
  response: z.object({ ok: z.literal(true), textId: z.string() }),
})

export const replyWordsEndpoints = [
  replyWordsApi,
  tryReplyApi,
  addWordsApi,
  retireWordApi,
  proposalsApi,
  setAsideApi,
]
