import { describe, expect, it } from 'vitest'
import { compareHarm, harmOf, type HarmInput } from '@/lib/domain/harm'

const timeZone = 'America/Lima'
/** Tuesday, 3 March 2026, 12:10 in Lima (UTC−5). */
const now = Date.UTC(2026, 2, 3, 17, 10)
const hour = 3_600_000

const alone = { people: 5, infant: false, pregnant: false, elderly: false, ill: false }

function input(change: Partial<HarmInput> = {}): HarmInput {
  return {
    trouble: 'slow',
    house: alone,
    outOfService: false,
    noSafeWaterSince: null,
    need: 'slow',
    litresPerHour: 4.6,
    litresPerDay: 37.1,
    hours: 8 + 5 / 60,
    openedAt: now - 5.5 * hour,
    now,
    timeZone,
    ...change,
  }
}

const stopped = { outOfService: true, noSafeWaterSince: Date.UTC(2026, 2, 2, 23, 20) }

describe('the place in the shift and the sentence that explains it', () => {
  it.each<{ harmClass: number; band: string; change: Partial<HarmInput>; sentence: string }>([
    {
      harmClass: 1,
      band: 'Unwell',
      change: { trouble: 'danger sign', toldToGo: true, house: { ...alone, infant: true } },
      sentence: 'A danger sign; 5 people, an infant. Told to go to the health worker now.',
    },
    {
      harmClass: 1,
      band: 'Unwell',
      change: { trouble: 'danger sign' },
      sentence: 'A danger sign; 5 people. Not yet told to go to the health worker.',
    },
    {
      harmClass: 2,
      band: 'Unwell',
      change: { trouble: 'unwell', house: { ...alone, people: 1, elderly: true } },
      sentence: 'Someone is unwell since 06:40; 1 person, an old person.',
    },
    {
      harmClass: 3,
      band: 'No safe water',
      change: { ...stopped, house: { ...alone, people: 6, infant: true } },
      sentence: '6 people, an infant; nothing safe since yesterday 18:20.',
    },
    {
      harmClass: 3,
      band: 'No safe water',
      change: { ...stopped, house: { ...alone, pregnant: true, ill: true } },
      sentence: '5 people, a pregnancy, an ill person; nothing safe since yesterday 18:20.',
    },
    {
      harmClass: 4,
      band: 'No safe water',
      change: { ...stopped, noSafeWaterSince: now - 4.5 * hour },
      sentence: '5 people; nothing safe since 07:40.',
    },
    {
      harmClass: 5,
      band: 'No safe water',
      change: { trouble: 'unsafe' },
      sentence: '5 people; unsafe filter still in use since 06:40.',
    },
    {
      harmClass: 6,
      band: 'No safe water',
      change: { trouble: 'no flow', openedAt: now - 4 * 24 * hour },
      sentence: '5 people; no water at all since Friday 12:10.',
    },
    {
      harmClass: 7,
      band: 'Slow',
      change: { house: { ...alone, people: 7, elderly: true } },
      sentence: '7 people; 4.6 L an hour at 20 °C, needs 37 L a day: 8 h 05.',
    },
    {
      harmClass: 7,
      band: 'Slow',
      change: { need: 'short', litresPerHour: 0.6, hours: 61.8 },
      sentence: '5 people; 0.6 L an hour at 20 °C, needs 37 L a day: not in a day.',
    },
    {
      harmClass: 7,
      band: 'Slow',
      change: { need: 'short', litresPerHour: 0, hours: Infinity },
      sentence: '5 people; 0.0 L an hour at 20 °C, needs 37 L a day: not in a day.',
    },
    {
      harmClass: 7,
      band: 'Slow',
      change: { need: 'short', litresPerHour: 1.6, hours: 23.5 },
      sentence: '5 people; 1.6 L an hour at 20 °C, needs 37 L a day: 23 h 30.',
    },
    {
      harmClass: 7,
      band: 'Slow',
      change: { need: null, litresPerHour: 1.2, hours: 30.5 },
      sentence: '5 people; 1.2 L an hour at 20 °C, needs 37 L a day: not in a day.',
    },
    {
      harmClass: 7,
      band: 'Slow',
      change: { litresPerHour: 1.6, hours: 24 },
      sentence: '5 people; 1.6 L an hour at 20 °C, needs 37 L a day: 24 h 00.',
    },
    {
      harmClass: 7,
      band: 'Slow',
      change: { need: null, litresPerHour: null, hours: null },
      sentence: '5 people; slow, nobody has timed a litre yet; needs 37 L a day.',
    },
    {
      harmClass: 7,
      band: 'Slow',
      change: { errorLitresPerHour: 0.5 },
      sentence: '5 people; 4.6 ± 0.5 L an hour at 20 °C, needs 37 L a day: 8 h 05.',
    },
    {
      harmClass: 8,
      band: 'Slow',
      change: { need: 'enough', litresPerHour: 6.2, litresPerDay: 21.2, hours: 21.2 / 6.2 },
      sentence: '5 people; slow but enough: 6.2 L an hour at 20 °C, needs 21 L a day: 3 h 25.',
    },
    {
      harmClass: 9,
      band: 'Unread words',
      change: { trouble: 'unread' },
      sentence: '5 people; words nobody has read since 06:40.',
    },
    {
      harmClass: 10,
      band: 'Silent',
      change: { trouble: 'silent', openedAt: now - 20 * 24 * hour },
      sentence: '5 people; no answer since 11 February.',
    },
  ])('class $harmClass: $sentence', ({ harmClass, band, change, sentence }) => {
    expect(harmOf(input(change))).toMatchObject({ harmClass, band, sentence })
  })

  it.each([{ litresPerHour: null }, { hours: null }])(
    'names no flow that is half known: %o',
    (half) => {
      expect(harmOf(input(half)).sentence).toContain('nobody has timed a litre yet')
    },
  )

  it('tells the time on the area’s own clock', () => {
    const at = (zone: string) => harmOf(input({ ...stopped, timeZone: zone })).sentence
    expect(at('Asia/Dhaka')).toBe('5 people; nothing safe since 05:20.')
    expect(at('Europe/Paris')).toBe('5 people; nothing safe since 00:20.')
    expect(at('Asia/Kathmandu')).toBe('5 people; nothing safe since 05:05.')
  })

  it('tells yesterday from last week', () => {
    const since = (days: number) =>
      harmOf(input({ trouble: 'unread', openedAt: now - days * 24 * hour })).sentence
    expect(since(1)).toContain('since yesterday 12:10')
    expect(since(6)).toContain('since Wednesday 12:10')
    expect(since(7)).toContain('since 24 February')
  })
})

