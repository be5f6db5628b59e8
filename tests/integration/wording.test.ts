import { asc } from 'drizzle-orm'
import { beforeEach, describe, expect, test } from 'vitest'
import { firstLanguage } from '@/db/queries/wording'
import { audit } from '@/db/schema/staff'
import { wordings } from '@/db/schema/wording'
import { languages } from '@/lib/domain/language'
import { moments } from '@/lib/domain/moments'
import { NotAllowedError, type Actor } from '@/lib/domain/role'
import type { WordingCell } from '@/lib/schemas/wording'
import { approveWording } from '@/lib/services/approve-wording'
import { planPrompts } from '@/lib/services/plan-prompts'
import { retireDraft } from '@/lib/services/retire-draft'
import { saveDraft } from '@/lib/services/save-draft'
import { sendDueTexts } from '@/lib/services/send-text'
import { tryWording } from '@/lib/services/try-wording'
import { wordingCell } from '@/lib/services/wording-cell'
import { wordingMatrix } from '@/lib/services/wording-matrix'
import { testDeps, type TestDeps } from '../factories/deps'
import { actorOf, houseIn, world, type World } from '../factories/world'

const DAY = 86_400_000
const washDue = { moment: 'wash-due', language: 'es' }
const stopUsing = { moment: 'stop-using', language: 'en' }

let deps: TestDeps
let place: World
let writer: Actor

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
  writer = place.coordinator
})

function cellOf(result: Awaited<ReturnType<typeof wordingCell>>): WordingCell {
  if ('ok' in result) throw new Error(result.reason)
  return result
}

/** Saves over what stands there now, as a person who has just opened the page does. */
async function write(at: typeof washDue, body: string, actor = writer) {
  const before = cellOf(await wordingCell(deps, actor, at))
  const readAt = before.draft?.writtenAt ?? null
  return cellOf(await saveDraft(deps, actor, { ...at, body, note: '', readAt }))
}

/** Says yes to what stands there now. */
async function approve(at: typeof washDue, actor = writer) {
  const { draft } = cellOf(await wordingCell(deps, actor, at))
  return approveWording(deps, actor, { ...at, readAt: draft?.writtenAt ?? 0 })
}

const matrixCell = async (at: typeof washDue) => {
  const { groups } = await wordingMatrix(deps, writer)
  const row = groups.flatMap(({ rows }) => rows).find(({ moment }) => moment === at.moment)
  return row?.cells.find(({ language }) => language === at.language)
}

describe('the matrix of wordings', () => {
  test('has a first edition for every moment in every language on a new desk', async () => {
    const { groups } = await wordingMatrix(deps, writer)
    const cells = groups.flatMap(({ rows }) => rows.flatMap((row) => row.cells))
    expect(cells).toHaveLength(moments.length * languages.length)
    expect(cells.filter(({ edition, parts }) => edition !== 1 || parts === 0)).toEqual([])
  })

  test('shows a draft with its writer, and nothing of it once it is put away', async () => {
    const { draft } = await write(washDue, '{house}: lave el filtro hoy. Escriba LISTO.')
    expect(await matrixCell(washDue)).toMatchObject({
      edition: 1,
      draft: { state: 'draft', edition: 2, writtenBy: 'Tomas Ibarra' },
    })
    await retireDraft(deps, writer, { ...washDue, readAt: draft!.writtenAt })
    expect(await matrixCell(washDue)).toMatchObject({ edition: 1, draft: null })
  })

  test('says that a language lags from the day the first language has a newer edition', async () => {
    const english = { ...washDue, language: 'en' }
    await write(english, '{house}: time to wash your filter. Done? Reply DONE.')
    expect(await matrixCell(washDue)).toMatchObject({ lags: false })
    await approve(english)
    expect(await matrixCell(washDue)).toMatchObject({ lags: true })
    expect(await matrixCell(english)).toMatchObject({ lags: false })
    await write(washDue, '{house}: toca lavar el filtro. Escriba LISTO.')
    await approve(washDue)
    expect(await matrixCell(washDue)).toMatchObject({ lags: false, edition: 2 })
  })

  test('is for coordinators only', async () => {
    const agent = await actorOf(deps, 'agent')
    await expect(wordingMatrix(deps, agent)).rejects.toBeInstanceOf(NotAllowedError)
    await expect(
      saveDraft(deps, agent, { ...washDue, body: 'x', note: '', readAt: null }),
    ).rejects.toBeInstanceOf(NotAllowedError)
  })

  test('falls back to the language that the programme words everything in', () => {
    expect(firstLanguage).toBe(languages[0])
  })
})

