import { describe, expect, it } from 'vitest'
import { recovery, type Recovery } from '@/lib/domain/flow'
import { answerStep, cueEvidence, nextStep, startWalk, steps } from '@/lib/domain/walk'
import type { Cue, Next, Walk } from '@/lib/domain/walk'
import { seeded } from '@/tests/factories/seeded'

const cues = [undefined, ...(Object.keys(cueEvidence) as Cue[])]
const troubles = ['slow', 'no flow'] as const

function randomFigure(random: () => number): Recovery {
  return recovery({ flow: 0.5 + random() * 15, first: 15, nominal: 15 })
}

/** One walk with answers at random, to its end. */
function wander(start: Walk, random: () => number): { asked: string[]; end: Next; walk: Walk } {
  const asked: string[] = []
  let walk = start
  for (;;) {
    const next = nextStep(walk)
    if (next.kind === 'end' || asked.length > 40) return { asked, end: next, walk }
    const { step } = next
    asked.push(step.id)
    const choices = [...step.answers.map(({ answer }) => answer), 'no answer' as const]
    const answer = choices[Math.floor(random() * choices.length)] ?? 'no answer'
    const isTimed = answer === 'done' && random() < 0.8
    walk = answerStep(walk, {
      stepId: step.id,
      answer,
      at: asked.length,
      ...(isTimed ? { recovery: randomFigure(random) } : {}),
    })
  }
}

describe('walks with answers at random', () => {
  // Walked anew by each test, so that whoever asks which test goes through a line is told all of them.
  function walks() {
    const random = seeded(14)
    return troubles.flatMap((trouble) =>
      cues.flatMap((cue) =>
        Array.from({ length: 60 }, () =>
          wander(startWalk({ trouble, cues: cue ? [cue] : [] }), random),
        ),
      ),
    )
  }

  it('all come to an end', () => {
    for (const { end, asked } of walks()) {
      expect(end.kind).toBe('end')
      expect(asked.length).toBeLessThan(25)
    }
  })

  it('reach every step and every end', () => {
    const all = walks()
    expect(new Set(all.flatMap(({ asked }) => asked))).toEqual(new Set(steps.map(({ id }) => id)))
    const ends = new Set(all.map(({ end }) => (end.kind === 'end' ? end.end : 'none')))
    expect(ends).toEqual(new Set(['restored', 'part', 'visit', 'stop using']))
  })

  it('never ask a step more often than it may be asked', () => {
    for (const { asked } of walks()) {
      for (const { id, tries } of steps) {
        expect(asked.filter((one) => one === id).length).toBeLessThanOrEqual(tries)
      }
    }
  })

  it('end for good: an end is an end whenever it is looked at', () => {
    for (const { end, walk } of walks()) expect(nextStep(walk)).toEqual(end)
  })

  it('name the stage with every part, and explain everything in one line', () => {
    const all = walks()
    const parts = all.flatMap(({ end }) =>
      end.kind === 'end' && end.end === 'part' ? [end.stage] : [],
    )
    expect([1, 2, 3]).toEqual(expect.arrayContaining(parts))
    for (const { end } of all) expect(end.why).toMatch(/^[^\n]+\.$/)
  })
})
