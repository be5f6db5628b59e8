import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Language } from '@/lib/domain/language'
import { readReply, sureEnough, type Asked } from '@/lib/domain/reply'
import { readByWords } from '@/lib/domain/reply-by-words'
import { explainReply } from '@/lib/domain/reply-explain'
import { senseOf } from '@/lib/domain/reply-sense'

/** As the word lists read it: what the two readers make of it together is tried on whole sets. */
function read(text: string, asked: Asked = 'none', language: Language = 'en') {
  return readByWords(senseOf(text, language, asked))
}

describe('the order of reading', () => {
  it('is opt-out, danger, wrong number, what was asked, the rest', () => {
    expect(read('stop texting me, the cap is cracked').kind).toBe('stop')
    expect(read('wrong number, my son is ill').kind).toBe('unwell')
    expect(read('wrong number, 12 minutes', 'flow').kind).toBe('wrong-number')
    expect(read('thanks, 12 minutes', 'flow').kind).toBe('flow-figure')
    expect(read('done but still slow', 'wash').kind).toBe('slow')
    expect(read('done, thanks', 'wash').kind).toBe('done')
  })

  it('puts illness before a broken filter, and that before odd water', () => {
    expect(read('cracked and my son is ill').kind).toBe('unwell')
    expect(read('black water and it leaks').kind).toBe('broken')
  })
})

describe('a bare number', () => {
  it('is minutes where a flow was asked for, or nothing', () => {
    expect(read('12', 'flow')).toMatchObject({ kind: 'flow-figure', minutes: 12 })
    expect(read('2', 'flow')).toMatchObject({ kind: 'flow-figure', minutes: 2 })
    expect(read('12', 'none')).toMatchObject({ kind: 'flow-figure', minutes: 12 })
  })

  it('up to three is a choice where a step was asked, with the minutes beside it', () => {
    expect(read('2', 'step')).toEqual({ kind: 'choice', choice: 2, minutes: 2, sure: 0.85 })
    expect(read('2 minutes', 'step')).toMatchObject({ kind: 'flow-figure', minutes: 2 })
    expect(read('4', 'step')).toMatchObject({ kind: 'flow-figure', minutes: 4 })
  })

  it('goes to a person when there are two different ones, or it is no time of a bottle', () => {
    expect(read('1 2', 'step').kind).toBe('unclear')
    expect(read('0780555012', 'flow').kind).toBe('unclear')
    expect(read('my 3 kids like it', 'flow').kind).not.toBe('flow-figure')
  })

  it('with "slow" answers what was asked and says so', () => {
    expect(read('slow 20 minutes', 'flow')).toMatchObject({ minutes: 20, alsoSlow: true })
    expect(read('slow 20 minutes', 'wash')).toMatchObject({ kind: 'slow', minutes: 20 })
  })

  it('is a promise with "in" when a wash was asked', () => {
    expect(read('in 10 minutes', 'wash').kind).toBe('not-yet')
    expect(read('filled in 10 minutes', 'wash')).toMatchObject({ kind: 'flow-figure', minutes: 10 })
  })
})

describe('a denial', () => {
  it.each<[string, Language, string]>([
    ['no longer slow', 'en', 'done'],
    ['ya no está lento', 'es', 'done'],
    ["ce n'est plus lent", 'fr', 'done'],
    ['আর আস্তে না', 'bn', 'done'],
    ['not flowing well', 'en', 'slow'],
    ['not flowing', 'en', 'no-flow'],
    ['ça coule plus', 'fr', 'no-flow'],
    ['ça coule plus lentement', 'fr', 'slow'],
    ['pani asena', 'bn', 'no-flow'],
    ['pani valo ase na', 'bn', 'slow'],
    ['not cracked or broken', 'en', 'no'],
    ['the tap wont close and water pours out', 'en', 'broken'],
  ])('"%s" (%s) reads %s', (text, language, kind) => {
    expect(read(text, 'step', language).kind).toBe(kind)
  })
})

