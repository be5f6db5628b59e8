import type { Recovery, RecoveryKind } from '@/lib/domain/flow'
import { answerStep, startWalk, type StepAnswer, type Walk } from '@/lib/domain/walk'

/** A flow figure of this share of the first reading, its error 15 % of it. */
export function figure(share: number, kind?: RecoveryKind): Recovery {
  const verdict =
    share > 1.3 ? 'too-fast' : share >= 0.7 ? 'restored' : share >= 0.4 ? 'partly' : 'not'
  return {
    kind: kind ?? verdict,
    share,
    lowShare: share * 0.85,
    highShare: share * 1.15,
    against: 'first reading',
  }
}

export type Entry = [stepId: string, answer: StepAnswer, share?: number]

export function walked(
  entries: readonly Entry[],
  from: Walk = startWalk({ trouble: 'slow' }),
): Walk {
  return entries.reduce(
    (walk, [stepId, answer, share], at) =>
      answerStep(walk, {
        stepId,
        answer,
        at,
        ...(share === undefined ? {} : { recovery: figure(share) }),
      }),
    from,
  )
}
