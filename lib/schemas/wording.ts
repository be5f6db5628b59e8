import { z } from 'zod'
import { languages } from '@/lib/domain/language'
import { endpoint } from './endpoint'

const languageSchema = z.enum(languages as readonly ['en', 'es', 'fr', 'bn'])

const openStateSchema = z.enum(['draft', 'approved'])

const matrixCellSchema = z.object({
  language: languageSchema,
  /** Parts of what is in use, or of the draft where nothing is. */
  parts: z.number(),
  edition: z.number().nullable(),
  lags: z.boolean(),
  draft: z
    .object({ state: openStateSchema, edition: z.number(), writtenBy: z.string().nullable() })
    .nullable(),
})

export const wordingMatrixSchema = z.object({
  languages: z.array(z.object({ language: languageSchema, name: z.string() })),
  groups: z.array(
    z.object({
      name: z.string(),
      rows: z.array(
        z.object({
          moment: z.string(),
          name: z.string(),
          safety: z.boolean(),
          cells: z.array(matrixCellSchema),
        }),
      ),
    }),
  ),
})

export const editionSchema = z.object({
  edition: z.number(),
  body: z.string(),
  state: z.enum(['draft', 'approved', 'in use', 'retired']),
  note: z.string(),
  /** The first language's edition that stood beside it when it was written. */
  followsEdition: z.number(),
  writtenBy: z.string().nullable(),
  /** As printed. */
  writtenOn: z.string(),
  /** Names this version of the draft: an approval is for what was read. */
  writtenAt: z.number(),
  approvedBy: z.string().nullable(),
  secondApprovedBy: z.string().nullable(),
  inUseFrom: z.string().nullable(),
  parts: z.number(),
})

export const wordingCellSchema = z.object({
  moment: z.string(),
  momentName: z.string(),
  group: z.string(),
  safety: z.boolean(),
  values: z.array(z.string()),
  language: languageSchema,
  languageName: z.string(),
  languageNameInEnglish: z.string(),
  inUse: editionSchema.nullable(),
  draft: editionSchema.nullable(),
  /** This person gave the first yes to the draft. */
  approvedByMe: z.boolean(),
  /** What is in use in the first language; null on the first language's own page. */
  first: editionSchema.nullable(),
  lags: z.boolean(),
  editions: z.array(editionSchema),
  month: z.object({ texts: z.number(), parts: z.number() }),
  pricePerSegment: z.number(),
  currency: z.string(),
  households: z.array(z.object({ id: z.string(), name: z.string(), area: z.string() })),
})

export const triedWordingSchema = z.object({
  /** Null where the draft cannot be filled in; `problem` says why. */
  text: z.string().nullable(),
  problem: z.string().nullable(),
  /** Values the household has none of yet, filled with an example. */
  examples: z.array(z.string()),
})

export type WordingMatrix = z.infer<typeof wordingMatrixSchema>
export type WordingMatrixCell = z.infer<typeof matrixCellSchema>
export type WordingCell = z.infer<typeof wordingCellSchema>
export type WordingEdition = z.infer<typeof editionSchema>
export type TriedWording = z.infer<typeof triedWordingSchema>

/** Longer than any text that the checks let through, so that the checks and not the field say so. */
const bodySchema = z.string().max(2000, 'At most 2000 characters.')

const saveDraftSchema = z.object({
  body: bodySchema.refine((body) => body.trim() !== '', 'Write what the text says.'),
  note: z.string().max(500, 'At most 500 characters.'),
  /** `writtenAt` of the draft that was on the screen; null where there was none. */
  readAt: z.number().nullable(),
})
const readDraftSchema = z.object({ readAt: z.number() })
const tryWordingSchema = z.object({ body: bodySchema, householdId: z.string().min(1) })

export type SaveDraft = z.infer<typeof saveDraftSchema>
export type TryWording = z.infer<typeof tryWordingSchema>

const place = '/api/wordings/{moment}/{language}'

export const wordingMatrixApi = endpoint({
  method: 'get',
  path: '/api/wordings',
  act: 'see wording',
  summary: 'Every moment in every language: editions, parts, what lags, open drafts',
  response: wordingMatrixSchema,
})

export const wordingCellApi = endpoint({
  method: 'get',
  path: place,
  act: 'see wording',
  summary: 'One moment in one language: what is in use, the draft, all editions, the cost',
  response: wordingCellSchema,
})

export const saveDraftApi = endpoint({
  method: 'put',
  path: `${place}/draft`,
  act: 'write wording',
  summary: 'Write the open draft, or a new one',
  body: saveDraftSchema,
  response: wordingCellSchema,
})

export const retireDraftApi = endpoint({
  method: 'post',
  path: `${place}/retire`,
  act: 'write wording',
  summary: 'Put the open draft away unused',
  body: readDraftSchema,
  response: wordingCellSchema,
})

export const approveWordingApi = endpoint({
  method: 'post',
  path: `${place}/approve`,
  act: 'write wording',
  summary: 'Say yes to the draft; a safety wording wants a second person’s yes',
  body: readDraftSchema,
  response: wordingCellSchema,
})

export const tryWordingApi = endpoint({
  method: 'post',
  path: `${place}/try`,
  act: 'see wording',
  summary: 'What a household would read, its own values filled in; sends nothing',
  body: tryWordingSchema,
  response: triedWordingSchema,
})

export const wordingEndpoints = [
  wordingMatrixApi,
  wordingCellApi,
  saveDraftApi,
  retireDraftApi,
  approveWordingApi,
  tryWordingApi,
]

/** Where a wording stands, from the parts of an address; a name that is none is refused by the service. */
export function placeParams(params: Record<string, string>) {
  return { moment: params.moment ?? '', language: params.language ?? '' }
}
