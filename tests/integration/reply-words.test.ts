import { asc } from 'drizzle-orm'
import { beforeEach, describe, expect, test } from 'vitest'
import { addedWords } from '@/db/schema/reply-word'
import { audit } from '@/db/schema/staff'
import { replyReadings } from '@/db/schema/text'
import type { NewWord } from '@/lib/schemas/reply-words'
import { addWords } from '@/lib/services/add-words'
import { listWordProposals } from '@/lib/services/list-proposals'
import { replyWords } from '@/lib/services/reply-words'
import { retireWord } from '@/lib/services/retire-word'
import { setAsideProposal } from '@/lib/services/set-aside-proposal'
import { testDeps, type TestDeps } from '../factories/deps'
import { readingDesk, type ReadingDesk } from '../factories/reading-desk'

const slang: NewWord = { phrase: 'zurumbo', concept: 'slow' }

let deps: TestDeps
let desk: ReadingDesk

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  desk = await readingDesk(deps)
})

async function accept(textId: string, words: NewWord[]) {
  const { readingN } = await desk.proposalOf(textId)
  return addWords(deps, desk.tomas, { language: 'es', words, proposal: { textId, readingN } })
}

const openTexts = async () =>
  (await listWordProposals(deps, desk.tomas, {})).rows.map((row) => row.body)
const addedOf = async () => (await replyWords(deps, desk.tomas, { language: 'es' })).added

describe('an accepted word', () => {
  test('is read so from the next text on, and no longer once it is retired', async () => {
    const textId = await desk.corrected('el agua muy zurumbo', 'slow')
    expect(await desk.deskReads('hoy zurumbo')).toBe('unclear')
    expect(await accept(textId, [slang])).toEqual({ ok: true, added: 1 })
    expect(await openTexts()).toEqual([])
    expect(await desk.deskReads('hoy zurumbo')).toBe('slow')
    const [word] = await addedOf()
    expect(word).toMatchObject({
      phrase: 'zurumbo',
      meaning: 'slow',
      addedBy: 'Tomas Ibarra',
      day: '2 Mar',
      year: '2026',
      from: 'el agua muy zurumbo',
    })
    expect(await retireWord(deps, desk.tomas, word!.id)).toMatchObject({ ok: true })
    expect(await desk.deskReads('hoy zurumbo')).toBe('unclear')
    const { added, retired } = await replyWords(deps, desk.tomas, { language: 'es' })
    expect(added).toEqual([])
    expect(retired).toMatchObject([
      { phrase: 'zurumbo', retiredBy: 'Tomas Ibarra', retiredOn: '2 Mar 2026' },
    ])
    expect(await retireWord(deps, desk.tomas, word!.id)).toMatchObject({ ok: false })
  })

  test('changes nothing that was read before', async () => {
    const textId = await desk.corrected('el agua muy zurumbo', 'slow')
    const readings = () => deps.store.db.select().from(replyReadings).orderBy(asc(replyReadings.n))
    const before = await readings()
    await accept(textId, [slang])
    expect(await readings()).toEqual(before)
  })

  test('settles other proposals that say the same, in the eyes of who looks at them', async () => {
    const textId = await desk.corrected('el agua muy zurumbo', 'slow')
    const other = await desk.corrected('hoy zurumbo', 'slow')
    await accept(textId, [slang])
    expect(await desk.proposalOf(other)).toMatchObject({ settledByNow: true })
  })

  test('may be given back after it was retired, with another meaning', async () => {
    await addWords(deps, desk.tomas, { language: 'es', words: [slang] })
    const [word] = await addedOf()
    await retireWord(deps, desk.tomas, word!.id)
    const words: NewWord[] = [{ phrase: 'zurumbo', concept: 'thanks' }]
    expect(await addWords(deps, desk.tomas, { language: 'es', words })).toMatchObject({ ok: true })
    expect(await desk.deskReads('zurumbo')).toBe('thanks')
    expect(await deps.store.db.select().from(addedWords)).toHaveLength(2)
  })

  test('is written down in the audit, like its end and what was set aside', async () => {
    const textId = await desk.corrected('el agua muy zurumbo', 'slow')
    await accept(textId, [slang])
    const [word] = await addedOf()
    await retireWord(deps, desk.tomas, word!.id)
    const other = await desk.corrected('dice mi tia que quizas', 'no')
    const { readingN } = await desk.proposalOf(other)
    await setAsideProposal(deps, desk.tomas, { textId: other, readingN })
    const rows = await deps.store.db.select().from(audit).orderBy(asc(audit.n))
    const acts = rows.filter(({ staffId }) => staffId === desk.tomas.staffId).map(({ act }) => act)
    expect(acts.slice(-3)).toEqual([
      'add a reply word',
      'retire a reply word',
      'set a proposal aside',
    ])
  })
})

describe('words that may not be added', () => {
  test('are refused with the reason, and none of the others is kept', async () => {
    const textId = await desk.corrected('zurumbo gracias stop', 'slow')
    const words: NewWord[] = [slang, { phrase: 'gracias', concept: 'slow' }]
    const refused = await accept(textId, words)
    expect(refused).toMatchObject({ ok: false })
    expect(JSON.stringify(refused)).toContain('“gracias”')
    expect(await addedOf()).toEqual([])
    expect(await openTexts()).toHaveLength(1)
  })

  test('are those that do not stand in the text of the proposal', async () => {
    const textId = await desk.corrected('el agua muy zurumbo', 'slow')
    for (const phrase of ['cabra', 'zurumb', 'agua zurumbo']) {
      expect(await accept(textId, [{ phrase, concept: 'slow' }])).toMatchObject({ ok: false })
    }
    expect(await accept(textId, [{ phrase: 'muy Zurumbo', concept: 'slow' }])).toMatchObject({
      ok: true,
    })
  })

  test('are those with a meaning in force already', async () => {
    await addWords(deps, desk.tomas, { language: 'es', words: [slang] })
    const words: NewWord[] = [{ phrase: 'ZURUMBO', concept: 'thanks' }]
    expect(await addWords(deps, desk.tomas, { language: 'es', words })).toEqual({
      ok: false,
      reason: '“ZURUMBO”: The desk takes it for “slow”. Take a word beside it as well.',
    })
    expect(await addWords(deps, desk.tomas, { language: 'fr', words })).toMatchObject({ ok: true })
  })
})
