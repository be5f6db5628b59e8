import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { allowedSlips, isKeypadSlip, isLikelySlip, slipsBetween } from '@/lib/domain/reply-slips'
import {
  foldBengali,
  foldFrench,
  foldRoman,
  foldSpanish,
  squeeze,
} from '@/lib/domain/reply-spelling'
import { foldText, tokenise } from '@/lib/domain/reply-tokens'

describe('slips', () => {
  it('are counted once for two letters changed about', () => {
    expect(slipsBetween('stpo', 'stop')).toBe(1)
    expect(slipsBetween('dnoe', 'done')).toBe(1)
    expect(slipsBetween('slow', 'stop')).toBe(2)
    expect(slipsBetween('stop', 'stop')).toBe(0)
  })

  it('are never allowed in three letters', () => {
    expect([1, 3, 4, 7, 8, 20].map(allowedSlips)).toEqual([0, 0, 1, 1, 2, 2])
  })

  it('of a twelve-key phone stay on one key', () => {
    expect(isKeypadSlip('sloz', 'slow')).toBe(true)
    expect(isKeypadSlip('good', 'home')).toBe(false)
    expect(isKeypadSlip('gone', 'home')).toBe(true)
    expect(isKeypadSlip('cat', 'bat')).toBe(false)
  })

  it('are believed where a finger or an ear explains them', () => {
    expect(isLikelySlip('slpw', 'slow')).toBe(true)
    expect(isLikelySlip('slaw', 'slow')).toBe(true)
    expect(isLikelySlip('bomito', 'vomito')).toBe(true)
    expect(isLikelySlip('shop', 'stop')).toBe(false)
    expect(isLikelySlip('snow', 'slow')).toBe(false)
  })

  it('are the same both ways round', () => {
    const word = fc.stringMatching(/^[a-z]{1,9}$/)
    fc.assert(
      fc.property(word, word, (one, other) => {
        expect(slipsBetween(one, other)).toBe(slipsBetween(other, one))
        expect(isKeypadSlip(one, other)).toBe(isKeypadSlip(other, one))
      }),
    )
  })
})

describe('respelling', () => {
  it('takes away what writers leave to chance', () => {
    expect(squeeze('slooow')).toBe('slow')
    expect(foldSpanish('quebrado')).toBe(foldSpanish('kebrado'))
    expect(foldSpanish('hice')).toBe(foldSpanish('ise'))
    expect(foldFrench('coule')).toBe(foldFrench('koul'))
    expect(foldFrench('laver')).toBe(foldFrench('lave'))
    expect(foldRoman('bhenge')).toBe(foldRoman('venge'))
    expect(foldRoman('dhuyechhi')).toBe(foldRoman('dhuyesi'))
    expect(foldBengali('পানী')).toBe(foldBengali('পানি'))
    expect(foldBengali('ফোঁটা')).toBe(foldBengali('ফোটা'))
  })
})

describe('tokens', () => {
  const words = (text: string) => tokenise(text).map((token) => token.text)

  it('have no case, no accent, no curly quotes and one script of digits', () => {
    expect(foldText('SÍ “Été” ১২')).toBe('si "ete" 12')
    expect(words("don't")).toEqual(['dont'])
    expect(words("L'eau n’est pas")).toEqual(['l', 'eau', 'n', 'est', 'pas'])
    expect(words("I'll wash")).toEqual(['i', 'will', 'wash'])
  })

  it('part numbers from letters, and mend letters written as digits', () => {
    expect(words('12min')).toEqual(['12', 'min'])
    expect(words('১২মিনিট')).toEqual(['12', 'মিনিট'])
    expect(words('n0')).toEqual(['no'])
    expect(words('sl0w')).toEqual(['slow'])
    expect(words('2moro')).toEqual(['tomorrow'])
    expect(words('wrong #')).toEqual(['wrong', 'number'])
  })

  it('keep the ends of clauses and sentences apart', () => {
    expect(tokenise('no, it is. ok')).toEqual([
      { kind: 'word', text: 'no' },
      { kind: 'break', text: ',', strength: 'weak' },
      { kind: 'word', text: 'it' },
      { kind: 'word', text: 'is' },
      { kind: 'break', text: '.', strength: 'strong' },
      { kind: 'word', text: 'ok' },
    ])
  })

  it('read a plain face or thumb', () => {
    expect(words('👍🏽')).toContain('emojiyes')
    expect(words('🙏')).toEqual(['emojithanks'])
  })
})
