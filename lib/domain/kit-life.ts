import { causeWords } from './end-causes'
import { dayWords, dueWords, shortDayWords } from './stamp'

/** One bead of a kit's life; `on` is the ISO day it hangs on. */
export type LifeBead = {
  id: string
  on: string
  day: string
  beside?: string
  bead: 'ring' | 'half' | 'full' | 'broken'
  tone?: 'water' | 'clay'
  title: string
  note?: string
}

type Position = 1 | 2 | 3

export type KitPast = {
  handedOverOn: string
  fittings: readonly {
    id: string
    position: Position
    fittedOn: string
    dueOn: string
    removedOn: string | null
    removedFor: string | null
  }[]
  washes: readonly { n: number; washedOn: string; known: 'said' | 'measured' | 'seen' }[]
  prompts: readonly {
    id: string
    kind: 'wash' | 'change' | 'flow check' | 'welcome'
    dueOn: string
    positions: readonly number[]
    state: 'planned' | 'asked' | 'answered' | 'silent' | 'dropped'
  }[]
  tickets: readonly {
    id: string
    trouble: string
    openedOn: string
    endedOn: string | null
    stage: string
    cause: string | null
  }[]
}

export const stageNames: Record<Position, string> = { 1: 'cloth', 2: 'carbon', 3: 'fibre' }

const knownWords = { said: 'as they said', measured: 'measured after it', seen: 'seen by a person' }

type Bare = Omit<LifeBead, 'day'>

function handOver({ handedOverOn }: KitPast): Bare {
  return { id: 'hand-over', on: handedOverOn, bead: 'full', title: 'Handed over' }
}

function refits({ fittings, handedOverOn }: KitPast): Bare[] {
  const later = fittings.filter((fitting) => fitting.fittedOn > handedOverOn)
  return later.map((fitting): Bare => {
    const old = fittings.find(
      (one) => one.position === fitting.position && one.removedOn === fitting.fittedOn,
    )
    const note = old?.removedFor ? { note: `the old one: ${old.removedFor}` } : {}
    const title = `New ${stageNames[fitting.position]} fitted`
    return { id: `fitting-${fitting.id}`, on: fitting.fittedOn, bead: 'full', title, ...note }
  })
}

function washBeads({ washes }: KitPast): Bare[] {
  return washes.map(({ n, washedOn, known }) => ({
    id: `wash-${n}`,
    on: washedOn,
    bead: 'full',
    title: 'Washed',
    note: knownWords[known],
  }))
}

type Prompt = KitPast['prompts'][number]

function askedWords({ kind, positions }: Prompt): string {
  switch (kind) {
    case 'wash':
      return 'Asked to wash'
    case 'change': {
      const names = positions.map((position) => stageNames[position as Position])
      return `Asked to change ${names.join(' and ') || 'a stage'}`
    }
    case 'flow check':
      return 'Asked for a flow reading'
    case 'welcome':
      return 'Welcomed'
  }
}

const promptBeads: Record<Prompt['state'], Pick<LifeBead, 'bead' | 'note'>> = {
  planned: { bead: 'ring', note: 'waits for its hour' },
  asked: { bead: 'half', note: 'no answer yet' },
  answered: { bead: 'full', note: 'answered' },
  silent: { bead: 'broken', note: 'no answer' },
  dropped: { bead: 'broken', note: 'could not go, planned anew' },
}

function asked({ prompts }: KitPast): Bare[] {
  return prompts.map((prompt) => ({
    id: `prompt-${prompt.id}`,
    on: prompt.dueOn,
    title: askedWords(prompt),
    ...promptBeads[prompt.state],
  }))
}

function troubles({ tickets }: KitPast): Bare[] {
  return tickets.map((ticket): Bare => {
    const cause = ticket.cause ? `: ${causeWords(ticket.cause).toLowerCase()}` : ''
    const note = ticket.endedOn
      ? `${ticket.stage} on ${dayWords(ticket.endedOn)}${cause}`
      : 'the ticket is open'
    return {
      id: `ticket-${ticket.id}`,
      on: ticket.openedOn,
      bead: ticket.endedOn ? 'full' : 'half',
      tone: 'clay',
      title: `Trouble: ${ticket.trouble}`,
      note,
    }
  })
}

/** The year, where it is not this one. */
function yearBeside(day: string, today: string): { beside?: string } {
  const year = day.slice(0, 4)
  return year === today.slice(0, 4) ? {} : { beside: year }
}

/** What happened to a kit, oldest first; things of one day keep the order: hand-over, asked, done, trouble. */
export function kitPast(past: KitPast, today: string): LifeBead[] {
  const beads = [
    handOver(past),
    ...asked(past),
    ...washBeads(past),
    ...refits(past),
    ...troubles(past),
  ]
  return beads
    .map((bead) => ({ ...bead, day: shortDayWords(bead.on), ...yearBeside(bead.on, today) }))
    .sort((one, other) => (one.on < other.on ? -1 : one.on > other.on ? 1 : 0))
}

export type KitPlan = {
  state: 'in use' | 'out of service' | 'retired'
  nextWashOn: string
  /** When the wash would be due without the trend of the flow. */
  calendarWashOn: string
  nextFlowCheckOn: string
  /** What stands in the stages now. */
  fittings: readonly { position: Position; dueOn: string }[]
}

/** Why a wash comes before its time by the calendar. */
function washNote({ nextWashOn, calendarWashOn }: KitPlan): { note?: string } {
  if (nextWashOn >= calendarWashOn) return {}
  return { note: `brought forward from ${shortDayWords(calendarWashOn)} by the trend of the flow` }
}

/** What comes next for a kit, soonest first; nothing for one that is retired. */
export function kitPlan(plan: KitPlan, today: string): LifeBead[] {
  if (plan.state === 'retired') return []
  const due: Pick<LifeBead, 'id' | 'on' | 'title' | 'note'>[] = [
    { id: 'next-wash', on: plan.nextWashOn, title: 'Wash', ...washNote(plan) },
    { id: 'next-flow-check', on: plan.nextFlowCheckOn, title: 'Flow reading' },
    ...plan.fittings.map(({ position, dueOn }) => ({
      id: `next-change-${position}`,
      on: dueOn,
      title: `Change of ${stageNames[position]}`,
    })),
  ]
  const waits = plan.state === 'out of service' ? { note: 'waits: out of service' } : {}
  return due
    .map((bead): LifeBead => ({
      ...bead,
      ...waits,
      bead: 'ring',
      day: shortDayWords(bead.on),
      beside: dueWords(bead.on, today),
    }))
    .sort((one, other) => (one.on < other.on ? -1 : one.on > other.on ? 1 : 0))
}
