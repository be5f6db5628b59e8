import { describe, expect, it } from 'vitest'
import { languages } from '@/lib/domain/language'
import {
  costOf,
  offendingCharacters,
  renderWording,
  segmentsOf,
  unitsPerPart,
  valuesIn,
} from '@/lib/domain/wording'

describe('rendering a wording', () => {
  it('chooses by the stage and fills in the values', () => {
    const body = '{house}: change the {stage, select, 1 {cloth} 2 {carbon} other {long stage}}.'
    const text = (stage: number) => renderWording(body, { house: 'Orellana', stage }, 'en')
    expect(text(1)).toEqual({ ok: true, text: 'Orellana: change the cloth.' })
    expect(text(3)).toEqual({ ok: true, text: 'Orellana: change the long stage.' })
  })

  it('chooses by number', () => {
    const body = '{minutes, plural, one {# minute} other {# minutes}}'
    expect(renderWording(body, { minutes: 1 }, 'en')).toEqual({ ok: true, text: '1 minute' })
    expect(renderWording(body, { minutes: 12 }, 'en')).toEqual({ ok: true, text: '12 minutes' })
  })

  it.each([
    ['en', '1 August'],
    ['es', '1 de agosto'],
    ['fr', '1 aout'],
    ['bn', '1 আগস্ট'],
  ] as const)('writes a day out in %s, in letters of the basic alphabet: %s', (language, day) => {
    expect(renderWording('{visitOn}', { visitOn: '2026-08-01' }, language)).toEqual({
      ok: true,
      text: day,
    })
  })

  it('leaves a day that is none as it is, and days in other values', () => {
    const values = { dueOn: 'soon', depot: '2026-08-01', visitOn: '2026-02-31' }
    expect(renderWording('{dueOn} {depot} {visitOn}', values, 'en')).toEqual({
      ok: true,
      text: 'soon 2026-08-01 2026-02-31',
    })
  })

  it.each([
    { body: 'Dear {name}', values: {}, reason: 'unknown value', detail: 'name' },
    { body: 'At {depot}', values: {}, reason: 'missing value', detail: 'depot' },
    { body: 'At {depot}', values: { depot: '' }, reason: 'missing value', detail: 'depot' },
    {
      body: '{stage, select, 1 {at {depot}} other {now}}',
      values: { stage: 2 },
      reason: 'missing value',
      detail: 'depot',
    },
    {
      body: "l'{part}",
      values: { part: 'x' },
      reason: 'bad message',
      detail: 'a brace is left in the text',
    },
  ])('refuses $body: $reason', ({ body, values, reason, detail }) => {
    expect(renderWording(body, values, 'en')).toEqual({ ok: false, reason, detail })
  })

  it('refuses a form that a value cannot take', () => {
    expect(renderWording('{dueOn, date}', { dueOn: 'soon' }, 'en')).toMatchObject({
      ok: false,
      reason: 'bad message',
    })
  })

  it('minds braces in its own words only, in every branch', () => {
    expect(renderWording('{house}', { house: '{x}' }, 'en')).toEqual({ ok: true, text: '{x}' })
    const body = "{stage, select, 1 {a '{' b} other {c}}"
    expect(renderWording(body, { stage: 2 }, 'en')).toMatchObject({ reason: 'bad message' })
  })

  it.each(['{', '{house', '{minutes, plural, one {x}}', '{}', '{house, sorcery}'])(
    'refuses what ICU cannot read: %s',
    (body) => {
      const rendered = renderWording(body, { house: 'x', minutes: 1 }, 'en')
      expect(rendered).toMatchObject({ ok: false, reason: 'bad message' })
      expect(valuesIn(body, 'en')).toEqual([])
    },
  )

  it('takes signs of markup as they are', () => {
    for (const language of languages) {
      expect(renderWording('1 < 2 <b>', {}, language)).toEqual({ ok: true, text: '1 < 2 <b>' })
    }
  })

  it('names the values a wording speaks of, each once, inner ones too', () => {
    const body = '{house} {minutes, plural, one {{depot} #} other {{house}}} {litres, number}'
    expect(valuesIn(body, 'en')).toEqual(['house', 'minutes', 'depot', 'litres'])
  })
})

describe('the size of a text', () => {
  it('is nothing for no text', () => {
    expect(segmentsOf('')).toEqual({ encoding: 'GSM-7', segments: 0, units: 0 })
  })

  it('names each letter outside the basic alphabet once, in order', () => {
    expect(offendingCharacters('más más ó €[]')).toEqual(['á', 'ó'])
    expect(offendingCharacters('plain')).toEqual([])
  })

  it('costs by the part', () => {
    expect(costOf({ segments: 2, pricePerSegment: 0.0075 })).toBeCloseTo(0.015, 12)
    expect(unitsPerPart('UCS-2', 2)).toBe(67)
  })
})
