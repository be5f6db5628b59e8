/** Constants of care, danger and what to drink meanwhile, and a change of each that its outside test must notice. */
export const careConstants = [
  {
    what: 'boiling, bleach and doses as printed',
    file: 'lib/domain/advice-tables.ts',
    test: 'drink',
    changes: [
      ['aboveMetres: -Infinity, minutes: 0', 'aboveMetres: -Infinity, minutes: 1'],
      ['6500 * metresPerFoot', '6400 * metresPerFoot'],
      ['metresPerFoot, minutes: 3', 'metresPerFoot, minutes: 2'],
      ['aboveMetres: 1000', 'aboveMetres: 1500'],
      ['aboveMetres: 1000, minutes: 3', 'aboveMetres: 1000, minutes: 2'],
      ['toPercent: 6, clearDrops: 8', 'toPercent: 6, clearDrops: 9'],
      [
        'toPercent: 6, clearDrops: 8, cloudyDrops: 16',
        'toPercent: 6, clearDrops: 8, cloudyDrops: 15',
      ],
      ['fromPercent: 5, toPercent: 6', 'fromPercent: 5.5, toPercent: 6'],
      ['{ ...quart, ...weak, clearDrops: 2', '{ ...quart, ...weak, clearDrops: 3'],
      [
        '{ ...quart, ...strong, clearDrops: 2, cloudyDrops: 4',
        '{ ...quart, ...strong, clearDrops: 2, cloudyDrops: 3',
      ],
      ['{ ...gallon, ...weak, clearDrops: 8', '{ ...gallon, ...weak, clearDrops: 7'],
      ['fromPercent: 8.25', 'fromPercent: 8.3'],
      ['fromPercent: 6, toPercent: 6 }', 'fromPercent: 3, toPercent: 6 }'],
      ['milligramsPerLitre: 1.88', 'milligramsPerLitre: 1.9'],
      ['useWithinHours: 24', 'useWithinHours: 48'],
      ['milligramsPerLitre: 3.75', 'milligramsPerLitre: 3.8'],
      ['useWithinHours: 8', 'useWithinHours: 12'],
    ],
  },
  {
    what: 'what passes for a printed table',
    file: 'lib/domain/advice-lint.ts',
    test: 'drink',
    changes: [
      ['doseSpread = 0.4', 'doseSpread = 0.39'],
      ['doseSpread = 0.4', 'doseSpread = 0.42'],
      ['low: 1.8', 'low: 1.75'],
      ['high: 2.2', 'high: 2.25'],
      ['waitMinutes >= 30', 'waitMinutes >= 15'],
    ],
  },
  {
    what: 'cautions that go with an advice',
    file: 'lib/domain/advice.ts',
    test: 'drink',
    changes: [
      ["cautions: ['scald', 'cool covered'", "cautions: ['cool covered'"],
      ["['after the filter', 'never mix'", "['never mix'"],
    ],
  },
  {
    what: 'months and washes of the first kit model',
    file: 'db/queries/reference.ts',
    test: 'care',
    changes: [
      ['changeMonths: 1,', 'changeMonths: 2,'],
      ['changeMonths: 3,', 'changeMonths: 4,'],
      ['changeMonths: 12', 'changeMonths: 18'],
      ['changeMonths: 3, washed: false', 'changeMonths: 3, washed: true'],
    ],
  },
  {
    what: 'strokes and litres of the first wordings',
    file: 'lib/domain/first-wordings/en.ts',
    test: 'care',
    changes: [
      ['10 strokes each end. Washed?', '5 strokes each end. Washed?'],
      ['10 strokes each end. ${', '10 strokes one end. ${'],
      ['Flush it with 1 litre', 'Flush it with 2 litres'],
      [
        'Push clean water back, 10 strokes each end. ${',
        'Push water back, 10 strokes each end. ${',
      ],
    ],
  },
  {
    what: 'when a stage is past washing',
    file: 'lib/domain/flow-settings.ts',
    test: 'care',
    changes: [['partlyShare: 0.4', 'partlyShare: 0.3']],
  },
  {
    what: 'what a crack or a fall ends in',
    file: 'lib/domain/walk-catalogue.ts',
    test: 'care',
    changes: [["label: '2 · It fell or froze',", "label: '2 · It fell',"]],
  },
  {
    what: 'words of the danger signs',
    file: 'lib/domain/reply-words/en-ill.ts',
    test: 'danger',
    changes: [['letharg*', 'sluggish*']],
  },
  {
    what: 'the danger signs among illnesses',
    file: 'lib/domain/reply-illness.ts',
    test: 'danger',
    changes: [[', dangerSign: true }', ' }']],
  },
  {
    what: 'two ill houses of one area',
    file: 'lib/domain/illness.ts',
    test: 'unwell',
    changes: [
      ['togetherDays = 7', 'togetherDays = 5'],
      ['togetherDays = 7', 'togetherDays = 9'],
    ],
  },
  {
    what: 'the class of a danger sign',
    file: 'lib/domain/harm.ts',
    test: 'unwell',
    changes: [["'danger sign') return 1", "'danger sign') return 2"]],
  },
  {
    what: 'the text for a danger sign',
    file: 'lib/domain/ticket-opening.ts',
    test: 'unwell',
    changes: [["? 'unwell-now' :", "? 'unwell' :"]],
  },
]
