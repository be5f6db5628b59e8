import { hasRoom, sendingDefaults, type Due, type SendingSettings } from './round'
import { textFor } from './round-text'
import { sendAfter } from './round-spread'
import {
  insideWindow,
  localDay,
  nextInsideWindow,
  windowClosesAt,
  type Window,
} from './round-window'

/** A kit with what falls due on it. `sentAt`: when its household was or will be prompted otherwise. */
export type KitDue = {
  kitId: string
  householdId: string
  areaId: string
  due: readonly Due[]
  sentAt: readonly number[]
}

/** One text that the desk is going to plan: to which kit, about what, at what hour. */
export type Going = { kitId: string; on: string; at: number; due: Due[] }

type Opening = { on: string; at: number }

const day = 86_400_000

/** The days, from now on, on which a window opens, each with its first instant that is not past. */
export function openingsAhead(window: Window, now: number, until: number): Opening[] {
  const openings: Opening[] = []
  let at = nextInsideWindow(now, window)
  while (at <= until) {
    openings.push({ on: localDay(at, window.timeZone), at })
    // A window that never closes has no next opening to look for: the same hour tomorrow will do.
    const closesAt = windowClosesAt(at, at + 2 * day, window)
    at = nextInsideWindow(closesAt ?? at + day, window)
  }
  return openings
}

type Rules = { window: Window; settings: SendingSettings }
type Wanted = Opening & { kit: KitDue; due: Due[] }

/** The first hour of an opening at which a household has room for a prompt; null when it has none. */
function hourFor(
  { on, at }: Opening,
  sentAt: readonly number[],
  { window, settings }: Rules,
): number | null {
  const roomAgainAt = sentAt
    .map((sent) => sent + 7 * day)
    .filter((room) => room > at && localDay(room, window.timeZone) === on)
    .filter((room) => insideWindow(room, window))
  const hours = [at, ...roomAgainAt.sort((one, other) => one - other)]
  const limit = settings.promptsAWeek
  const { timeZone } = window
  return hours.find((now) => hasRoom({ sentAt, now, timeZone, limit })) ?? null
}

/** Bundles kit by kit and day by day, as the planning of each of those days will. */
function wantedOf(kits: readonly KitDue[], openings: readonly Opening[], rules: Rules): Wanted[] {
  const sentTo = new Map<string, number[]>()
  return kits.flatMap((kit) => {
    const sentAt = sentTo.get(kit.householdId) ?? [...kit.sentAt]
    sentTo.set(kit.householdId, sentAt)
    let left = [...kit.due]
    return openings.flatMap((opening) => {
      const due = textFor(left, opening.on, rules.settings)?.due ?? []
      const at = due.length === 0 ? null : hourFor(opening, sentAt, rules)
      if (at === null) return []
      left = left.filter((one) => !due.includes(one))
      sentAt.push(at)
      return [{ kit, on: opening.on, at, due }]
    })
  })
}

/**
 * The texts that planning will make in the days ahead if nothing else happens: bundled, under the weekly
 * limit, inside the window, one behind the other at the sender's rate. What a household answers in between
 * brings further dates that are not in here.
 */
export function goingOut({
  kits,
  windows,
  now,
  days,
  perMinute,
  settings = sendingDefaults,
}: {
  kits: readonly KitDue[]
  windows: ReadonlyMap<string, Window>
  now: number
  days: number
  perMinute: number
  settings?: SendingSettings
}): Going[] {
  return [...windows].flatMap(([areaId, window]) => {
    const openings = openingsAhead(window, now, now + days * day)
    const ofArea = kits.filter((kit) => kit.areaId === areaId)
    const inOrder = wantedOf(ofArea, openings, { window, settings }).sort(
      (one, other) => one.at - other.at,
    )
    const places = new Map<string, number>()
    return inOrder.map(({ kit, on, at, due }) => {
      const spreadIndex = places.get(on) ?? 0
      places.set(on, spreadIndex + 1)
      const hour = sendAfter({ now: at, window, spreadIndex, perMinute })
      return { kitId: kit.kitId, on: localDay(hour, window.timeZone), at: hour, due }
    })
  })
}

/** Texts that the sender can hand over while the window is open for a day. */
export function carriedADay(
  window: { opensMinute: number; closesMinute: number },
  perMinute: number,
) {
  return Math.floor((window.closesMinute - window.opensMinute) * perMinute)
}
