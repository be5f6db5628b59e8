import { listRetiredWords, listWordsOfLanguage, type WordWithPeople } from '@/db/queries/added-word'
import { listTimeZones } from '@/db/queries/time-zone'
import type { Deps } from '@/lib/deps'
import type { Language } from '@/lib/domain/language'
import { mostAdded } from '@/lib/domain/reply-added'
import { conceptNames } from '@/lib/domain/reply-concept-names'
import { wordLists } from '@/lib/domain/reply-word-lists'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round-window'
import { dayWords, shortDayWords } from '@/lib/domain/stamp'
import type { AddedWordView, ReplyWords } from '@/lib/schemas/reply-words'

/** So many retired words are still shown. */
const RETIRED = 50

/** The words that the desk knows in a language, and those that the programme added to them. */
export async function replyWords(
  deps: Deps,
  actor: Actor,
  { language }: { language: Language },
): Promise<ReplyWords> {
  allow(actor, 'set reply words')
  const { db } = deps.store
  const view = viewerOf((await listTimeZones(db))[0] ?? 'UTC')
  return {
    language,
    groups: wordLists(language),
    added: (await listWordsOfLanguage(db, language, mostAdded)).map(view),
    retired: (await listRetiredWords(db, language, RETIRED)).map(view),
  }
}

function viewerOf(timeZone: string) {
  const dayOf = (at: number) => localDay(at, timeZone)
  const names: Partial<Record<string, string>> = conceptNames
  return ({ word, body, addedBy, retiredBy }: WordWithPeople): AddedWordView => ({
    id: word.id,
    phrase: word.phrase,
    meaning: names[word.concept] ?? 'a meaning the desk no longer has',
    addedBy: addedBy ?? 'somebody',
    day: shortDayWords(dayOf(word.addedAt)),
    year: dayOf(word.addedAt).slice(0, 4),
    from: body,
    retiredBy,
    retiredOn: word.retiredAt === null ? null : dayWords(dayOf(word.retiredAt)),
  })
}
