import type { Language } from './language'
import { momentInfo } from './moments'
import { offendingCharacters, renderWording, segmentsOf, valuesIn } from './wording'
import { actionsIn } from './wording-actions'
import { claimsOfSafety } from './wording-claims'
import { exampleValues } from './wording-examples'

export type DraftNote = {
  kind:
    | 'two actions'
    | 'long sentence'
    | 'claim of safety'
    | 'no way out'
    | 'no programme name'
    | 'word of the carrier'
    | 'letter halves the room'
    | 'unknown value'
    | 'missing value'
    | 'too many parts'
    | 'empty'
    | 'bad message'
  detail: string
  /** A draft with such a note cannot be approved. The rest is for the writer to weigh. */
  blocks: boolean
}

type Draft = { moment: string; language: Language; body: string }

const wordsASentence = 10
const partsAText = 2

/**
 * Words that the carrier acts on by itself: an answer of END or CANCEL would opt the household out,
 * YES would opt it in. Asked for in capitals, as texts ask for words. STOP and START are the way
 * out and back and stand in few texts; a person reads those.
 */
const carrierWords =
  /\b(?:YES|CANCEL|END|QUIT|INFO|HELP|UNSUBSCRIBE|STOPALL|REVOKE|OPTOUT|UNSTOP)\b/g

/** What is to be said about a draft before anybody approves it. No notes: nothing to say. */
export function checkDraft(draft: Draft): DraftNote[] {
  if (draft.body.trim() === '') return [blocking('empty', 'There are no words in it.')]
  const rendered = renderedForEachStage(draft)
  if (!Array.isArray(rendered)) return [rendered]
  return [...valueNotes(draft), ...firstContactNotes(draft), ...textNotes(draft, rendered)]
}

function blocking(kind: DraftNote['kind'], detail: string): DraftNote {
  return { kind, detail, blocks: true }
}

function hint(kind: DraftNote['kind'], detail: string): DraftNote {
  return { kind, detail, blocks: false }
}

/** A wording may read differently for each stage: all readings are looked at. */
function renderedForEachStage({ body, language }: Draft): string[] | DraftNote {
  const texts: string[] = []
  for (const stage of [1, 2, 3]) {
    const rendered = renderWording(body, exampleValues({ stage }), language)
    if (!rendered.ok) return blocking(rendered.reason, rendered.detail)
    texts.push(rendered.text)
  }
  return [...new Set(texts)]
}

function valueNotes({ moment, body, language }: Draft): DraftNote[] {
  const info = momentInfo(moment)
  const used = valuesIn(body, language)
  const offered: readonly string[] = info?.values ?? []
  return [
    ...used
      .filter((name) => !offered.includes(name))
      .map((name) => blocking('unknown value', `{${name}} is not known at this moment.`)),
    ...(info?.needs ?? [])
      .filter((name) => !used.includes(name))
      .map((name) => blocking('missing value', `{${name}} must be in it.`)),
  ]
}

function firstContactNotes({ moment, body, language }: Draft): DraftNote[] {
  if (!momentInfo(moment)?.firstContact) return []
  const notes: DraftNote[] = []
  if (!valuesIn(body, language).includes('programme')) {
    notes.push(blocking('no programme name', 'Who writes? {programme} must be in it.'))
  }
  if (!/\bSTOP\b/.test(body)) {
    notes.push(blocking('no way out', 'The word STOP must be in it.'))
  }
  return notes
}

function textNotes({ language }: Draft, texts: readonly string[]): DraftNote[] {
  const segments = Math.max(...texts.map((text) => segmentsOf(text).segments))
  const claims = new Set(texts.flatMap((text) => claimsOfSafety(text, language)))
  const long = new Set(texts.flatMap(longSentences))
  const actions = texts.map((text) => actionsIn(text, language)).find(({ length }) => length > 1)
  const carriers = new Set(texts.flatMap((text) => text.match(carrierWords) ?? []))
  const letters = language === 'bn' ? [] : offendingCharacters(texts.join(''))
  return [
    ...[...claims].map((claim) => blocking('claim of safety', `"${claim}" promises too much.`)),
    ...[...carriers].map((word) =>
      blocking('word of the carrier', `${word} as an answer is the carrier's, not ours.`),
    ),
    ...(segments > partsAText
      ? [blocking('too many parts', `${segments} parts; at most ${partsAText}.`)]
      : []),
    ...(actions ? [hint('two actions', `It asks to ${actions.join(' and to ')}.`)] : []),
    ...[...long].map((sentence) => hint('long sentence', sentence)),
    ...(letters.length > 0
      ? [hint('letter halves the room', `${letters.join(' ')}: 70 units a part, not 160.`)]
      : []),
  ]
}

/** Sentences of more than ten words, each with its count. */
function longSentences(text: string): string[] {
  return text
    .split(/[.!?।\n]+(?=\s|$)|\n/u)
    .map((sentence) =>
      sentence
        .trim()
        .split(/\s+/)
        .filter((word) => /[\p{L}\p{N}]/u.test(word)),
    )
    .filter((words) => words.length > wordsASentence)
    .map((words) => `${words.length} words: ${words.join(' ')}`)
}
