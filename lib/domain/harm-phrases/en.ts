import { enGB } from 'date-fns/locale/en-GB'
import type { HarmPhrases } from './phrases'

export const enHarmPhrases: HarmPhrases = {
  locale: enGB,
  digits: (text) => text,
  people: (count) => (count === 1 ? '1 person' : `${count} people`),
  infant: 'an infant',
  pregnant: 'a pregnancy',
  elderly: 'an old person',
  ill: 'an ill person',
  yesterday: (clock) => `yesterday ${clock}`,
  hours: (whole, minutes) => `${whole} h ${minutes}`,
  dangerSign: (house) => `A danger sign; ${house}.`,
  toldToGo: 'Told to go to the health worker now.',
  notToldToGo: 'Not yet told to go to the health worker.',
  unwell: (house, since) => `Someone is unwell since ${since}; ${house}.`,
  nothingSafe: (house, since) => `${house}; nothing safe since ${since}.`,
  unsafe: (house, since) => `${house}; unsafe filter still in use since ${since}.`,
  noWater: (house, since) => `${house}; no water at all since ${since}.`,
  untimed: (people, litresPerDay) =>
    `${people}; slow, nobody has timed a litre yet; needs ${litresPerDay} L a day.`,
  flow: ({ people, flow, litresPerDay, time, enough }) => {
    const litres = `${flow} L an hour at 20 °C, needs ${litresPerDay} L a day`
    if (time === null) return `${people}; ${litres}: not in a day.`
    return `${people}; ${enough ? 'slow but enough: ' : ''}${litres}: ${time}.`
  },
  unread: (people, since) => `${people}; words nobody has read since ${since}.`,
  silent: (people, since) => `${people}; no answer since ${since}.`,
}
