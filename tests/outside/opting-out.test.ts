import { describe, expect, it } from 'vitest'
import { answerTo } from '@/lib/domain/answer'
import { isStartKeyword, isStopKeyword, mayText, optOutDeadline } from '@/lib/domain/consent'
import { readReply } from '@/lib/domain/reply'
import type { Language } from '@/lib/domain/language'

const read = (text: string) => readReply({ text, language: 'en', asked: 'none' }).kind

describe('opting out', () => {
  // 47 CFR 64.1200(a)(10), read in a copy.
  it.each(['stop', 'quit', 'end', 'revoke', 'opt out', 'cancel', 'unsubscribe'])(
    'is asked by the word "%s" of the federal rule',
    (word) => {
      expect(isStopKeyword(word)).toBe(true)
      expect(read(word)).toBe('stop')
    },
  )

  // The carrier's own list, read in a copy of its documentation.
  it.each(['STOPALL', 'OPTOUT', 'UNSUBSCRIBE', 'END', 'QUIT', 'CANCEL', 'REVOKE', 'STOP'])(
    'is asked by the word "%s" of the carrier',
    (word) => {
      expect(isStopKeyword(word)).toBe(true)
      expect(read(word)).toBe('stop')
    },
  )

  it.each([
    'Stop.',
    'STOP!!',
    '  unsubscribe',
    'opt-out',
    'OPT OUT please',
    'no mas',
    'dont text me',
    'please stop texting me',
    'arrête',
    "ne m'écrivez plus",
  ])('is asked by "%s"', (text) => {
    expect(read(text)).toBe('stop')
  })

  it.each([
    "I'll stop by tomorrow",
    'the filter will stop',
    'it stopped dripping',
    'water end?',
    'it stopped',
    'it stop',
    'water stop',
    'the water stopped',
    'stopped',
  ])('is not asked by "%s"', (text) => {
    expect(isStopKeyword(text)).toBe(false)
    expect(read(text)).not.toBe('stop')
  })

  // One or two edits from STOP, and words of their own.
  it.each(['SHOP', 'STEP', 'SLOW', 'SLOP', 'shop', 'Stew', 'spot', 'STO', 'top'])(
    'is never guessed from "%s"',
    (text) => {
      expect(isStopKeyword(text)).toBe(false)
      expect(read(text)).not.toBe('stop')
    },
  )

  it.each<[string, Language]>([
    ['dont stop texting me, it helps me remember', 'en'],
    ['please do not stop the messages', 'en'],
    ['no dejen de mandarme los avisos', 'es'],
    ["n'arrêtez pas les messages", 'fr'],
    ['মেসেজ বন্ধ কইরেন না', 'bn'],
    ['msg bondho koiren na', 'bn'],
  ])('is not asked by "%s" (%s), which asks the texts to go on', (text, language) => {
    expect(readReply({ text, language, asked: 'none' }).kind).not.toBe('stop')
  })

  it('is guessed from one slip in the whole of a text of four letters or more', () => {
    for (const text of ['STPO', 'stopp', 'sttop', 'sotp']) expect(read(text)).toBe('stop')
    expect(read('the stpo')).not.toBe('stop')
  })

  it('is undone by START and UNSTOP, never by YES', () => {
    expect(isStartKeyword('START')).toBe(true)
    expect(isStartKeyword(' unstop. ')).toBe(true)
    expect(isStartKeyword('YES')).toBe(false)
    expect(read('START')).toBe('start')
    expect(read('YES')).toBe('yes')
  })

  it('is honoured within ten business days', () => {
    // Friday 28 November 2025; ten weekdays on, and one more for a named holiday. [arithmetic]
    expect(optOutDeadline({ withdrawnOn: '2025-11-28' })).toBe('2025-12-12')
    expect(optOutDeadline({ withdrawnOn: '2025-11-28', holidays: ['2025-12-08'] })).toBe(
      '2025-12-15',
    )
    expect(optOutDeadline({ withdrawnOn: '2025-12-13' })).toBe('2025-12-26')
  })

  // 47 CFR 64.1200(a)(12) allows one text that confirms. The carrier sends its own to its own words.
  it.each([
    [false, ['stopped']],
    [true, []],
  ])('is confirmed once, by the carrier where it acted itself: %s', (handledByCarrier, sent) => {
    const acts = answerTo({
      reading: { kind: 'stop', sure: 1 },
      asked: 'wash',
      waitingFor: 'wash-fibre',
      hasOpenTicket: true,
      handledByCarrier,
      mayMeanStop: true,
    })
    expect(acts[0]).toEqual({ kind: 'withdraw consent' })
    expect(acts.flatMap((act) => (act.kind === 'send' ? [act.moment] : []))).toEqual(sent)
  })

  it('outranks every other reason not to text', () => {
    expect(mayText({ consent: 'withdrawn', phoneState: 'gone', carrierBlocked: true })).toEqual({
      ok: false,
      reason: 'withdrawn',
    })
  })

  it('comes before danger in one text', () => {
    expect(read('stop texting me my son is sick')).toBe('stop')
  })
})
