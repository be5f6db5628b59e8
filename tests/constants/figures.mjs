/** Constants of statistics, stock, the walk and the ladder, and a change of each that its outside test must notice. */
export const figuresConstants = [
  {
    what: 'quantiles',
    file: 'lib/domain/quantile.ts',
    test: 'statistics',
    changes: [
      ['upperTail95 = 0.975', 'upperTail95 = 0.95'],
      ['133.14166789178438', '133.15166789178438'],
      ['4.630337846156546', '4.631337846156546'],
      ['6.657904643501104', '6.658904643501104'],
      ['k <= freedom - 2', 'k <= freedom - 3'],
    ],
  },
  {
    what: 'the interval of Wilson',
    file: 'lib/domain/measure.ts',
    test: 'statistics',
    changes: [['4 * n * n', '2 * n * n']],
  },
  {
    what: 'the curve of Kaplan and Meier',
    file: 'lib/domain/measure-survival.ts',
    test: 'statistics',
    changes: [['days >= on', 'days > on']],
  },
  {
    what: 'stock',
    file: 'lib/domain/part.ts',
    test: 'stock',
    changes: [
      ['sum < chance', 'sum <= chance + 0.01'],
      ['stock - 1 })', 'stock })'],
      ['chance: share }) + 1', 'chance: share })'],
      ['Math.sqrt(days)', 'days'],
    ],
  },
  {
    what: 'the order of cures',
    file: 'lib/domain/walk-search.ts',
    test: 'walk',
    changes: [
      ['cureChance(odds, step) / costMinutes(step)', 'cureChance(odds, step)'],
      ['rest[id] *= 1 - ', 'rest[id] *= 0.9 - '],
    ],
  },
  {
    what: 'likelihoods of an outcome',
    file: 'lib/domain/walk-odds.ts',
    test: 'walk',
    changes: [
      ['partlyShare = 1 / 3', 'partlyShare = 1 / 2'],
      ['partlyByChance = 0.1', 'partlyByChance = 0.2'],
      ['curedByChance = 0.02', 'curedByChance = 0.03'],
      ['evidence[id] ?? 1', 'evidence[id] ?? 2'],
    ],
  },
  {
    what: 'the ladder and effective use',
    file: 'lib/domain/measure-ladder.ts',
    test: 'ladder',
    changes: [
      ['roundTripMinutes <= 30', 'roundTripMinutes <= 31'],
      ['roundTripMinutes <= 30', 'roundTripMinutes <= 29'],
      ['sourceCount >= 1', 'sourceCount >= 13'],
      ['treatedCount < 1', 'treatedCount < 2'],
    ],
  },
  {
    what: 'what is said, measured and seen',
    file: 'lib/domain/measure-kits.ts',
    test: 'ladder',
    changes: [['piece.known === known', "piece.known !== 'measured'"]],
  },
]
