import { labelled } from './reply-set'
/** A fourth Bengali batch, written after the third was mended. */
export const fourthBnReplies = labelled('bn', [
  [
    'wash',
    'slow',
    `ধারা কমে গেছে | পানি টিপ টিপ করে | ঘন্টায় এক কাপও হয় না | আজ খুব স্লো | আস্তে হয়ে যাচ্ছে | আবার আস্তে | চিকন ধারা | যথেষ্ট পানি আসে না | শুধু ফোঁটা ফোঁটা | pani tip tip kore | aj khub slow | abar aste | chikon dhara | sudhu fota fota`,
  ],
  [
    'wash',
    'no-flow',
    `কিছু আসে না | পানি নামতেছে না | এক ফোটাও না | থেমে গেছে পানি নাই | মনে হয় আটকে গেছে | kisu ase na | pani namtese na | ek fotao na | mone hoy atke gese`,
  ],
  [
    'flow',
    'flow-figure',
    `১২ মিনিট প্রায় => 12 | আঠারো মিনিট => 18 | ৩ মিনিট => 3 | বত্রিশ মিনিট => 32 | ৬:১৫ => 6.25 | ১১ বা ১২ => 11.5 | ১০০ সেকেন্ড => 1.6667 | ৪৫ => 45 | atharo minit => 18 | 3 minit => 3 | 11 ba 12 => 11.5 | 9 hobe => 9`,
  ],
  [
    'step',
    'broken',
    `হ্যাঁ ফাটল আছে | পাশে ফাটা | হ্যাঁ লিক করে | ছিদ্র আছে | গত সপ্তাহে পড়ে গেছিল | হ্যাঁ বরফ হয়ে গেছিল | পাইপ ফাটা | ha fatol ase | pashe fata | ha leak kore | chidro ase | goto soptahe pore gesilo`,
  ],
  [
    'step',
    'no',
    `ফাটল নাই | পড়ে যায় নাই | কিছু ভাঙে নাই | ফুটা নাই | fatol nai | futa nai | kisu vange nai`,
  ],
  [
    'wash',
    'broken',
    `ঢাকনা খুলে ভেঙে গেছে | ফিল্টার ভেঙে চুরমার | সব দিক দিয়ে পানি বের হয় | বালতি কলের কাছে লিক | ইঁদুরে পাইপ কাটছে | বাচ্চা ছুড়ে ফেলছে | filter venge gese | sob dik diye pani ber hoy | balti leak`,
  ],
  [
    'change',
    'odd-water',
    `ধূসর পানি | মাটির স্বাদ | বাজে গন্ধ | কালির মতো কালো | তেলের গন্ধ | কেরোসিনের স্বাদ | গ্লাসে পোকা | পচা গন্ধ | ফেনা ফেনা | matir shad | baje gondho | kalir moto kalo | glass e poka | poca gondho`,
  ],
  [
    'none',
    'unwell',
    `বাচ্চার পেট ব্যথা | বাসায় ডায়রিয়া | আম্মা বমি করতেছে | বাচ্চার গায়ে জ্বর | পানি খেয়ে অসুখ হইছে | আমার পেট খুব ব্যথা | রবিবার থেকে পেট খারাপ | হাসপাতালে ভর্তি | ছেলেটা ভালো না, অসুস্থ | baccar pet betha | basay diarrhea | amma bomi kortese | baccar gaye jor | pani kheye osukh hoise | haspatale vorti`,
  ],
  [
    'none',
    'unwell',
    `অজ্ঞান হয়ে আছে† | বাচ্চা পানি খায় না† | সব বমি করে দিচ্ছে† | পায়খানায় রক্ত যায়† | খিঁচুনি উঠছে† | oggan hoye ase† | bacca pani khay na† | khichuni uthse†`,
  ],
  [
    'none',
    'stop',
    `মেসেজ বন্ধ করো | পাঠাবেন না | আমি বের হতে চাই এই লিস্ট থেকে | মেসেজ না প্লিজ | স্টপ!!! | বাতিল | যথেষ্ট হয়েছে বন্ধ করেন | msg bondho koro | pathaben na | msg na please | batil`,
  ],
  [
    'none',
    'wrong-number',
    `রং নাম্বার ভাই | আমি ফাতিমা না | এটা জামালের ফোন, তার না | ভুল মানুষ | কে? ভুল নাম্বার | rong number vai | ami fatima na | vul manush`,
  ],
  [
    'wash',
    'done',
    `ধুইলাম | সকালে ধুয়েছি | হইছে, ভালো পড়ে | ওকে করছি | হ্যাঁ ধুইছি | এখন শেষ | dhuilam | sokale dhuyechi | ok korsi | ekhon sesh`,
  ],
  [
    'wash',
    'not-yet',
    `এখন না | পরে ধুব | সন্ধ্যায় | কাল সকালে | সময় হয় নাই | সরি ব্যস্ত | ধুই নাই | ekhon na | pore dhubo | sondhay | kal sokale | somoy hoy nai`,
  ],
  [
    'none',
    'need-part',
    `ক্যাপ হারায় গেছে | ফিল্টার লাগবে | সিরিঞ্জ পাঠান | পাইপ নাই | cap haray gese | filter lagbe | syringe pathan`,
  ],
  [
    'none',
    'ask',
    `কিভাবে? | কখন বদলাব? | মানে কি? | খাওয়া যাবে? | kivabe? | kokhon bodlabo? | khawa jabe?`,
  ],
  [
    'none',
    'thanks',
    `ধন্যবাদ স্যার | আল্লাহ ভালো করুক | অনেক অনেক ধন্যবাদ | dhonnobad sir | onek onek dhonnobad`,
  ],
  ['none', 'moved', `বাসা চেঞ্জ করছি | এখন শহরে থাকি, নতুন ঠিকানা | basa change korsi`],
  ['step', 'yes', `জি হ্যাঁ | ঠিক | ji ha | hae vai`],
])
