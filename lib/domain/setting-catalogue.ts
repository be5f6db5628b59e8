import type { SettingPath, Settings } from './settings'

type Said = {
  label: string
  /** Where its default comes from. */
  source: string
}

/** What the settings page says of a setting, and within which bounds it may be set. */
export type SettingInfo = Said &
  (
    | { kind: 'number'; unit: string; least: number; most: number; whole: boolean }
    /** A share of 1, read and written as per cent. */
    | { kind: 'share'; least: number; most: number }
    | { kind: 'text'; longest: number }
    | { kind: 'switch' }
  )

const practice = 'Common practice, no source.'
const own = 'Your own.'

type Bounds = readonly [least: number, most: number]

function whole(label: string, unit: string, [least, most]: Bounds, source = practice): SettingInfo {
  return { kind: 'number', label, unit, least, most, whole: true, source }
}

function share(label: string, [least, most]: Bounds): SettingInfo {
  return { kind: 'share', label, least, most, source: practice }
}

/** The groups of the page in order, each with what it is about. */
export const settingGroups: Record<keyof Settings, { title: string; lead: string }> = {
  programme: { title: 'The programme', lead: 'How it is called, and what a text costs it.' },
  need: {
    title: 'Water need',
    lead: 'What a family must have, and how long its filter may take to give it.',
  },
  flow: {
    title: 'Flow',
    lead: 'How far a reading errs, and what share of the first flow means what: below “partly back” a wash has not worked, “too fast” suspects a breach.',
  },
  wash: {
    title: 'Washing',
    lead: 'How often by the calendar; the trend of the flow may ask sooner.',
  },
  sending: { title: 'Sending', lead: 'How often a household hears from us, and how long we wait.' },
  walks: {
    title: 'Where walks start',
    lead: 'The odds of each suspect before anything is asked: by the catalogue alone, or moved by what cured the tickets of the same area, season and trouble in the last year.',
  },
}

/** Every setting, in the order of the page. */
export const settingInfos: Record<SettingPath, SettingInfo> = {
  'programme.name': { kind: 'text', label: 'Name in the texts', longest: 40, source: own },
  'programme.currency': { kind: 'text', label: 'Currency', longest: 8, source: own },
  'programme.pricePerSegment': {
    kind: 'number',
    label: 'Price of a part of a text',
    unit: 'in that currency',
    least: 0,
    most: 10,
    whole: false,
    source: 'As your carrier bills it.',
  },
  'programme.textsPerMinute': whole(
    'Texts a minute',
    'texts',
    [1, 6000],
    'One part a second is a carrier’s common rate.',
  ),
  'need.litresPerPersonDay': {
    kind: 'number',
    label: 'Water a person needs a day',
    unit: 'litres',
    least: 3,
    most: 20,
    whole: false,
    source: 'WHO, Domestic water quantity, 2020; the floor of 3: Sphere Handbook.',
  },
  'need.enoughHours': whole('Enough if it comes within', 'hours', [1, 23]),
  'need.slowHours': whole('Slow if within; later is short', 'hours', [2, 24]),
  'flow.timeErrorShare': share('Error of the time', [0, 0.5]),
  'flow.bottleErrorShare': share('Error of the bottle', [0, 0.5]),
  'flow.restoredShare': share('Restored from', [0.1, 1]),
  'flow.partlyShare': share('Partly back from', [0.05, 0.95]),
  'flow.tooFastShare': share('Too fast above', [1.05, 3]),
  'wash.days.clear': whole('Clear water, every', 'days', [2, 365]),
  'wash.days.cloudy': whole('Cloudy water, every', 'days', [2, 365]),
  'wash.days.very cloudy': whole('Very cloudy water, every', 'days', [2, 365]),
  'wash.wetShare': share('Left of that in a wet month', [0.2, 1]),
  'wash.floorDays': whole('Never sooner than after', 'days', [2, 30]),
  'wash.flowCheckDays': whole('A flow reading every', 'days', [14, 365]),
  'sending.promptsAWeek': whole('In a week at most', 'prompts', [1, 7]),
  'sending.bundleDays': whole('One text for all due within', 'days', [0, 10]),
  'sending.firstNudgeDays': whole('First nudge after the prompt', 'days', [1, 30]),
  'sending.secondNudgeDays': whole('Second nudge after the first', 'days', [1, 60]),
  'walks.fromClosedTickets': {
    kind: 'switch',
    label: 'Start walks from the causes of closed tickets',
    source: practice,
  },
  'walks.priorTickets': whole('The catalogue weighs', 'closed tickets', [1, 500]),
}

export const settingPaths = Object.keys(settingInfos) as readonly SettingPath[]

/** The settings of a group, in the order of the page. */
export function pathsOf(group: keyof Settings): SettingPath[] {
  return settingPaths.filter((path) => path.startsWith(`${group}.`))
}

export type Grouped<Thing> = { [key: string]: Thing | Grouped<Thing> }

/** A thing for each setting, in the groups of the settings. */
export function grouped<Thing>(of: (path: SettingPath) => Thing): Grouped<Thing> {
  const all: Grouped<Thing> = {}
  for (const path of settingPaths) {
    const keys = path.split('.')
    const name = keys.pop() ?? ''
    let group = all
    for (const key of keys) group = group[key] ??= {}
    group[name] = of(path)
  }
  return all
}

/** A share as per cent, without the dust of floating point. */
export function percentOf(share: number): number {
  return Number((share * 100).toFixed(4))
}

/** What the bounds of a setting are, in words. */
export function boundsWords(info: SettingInfo): string {
  switch (info.kind) {
    case 'switch':
      return 'On or off.'
    case 'text':
      return `At most ${info.longest} characters.`
    case 'share':
      return `${percentOf(info.least)} to ${percentOf(info.most)}.`
    case 'number':
      return `${info.least} to ${info.most}.`
  }
}
