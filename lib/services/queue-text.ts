import type { Transaction } from '@/db/client'
import { insertText } from '@/db/queries/text'
import type { Deps } from '@/lib/deps'
import type { Language } from '@/lib/domain/language'
import { momentInfo, type Moment } from '@/lib/domain/moments'
import { segmentsOf, type Values } from '@/lib/domain/wording'
import { wordForStaff, wordText } from './word-text'

export type Letter = {
  /** What for, for whom, when: unique for ever. */
  purpose: string
  moment: Moment
  phone: { id: string; e164: string }
  household: { id: string; name: string; language: Language }
  kitId?: string
  ticketId?: string
  values?: Values
  stepId?: string
  staffId?: string
  /** The agent's own words in place of the wording's. */
  body?: string
  sendAfter: number
  /** After this it would do more harm than good: a prompt is dropped, a person decides over an answer. */
  notAfter?: number
  /** An answer to what the household just wrote may go at any hour; a prompt may not. */
  anyHour: boolean
}

export type Queued = { ok: true; textId: string } | { ok: false; reason: string }

/**
 * Writes an outbound text as a row before it is anything else, and enqueues its sending in the same
 * transaction. A purpose that has its text already is left alone: asking twice sends once.
 */
export async function queueText(tx: Transaction, deps: Deps, letter: Letter): Promise<Queued> {
  const composed = await wordText(tx, letter)
  if (!composed.ok && letter.body === undefined) {
    deps.log.error(
      { purpose: letter.purpose, reason: composed.reason },
      'a text could not be worded',
    )
    return composed
  }
  const staffBody = letter.body === undefined ? await wordForStaff(tx, letter) : null
  const body = letter.body ?? (composed.ok ? composed.text : '')
  const row = await insertText(tx, {
    direction: 'out',
    purpose: letter.purpose,
    phoneId: letter.phone.id,
    e164: letter.phone.e164,
    householdId: letter.household.id,
    kitId: letter.kitId,
    ticketId: letter.ticketId,
    moment: letter.moment,
    wordingId: composed.ok ? composed.wording.id : null,
    language: composed.ok ? composed.wording.language : letter.household.language,
    body,
    values: letter.values,
    staffBody,
    segments: segmentsOf(body).segments,
    asked: momentInfo(letter.moment)?.asked ?? 'none',
    stepId: letter.stepId,
    state: 'queued',
    sendAfter: letter.sendAfter,
    notAfter: letter.notAfter,
    anyHour: letter.anyHour,
    staffId: letter.staffId,
    createdAt: deps.clock.now(),
  })
  if (!row) return { ok: false, reason: 'this was texted already' }
  if (letter.sendAfter <= deps.clock.now())
    await deps.queue.add(tx, 'send-text', { textId: row.id })
  return { ok: true, textId: row.id }
}