describe('a draft', () => {
  test('is one at a time: writing again rewrites it and keeps its edition', async () => {
    await write(washDue, 'Uno. Escriba LISTO.')
    const { draft, editions } = await write(washDue, 'Dos. Escriba LISTO.')
    expect(draft).toMatchObject({ edition: 2, body: 'Dos. Escriba LISTO.' })
    expect(editions).toHaveLength(2)
  })

  test('is not written over by somebody who has not read it', async () => {
    await write(washDue, 'Uno. Escriba LISTO.')
    const other = await actorOf(deps, 'coordinator', { name: 'Ines Vela' })
    const blind = { ...washDue, body: 'Dos.', note: '', readAt: null }
    expect(await saveDraft(deps, other, blind)).toMatchObject({ ok: false })
    expect(cellOf(await wordingCell(deps, other, washDue)).draft?.body).toBe('Uno. Escriba LISTO.')
  })

  test('put away does not give its edition number to the next one', async () => {
    const { draft } = await write(washDue, 'Uno. Escriba LISTO.')
    await retireDraft(deps, writer, { ...washDue, readAt: draft!.writtenAt })
    const after = await write(washDue, 'Dos. Escriba LISTO.')
    expect(after.draft?.edition).toBe(3)
  })

  test('opened by two people at once is one draft', async () => {
    const draft = { ...washDue, body: 'Uno. Escriba LISTO.', note: '', readAt: null }
    const both = await Promise.all([saveDraft(deps, writer, draft), saveDraft(deps, writer, draft)])
    expect(both.filter((result) => 'ok' in result)).toHaveLength(1)
    expect(cellOf(await wordingCell(deps, writer, washDue)).editions).toHaveLength(2)
  })
})

