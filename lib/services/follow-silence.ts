import type { Transaction } from '@/db/client'
import { holdHousehold } from '@/db/queries/household'
import { findKitFacts } from '@/db/queries/kit-facts'
import { findFirstPhone } from '@/db/queries/phone'
import {
  findPromptForUpdate,
  listPromptsOfText,
  listPromptsToNudge,
  updatePrompts,
  type PromptRow,
} from '@/db/queries/prompt'
import { listPromptHours } from '@/db/queries/text'
import { findTicketForUpdate, listUnansweredTickets } from '@/db/queries/ticket-events'
import type { Deps } from '@/lib/deps'
import type { Moment } from '@/lib/domain/moments'
import {
  expiresAt,
  hadLastNudge,
  nextInsideWindow,
  overWeeklyLimit,
  waitUntil,
} from '@/lib/domain/round'
import { stageKey } from '@/lib/domain/round-text'
import { applyTicketEvent, raiseTrouble } from './apply-ticket-event'
import { windowOf } from './area-window'
import { closePrompts } from './care-for-kit'
import { queueText } from './queue-text'
import { settingsNow } from './settings-now'

const DAY = 24 * 60 * 60_000
const BATCH = 500

const nudgeMoment: Record<PromptRow['kind'], Moment> = {
  wash: 'wash-nudge',
  change: 'change-nudge',
  'flow check': 'flow-check',
  welcome: 'wash-nudge',
}

async function nudge(tx: Transaction, deps: Deps, prompt: PromptRow): Promise<void> {
  const now = deps.clock.now()
  const facts = await findKitFacts(tx, prompt.kitId)
  const phone = facts && (await findFirstPhone(tx, facts.household.id))
  if (!facts || !phone) return updatePrompts(tx, [prompt.id], { state: 'silent', nudgeAfter: null })
  await holdHousehold(tx, facts.household.id)
  const hours = await listPromptHours(tx, [facts.household.id], now - 7 * DAY)
  const { sending } = await settingsNow(tx)
  const sentAt = hours.map(({ at }) => Math.min(at, now))
  if (overWeeklyLimit({ sentAt, now, limit: sending.promptsAWeek })) {
    return updatePrompts(tx, [prompt.id], { nudgeAfter: now + DAY })
  }
  const sendAt = nextInsideWindow(now, windowOf(facts.area))
  const nudges = prompt.nudges + 1
  // One text asked for all of these: one nudge reminds of all.
  const together = (await listPromptsOfText(tx, prompt.textId)).filter(
    ({ state }) => state === 'asked',
  )
  const main = together.find(({ kind }) => kind === 'change') ?? prompt
  await queueText(tx, deps, {
    purpose: `nudge:${prompt.id}:${nudges}`,
    moment: nudgeMoment[main.kind],
    phone,
    household: facts.household,
    kitId: prompt.kitId,
    values: {
      stage: stageKey(together.flatMap(({ positions }) => positions)),
      dueOn: prompt.dueOn,
      litres: facts.model.bottleLitres,
    },
    sendAfter: sendAt,
    notAfter: expiresAt(sendAt),
    anyHour: false,
  })
  await updatePrompts(
    tx,
    together.map(({ id }) => id),
    { nudges, nudgeAfter: waitUntil(sendAt, nudges, sending) },
  )
}

async function giveUp(tx: Transaction, deps: Deps, prompt: PromptRow): Promise<void> {
  const facts = await findKitFacts(tx, prompt.kitId)
  if (!facts) return
  await closePrompts(tx, deps, { facts, state: 'silent' })
  await raiseTrouble(tx, deps, { facts, trouble: 'silent' })
}

/** Nudges what was not answered, twice, and gives steps that nobody answered to a person; then the silence goes into the shift. It never counts as working. */
export async function followSilence(deps: Deps): Promise<{ nudged: number; silent: number }> {
  const due = await listPromptsToNudge(deps.store.db, deps.clock.now(), BATCH)
  const done = { nudged: 0, silent: 0 }
  for (const { id } of due) {
    await deps.store.transaction(async (tx) => {
      const prompt = await findPromptForUpdate(tx, id)
      if (prompt?.state !== 'asked' || prompt.nudgeAfter === null) return
      if (prompt.nudgeAfter > deps.clock.now()) return
      const isLast = hadLastNudge(prompt.nudges)
      if (isLast) await giveUp(tx, deps, prompt)
      else await nudge(tx, deps, prompt)
      done[isLast ? 'silent' : 'nudged'] += 1
    })
  }
  await followSteps(deps)
  return done
}

/** A step that nobody answered for as long as a prompt waits for its nudge: from now on it is a person's. */
async function followSteps(deps: Deps): Promise<void> {
  const { sending } = await settingsNow(deps.store.db)
  const since = deps.clock.now() - sending.firstNudgeDays * DAY
  const waiting = await listUnansweredTickets(deps.store.db, { since, limit: BATCH })
  for (const { id: ticketId } of waiting) {
    await deps.store.transaction(async (tx) => {
      // An answer may have come since the list was read.
      const ticket = await findTicketForUpdate(tx, ticketId)
      if (!ticket || ticket.endedAt !== null || ticket.waitingFor === null) return
      await applyTicketEvent(tx, deps, { ticketId, event: { kind: 'no answer' } })
    })
  }
}
