import { beforeEach, describe, expect, test } from 'vitest'
import { NotAllowedError } from '@/lib/domain/role'
import type { NewWord } from '@/lib/schemas/reply-words'
import { addWords } from '@/lib/services/add-words'
import { listWordProposals, wordProposal } from '@/lib/services/list-proposals'
import { readAs } from '@/lib/services/read-as'
import { replyWords } from '@/lib/services/reply-words'
import { retireWord } from '@/lib/services/retire-word'
import { setAsideProposal } from '@/lib/services/set-aside-proposal'
import { tryReply } from '@/lib/services/try-reply'
import { testDeps, type TestDeps } from '../factories/deps'
import { readingDesk, type ReadingDesk } from '../factories/reading-desk'
import { houseIn, say } from '../factories/world'

const spanish = { language: 'es', asked: 'none' } as const
const slang: NewWord = { phrase: 'zurumbo', concept: 'slow' }

let deps: TestDeps
let desk: ReadingDesk

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  desk = await readingDesk(deps)
})

const openTexts = async () =>
  (await listWordProposals(deps, desk.tomas, {})).rows.map((row) => row.body)
const addedOf = async () => (await replyWords(deps, desk.tomas, { language: 'es' })).added

describe('a proposal', () => {
  test('is a text that a person read otherwise, with both readings', async () => {
    const textId = await desk.corrected('el agua muy zurumbo', 'slow')
    const { rows } = await listWordProposals(deps, desk.tomas, {})
    expect(rows).toHaveLength(1)
    expect(rows[0]).toMatchObject({
      textId,
      body: 'el agua muy zurumbo',
      language: 'es',
      asked: 'none',
      desk: { meaning: 'not clear' },
      person: { meaning: 'slow water', by: 'Ana Belmar' },
      settledByNow: false,
    })
  })

  test('is none where the person agrees with the desk', async () => {
    await desk.corrected('sale muy lento', 'slow')
    expect(await openTexts()).toEqual([])
  })

  test('is listed newest first, a page at a time', async () => {
    for (let at = 0; at < 21; at++) await desk.corrected(`zurumbo ${'x'.repeat(at + 4)}`, 'slow')
    const first = await listWordProposals(deps, desk.tomas, {})
    expect(first.rows).toHaveLength(20)
    expect(first.rows[0]?.body).toBe(`zurumbo ${'x'.repeat(24)}`)
    const rest = await listWordProposals(deps, desk.tomas, { before: first.before ?? 0 })
    expect(rest.rows.map(({ body }) => body)).toEqual(['zurumbo xxxx'])
    expect(rest.before).toBeNull()
  })

  test('set aside is not listed again, until somebody reads the text anew', async () => {
    const textId = await desk.corrected('el agua muy zurumbo', 'slow')
    const { readingN } = await desk.proposalOf(textId)
    expect(await setAsideProposal(deps, desk.tomas, { textId, readingN })).toMatchObject({
      ok: true,
    })
    expect(await openTexts()).toEqual([])
    expect(await setAsideProposal(deps, desk.tomas, { textId, readingN })).toMatchObject({
      ok: false,
    })
    await readAs(deps, desk.ana, { textId, kind: 'no-flow' })
    expect((await desk.proposalOf(textId)).person.meaning).toBe('no water')
  })

  test('is not settled by somebody who saw an older reading', async () => {
    const textId = await desk.corrected('el agua muy zurumbo', 'slow')
    const { readingN } = await desk.proposalOf(textId)
    await readAs(deps, desk.ana, { textId, kind: 'no-flow' })
    const proposal = { textId, readingN }
    expect(
      await addWords(deps, desk.tomas, { language: 'es', words: [slang], proposal }),
    ).toMatchObject({
      ok: false,
    })
    expect(await setAsideProposal(deps, desk.tomas, proposal)).toMatchObject({ ok: false })
    expect(await addedOf()).toEqual([])
  })
})

describe('trying a text', () => {
  test('shows what it is read as and on which words that rests', async () => {
    const tried = await tryReply(deps, desk.tomas, {
      ...spanish,
      text: 'no está roto zorblax',
      words: [],
    })
    expect(tried).toMatchObject({ unknownWords: ['zorblax'], refused: [], effect: null })
    expect(tried.found).toContainEqual(
      expect.objectContaining({ meaning: 'broken, cracked', denied: true, from: 2, to: 3 }),
    )
  })

  test('with words on trial tells what they would change, and changes nothing', async () => {
    await desk.deskReads('hoy zurumbo')
    await desk.deskReads('gracias')
    await desk.deskReads('zurumbo')
    const words = [slang, { phrase: '12', concept: 'slow' as const }]
    const tried = await tryReply(deps, desk.tomas, { ...spanish, text: 'zurumbo', words })
    expect(tried.reading).toMatchObject({ meaning: 'slow water' })
    expect(tried.found[0]).toMatchObject({ meaning: 'slow', added: true })
    expect(tried.refused).toMatchObject([{ phrase: '12' }])
    expect(tried.effect).toMatchObject({ looked: 3, changed: 2, calmed: 0 })
    expect(tried.effect?.some.map(({ body, after }) => [body, after])).toEqual([
      ['zurumbo', 'slow water'],
      ['hoy zurumbo', 'slow water'],
    ])
    expect(await desk.deskReads('zurumbo')).toBe('unclear')
  })

  test('looks at the texts of that language only, ten of them by name', async () => {
    await houseIn(deps, desk.place, {
      name: 'Whitlock',
      number: '+12025550102',
      language: 'en',
      handedOverOn: '2026-03-01',
    })
    await say(deps, '+12025550102', 'zurumbo')
    for (let at = 0; at < 12; at++) await desk.deskReads(`zurumbo ${'y'.repeat(at + 4)}`)
    const tried = await tryReply(deps, desk.tomas, { ...spanish, text: 'zurumbo', words: [slang] })
    expect(tried.effect).toMatchObject({ looked: 12, changed: 12 })
    expect(tried.effect?.some).toHaveLength(10)
  })
})

test('none of it is for agents', async () => {
  const textId = await desk.corrected('el agua muy zurumbo', 'slow')
  const { readingN } = await desk.proposalOf(textId)
  const words = [slang]
  const acts = [
    () => replyWords(deps, desk.ana, { language: 'es' }),
    () => tryReply(deps, desk.ana, { ...spanish, text: 'zurumbo', words }),
    () => addWords(deps, desk.ana, { language: 'es', words, proposal: { textId, readingN } }),
    () => retireWord(deps, desk.ana, 'any'),
    () => listWordProposals(deps, desk.ana, {}),
    () => wordProposal(deps, desk.ana, textId),
    () => setAsideProposal(deps, desk.ana, { textId, readingN }),
  ]
  for (const act of acts) await expect(act()).rejects.toBeInstanceOf(NotAllowedError)
  expect(await addedOf()).toEqual([])
})
