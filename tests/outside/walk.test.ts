import { describe, expect, it } from 'vitest'
import { seeded } from '@/tests/factories/seeded'
import { bestCure, expectedMinutes } from '@/lib/domain/walk-search'
import { costMinutes, timingMinutes, type Step } from '@/lib/domain/walk-catalogue'
import { afterAnswer, afterOutcome, normalise, withEvidence } from '@/lib/domain/walk-odds'
import { suspectIds, type Evidence, type Odds } from '@/lib/domain/walk-suspects'

/*
 * CHECKS.md section 14. Heckerman, Breese, Rommelse 1995, Decision-theoretic troubleshooting
 * (CACM 38:3): with one fault, sure cures and independent costs, the order of falling p/c makes the
 * expected cost least.
 */

function oddsOf(weights: Evidence): Odds {
  const zero = Object.fromEntries(suspectIds.map((id) => [id, 0])) as Odds
  return normalise({ ...zero, ...weights })
}

/** One sure cure for each of the first `count` suspects, at costs that differ. */
function caseOf(count: number, random: () => number) {
  const suspects = suspectIds.slice(0, count)
  const odds = oddsOf(Object.fromEntries(suspects.map((id) => [id, 0.01 + random()])))
  const cures = suspects.map((id): Step => ({
    id,
    name: id,
    kind: 'cure',
    minutes: 1 + random() * 60 - timingMinutes,
    moment: 'ask-flow',
    asks: 'step',
    tries: 1,
    cures: { [id]: 1 },
    answers: [],
  }))
  return { odds, cures }
}

/** Expected cost of trying sure cures in this order: each is paid for if none before it cured. */
function costOfOrder(order: readonly Step[], odds: Odds): number {
  let unsolved = 1
  let cost = 0
  for (const step of order) {
    cost += unsolved * costMinutes(step)
    unsolved -= odds[step.id as keyof Odds]
  }
  return cost
}

function permutations<T>(items: readonly T[]): T[][] {
  if (items.length < 2) return [[...items]]
  return items.flatMap((item, index) =>
    permutations(items.toSpliced(index, 1)).map((rest) => [item, ...rest]),
  )
}

/** The order in which the search takes them, each failing. */
function orderOf(odds: Odds, cures: readonly Step[]): Step[] {
  const order: Step[] = []
  let weights = odds
  for (;;) {
    const step = bestCure(
      weights,
      cures.filter((cure) => !order.includes(cure)),
    )
    if (!step) return order
    order.push(step)
    weights = { ...weights, [step.id]: 0 }
  }
}

const never = Number.MAX_SAFE_INTEGER

describe('decision-theoretic troubleshooting', () => {
  it('takes the cheapest of all orders, in 1,000 cases of up to 7 sure cures', () => {
    const random = seeded(1995)
    for (let index = 0; index < 1_000; index += 1) {
      const { odds, cures } = caseOf(1 + (index % 7), random)
      const cheapest = permutations(cures).reduce(
        (least, order) => Math.min(least, costOfOrder(order, odds)),
        Infinity,
      )
      const order = orderOf(odds, cures)
      expect(order).toHaveLength(cures.length)
      expect(costOfOrder(order, odds)).toBeCloseTo(cheapest, 9)
      expect(expectedMinutes(odds, cures, never)).toBeCloseTo(cheapest, 3)
    }
  }, 120_000)

  it('is the order of falling p/c', () => {
    const random = seeded(38)
    for (let index = 0; index < 200; index += 1) {
      const { odds, cures } = caseOf(7, random)
      const rate = (step: Step) => odds[step.id as keyof Odds] / costMinutes(step)
      const rates = orderOf(odds, cures).map(rate)
      expect(rates).toEqual(rates.toSorted((a, b) => b - a))
    }
  })
})

describe('Bayes: odds times likelihood ratio', () => {
  const start = oddsOf({ 'fouled-fibre': 0.5, 'full-cloth': 0.3, 'air-lock': 0.2 })

  /*
   * Worked by hand. Weights after the evidence, and each over their sum:
   *   rain: fibre 0.5 · 1.5 = 0.75, cloth 0.3 · 3 = 0.90, air 0.2 · 1 = 0.20; sum 1.85
   *   bubbles seen, P(seen | air) 0.7, else 0.1: 0.05, 0.03, 0.14; sum 0.22
   *   a wash fails, P(cured | fibre) 0.6; the cure's other chances are the catalogue's own
   */
  it.each([
    {
      what: 'rain',
      odds: withEvidence(start, { 'fouled-fibre': 1.5, 'full-cloth': 3 }),
      hand: { 'fouled-fibre': 0.75 / 1.85, 'full-cloth': 0.9 / 1.85, 'air-lock': 0.2 / 1.85 },
    },
    {
      what: 'bubbles',
      odds: afterAnswer(start, { chance: { 'air-lock': 0.7 }, otherwise: 0.1 }),
      hand: { 'fouled-fibre': 0.05 / 0.22, 'full-cloth': 0.03 / 0.22, 'air-lock': 0.14 / 0.22 },
    },
  ])('$what, by hand', ({ odds, hand }) => {
    for (const [id, chance] of Object.entries(hand)) {
      expect(odds[id as keyof Odds]).toBeCloseTo(chance, 12)
    }
    expect(odds['kinked-hose']).toBe(0)
  })

  it('a cure that fails, by hand', () => {
    // Not cured: of fibre 1 − 0.6 − 0.4/3 = 0.26667; of the others 1 − 0.02 − 0.1 = 0.88.
    const odds = afterOutcome(start, { cures: { 'fouled-fibre': 0.6 } }, 'not cured')
    const sum = 0.5 * 0.2666667 + 0.3 * 0.88 + 0.2 * 0.88
    expect(odds['fouled-fibre']).toBeCloseTo((0.5 * 0.2666667) / sum, 6)
    expect(odds['full-cloth']).toBeCloseTo((0.3 * 0.88) / sum, 6)
    expect(odds['air-lock']).toBeCloseTo((0.2 * 0.88) / sum, 6)
  })
})
