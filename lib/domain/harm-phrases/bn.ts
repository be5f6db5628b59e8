import { bn } from 'date-fns/locale/bn'
import type { HarmPhrases } from './phrases'

const bengaliZero = 0x09e6

/** A draft for a native speaker to check. */
export const bnHarmPhrases: HarmPhrases = {
  locale: bn,
  digits: (text) =>
    text.replace(/\d/g, (digit) => String.fromCharCode(bengaliZero + Number(digit))),
  people: (count) => `${count} জন`,
  infant: 'একটি শিশু',
  pregnant: 'একজন গর্ভবতী',
  elderly: 'একজন বয়স্ক',
  ill: 'একজন অসুস্থ',
  yesterday: (clock) => `গতকাল ${clock}`,
  hours: (whole, minutes) => `${whole} ঘণ্টা ${minutes}`,
  dangerSign: (house) => `বিপদের লক্ষণ; ${house}।`,
  toldToGo: 'এখনই স্বাস্থ্যকর্মীর কাছে যেতে বলা হয়েছে।',
  notToldToGo: 'স্বাস্থ্যকর্মীর কাছে যেতে এখনও বলা হয়নি।',
  unwell: (house, since) => `কেউ অসুস্থ, ${since} থেকে; ${house}।`,
  nothingSafe: (house, since) => `${house}; নিরাপদ পানি নেই, ${since} থেকে।`,
  unsafe: (house, since) => `${house}; অনিরাপদ ফিল্টার এখনও চলছে, ${since} থেকে।`,
  noWater: (house, since) => `${house}; একদম পানি নেই, ${since} থেকে।`,
  untimed: (people, litresPerDay) =>
    `${people}; ধীরে পড়ে, কেউ এক লিটার মেপে দেখেনি; দিনে ${litresPerDay} লি লাগে।`,
  flow: ({ people, flow, litresPerDay, time, enough }) => {
    const litres = `২০ °সে-তে ঘণ্টায় ${flow} লি, দিনে ${litresPerDay} লি লাগে`
    if (time === null) return `${people}; ${litres}: এক দিনে হয় না।`
    return `${people}; ${enough ? 'ধীর কিন্তু যথেষ্ট: ' : ''}${litres}: ${time}।`
  },
  unread: (people, since) => `${people}; কেউ পড়েনি এমন কথা, ${since} থেকে।`,
  silent: (people, since) => `${people}; উত্তর নেই, ${since} থেকে।`,
}