describe('words shared by stop and stopped', () => {
  it.each(['it stopped', 'water stop', 'stopped dripping', 'not working'])(
    'leave "%s" to a person',
    (text) => expect(read(text, 'wash').kind).toBe('unclear'),
  )

  it('tell that water stopped flowing', () => {
    expect(read('it stopped flowing', 'wash').kind).toBe('no-flow')
  })
})

describe('spelling', () => {
  it('is forgiven where a finger or an ear explains it', () => {
    for (const text of ['slooow', 'slpw', 'SLWO', 'sl0w'])
      expect(read(text, 'wash').kind).toBe('slow')
    expect(read('diareea', 'none').kind).toBe('unwell')
    expect(read('kebrado', 'none', 'es').kind).toBe('broken')
    expect(read('sa coul pa', 'none', 'fr').kind).toBe('no-flow')
    expect(read('dhakna vhenge gese', 'none', 'bn').kind).toBe('broken')
  })

  it('is never guessed in three letters or fewer, nor where it is another word', () => {
    for (const text of ['sow', 'ilk', 'tap', 'snow', 'show']) {
      expect(read(text, 'wash').kind).toBe('unclear')
    }
  })
})

describe("another language than the household's own", () => {
  it('is tried after it', () => {
    expect(read('mi hijo tiene diarrea', 'none', 'en').kind).toBe('unwell')
    expect(read('my son has diarrhoea', 'none', 'bn').kind).toBe('unwell')
    expect(read('le filtre est sale', 'none', 'es').kind).not.toBe('no-flow')
    expect(read('sale agua', 'none', 'fr').kind).not.toBe('no-flow')
  })

  it('may stand beside it in one text', () => {
    expect(read('mi hijo is sick', 'none', 'es').kind).toBe('unwell')
    expect(read('filter ta slow hoye gese', 'wash', 'bn').kind).toBe('slow')
  })
})

describe('any text at all', () => {
  const text = fc.oneof(
    fc.string({ maxLength: 80 }),
    fc.string({ unit: 'grapheme', maxLength: 40 }),
  )
  const language = fc.constantFrom<Language>('en', 'es', 'fr', 'bn')
  const asked = fc.constantFrom<Asked>('wash', 'change', 'flow', 'step', 'none')

  it('is read without a fault, the same each time, and unclear only below the line', () => {
    fc.assert(
      fc.property(text, language, asked, (written, own, question) => {
        const reading = readReply({ text: written, language: own, asked: question })
        expect(reading.sure).toBeGreaterThanOrEqual(0)
        expect(reading.sure).toBeLessThanOrEqual(1)
        expect(reading.kind === 'unclear').toBe(reading.sure < sureEnough)
        expect(readReply({ text: written, language: own, asked: question })).toEqual(reading)
      }),
      { numRuns: 150 },
    )
  }, 60_000)

  it.each([
    ['STOP', 'none', 'stop'],
    ['start', 'none', 'start'],
    ['slow', 'wash', 'slow'],
    ['12', 'flow', 'flow-figure'],
    ['4 min 30', 'flow', 'flow-figure'],
    ['2', 'step', 'choice'],
  ] as const)(
    '"%s" (%s), a keyword, one known word or a figure, is %s whatever its like meant',
    (written, asked, kind) => {
      expect(readReply({ text: written, language: 'en', asked }).kind).toBe(kind)
    },
  )

  it('empty goes to a person', () => {
    expect(read('').kind).toBe('unclear')
    expect(read(' \n ').kind).toBe('unclear')
  })
})

describe('an explanation', () => {
  it('names the words a reading rests on, and the strange ones', () => {
    const { byWords, byExamples, found, unknownWords } = explainReply({
      text: 'the cap is not cracked xyzzy',
      language: 'en',
      asked: 'step',
    })
    expect(found).toContainEqual(
      expect.objectContaining({ concept: 'broken', denied: true, language: 'en' }),
    )
    expect(unknownWords).toEqual(['xyzzy'])
    expect(byWords.kind).toBe('no')
    expect(byExamples[0]).toMatchObject({ kind: 'no' })
    expect(byExamples.reduce((sum, { chance }) => sum + chance, 0)).toBeCloseTo(1, 6)
  })
})
