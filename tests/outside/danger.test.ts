import { describe, expect, it } from 'vitest'
import type { Language } from '@/lib/domain/language'
import { readReply } from '@/lib/domain/reply'

const read = (text: string, language: Language = 'en') =>
  readReply({ text, language, asked: 'none' })

// WHO IMCI chart booklet (2014), general danger signs, read in a copy: cannot drink or breastfeed;
// vomits everything; convulsions; lethargic or unconscious. Blood in the stool is added by it for
// diarrhoea. The wordings are ours.
const signs: Record<string, [Language, string][]> = {
  'cannot drink or breastfeed': [
    ['en', 'baby cant drink n sleepy'],
    ['en', 'she is not able to breastfeed'],
    ['es', 'mi hija no quiere tomar nada y esta muy dormida'],
    ['es', 'el bebé no puede mamar'],
    ['fr', "le bébé n'arrive pas à téter"],
    ['fr', 'ma fille ne boit plus'],
    ['bn', 'বাচ্চা দুধ খেতে পারে না'],
    ['bn', 'bacca pani khete pare na'],
  ],
  'vomits everything': [
    ['en', 'my son vomits everything'],
    ['es', 'mi hijo vomita todo lo que toma'],
    ['fr', 'il vomit tout'],
    ['bn', 'ছেলে যা খায় সব বমি করে'],
    ['bn', 'ja khay sob bomi kore'],
  ],
  convulsions: [
    ['en', 'she had a convulsion'],
    ['es', 'le dieron convulsiones'],
    ['fr', 'mon fils a des convulsions'],
    ['bn', 'মেয়ের খিঁচুনি হচ্ছে'],
    ['bn', 'meyer khichuni hocche'],
  ],
  'lethargic or unconscious': [
    ['en', 'my daughter is unconscious'],
    ['en', 'he is lethargic'],
    ['en', "the baby won't wake up"],
    ['es', 'mi niño está inconsciente'],
    ['es', 'la niña no despierta'],
    ['fr', 'mon bébé est inconscient'],
    ['fr', 'il ne se réveille pas'],
    ['bn', 'ছেলে অজ্ঞান হয়ে গেছে'],
    ['bn', 'bacca nistej hoye gese'],
  ],
  'blood in the stool': [
    ['en', 'stool has blood'],
    ['en', "there's blood in his poo"],
    ['es', 'hay sangre en las heces'],
    ['fr', 'du sang dans les selles'],
    ['bn', 'পায়খানার সাথে রক্ত যায়'],
    ['bn', 'paykhanay rokto'],
  ],
}

describe.each(Object.entries(signs))('"%s"', (_, wordings) => {
  it.each(wordings)('is a danger sign in %s: %s', (language, text) => {
    expect(read(text, language)).toMatchObject({ kind: 'unwell', dangerSign: true })
  })
})

describe('illness without a danger sign', () => {
  it.each<[Language, string]>([
    ['en', 'my son has diarrhoea'],
    ['es', 'mi hijo tiene diarrea'],
    ['fr', 'mon fils a la diarrhée'],
    ['bn', 'আমার ছেলের ডায়রিয়া'],
    ['bn', 'amar cheler dayria'],
    ['es', 'my son has diarrhoea'],
    ['en', 'mi hijo está enfermo'],
  ])('is unwell, and no more, in %s: %s', (language, text) => {
    const reading = read(text, language)
    expect(reading.kind).toBe('unwell')
    expect(reading.dangerSign).toBeUndefined()
  })
})

// DESIGN.md section 5, "Danger".
describe('a filter or water that must not be used', () => {
  it.each([
    ['the cap is cracked', 'broken'],
    ['it froze in the night', 'broken'],
    ['I dropped the filter', 'broken'],
    ['it is leaking', 'broken'],
    ['the water runs too fast', 'broken'],
    ['black water comes out', 'odd-water'],
    ['it smells of fuel', 'odd-water'],
    ['chemical smell', 'odd-water'],
  ])('"%s" is %s', (text, kind) => {
    expect(read(text).kind).toBe(kind)
  })

  it('outranks a wrong number, a figure, thanks and what is done', () => {
    expect(read('wrong number but my son is sick').kind).toBe('unwell')
    expect(read('12 minutes and it leaks').kind).toBe('broken')
    expect(read('done thanks the cap is cracked').kind).toBe('broken')
    expect(read('slow and leaking')).toMatchObject({ kind: 'broken', alsoSlow: true })
  })

  it('is not read into its denial', () => {
    for (const text of ['not cracked', 'no leak', 'it is not leaking', 'nobody is sick']) {
      expect(read(text).kind).not.toMatch(/broken|unwell|odd-water/)
    }
    expect(read('it cracked, not leaking').kind).toBe('broken')
    expect(read("he can't stop vomiting").kind).toBe('unwell')
    expect(read('No it is cracked').kind).toBe('broken')
  })

  it('goes to a person when it is only supposed', () => {
    // A question is answered by a person too.
    expect(['unclear', 'ask']).toContain(read('what if the cap cracks?').kind)
  })
})
