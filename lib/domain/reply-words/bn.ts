import type { LanguagePack } from './concept'
import { bnBreach } from './bn-breach'
import { bnCare } from './bn-care'
import { bnContact } from './bn-contact'
import { bnEveryday } from './bn-everyday'
import { bnIll } from './bn-ill'
import { bnOdd } from './bn-odd'
import { bnPeople } from './bn-people'
import { bnTalk } from './bn-talk'
import { bnWant } from './bn-want'
import { bnWater } from './bn-water'

/** Bengali as people text it, in its own script and in Latin letters. */
export const bnPack: LanguagePack = {
  spelling: 'bengali',
  concepts: {
    ...bnWater,
    ...bnBreach,
    ...bnOdd,
    ...bnPeople,
    ...bnIll,
    ...bnCare,
    ...bnTalk,
    ...bnWant,
    ...bnContact,
  },
  numbers: `একত্রিশ 31, বত্রিশ 32, তেত্রিশ 33, চৌত্রিশ 34, ছত্রিশ 36, সাঁইত্রিশ 37, আটত্রিশ 38,
    ঊনচল্লিশ 39, একচল্লিশ 41, বিয়াল্লিশ 42, তেতাল্লিশ 43, চুয়াল্লিশ 44, ছেচল্লিশ 46,
    সাতচল্লিশ 47, আটচল্লিশ 48, ঊনপঞ্চাশ 49, একান্ন 51, বায়ান্ন 52, তিপ্পান্ন 53, চুয়ান্ন 54,
    ছাপ্পান্ন 56, সাতান্ন 57, আটান্ন 58, ঊনষাট 59, botrish 32, tetrish 33, choutrish 34,
    chotrish 36, aatrish 38, biyallish 42, chuallish 44, chechollish 46, atchollish 48, দুই 2,
    দু 2, তিন 3, চার 4, পাঁচ 5, পাচ 5, ছয় 6, সাত 7, আট 8, দশ 10, এগারো 11, এগার 11, বারো 12,
    তেরো 13, তের 13, চৌদ্দ 14, পনেরো 15, পনের 15, ষোল 16, ষোলো 16, সতেরো 17, সতের 17, আঠারো 18,
    আঠার 18, উনিশ 19, ঊনিশ 19, বিশ 20, কুড়ি 20, একুশ 21, বাইশ 22, তেইশ 23, চব্বিশ 24, পঁচিশ 25,
    পচিশ 25, ছাব্বিশ 26, সাতাশ 27, আঠাশ 28, আটাশ 28, ঊনত্রিশ 29, উনত্রিশ 29, ত্রিশ 30, তিরিশ 30,
    পঁয়ত্রিশ 35, পয়ত্রিশ 35, চল্লিশ 40, পঁয়তাল্লিশ 45, পয়তাল্লিশ 45, পঞ্চাশ 50, পঞ্চান্ন 55,
    ষাট 60, সত্তর 70, আশি 80, নব্বই 90, একশ 100, একশো 100, dui 2, tin 3, char 4, chaar 4, car 4,
    pach 5, panch 5, paanch 5, pas 5, choy 6, chhoy 6, soy 6, choi 6, sat 7, shat 7, saat 7, aat 8,
    dosh 10, dos 10, doş 10, egaro 11, egar 11, baro 12, tero 13, choddo 14, coddo 14, ponero 15,
    poner 15, ponro 15, sholo 16, solo 16, sotero 17, shotero 17, atharo 18, aţharo 18, unish 19,
    unis 19, bish 20, bis 20, kuri 20, ekush 21, baish 22, teish 23, chobbish 24, pochish 25,
    pocis 25, ponchish 25, chabbish 26, satash 27, athash 28, trish 30, tirish 30, tris 30,
    poytrish 35, chollish 40, collis 40, poytallish 45, ponchash 50, poncas 50, shaat 60,
    shottor 70, ashi 80, nobboi 90, eksho 100`,
  weakNumbers: `বার 12, এক 1, একটা 1, নয় 9, আধ 0.5, আধা 0.5, ek 1, ekta 1, noy 9, at 8, adh 0.5, adha 0.5,
    আড়াই 2.5, দেড় 1.5, arai 2.5, aray 2.5, der 1.5, half 0.5`,
  units: {
    minute:
      'মিনিট, মিনিটে, মিনিটের, মিনিটও, মিনিটেই, মিনিত, মিনিটি, মিঃ, মিন, মি, মিনট, minit, minute, minutes, miniter, minite, min, mins, mn, mint, minut, m, minitei, minuit',
    hour: 'ঘন্টা, ঘণ্টা, ঘন্টার, ঘণ্টার, ঘন্টায়, ঘণ্টায়, ঘনটা, ঘন্টাও, ঘন্টার মত, ghonta, ghontar, gonta, ghonto, ghontay, ghnta, hour, hours, hr, hrs, h, gontha, ghanta',
    second:
      'সেকেন্ড, সেকেন্ডে, সেকেন্ডের, সেকেণ্ড, সেঃ, second, sekend, seconds, sec, secs, sekender, s',
    other:
      'লিটার*, দিন*, সপ্তাহ*, মাস*, বছর*, বার, বারে, জন, জনের, বোতল*, বালতি*, গ্লাস*, সিরিঞ্জ*, ছেলে, মেয়ে, বাচ্চা*, তারিখ*, টাকা*, রাত, liter, litre, litar, din, dine, diner, soptaho, mas, mash, bochor, bar, jon, joner, botol, bottle, balti, glass, gelas, syringe, chele, meye, baccha, tarikh, taka, rat, rat e, jinish, মাত্র দিন, x, দিন ধরে, টার, tay, টায়, টার সময়',
  },
  spans: `আধা ঘন্টা 30, আধা ঘণ্টা 30, আধ ঘন্টা 30, আধ ঘণ্টা 30, আধাঘন্টা 30, আধঘন্টা 30, আধঘণ্টা 30,
    আধা ঘন্টার 30, অর্ধেক ঘন্টা 30, অর্ধ ঘন্টা 30, হাফ ঘন্টা 30, দেড় ঘন্টা 90, দেড় ঘণ্টা 90,
    আড়াই ঘন্টা 150, আড়াই ঘণ্টা 150, পৌনে এক ঘন্টা 45, পৌনে এক ঘণ্টা 45, এক ঘন্টা 60, এক ঘণ্টা 60,
    ঘন্টা খানেক 60, ঘন্টাখানেক 60, ঘণ্টাখানেক 60, পনেরো মিনিট 15, মিনিট পাঁচেক 5, মিনিট দশেক 10,
    মিনিট পনেরো 15, মিনিট বিশেক 20, এক মিনিট 1, adha ghonta 30, adh ghonta 30, ad ghonta 30,
    ada ghonta 30, adha gonta 30, half ghonta 30, half hour 30, adhaghonta 30, adhghonta 30,
    der ghonta 90, dher ghonta 90, arai ghonta 150, poune ek ghonta 45, ek ghonta 60,
    ghonta khanek 60, minit pachek 5, minit doshek 10, minit ponero 15, minit bishek 20,
    ek minit 1, ek min 1`,
  halves: `আর আধা 0.5, ar adha 0.5, and half 0.5`,
  shifts: `সাড়ে 0.5, সারে 0.5, পৌনে -0.25, সোয়া 0.25, sare 0.5, share 0.5, shaare 0.5, sharhe 0.5,
    poune -0.25, pone -0.25, soya 0.25, shoya 0.25, sowa 0.25`,
  light: ``,
  common: `${bnEveryday} কখনো কখনও kokhono laga লাগা upore dhali niche ঢালি উপরে একদম একেবারেই মোটেই
    ekdom ekebarei motei pray prai প্রায় lokta লোকটা এই এটা এটি এইটা ওই ওটা সেই সেটা আমি তুমি
    আপনি সে তিনি আমরা তারা আমার তোমার আপনার তার আমাদের আপনাদের তাদের ও আর এবং বা যে যা কে কি কী তো
    না হ্যাঁ হয় হলো হবে ছিল আছে আছি আছেন থাকে থাকি করে করি করেন করা করতে দিয়ে থেকে জন্য সাথে
    সঙ্গে মধ্যে উপর নিচে ভিতরে ভিতর বাইরে কাছে দিকে পর্যন্ত পর আগে পরে এখন তখন যখন আজ কাল গতকাল
    সকাল দুপুর বিকাল রাত দিন সপ্তাহ মাস বছর সময় টাকা দাম কাজ বাড়ি ঘর বাসা বাজার গ্রাম শহর রাস্তা
    স্কুল মসজিদ মন্দির দোকান ভাত মাছ ডাল চা দুধ লবণ চিনি তেল মানুষ লোক মেয়ে ছেলে ভাই বোন মা বাবা
    বন্ধু হাত পা মাথা চোখ মুখ কথা নাম বড় ছোট নতুন পুরান পুরানো প্রথম শেষ সব কিছু কেউ একটা একটি
    দুইটা অনেক খুব বেশি কম একটু আবার শুধু মাত্র হয়তো মনে গেছে গেল যাই যায় যাব আসি আসব এসে নিয়ে
    নিছি দেখি দেখে বলি বলে বলছি জানি জানে ভাবি চাই লাগে লাগবে পারি পারে পারব বৃষ্টি রোদ গরম ঠান্ডা
    হাওয়া আগুন আলো অন্ধকার ei eta eita oi ota sei seta ami tumi apni se tini amra tara amar tomar
    apnar tar amader apnader tader o ar r ebong ba je ja ke ki to na hoy holo hobe chilo silo ache
    achi achen ase asi asen thake thaki kore kori koren kora korte diye dia theke thaika jonno
    jonne sathe shathe songe moddhe upor vitore bhitor baire kase kache dike por age pore ekhon
    tokhon jokhon aj kal sokal dupur bikal rat din soptaho mash bochor somoy shomoy taka dam kaj
    bari ghor basa basha bajar gram shohor rasta school moshjid mondir dokan bhat mach dal cha
    dudh lobon chini manush lok meye chele vai bhai bon ma baba bondhu hat pa matha chokh mukh
    kotha nam boro choto soto notun puran prothom sob shob kichu kisu keu ekta ekti duita onek
    khub beshi kom ektu abar sudhu shudhu matro hoyto mone gese geche gelo jai jay jabo asbo ese
    eshe niye nisi dekhi dekhe boli bole bolchi bolsi jani jane vabi chai lage lagbe pari pare
    parbo bristi rod gorom thanda hawa agun alo ondhokar theika hoye hoite hote korle korlam korar
    dewar deoa dey dei dise disi ney nei kintu tai tahole jemon temon emon kemon erokom orokom
    ফুটাতে ফুটিয়ে ফুটানো ফোটানো ফুটায়ে futate futiye futano fotano khola khela chulae chular
    chulay chinno`,
}