describe('an approval', () => {
  test('puts the words into use, retires the former ones, and the next text says them', async () => {
    await houseIn(deps, place, { handedOverOn: '2026-03-02' })
    await write(washDue, '{house}: hoy toca lavar. Escriba LISTO.')
    const after = cellOf(await approve(washDue))
    expect(after).toMatchObject({ draft: null, inUse: { edition: 2, approvedBy: 'Tomas Ibarra' } })
    expect(after.editions.map(({ state }) => state)).toEqual(['in use', 'retired'])
    await planPrompts(deps)
    await sendDueTexts(deps)
    deps.clock.advance(14 * DAY)
    await planPrompts(deps)
    await sendDueTexts(deps)
    expect(deps.carrier.sent.at(-1)?.body).toBe('Orellana: hoy toca lavar. Escriba LISTO.')
    expect(cellOf(await wordingCell(deps, writer, washDue)).month).toEqual({ texts: 1, parts: 1 })
  })

  test('is refused while a check blocks, and says which', async () => {
    await write(washDue, '{house}: lave el filtro de {nobody}. Escriba LISTO.')
    expect(await approve(washDue)).toMatchObject({
      ok: false,
      reason: expect.stringContaining('nobody') as string,
    })
    expect(await matrixCell(washDue)).toMatchObject({ edition: 1 })
  })

  test('is for the words that were read: later words want another', async () => {
    const { draft } = await write(washDue, 'Uno. Escriba LISTO.')
    await write(washDue, 'Dos. Escriba LISTO.')
    const late = { ...washDue, readAt: draft!.writtenAt }
    expect(await approveWording(deps, writer, late)).toMatchObject({ ok: false })
  })

  test('given twice at once leaves one edition in use', async () => {
    const { draft } = await write(washDue, 'Uno. Escriba LISTO.')
    const yes = { ...washDue, readAt: draft!.writtenAt }
    await Promise.all([approveWording(deps, writer, yes), approveWording(deps, writer, yes)])
    const { editions } = cellOf(await wordingCell(deps, writer, washDue))
    expect(editions.filter(({ state }) => state === 'in use')).toHaveLength(1)
  })

  test('of a safety wording takes two people', async () => {
    const other = await actorOf(deps, 'coordinator', { name: 'Ines Vela' })
    await write(stopUsing, 'Please do not drink from the filter now. We will help.')
    expect(cellOf(await approve(stopUsing))).toMatchObject({
      draft: { state: 'approved', approvedBy: 'Tomas Ibarra' },
      inUse: { edition: 1 },
      approvedByMe: true,
    })
    expect(await matrixCell(stopUsing)).toMatchObject({ draft: { state: 'approved' } })
    expect(await approve(stopUsing)).toMatchObject({ ok: false })
    expect(cellOf(await approve(stopUsing, other))).toMatchObject({
      draft: null,
      inUse: { edition: 2, approvedBy: 'Tomas Ibarra', secondApprovedBy: 'Ines Vela' },
    })
  })

  test('of a safety wording is lost when the words change', async () => {
    const other = await actorOf(deps, 'coordinator', { name: 'Ines Vela' })
    await write(stopUsing, 'Please do not drink from the filter now. We will help.')
    await approve(stopUsing)
    const { draft } = await write(stopUsing, 'Please drink no water from the filter now.', other)
    expect(draft).toMatchObject({ state: 'draft', approvedBy: null })
    expect(cellOf(await approve(stopUsing, other)).inUse?.edition).toBe(1)
  })

  test('leaves a trace of who wrote and who said yes to which words', async () => {
    await write(washDue, 'Uno. Escriba LISTO.')
    await approve(washDue)
    const rows = await deps.store.db.select().from(audit).orderBy(asc(audit.n))
    const ofWording = rows.filter(({ subject }) => subject === 'wording')
    expect(ofWording.map(({ act }) => act)).toEqual(['write wording', 'put wording in use'])
    expect(ofWording.every(({ staffId }) => staffId === writer.staffId)).toBe(true)
    expect(ofWording[1]).toMatchObject({
      subjectId: 'wash-due/es',
      detail: { edition: 2, body: 'Uno. Escriba LISTO.' },
    })
  })
})

describe('trying a wording', () => {
  test('fills in what is known of the household and says what is made up', async () => {
    const { householdId } = await houseIn(deps, place, { handedOverOn: '2026-03-02' })
    const body = '{house}, {minutes} min, {depot}, {visitor}'
    const tried = await tryWording(deps, writer, { ...washDue, body, householdId })
    expect(tried).toEqual({
      text: 'Orellana, 3 min, Vado depot, Amparo',
      problem: null,
      examples: ['visitor'],
    })
  })

  test('says why words cannot be filled in', async () => {
    const { householdId } = await houseIn(deps, place, { handedOverOn: '2026-03-02' })
    const tried = await tryWording(deps, writer, { ...washDue, body: '{house', householdId })
    expect(tried).toMatchObject({ text: null, problem: expect.stringContaining('bad message') })
  })

  test('changes nothing', async () => {
    const { householdId } = await houseIn(deps, place, { handedOverOn: '2026-03-02' })
    const before = await deps.store.db.select().from(wordings)
    await tryWording(deps, writer, { ...washDue, body: 'Hola', householdId })
    expect(await deps.store.db.select().from(wordings)).toEqual(before)
    expect(deps.carrier.sent).toEqual([])
  })

  test('knows no household that is none, and no moment that is none', async () => {
    const nobody = { ...washDue, body: 'Hola', householdId: 'nobody' }
    expect(await tryWording(deps, writer, nobody)).toEqual({ ok: false, reason: 'not found' })
    const nowhere = await wordingCell(deps, writer, { moment: 'no-moment', language: 'es' })
    expect(nowhere).toEqual({ ok: false, reason: 'not found' })
  })
})