describe('the order of the shift', () => {
  it('is by class first, however many wait in a lesser one', () => {
    const one = harmOf(input({ ...stopped, house: { ...alone, people: 1 } }))
    const many = harmOf(input({ house: { ...alone, people: 40 }, openedAt: now - 900 * hour }))
    expect(compareHarm(one, many)).toBeLessThan(0)
    expect(compareHarm(many, one)).toBeGreaterThan(0)
  })

  it('is by people times hours within a class', () => {
    const few = harmOf(input({ ...stopped, house: { ...alone, people: 3 } }))
    const longer = harmOf(
      input({ ...stopped, noSafeWaterSince: now - 40 * hour, house: { ...alone, people: 3 } }),
    )
    const more = harmOf(input({ ...stopped, house: { ...alone, people: 9 } }))
    expect([few, longer, more].sort(compareHarm)).toEqual([more, longer, few])
    expect(longer.personHours).toBeCloseTo(120, 9)
    expect(compareHarm(few, few)).toBe(0)
  })

  it('counts from the last safe water, or from the opening where the filter still gives some', () => {
    expect(harmOf(input({ ...stopped })).sinceAt).toBe(stopped.noSafeWaterSince)
    expect(harmOf(input()).sinceAt).toBe(now - 5.5 * hour)
    expect(harmOf(input({ openedAt: now + hour })).personHours).toBe(0)
  })

  it.each(['infant', 'pregnant', 'elderly', 'ill'] as const)(
    'puts a house without safe water higher for: %s',
    (who) => {
      const house = { ...alone, [who]: true }
      expect(harmOf(input({ ...stopped, house })).harmClass).toBe(3)
      expect(harmOf(input({ house })).harmClass).toBe(7)
    },
  )

  it('never puts illness below water', () => {
    for (const trouble of ['danger sign', 'unwell'] as const) {
      expect(harmOf(input({ ...stopped, trouble })).band).toBe('Unwell')
    }
  })
})
