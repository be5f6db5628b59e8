import type { Transaction } from '@/db/client'
import { findKitFacts } from '@/db/queries/kit-facts'
import { findPhoneByNumber, listHouseholdsOfPhone } from '@/db/queries/phone'
import {
  findLastAsked,
  findTextForUpdate,
  insertReplyReading,
  insertText,
  updateText,
  type TextRow,
} from '@/db/queries/text'
import { findOpenTicket } from '@/db/queries/ticket-events'
import type { Deps } from '@/lib/deps'
import { answerTo } from '@/lib/domain/answer'
import { isHelpKeyword, isStartKeyword, isStopKeyword } from '@/lib/domain/consent'
import { readReply } from '@/lib/domain/reply'
import { mayMeanStop } from '@/lib/domain/reply-stop'
import type { InboundText } from '@/lib/schemas/carrier'
import { addedWordsInForce } from './added-words'
import { carryOutAnswer } from './carry-out-answer'
import { changeConsent } from './change-consent'

/** A question older than this is no longer what a reply is about, in milliseconds. */
const ASKED_WITHIN = 21 * 24 * 60 * 60_000

/**
 * Keeps an inbound text once, whatever becomes of it later, and enqueues its reading. This is all that
 * the webhook waits for. Null when the same text came before.
 */
export async function storeInbound(
  deps: Deps,
  inbound: InboundText,
): Promise<{ textId: string } | null> {
  return deps.store.transaction(async (tx) => {
    const phone = await findPhoneByNumber(tx, inbound.from)
    const text = await insertText(tx, {
      direction: 'in',
      purpose: `in:${inbound.sid}`,
      sid: inbound.sid,
      phoneId: phone?.id,
      e164: inbound.from,
      language: 'en',
      body: inbound.body,
      state: 'received',
      raw: inbound.raw,
      createdAt: deps.clock.now(),
    })
    if (!text) return null
    await deps.queue.add(tx, 'receive-text', { textId: text.id })
    return { textId: text.id }
  })
}

/** Who a text is from and what it answers: the household last asked on this phone, else its first. */
async function whoAnswers(tx: Transaction, deps: Deps, phoneId: string) {
  const lastAsked = await findLastAsked(tx, phoneId, deps.clock.now() - ASKED_WITHIN)
  const candidates = await listHouseholdsOfPhone(tx, phoneId)
  const found = candidates.find((row) => row.kit.id === lastAsked?.kitId) ?? candidates[0]
  const facts = found ? await findKitFacts(tx, found.kit.id) : null
  return facts && { facts, asked: lastAsked?.asked ?? 'none' }
}

/** Who asks for no texts gets none, though we do not know them: an old list may be entered tomorrow. */
async function readStranger(tx: Transaction, deps: Deps, text: TextRow): Promise<void> {
  const { kind } = readReply({ text: text.body, language: text.language, asked: 'none' })
  if (kind === 'stop') await changeConsent(tx, deps, { text, consent: 'withdrawn' })
  if (kind === 'start') await changeConsent(tx, deps, { text, consent: 'given' })
  await updateText(tx, text.id, { state: 'read', stateWhy: 'from a number we do not know' })
}

async function read(tx: Transaction, deps: Deps, textId: string): Promise<void> {
  const text = await findTextForUpdate(tx, textId)
  if (text?.state !== 'received') return
  const from = text.phoneId ? await whoAnswers(tx, deps, text.phoneId) : null
  if (!from || !text.phoneId) {
    return readStranger(tx, deps, text)
  }
  const { facts, asked } = from
  const ticket = await findOpenTicket(tx, facts.kit.id)
  const reading = readReply({
    text: text.body,
    language: facts.household.language,
    asked,
    added: await addedWordsInForce(tx),
  })
  await insertReplyReading(tx, {
    textId,
    asked,
    kind: reading.kind,
    minutes: reading.minutes,
    choice: reading.choice,
    sure: reading.sure,
    at: deps.clock.now(),
  })
  const acts = answerTo({
    reading,
    asked,
    waitingFor: ticket?.waitingFor ?? null,
    hasOpenTicket: ticket !== null,
    handledByCarrier:
      isStopKeyword(text.body) || isStartKeyword(text.body) || isHelpKeyword(text.body),
    mayMeanStop: mayMeanStop(text.body),
  })
  await updateText(tx, textId, {
    state: 'read',
    householdId: facts.household.id,
    kitId: facts.kit.id,
    language: facts.household.language,
    ticketId: ticket?.id,
  })
  await carryOutAnswer(tx, deps, { text, phoneId: text.phoneId, facts, acts })
}

/** Reads one stored text and does what it means, all or nothing. Reading it again changes nothing. */
export async function receiveText(deps: Deps, { textId }: { textId: string }): Promise<void> {
  await deps.store.transaction((tx) => read(tx, deps, textId))
}
