import { describe, expect, it } from 'vitest'
import { settingInfos, settingPaths } from '@/lib/domain/setting-catalogue'
import {
  contradictions,
  defaultSettings,
  valueAt,
  withValue,
  type SettingPath,
  type SettingValue,
} from '@/lib/domain/settings'
import { readSettings, settingsInputSchema } from '@/lib/schemas/settings'

function set(...changes: [SettingPath, SettingValue][]) {
  return changes.reduce((all, [path, value]) => withValue(all, path, value), defaultSettings)
}

function refused(...changes: [SettingPath, SettingValue][]) {
  const { error } = settingsInputSchema.safeParse({ version: 0, settings: set(...changes) })
  return error?.issues.map(({ path, message }) => [path.slice(1).join('.'), message]) ?? []
}

describe('the defaults', () => {
  it('lie within their own bounds and contradict nothing', () => {
    expect(refused()).toEqual([])
  })

  it('are 5.3 L, 8 and 24 hours, 0.4, 0.7 and 1.3 of the first flow, 30, 14 and 7 days', () => {
    const { need, flow, wash, sending } = defaultSettings
    expect(need).toEqual({ litresPerPersonDay: 5.3, enoughHours: 8, slowHours: 24 })
    expect([flow.partlyShare, flow.restoredShare, flow.tooFastShare]).toEqual([0.4, 0.7, 1.3])
    expect(Object.values(wash.days)).toEqual([30, 14, 7])
    expect(Object.values(sending)).toEqual([2, 4, 3, 7])
  })

  it('each have a source, or are said to have none', () => {
    for (const path of settingPaths) expect(settingInfos[path].source).toMatch(/\.$/)
    expect(settingInfos['need.litresPerPersonDay'].source).toContain('WHO')
    expect(settingInfos['need.litresPerPersonDay'].source).toContain('Sphere')
  })
})

describe('one setting', () => {
  it('is read and changed by its path, the others left as they are', () => {
    const settings = set(['wash.days.very cloudy', 9])
    expect(valueAt(settings, 'wash.days.very cloudy')).toBe(9)
    expect(settings.wash.days).toEqual({ clear: 30, cloudy: 14, 'very cloudy': 9 })
    expect(defaultSettings.wash.days['very cloudy']).toBe(7)
  })

  it.each<[SettingPath, SettingValue, string]>([
    ['need.litresPerPersonDay', 2.9, 'At least 3 litres.'],
    ['need.litresPerPersonDay', 21, 'At most 20 litres.'],
    ['need.slowHours', 25, 'At most 24 hours.'],
    ['flow.tooFastShare', 1, 'At least 105 %.'],
    ['wash.floorDays', 5.5, 'Write a whole number.'],
    ['programme.name', ' ', 'Write something.'],
  ])('%s is refused as %s: %s', (path, value, message) => {
    expect(refused([path, value])).toContainEqual([path, message])
  })

  it('without a number is refused at its own field', () => {
    const settings = { ...defaultSettings, sending: { ...defaultSettings.sending } }
    Reflect.deleteProperty(settings.sending, 'bundleDays')
    const { error } = settingsInputSchema.safeParse({ version: 0, settings })
    expect(error?.issues[0]).toMatchObject({
      path: ['settings', 'sending', 'bundleDays'],
      message: 'Write a number.',
    })
  })
})

describe('settings that contradict each other', () => {
  it.each<[SettingPath, [SettingPath, SettingValue][]]>([
    [
      'need.slowHours',
      [
        ['need.enoughHours', 12],
        ['need.slowHours', 12],
      ],
    ],
    ['flow.partlyShare', [['flow.partlyShare', 0.7]]],
    [
      'flow.tooFastShare',
      [
        ['flow.restoredShare', 1.1],
        ['flow.tooFastShare', 1.1],
      ],
    ],
    ['wash.floorDays', [['sending.bundleDays', 5]]],
    ['sending.secondNudgeDays', [['sending.firstNudgeDays', 7]]],
    ['wash.days.very cloudy', [['wash.floorDays', 8]]],
    ['wash.days.clear', [['wash.days.clear', 4]]],
  ])('are refused at %s', (path, changes) => {
    expect(contradictions(set(...changes)).map((one) => one.path)).toEqual([path])
  })

  it('are told at the form’s own field', () => {
    expect(refused(['flow.partlyShare', 0.8])).toEqual([
      ['flow.partlyShare', 'Must be under what counts as restored.'],
    ])
  })
})

describe('the kept settings', () => {
  it('are the defaults where nothing is kept', () => {
    expect(readSettings([])).toEqual(defaultSettings)
  })

  it('fall back one by one where a value no longer fits', () => {
    const read = readSettings([
      { key: 'need.enoughHours', value: 'eight' },
      { key: 'flow.restoredShare', value: 0.6 },
      { key: 'what is this', value: 1 },
    ])
    expect(read).toEqual(set(['flow.restoredShare', 0.6]))
  })
})
