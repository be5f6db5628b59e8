import { washDefaults, type WashSettings } from './cycle'
import { flowDefaults, type FlowSettings } from './flow-settings'
import { needDefaults, type NeedSettings } from './need'
import { sendingDefaults, type SendingSettings } from './round'
import { walkDefaults, type WalkSettings } from './walk-history'

/** What a coordinator can set. Each group is what the rules of its area take. */
export type Settings = {
  programme: {
    /** As the texts say it. */
    name: string
    /** Price of one part of a text, in the programme's currency. */
    pricePerSegment: number
    currency: string
    /** Texts the sender may hand over in a minute. */
    textsPerMinute: number
  }
  need: NeedSettings
  flow: FlowSettings
  wash: WashSettings & { flowCheckDays: number }
  sending: SendingSettings
  walks: WalkSettings
}

/** What holds where nothing is set. */
export const defaultSettings: Settings = {
  programme: { name: 'Clear Water', pricePerSegment: 0.02, currency: 'EUR', textsPerMinute: 60 },
  need: needDefaults,
  flow: flowDefaults,
  wash: { ...washDefaults, flowCheckDays: 60 },
  sending: sendingDefaults,
  walks: walkDefaults,
}

export type SettingValue = string | number | boolean

type PathIn<T> = {
  [Key in keyof T & string]: T[Key] extends SettingValue ? Key : `${Key}.${PathIn<T[Key]>}`
}[keyof T & string]

/** The name of one setting: `wash.days.clear`. Under it the row is kept and the field is named. */
export type SettingPath = PathIn<Settings>

/** What one setting is. */
export function valueAt(settings: Settings, path: SettingPath): SettingValue {
  let at: unknown = settings
  for (const key of path.split('.')) at = (at as Record<string, unknown>)[key]
  return at as SettingValue
}

/** The settings with one of them changed. */
export function withValue(settings: Settings, path: SettingPath, value: SettingValue): Settings {
  return changed(settings, path.split('.'), value) as Settings
}

function changed(at: object, [key = '', ...rest]: readonly string[], value: SettingValue): object {
  const inside = (at as Record<string, object>)[key] ?? {}
  return { ...at, [key]: rest.length === 0 ? value : changed(inside, rest, value) }
}

/** A setting that another one does not allow, with why. */
export type Contradiction = { path: SettingPath; message: string }

/** What cannot hold together, each said at the field that is to give way. */
export function contradictions({ need, flow, wash, sending }: Settings): Contradiction[] {
  const found: (Contradiction | false)[] = [
    need.slowHours <= need.enoughHours && {
      path: 'need.slowHours',
      message: `Must be more than the hours that are enough, ${need.enoughHours}.`,
    },
    flow.partlyShare >= flow.restoredShare && {
      path: 'flow.partlyShare',
      message: 'Must be under what counts as restored.',
    },
    flow.restoredShare >= flow.tooFastShare && {
      path: 'flow.tooFastShare',
      message: 'Must be over what counts as restored.',
    },
    // Asked for early in a bundle, one wash could share its day with the next, which then is never asked for.
    wash.floorDays <= sending.bundleDays && {
      path: 'wash.floorDays',
      message: `Must be more than the days that one text bundles, ${sending.bundleDays}.`,
    },
    sending.secondNudgeDays <= sending.firstNudgeDays && {
      path: 'sending.secondNudgeDays',
      message: 'Must be a longer wait than the first.',
    },
    ...(['clear', 'cloudy', 'very cloudy'] as const).map(
      (source) =>
        wash.days[source] < wash.floorDays && {
          path: `wash.days.${source}` as const,
          message: `Must not be under the floor, ${wash.floorDays} days.`,
        },
    ),
  ]
  return found.filter((one) => one !== false)
}
