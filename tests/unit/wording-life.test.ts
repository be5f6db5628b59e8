import { describe, expect, test } from 'vitest'
import { approval, lags } from '@/lib/domain/wording-life'

const draft = { state: 'draft' as const, approvedBy: null, writtenAt: 7 }
const onceApproved = { state: 'approved' as const, approvedBy: 'ines', writtenAt: 7 }
const yes = { open: draft, safety: false, staffId: 'ines', readAt: 7, blocked: false }

describe('a yes to a draft', () => {
  test('puts an everyday wording into use at once', () => {
    expect(approval(yes)).toEqual({ ok: true, next: 'in use' })
  })

  test('to a safety wording waits for a second person', () => {
    expect(approval({ ...yes, safety: true })).toEqual({
      ok: true,
      next: 'waits for a second yes',
    })
  })

  test('by a second person puts a safety wording into use', () => {
    const second = { ...yes, safety: true, open: onceApproved, staffId: 'tomas' }
    expect(approval(second)).toEqual({ ok: true, next: 'in use' })
  })

  test('given twice by one person is not two', () => {
    expect(approval({ ...yes, safety: true, open: onceApproved })).toMatchObject({ ok: false })
  })

  test('never lets a blocked draft through, whoever says it and however often', () => {
    for (const safety of [true, false]) {
      for (const open of [draft, onceApproved]) {
        for (const staffId of ['ines', 'tomas']) {
          const blocked = { ...yes, safety, open, staffId, blocked: true }
          expect(approval(blocked)).toMatchObject({ ok: false })
        }
      }
    }
  })

  test('is for the version that was read, and for nothing where there is no draft', () => {
    expect(approval({ ...yes, readAt: 6 })).toMatchObject({ ok: false })
    expect(approval({ ...yes, open: null })).toMatchObject({ ok: false })
  })
})

describe('a wording in another language', () => {
  test.each([
    [1, 1, false],
    [1, 2, true],
    [2, 1, false],
    [1, null, false],
  ])('that follows edition %s lags behind edition %s: %s', (followsEdition, first, expected) => {
    expect(lags({ followsEdition, firstEditionInUse: first })).toBe(expected)
  })
})
