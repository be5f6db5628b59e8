/*
 * CHECKS section 7: what follows when somebody is unwell. WHO IMCI chart booklet (2014), read in a
 * copy: a general danger sign means going to a health worker now. The rest is the desk's own rule.
 */
import { describe, expect, it } from 'vitest'
import { answerTo } from '@/lib/domain/answer'
import { bn } from '@/lib/domain/first-wordings/bn'
import { en } from '@/lib/domain/first-wordings/en'
import { es } from '@/lib/domain/first-wordings/es'
import { fr } from '@/lib/domain/first-wordings/fr'
import { harmOf } from '@/lib/domain/harm'
import { fellIllTogether } from '@/lib/domain/illness'
import { readReply } from '@/lib/domain/reply'
import { decide } from '@/lib/domain/ticket'
import type { Trouble } from '@/lib/domain/trouble'

const now = Date.parse('2026-03-04T12:00:00Z')
const day = 86_400_000

function raisedBy(text: string): Trouble[] {
  const acts = answerTo({
    reading: readReply({ text, language: 'en', asked: 'wash' }),
    asked: 'wash',
    waitingFor: 'wash-fibre',
    hasOpenTicket: false,
    handledByCarrier: false,
    mayMeanStop: false,
  })
  return acts.flatMap((act) => (act.kind === 'raise trouble' ? [act.trouble] : []))
}

function classOf(trouble: Trouble): number {
  return harmOf({
    trouble,
    house: { people: 4, infant: false, pregnant: false, elderly: false, ill: false },
    outOfService: false,
    noSafeWaterSince: null,
    need: null,
    litresPerHour: null,
    litresPerDay: 20,
    hours: null,
    openedAt: now,
    now,
    timeZone: 'Etc/UTC',
  }).harmClass
}

describe.each(['baby cant drink n sleepy', 'stool has blood'])('"%s"', (text) => {
  it('stands on top of the shift', () => {
    expect(raisedBy(text)).toEqual(['danger sign'])
    expect(classOf('danger sign')).toBe(1)
    const others: Trouble[] = ['unwell', 'unsafe', 'no flow', 'slow', 'unread', 'silent']
    for (const trouble of others) expect(classOf(trouble)).toBeGreaterThan(1)
  })

  it('is answered with going now, and with nothing else', () => {
    const decision = decide(null, { kind: 'opened', trouble: 'danger sign' }, now)
    expect(decision.ok && decision.effects).toEqual([{ kind: 'send', moment: 'unwell-now' }])
  })
})

// Cures that are not ours to give: salts and sugar, drugs, diets, names of diseases.
const medicine = {
  en: /salt|sugar|\bORS\b|solution|medicine\b|tablet|pill|dose|zinc|antibiotic|paracetamol|cholera|dysentery|typhoid|give (him|her|them)/i,
  es: /\bsal\b|azúcar|suero|medicina\b|pastilla|dosis|zinc|antibiótico|paracetamol|cólera|disentería|tifoidea/i,
  fr: /\bsel\b|sucre|\bSRO\b|médicament|comprimé|dose|zinc|antibiotique|paracétamol|choléra|dysenterie|typhoïde/i,
  bn: /লবণ|চিনি|স্যালাইন|ওষুধ|ঔষধ|বড়ি|জিঙ্ক|অ্যান্টিবায়োটিক|কলেরা|আমাশয়|টাইফয়েড/,
}

describe('the texts to the unwell', () => {
  it.each([
    ['English', en, /health worker/, / NOW\b/, medicine.en],
    ['Spanish', es, /centro de salud/, / YA\b/, medicine.es],
    ['French', fr, /agent de santé/, / MAINTENANT\b/, medicine.fr],
    ['Bengali', bn, /স্বাস্থ্যকর্মী/, /এখনই/, medicine.bn],
  ] as const)(
    'in %s lead to a health worker, and hold no diagnosis, drug or recipe',
    (_, wordings, worker, atOnce, cures) => {
      const bodyOf = (moment: string) => wordings.find((one) => one.moment === moment)?.body
      for (const moment of ['unwell', 'unwell-now']) {
        expect(bodyOf(moment)).toMatch(worker)
        expect(bodyOf(moment)).not.toMatch(cures)
      }
      expect(bodyOf('unwell-now')).toMatch(atOnce)
    },
  )
})

describe('two houses of one area', () => {
  it.each([
    [0, true],
    [6, true],
    [8, false],
  ])('ill %d days apart are told to the coordinator: %s', (days, isTold) => {
    expect(fellIllTogether([now - days * day], now)).toBe(isTold)
  })

  it('are two only if the other fell ill before', () => {
    expect(fellIllTogether([], now)).toBe(false)
    expect(fellIllTogether([now + 1], now)).toBe(false)
    expect(fellIllTogether([now - 30 * day, now - 7 * day], now)).toBe(true)
  })
})
