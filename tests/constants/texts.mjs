/** Constants of dates, texts and the carrier, and a change of each that its outside test must notice. */
export const textsConstants = [
  {
    what: 'the calendar',
    file: 'lib/domain/day.ts',
    test: 'dates',
    changes: [
      ['? 29 : 28', '? 28 : 28'],
      ['month === 11 ? 30', 'month === 10 ? 30'],
      ['719_468', '719_467'],
      ['number + 4', 'number + 5'],
    ],
  },
  {
    what: 'months from the fitting',
    file: 'lib/domain/cycle.ts',
    test: 'dates',
    changes: [['fittedOn, months * count', 'fittedOn, months + count']],
  },
  {
    what: 'the sending window',
    file: 'lib/domain/round-window.ts',
    test: 'dates',
    changes: [
      ['wall.minute < window.opensMinute', 'wall.minute <= window.opensMinute'],
      ['wall.minute >= window.closesMinute', 'wall.minute > window.closesMinute'],
    ],
  },
  {
    what: 'the spread of a round',
    file: 'lib/domain/round-spread.ts',
    test: 'dates',
    changes: [['(spreadIndex * minute) / perMinute', '(spreadIndex * minute) / (2 * perMinute)']],
  },
  {
    what: 'a bundle of what is due',
    file: 'lib/domain/round.ts',
    test: 'dates',
    changes: [['dueOn <= today', 'dueOn < today']],
  },
  {
    what: 'words that opt out and in',
    file: 'lib/domain/consent.ts',
    test: 'opting-out',
    changes: [
      ["'revoke'", "'revoked'"],
      ["'cancel'", "'cancelled'"],
      ["'stopall',\n", "'stopalls',\n"],
      ["'optout',\n", "'optouts',\n"],
      ["'unstop'", "'yes'"],
      ['optOutBusinessDays = 10', 'optOutBusinessDays = 11'],
      ['+ 4) % 7', '+ 5) % 7'],
    ],
  },
  {
    what: 'slips from the word STOP',
    file: 'lib/domain/reply-opt-out.ts',
    test: 'opting-out',
    changes: [
      ["slipsBetween(only.text, 'stop') === 1", "slipsBetween(only.text, 'stop') === 0"],
      ['only.text.length < 4', 'only.text.length < 3'],
    ],
  },
  {
    what: 'the one confirmation',
    file: 'lib/domain/answer.ts',
    test: 'opting-out',
    changes: [["{ kind: 'send', moment: 'stopped' }", "{ kind: 'send', moment: 'help' }"]],
  },
  {
    what: 'the room in a text',
    file: 'lib/domain/wording-size.ts',
    test: 'texts',
    changes: [
      ['153 : 160', '152 : 160'],
      ['153 : 160', '153 : 161'],
      ['67 : 70', '66 : 70'],
      ['67 : 70', '67 : 71'],
      ["'GSM-7' ? 7 : 16", "'GSM-7' ? 8 : 16"],
    ],
  },
  {
    what: 'the reading grade',
    file: 'lib/domain/wording-reading.ts',
    test: 'texts',
    changes: [
      ['0.39', '0.4'],
      ['11.8', '11.9'],
      ['15.59', '15.6'],
    ],
  },
  {
    what: 'words a sentence and actions a text',
    file: 'lib/domain/wording-checks.ts',
    test: 'texts',
    changes: [
      ['wordsASentence = 10', 'wordsASentence = 9'],
      ['wordsASentence = 10', 'wordsASentence = 11'],
      ['length > 1)', 'length > 2)'],
    ],
  },
  {
    what: 'codes and statuses of the carrier',
    file: 'lib/domain/carrier-code.ts',
    test: 'carrier-codes',
    changes: [
      ["'30005': 'gone'", "'30005': 'later'"],
      ["'21610': 'opted out'", "'21610': 'never'"],
      ["'30006': 'never'", "'30006': 'later'"],
      ["?? 'our fault'", "?? 'later'"],
      ['delivered: 4,\n    u', 'delivered: 2,\n    u'],
    ],
  },
  {
    what: 'the signature of the carrier',
    file: 'tests/fakes/carrier/signature.ts',
    test: 'carrier',
    changes: [
      ["?? 'sha1'", "?? 'sha256'"],
      ["split('#')[0]", "split('?')[0]"],
    ],
  },
  {
    what: 'phone numbers',
    file: 'lib/schemas/phone-number.ts',
    test: 'phones',
    changes: [['isValid() !== true', 'isPossible() !== true']],
  },
]
