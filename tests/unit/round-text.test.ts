import { describe, expect, test } from 'vitest'
import { stageKey, textFor } from '@/lib/domain/round-text'

const wash = { kind: 'wash', dueOn: '2026-03-02' } as const
const cloth = { kind: 'change', dueOn: '2026-03-02', stagePosition: 1 } as const
const fibre = { kind: 'change', dueOn: '2026-03-03', stagePosition: 3 } as const
const check = { kind: 'flow check', dueOn: '2026-03-01' } as const
const welcome = { kind: 'welcome', dueOn: '2026-03-01' } as const

describe('the text of a round', () => {
  test('a welcome goes alone, and the wash waits for a text of its own', () => {
    expect(textFor([wash, welcome])).toEqual({ moment: 'welcome', due: [welcome] })
  })

  test('a change goes before a wash, which waits for a text of its own', () => {
    expect(textFor([wash, cloth])).toEqual({ moment: 'change-due', due: [cloth] })
  })

  test('a new fibre stage needs no wash, and closes the one that was due', () => {
    expect(textFor([wash, cloth, fibre])).toEqual({
      moment: 'change-due',
      due: [cloth, fibre, wash],
    })
  })

  test('a flow check goes only when nothing weightier is due', () => {
    expect(textFor([check, wash])).toEqual({ moment: 'wash-due', due: [wash] })
    expect(textFor([check])).toEqual({ moment: 'flow-check', due: [check] })
  })

  test('nothing due is no text', () => {
    expect(textFor([])).toBeNull()
  })

  test('stages are named by their numbers in order, and none means the fibre stage', () => {
    expect([stageKey([2]), stageKey([2, 1]), stageKey([3, 1, 2]), stageKey([])]).toEqual([
      2, 12, 123, 3,
    ])
  })
})
