import type { Moment } from '@/lib/domain/moments'

/*
 * First edition in Bengali: a draft for a native speaker to check. Bengali script leaves 67 units a
 * part, so these are shorter than the others. Digits are Latin, as on the keys of a phone.
 */

const stage =
  '{stage, select, 1 {কাপড় (1 খাঁজ)} 2 {কার্বন (2 খাঁজ)} 3 {লম্বা ধাপ (3 খাঁজ)} 12 {কাপড় (1 খাঁজ) ও কার্বন (2 খাঁজ)} 13 {কাপড় (1 খাঁজ) ও লম্বা ধাপ (3 খাঁজ)} 23 {কার্বন (2 খাঁজ) ও লম্বা ধাপ (3 খাঁজ)} 123 {তিনটি ধাপ} other {ধাপ}}'
const thenTime = 'তারপর 1 লিটার ভরতে কত মিনিট লাগে লিখুন।'

export const bn: readonly { moment: Moment; body: string }[] = [
  {
    moment: 'welcome',
    body: '{programme}: আপনার পানির ফিল্টারের যত্নের কথা জানাব। নিজের ভাষায় উত্তর দিন। মেসেজ না চাইলে STOP লিখুন।',
  },
  {
    moment: 'first-flush',
    body: 'নতুন ফিল্টারে প্রথমে 1 লিটার পানি চালিয়ে দিন। সেটি ফেলে দিন। পরের 1 লিটারে কত মিনিট লাগে লিখুন।',
  },
  {
    moment: 'wash-due',
    body: '{house}: লম্বা ধাপ (3 খাঁজ) ধোয়ার সময়। পরিষ্কার পানি উল্টো ঠেলুন, দুই দিকে 10 বার। হলে লিখুন শেষ। ধীর হলে লিখুন ধীর।',
  },
  {
    moment: 'wash-nudge',
    body: '{house}: ফিল্টার ধোয়া বাকি। হলে লিখুন শেষ। সময় না পেলে লিখুন পরে। পানি ধীর হলে লিখুন ধীর।',
  },
  {
    moment: 'change-due',
    body: `{house}: ${stage} বদলানোর সময়। হলে লিখুন শেষ। নতুনটি না থাকলে লিখুন পার্টস লাগবে।`,
  },
  {
    moment: 'change-nudge',
    body: `{house}: ${stage} বদলানো বাকি। হলে লিখুন শেষ। নতুনটি না থাকলে লিখুন পার্টস লাগবে।`,
  },
  {
    moment: 'flow-check',
    body: '{house}: ফিল্টার কেমন চলে? 1 লিটার বোতল ভরুন। কত মিনিট লাগে শুধু সংখ্যা লিখুন।',
  },
  {
    moment: 'ask-flow',
    body: 'ধন্যবাদ। 1 লিটার ভরতে কত মিনিট লাগে? শুধু সংখ্যা লিখুন। কিছুই না এলে লিখুন পানি নাই।',
  },
  {
    moment: 'step-wash-fibre',
    body: `লম্বা ধাপ (3 খাঁজ) ধুয়ে নিন। পরিষ্কার পানি উল্টো ঠেলুন, দুই দিকে 10 বার। ${thenTime}`,
  },
  {
    moment: 'step-rinse-cloth',
    body: `উপরের ঢাকনার কাপড়টি পরিষ্কার পানিতে ধুয়ে নিন। আবার বসান। ${thenTime}`,
  },
  {
    moment: 'step-flush-carbon',
    body: `কার্বন (2 খাঁজ) খুলে 1 লিটার পানি চালিয়ে দিন। আবার বসান। ${thenTime}`,
  },
  {
    moment: 'step-bleed-air',
    body: `নলের বাতাস বের করুন। মাথা নিচে ধরে টোকা দিন। বুদবুদ থামলে থামুন। ${thenTime}`,
  },
  {
    moment: 'step-straighten-hose',
    body: `নলটি সোজা করুন। কিছুতে যেন চাপা না পড়ে। ${thenTime}`,
  },
  {
    moment: 'step-fill-container',
    body: `উপরের পাত্র পুরো ভরুন। পানি উঁচু হলে চাপ বাড়ে। ${thenTime}`,
  },
  {
    moment: 'step-refit-cap',
    body: `দুই মাথার ঢাকনা আবার লাগান। সোজা ও শক্ত হতে হবে। ${thenTime}`,
  },
  {
    moment: 'step-look-hose',
    body: 'পুরো নলটি দেখুন। বাঁকা বা চাপা হলে লিখুন 1। বুদবুদ থাকলে লিখুন 2। কোনোটি না হলে লিখুন 3।',
  },
  {
    moment: 'step-check-cracks',
    body: 'ফিল্টার ভালো করে দেখুন। ফাটা বা চুঁইয়ে পড়লে লিখুন 1। পড়ে গিয়ে বা জমে থাকলে লিখুন 2। কোনোটি না হলে লিখুন 3।',
  },
  {
    moment: 'got-it',
    body: 'ধন্যবাদ, আপনার কথা পেয়েছি। {programme} থেকে কেউ আপনাকে লিখবে।',
  },
  {
    moment: 'flowing',
    body: 'সুখবর: আপনার ফিল্টার আবার ভালো চলছে। যত্নের জন্য ধন্যবাদ। পরের ধোয়ার সময় জানাব।',
  },
  {
    moment: 'ask-again',
    body: 'ধন্যবাদ। একই বোতলে আর একবার মাপুন। 1 লিটার ভরতে কত মিনিট লাগে লিখুন।',
  },
  {
    moment: 'part-owed',
    body: `আপনার নতুন ${stage} লাগবে। {programme} এনে দেবে। এলে জানাব।`,
  },
  {
    moment: 'part-ready',
    body: `আপনার নতুন ${stage} এসেছে। {depot} থেকে নিয়ে আসুন। লাগানো হলে লিখুন শেষ।`,
  },
  {
    moment: 'visit-booked',
    body: '{programme} থেকে কেউ {visitOn} আপনার বাড়ি আসবে। অন্য দিন চাইলে লিখুন।',
  },
  {
    moment: 'stop-using',
    body: 'এখন ফিল্টারের পানি খাবেন না। ফিল্টারে দোষ থাকতে পারে। {programme} শিগগির লিখবে।',
  },
  {
    moment: 'drink-advice',
    body: 'খাওয়ার পানি জোরে {minutes} মিনিট ফোটান। ঢেকে ঠান্ডা করুন। গরম, শিশু দূরে রাখুন। তেল বা রাসায়নিক এতে যায় না। গন্ধ থাকলে অন্য পানি নিন।',
  },
  {
    moment: 'unwell',
    body: 'শুনে খারাপ লাগল। আজই স্বাস্থ্যকর্মীর কাছে যান। বাড়লে দেরি করবেন না। {programme} চিকিৎসার পরামর্শ দেয় না।',
  },
  {
    moment: 'unwell-now',
    body: 'এখনই স্বাস্থ্যকর্মীর কাছে যান। আমাদের উত্তরের অপেক্ষা করবেন না। {programme} চিকিৎসার পরামর্শ দেয় না।',
  },
  { moment: 'thanks', body: 'ধন্যবাদ। ফিল্টারের আবার যত্ন লাগলে জানাব।' },
  {
    moment: 'unclear',
    body: 'ধন্যবাদ। {programme} থেকে একজন আপনার কথা পড়বে। অন্যভাবেও লিখতে পারেন।',
  },
  {
    moment: 'stop-or-stopped',
    body: 'পানি কি বন্ধ হয়েছে? লিখুন পানি নাই। আর মেসেজ চান না? লিখুন STOP।',
  },
  {
    moment: 'stopped',
    body: '{programme}: আর মেসেজ পাঠাব না। আবার চাইলে START লিখুন।',
  },
  {
    moment: 'started',
    body: '{programme}: আবার মেসেজ পাঠাব। না চাইলে STOP লিখুন।',
  },
  {
    moment: 'help',
    body: '{programme} আপনার পানির ফিল্টার চালু রাখতে সাহায্য করে। সমস্যা নিজের ভাষায় লিখুন। মেসেজ না চাইলে STOP লিখুন।',
  },
  {
    moment: 'wrong-number',
    body: 'কষ্ট দেওয়ার জন্য দুঃখিত। এই নম্বরে আর লিখব না।',
  },
]
