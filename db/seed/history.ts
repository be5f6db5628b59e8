import { findAttempt } from '@/db/queries/attempt'
import { findText } from '@/db/queries/text'
import type { PracticeClock } from '@/lib/clock'
import type { Deps } from '@/lib/deps'
import type { Actor } from '@/lib/domain/role'
import { localMinute } from '@/lib/domain/round'
import { followSilence } from '@/lib/services/follow-silence'
import { planPrompts } from '@/lib/services/plan-prompts'
import { storeReceipt } from '@/lib/services/receive-receipt'
import { storeInbound } from '@/lib/services/receive-text'
import { sendDueTexts } from '@/lib/services/send-text'
import type { BuildQueue } from './build-queue'
import { renew, replyTo, useFilter, type Family, type Reply } from './family'
import { oddWordsOf, setRight } from './odd-words'
import { timeZone } from './places'
import type { Random } from './random'
import { workShift } from './shift-work'
import type { Carried } from './virtual-carrier'
import { voices } from './voices'

const HOUR = 3_600_000

export type History = {
  deps: Deps
  clock: PracticeClock
  queue: BuildQueue
  random: Random
  agent: Actor
  families: Map<string, Family>
  /** Numbers by household, for a part that was handed over. */
  numbers: Map<string, string>
  carried: Carried[]
  replies: Reply[]
  texts: number
}

async function deliver(
  history: History,
  { sid, attemptId, to }: Carried,
  day: number,
): Promise<void> {
  const { deps, random, families, replies } = history
  const receipt = random.chance(0.985)
    ? { status: 'delivered', code: '' }
    : { status: 'undelivered', code: '30003' }
  await storeReceipt(deps, { attemptId, receipt: { sid, ...receipt, raw: { MessageSid: sid } } })
  if (receipt.status !== 'delivered') return
  const attempt = await deps.store.transaction((tx) => findAttempt(tx, attemptId))
  const text = attempt && (await findText(deps.store.db, attempt.textId))
  const family = families.get(to)
  if (!text?.moment || !family) return
  const reply = replyTo(random, family, { moment: text.moment, at: deps.clock.now(), day })
  if (reply) replies.push(reply)
}

/** A family's text comes in through the same door as a webhook's: the carrier's id for it. */
export async function hear(history: History, { number, body }: Omit<Reply, 'at'>): Promise<string> {
  history.texts += 1
  const sid = `SM${history.texts.toString(16).padStart(32, '0')}`
  await storeInbound(history.deps, { sid, from: number, body, raw: { MessageSid: sid } })
  await history.queue.drain(history.deps)
  return sid
}

/** A family puts it in words that no list has, and the agent reads them. */
async function speakOddly(history: History, day: number): Promise<void> {
  const { deps, agent, families } = history
  for (const { language, body, kind } of oddWordsOf(day)) {
    const family = [...families.values()].find((one) => one.language === language)
    if (!family) continue
    const sid = await hear(history, { number: family.number, body })
    await setRight(deps, agent, { sid, kind })
  }
}

/** Something happens to a family that nobody asked about. */
async function mishap(
  history: History,
  kind: 'unwell' | 'broken' | 'unsure' | 'noFlow' | 'slow',
): Promise<void> {
  const family = history.random.pick([...history.families.values()])
  await hear(history, {
    number: family.number,
    body: history.random.pick(voices[family.language][kind]),
  })
}

async function hourOf(history: History, day: number): Promise<void> {
  const { deps, queue, replies } = history
  const now = deps.clock.now()
  for (const reply of replies.filter(({ at }) => at <= now)) {
    replies.splice(replies.indexOf(reply), 1)
    await hear(history, reply)
  }
  await followSilence(deps)
  await planPrompts(deps)
  await queue.drain(deps)
  await sendDueTexts(deps)
  for (let text = history.carried.shift(); text; text = history.carried.shift()) {
    await deliver(history, text, day)
  }
  await queue.drain(deps)
}

/** Nothing goes out or comes in at night: those hours are passed over. */
function isAwake(at: number): boolean {
  const minute = localMinute(at, timeZone)
  return minute >= 7 * 60 && minute <= 22 * 60
}

async function dayOf(history: History, day: number): Promise<void> {
  const { random, families } = history
  for (const family of families.values()) useFilter(family)
  if (random.chance(0.1)) await mishap(history, 'unwell')
  if (random.chance(0.08)) await mishap(history, 'broken')
  if (random.chance(0.2)) await mishap(history, 'unsure')
  if (random.chance(0.12)) await mishap(history, 'noFlow')
  await speakOddly(history, day)
  await workShift(history.deps, history.agent, (householdId) => {
    const family = families.get(history.numbers.get(householdId) ?? '')
    if (family) renew(family)
  })
  await history.queue.drain(history.deps)
  for (let hour = 0; hour < 24; hour++) {
    if (isAwake(history.clock.now())) await hourOf(history, day)
    history.clock.advance(HOUR)
  }
}

/** Lives `days` days, hour by hour, up to the instant the clock then shows. */
export async function liveHistory(history: History, days: number): Promise<void> {
  for (let day = 0; day < days; day++) await dayOf(history, day)
}

/** What stands in the shift when a newcomer opens it: one of each trouble, fresh. */
export async function lastMorning(history: History): Promise<void> {
  for (const kind of [
    'unsure',
    'slow',
    'noFlow',
    'slow',
    'broken',
    'slow',
    'unwell',
    'unsure',
  ] as const)
    await mishap(history, kind)
  await hourOf(history, Infinity)
}
