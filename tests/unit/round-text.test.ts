import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { addDays } from '@/lib/domain/day'
import type { Due } from '@/lib/domain/round'
import { stageKey, textFor } from '@/lib/domain/round-text'

const today = '2026-03-02'
const on = (ahead: number) => addDays(today, ahead)

const wash = (ahead = 0): Due => ({ kind: 'wash', dueOn: on(ahead) })
const cloth = (ahead = 0): Due => ({ kind: 'change', dueOn: on(ahead), stagePosition: 1 })
const fibre = (ahead = 0): Due => ({ kind: 'change', dueOn: on(ahead), stagePosition: 3 })
const check = (ahead = 0): Due => ({ kind: 'flow check', dueOn: on(ahead) })
const welcome = (ahead = 0): Due => ({ kind: 'welcome', dueOn: on(ahead) })

describe('the text of a round', () => {
  test.each([
    ['a welcome goes alone', [wash(), welcome(-1)], 'welcome', [welcome(-1)]],
    ['a change goes before a wash', [wash(), cloth()], 'change-due', [cloth()]],
    [
      'a new fibre stage closes the wash that was due',
      [wash(), cloth(), fibre(1)],
      'change-due',
      [cloth(), fibre(1), wash()],
    ],
    [
      'nobody washes a fibre stage that is changed within days',
      [wash(), fibre(3)],
      'change-due',
      [fibre(3), wash()],
    ],
    ['a flow check waits while a wash is due', [check(-1), wash()], 'wash-due', [wash()]],
    ['a flow check goes when it is alone', [check()], 'flow-check', [check()]],
    [
      'what is due today goes before a wash of tomorrow',
      [check(), wash(1)],
      'flow-check',
      [check()],
    ],
    [
      'a wash of today goes before a change of cloth in days',
      [wash(), cloth(2)],
      'wash-due',
      [wash()],
    ],
    [
      'stages to change within days come along',
      [cloth(), { ...cloth(4), stagePosition: 2 }, fibre(5)],
      'change-due',
      [cloth(), { ...cloth(4), stagePosition: 2 }],
    ],
    [
      'a flow check does not wait for a new fibre stage',
      [check(), fibre(3)],
      'flow-check',
      [check()],
    ],
  ] as const)('%s', (_, due, moment, spoken) => {
    expect(textFor(due, today)).toEqual({ moment, due: spoken })
  })

  test('nothing due yet is no text', () => {
    expect(textFor([], today)).toBeNull()
    expect(textFor([wash(1), cloth(2), check(3), welcome(1)], today)).toBeNull()
  })

  test('whatever is due, there is a text, it is for something due, and says each thing once', () => {
    const ahead = fc.integer({ min: -20, max: 8 })
    const anything = fc
      .tuple(fc.constantFrom(wash, cloth, fibre, check, welcome), ahead)
      .map(([make, days]) => make(days))
    fc.assert(
      fc.property(fc.array(anything, { maxLength: 8 }), (due) => {
        const text = textFor(due, today)
        expect(text !== null).toBe(due.some(({ dueOn }) => dueOn <= today))
        const spoken = text?.due ?? []
        expect(new Set(spoken).size).toBe(spoken.length)
        expect(spoken.every((one) => due.includes(one) && one.dueOn <= on(4))).toBe(true)
        expect(text === null || spoken.some(({ dueOn }) => dueOn <= today)).toBe(true)
      }),
    )
  })

  test('stages are named by their numbers in order, and none means the fibre stage', () => {
    expect([stageKey([2]), stageKey([2, 1]), stageKey([3, 1, 2]), stageKey([])]).toEqual([
      2, 12, 123, 3,
    ])
  })
})
