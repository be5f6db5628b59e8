import { beforeEach, describe, expect, test } from 'vitest'
import { partPromises } from '@/db/schema/promise'
import { texts } from '@/db/schema/text'
import { visits } from '@/db/schema/visit'
import { NotAllowedError, type Actor } from '@/lib/domain/role'
import { bookVisit, noteVisit } from '@/lib/services/book-visit'
import { endTicket, stopUsing } from '@/lib/services/end-ticket'
import { nameTrouble, noteAnswer } from '@/lib/services/note-answer'
import { handOverPart, owePart } from '@/lib/services/owe-part'
import { readAs } from '@/lib/services/read-as'
import { sendStep, writeToHousehold } from '@/lib/services/send-step'
import { handOnTicket, takeTicket } from '@/lib/services/take-ticket'
import { ticketSheet } from '@/lib/services/ticket-sheet'
import { testDeps, type TestDeps } from '../factories/deps'
import { lastTicket, sheetOf, work } from '../factories/desk'
import { actorOf, houseIn, say, world } from '../factories/world'

const PHONE = '+12025550101'

let deps: TestDeps
let ana: Actor
let mirela: Actor

async function open(stock = 3) {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  const place = await world(deps, { stock })
  ana = await actorOf(deps, 'agent', { name: 'Ana Belmonte' })
  mirela = await actorOf(deps, 'agent', { name: 'Mirela Duarte' })
  await houseIn(deps, place, { number: PHONE, handedOverOn: '2026-03-02' })
  await say(deps, PHONE, 'sale poca agua')
}

beforeEach(() => open())

async function ref() {
  const { id, version } = await lastTicket(deps)
  return { ticketId: id, version }
}

describe('two agents at one ticket', () => {
  test('who is first has it; the other reads in plain words that it moved on', async () => {
    const seen = await ref()
    expect(await takeTicket(deps, ana, seen)).toMatchObject({ ok: true })
    expect(await takeTicket(deps, mirela, seen)).toEqual({
      ok: false,
      reason: 'Something has happened on this ticket since you saw it.',
    })
    expect(await takeTicket(deps, mirela, await ref())).toEqual({
      ok: false,
      reason: 'A colleague has this ticket.',
    })
  })

  test('a step that is refused half way sends nothing', async () => {
    await work(deps, (seen) => takeTicket(deps, ana, seen))
    const before = (await deps.store.db.select().from(texts)).length
    const refused = await sendStep(deps, mirela, { ...(await ref()), stepId: 'wash-fibre' })
    expect(refused).toEqual({ ok: false, reason: 'A colleague has this ticket.' })
    expect(await deps.store.db.select().from(texts)).toHaveLength(before)
  })

  test('handed on, it is the other’s; handed back, it is the shift’s and stays by hand', async () => {
    await work(deps, (seen) => takeTicket(deps, ana, seen))
    await work(deps, (seen) => handOnTicket(deps, ana, { ...seen, staffId: mirela.staffId }))
    const { holder } = await sheetOf(deps, ana)
    expect(holder).toMatchObject({ kind: 'another', words: 'Handed on to Mirela Duarte' })
    await work(deps, (seen) => handOnTicket(deps, mirela, { ...seen, staffId: null }))
    expect(await lastTicket(deps)).toMatchObject({ takenBy: null, automatic: false })
  })
})

describe('parts and visits', () => {
  test('a part that no depot has is not promised, and the coordinator is told', async () => {
    await open(0)
    expect(await owePart(deps, ana, { ...(await ref()), position: 3 })).toEqual({
      ok: false,
      reason: 'No depot has this part. The coordinator has been told.',
    })
    expect(await deps.store.db.select().from(partPromises)).toHaveLength(0)
    expect((await deps.jobs()).map(({ name }) => name)).toContain('tell-coordinator')
  })

  test('nothing is handed over that was not promised', async () => {
    expect(await handOverPart(deps, ana, await ref())).toMatchObject({ ok: false })
  })

  test('a visit is booked once, and what was seen ends it', async () => {
    const visit = { dueOn: '2026-03-05', why: 'Look at the caps' }
    await work(deps, (seen) => bookVisit(deps, ana, { ...seen, ...visit }))
    expect(await bookVisit(deps, ana, { ...(await ref()), ...visit })).toMatchObject({ ok: false })
    expect((await sheetOf(deps, ana)).owed.visit).toBe('Visit 5 Mar 2026, in 3 days.')
    await work(deps, (seen) =>
      noteVisit(deps, ana, { ...seen, flowing: true, note: 'cap refitted' }),
    )
    expect(await lastTicket(deps)).toMatchObject({ stage: 'flowing', cause: 'mended at a visit' })
    const [kept] = await deps.store.db.select().from(visits)
    expect(kept).toMatchObject({ state: 'done', note: 'cap refitted' })
  })

  test('the household is told the day that was booked', async () => {
    const visit = { dueOn: '2026-03-09', why: 'Look at the caps' }
    await work(deps, (seen) => bookVisit(deps, ana, { ...seen, ...visit }))
    const told = (await deps.store.db.select().from(texts)).find(
      ({ moment }) => moment === 'visit-booked',
    )
    expect(told?.body).toContain('9 de marzo')
  })
})

describe('reading a reply anew', () => {
  test('stands beside the desk’s reading and is the one that is shown', async () => {
    const [slip] = (await sheetOf(deps, ana)).slips.slips.filter(
      ({ direction }) => direction === 'in',
    )
    expect(slip?.under).toBe('read as: slow water')
    const textId = slip?.textId ?? ''
    expect(await readAs(deps, ana, { textId, kind: 'no-flow' })).toMatchObject({ ok: true })
    expect(await readAs(deps, ana, { textId, kind: 'flow-figure', minutes: 9 })).toMatchObject({
      ok: true,
    })
    const [after] = (await sheetOf(deps, ana)).slips.slips.filter(
      ({ direction }) => direction === 'in',
    )
    expect(after?.under).toBe('read as: 9 minutes a bottle (a person read it)')
    expect(await readAs(deps, ana, { textId, kind: 'flow-figure' })).toMatchObject({ ok: false })
  })
})

describe('a visitor', () => {
  test('may do nothing on a ticket', async () => {
    const visitor = await actorOf(deps, 'visitor', { name: 'Amparo Nieto' })
    const at = await ref()
    const acts = [
      () => ticketSheet(deps, visitor, { ticketId: at.ticketId }),
      () => takeTicket(deps, visitor, at),
      () => handOnTicket(deps, visitor, { ...at, staffId: null }),
      () => sendStep(deps, visitor, { ...at, stepId: 'ask-flow' }),
      () => writeToHousehold(deps, visitor, { ...at, body: 'Hola' }),
      () => noteAnswer(deps, visitor, { ...at, stepId: 'ask-flow', answer: 'no' }),
      () => nameTrouble(deps, visitor, { ...at, trouble: 'no flow' }),
      () => owePart(deps, visitor, { ...at, position: 3 }),
      () => handOverPart(deps, visitor, at),
      () => bookVisit(deps, visitor, { ...at, dueOn: '2026-03-05', why: 'Look' }),
      () => noteVisit(deps, visitor, { ...at, flowing: true, note: '' }),
      () => stopUsing(deps, visitor, at),
      () => endTicket(deps, visitor, { ...at, end: 'flowing', cause: 'not known' }),
      () => readAs(deps, visitor, { textId: 'any', kind: 'slow' }),
    ]
    for (const act of acts) await expect(act()).rejects.toThrow(NotAllowedError)
  })
})
