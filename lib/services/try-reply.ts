import { listReadTexts } from '@/db/queries/proposal'
import type { Deps } from '@/lib/deps'
import type { Language } from '@/lib/domain/language'
import { readReply } from '@/lib/domain/reply'
import type { AddedWord } from '@/lib/domain/reply-added'
import { conceptNames } from '@/lib/domain/reply-concept-names'
import { replyEffect } from '@/lib/domain/reply-effect'
import {
  explainReply,
  type Explained,
  type Found,
  type FoundFigure,
} from '@/lib/domain/reply-explain'
import { addedRefusalWords } from '@/lib/domain/reply-may-add'
import { meaningWords, sureWords } from '@/lib/domain/reply-meaning-words'
import { allow, type Actor } from '@/lib/domain/role'
import { spanWords } from '@/lib/domain/slip-words'
import type { TriedReply, TryReply } from '@/lib/schemas/reply-words'
import { addedWordsInForce } from './added-words'
import { checkNewWords } from './check-new-words'

/** The words on trial are tried on so many stored texts. */
const LOOKED = 200
const SHOWN = 10

/** How the desk reads a text, with the words on trial beside those in force. Changes nothing. */
export async function tryReply(deps: Deps, actor: Actor, input: TryReply): Promise<TriedReply> {
  allow(actor, 'set reply words')
  const { language, text, asked, words } = input
  const inForce = await addedWordsInForce(deps.store.db)
  const { allowed, refused } = checkNewWords({ language, words }, inForce)
  const added = allowed.length > 0 ? [...inForce, ...allowed] : inForce
  const explained = explainReply({ text, language, asked, added })
  return {
    ...explainedView(explained, added),
    refused: refused.map(({ phrase, refusal }) => ({
      phrase,
      reason: addedRefusalWords(refusal),
    })),
    effect: allowed.length > 0 ? await effectOn(deps, language, { inForce, added }) : null,
  }
}

function explainedView(explained: Explained, added: readonly AddedWord[]) {
  const { reading, byWords, byExamples, words, found, figures, unknownWords } = explained
  return {
    reading: { meaning: meaningWords(reading), sure: sureWords(reading.sure) },
    byWords: meaningWords(byWords),
    byExamples: byExamples
      .slice(0, 3)
      .filter(({ chance }) => chance >= 0.01)
      .map(({ kind, chance }) => ({
        meaning: meaningWords({ kind }),
        percent: Math.round(chance * 100),
      })),
    words,
    found: [...found.map((mark) => markView(mark, added)), ...figures.map(figureView)],
    unknownWords,
  }
}

function markView(mark: Found, added: readonly AddedWord[]) {
  return {
    from: mark.from,
    to: mark.to,
    meaning: conceptNames[mark.concept],
    denied: mark.denied,
    guessed: mark.likeness === 'guessed',
    added: isAdded(mark, added),
  }
}

function figureView({ from, to, minutes }: FoundFigure) {
  const meaning = minutes === null ? 'a number' : spanWords(minutes)
  return { from, to, meaning, denied: false, guessed: false, added: false }
}

function isAdded(mark: Found, added: readonly AddedWord[]): boolean {
  return added.some(
    ({ language, concept, phrase }) =>
      language === mark.language && concept === mark.concept && phrase === mark.words,
  )
}

async function effectOn(
  deps: Deps,
  language: Language,
  { inForce, added }: { inForce: readonly AddedWord[]; added: readonly AddedWord[] },
) {
  const texts = await listReadTexts(deps.store.db, language, LOOKED)
  const reads = texts.map((text) => {
    const reply = { text: text.body, language, asked: text.asked }
    return {
      text,
      before: readReply({ ...reply, added: inForce }),
      after: readReply({ ...reply, added }),
    }
  })
  const { some, ...counts } = replyEffect(reads, SHOWN)
  return {
    ...counts,
    some: some.map(({ text, before, after }) => ({
      textId: text.textId,
      body: text.body,
      before: meaningWords(before),
      after: meaningWords(after),
    })),
  }
}
