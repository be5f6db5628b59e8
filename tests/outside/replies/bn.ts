import { bnTroubleReplies } from './bn-trouble'
import { labelled, type LabelledReply } from './reply-set'

/** Bengali replies in both scripts, labelled by hand for the tests; every kind, with the hard ones. */
export const bnReplies: LabelledReply[] = [
  ...bnTroubleReplies,
  ...labelled('bn', [
    [
      'wash',
      'done',
      `
      হয়ে গেছে | হইছে | হয়েছে | শেষ | করেছি | করছি | করে ফেলেছি | ধুয়েছি | ধুইছি | ধুয়ে ফেলেছি | ধুয়ে দিয়েছি | ফিল্টার ধুয়েছি | ধোয়া শেষ | ধোয়া হয়ে গেছে | পরিষ্কার করেছি | পরিষ্কার করছি | হ্যাঁ করেছি | হ্যাঁ হয়ে গেছে | জি করেছি | ডান | কাল ধুয়েছি | আজ সকালে ধুইছি | করেছি ধন্যবাদ | ভাই ধুয়েছি |
      hoye gese | hoye geche | hoise | hoyeche | shesh | sesh | korechi | korsi | kore felechi | dhuyechi | dhuisi | dhuye felsi | dhuye disi | filter dhuyechi | dhoya sesh | dhoa hoye gese | porishkar korechi | porishkar korsi | wash korsi | clean korechi | ha korsi | ha hoye gese | ji korechi | done | Done vai | kal dhuyechi | korsi dhonnobad | dan`,
    ],
    [
      'change',
      'done',
      `বদলেছি | বদলাইছি | পাল্টেছি | নতুন লাগিয়েছি | লাগাইছি | bodlaisi | bodlechi | change korsi | change korechi | notun lagaisi | palte felechi`,
    ],
    [
      'step',
      'done',
      `এখন ভালো | ভালো হয়েছে | ঠিক হয়ে গেছে | এখন ভালো আসছে | এখন জোরে আসে | আর আস্তে না | আগে আস্তে ছিল এখন ভালো | ekhon valo | valo hoise | thik hoye gese | ekhon valo ase | ekhon jore ase | ar slow na | better`,
    ],
    [
      'wash',
      'not-yet',
      `
      এখনো না | এখনও না | এখনো করিনি | এখনো করি নাই | করিনি | করি নাই | ধুইনি | ধুই নাই | এখনো ধুইনি | কাল | কালকে | কাল করব | কালকে করবো | আগামীকাল | পরে | পরে করব | একটু পরে | রাতে করব | বিকালে | ভুলে গেছি | মনে নাই | মনে ছিল না | সময় নাই | সময় পাইনি | ব্যস্ত | ব্যস্ত আছি | বাড়িতে নাই | পারি নাই | পারিনি |
      শুক্রবার করব | সামনের সপ্তাহে | করব | এখন না | না এখনো করিনি | ধন্যবাদ এখনো করিনি |
      ekhono na | akhono na | ekhono korini | ekhono kori nai | korini | kori nai | dhui nai | dhuini | kal | kalke | kal korbo | kalke korbo | agamikal | pore | pore korbo | ektu pore | rate korbo | bikale | vule gesi | bhule gechi | mone nai | mone chilo na | somoy nai | shomoy paini | busy | besto achi | barite nai |
      pari nai | parini | shukrobar korbo | samner soptahe | korbo | ekhon na | na ekhono kori nai | wash kori nai | tomorrow | 10 minit pore`,
    ],
    [
      'change',
      'not-yet',
      `এখনো বদলাইনি | বদলাই নাই | কাল বদলাব | change kori nai | bodlai nai | kal bodlabo`,
    ],
    [
      'none',
      'need-part',
      `
      নতুন ক্যাপ লাগবে | একটা ক্যাপ লাগবে | সিরিঞ্জ লাগবে | একটা সিরিঞ্জ দরকার | নতুন ফিল্টার লাগবে | পাইপ দরকার | সিরিঞ্জ হারিয়ে গেছে | সিরিঞ্জ হারায়া গেছে | সিরিঞ্জ নাই | সিরিঞ্জ খুঁজে পাচ্ছি না | আমাদের সিরিঞ্জ নাই | একটা নতুন কার্টিজ দেন | কার্টিজ কোথায় পাব? | পাইপ চুরি হয়ে গেছে | ঢাকনা হারিয়ে গেছে |
      notun cap lagbe | ekta cap lagbe | syringe lagbe | ekta syringe dorkar | notun filter lagbe | pipe dorkar | syringe hariye gese | sirinj haray gese | syringe nai | syringe khuje pacchi na | amader syringe nai | ekta notun cartridge den | cartridge kothay pabo? | pipe churi hoye gese | need syringe`,
    ],
    [
      'none',
      'ask',
      `
      কিভাবে ধুব? | কিভাবে ধোব | কীভাবে পরিষ্কার করব? | কতবার সিরিঞ্জ দিব? | কখন বদলাব? | কবে আসবেন? | আপনারা কখন আসবেন? | পানি কি খাওয়া যাবে? | খাওয়া যাবে কি? | কি করব? | কি করবো এখন | বুঝি নাই | বুঝলাম না | বুঝতে পারছি না | মানে কি? | কেন? | গরম পানি দিয়ে ধুব? | পানি কি ফুটাতে হবে? | কতক্ষণ অপেক্ষা করব? | একটা প্রশ্ন | সাবান দেওয়া যাবে? |
      দাম কত? | এটা কি স্বাভাবিক? |
      kivabe dhubo? | kivabe porishkar korbo? | kotobar syringe dibo? | kokhon bodlabo? | kobe asben? | apnara kokhon asben? | pani ki khaoa jabe? | khaoa jabe ki? | ki korbo? | ki korbo ekhon | bujhi nai | bujhlam na | bujhte parchi na | mane ki? | keno? | gorom pani diye dhubo? | kotokhon opekkha korbo? | ekta proshno | saban dite parbo? | dam koto? | how to wash?`,
    ],
    [
      'none',
      'thanks',
      `ধন্যবাদ | অনেক ধন্যবাদ | ধন্যবাদ ভাই | শুকরিয়া | থ্যাংকস | আল্লাহ আপনাদের ভালো করুক | দোয়া করি | dhonnobad | onek dhonnobad | dhonnobad vai | shukria | thanks | thank you apa | thnx | donnobad | 🙏 | dua kori`,
    ],
    [
      'step',
      'yes',
      `হ্যাঁ | হ্যা | হা | জি | জ্বি | হুম | আচ্ছা | ঠিক আছে | ওকে | অবশ্যই | ha | hae | ji | hum | accha | thik ache | thik ase | ok | okay | yes | 👍 | ji vai | hmm`,
    ],
    [
      'step',
      'no',
      `না | না না | জি না | নাহ | na | na na | ji na | nah | no | ফাটা না | ফাটে নাই | ভাঙে নাই | লিক নাই | লিক করে না | কেউ অসুস্থ না | fata na | fate nai | leak nai | leak kore na | keu osustho na | gondho nai`,
    ],
    [
      'step',
      'choice',
      `১ => 1 | ২ => 2 | ৩ => 3 | 1 => 1 | 2 => 2 | 3 => 3 | এক => 1 | দুই => 2 | ek => 1 | dui => 2 | tin => 3 | ২। => 2`,
    ],
    [
      'none',
      'stop',
      `
      STOP | stop | স্টপ | থামুন | থামেন | বন্ধ করুন | বন্ধ করেন | বন্ধ করে দেন | মেসেজ বন্ধ করুন | মেসেজ পাঠানো বন্ধ করেন | মেসেজ দেওয়া বন্ধ করুন | মেসেজ পাঠাবেন না | আর মেসেজ পাঠাবেন না | মেসেজ দিবেন না | আর মেসেজ দিয়েন না | মেসেজ চাই না | আর মেসেজ চাই না | মেসেজ লাগবে না | বিরক্ত করবেন না | বিরক্ত কইরেন না |
      আমার নাম্বার কেটে দিন | নাম্বার ডিলিট করেন | আমার নাম বাদ দিন | আমাকে বাদ দেন | আর না | আর লিখবেন না | ফোন করবেন না | বাতিল করুন | এসএমএস বন্ধ করুন | দয়া করে বন্ধ করুন | আমি আগ্রহী না |
      thamun | thamen | bondho korun | bondho koren | bondho kore den | msg bondho koren | message pathano bondho koren | message pathaben na | ar message pathaben na | msg diben na | ar msg dien na | msg chai na | ar message chai na | msg lagbe na | birokto korben na | birokto koiren na | amar number kete den | number delete koren |
      amar nam bad den | amake bad den | ar na | ar likhben na | phone korben na | sms bondho koren | please stop | stop koren | unsubscribe | msg off koren | ar msg na | dont text me`,
    ],
    [
      'none',
      'wrong-number',
      `
      ভুল নাম্বার | ভুল নম্বর | রং নাম্বার | এটা ভুল নাম্বার | নাম্বার ভুল | আপনি ভুল নাম্বারে মেসেজ দিছেন | আমি রহিম না | আমি সালমা নই | আমি সেই লোক না | এটা তার নাম্বার না | চিনি না | আমি চিনি না | এই নামে কেউ নাই | অন্য কারো নাম্বার | কিসের ফিল্টার? ভুল নাম্বার | আমার কোনো ফিল্টার নাই, ভুল করছেন | এখানে থাকে না |
      vul number | bhul number | vul nambar | rong number | wrong number | eta vul number | number vul | apni vul numbare msg disen | ami rahim na | ami salma noi | ami sei lok na | eta tar number na | chini na | ei name keu nai | onno karo number | kiser filter? vul number | ekhane thake na | notun sim kinsi`,
    ],
    [
      'none',
      'moved',
      `বাসা বদলাইছি | আমরা বাসা বদলেছি | আমরা চলে গেছি অন্য গ্রামে | নতুন বাসায় উঠছি | ঠিকানা বদলেছে | এখানে আর থাকি না | basa bodlaisi | amra basa bodlechi | onno grame chole gesi | notun basay uthsi | shift korsi | ekhane ar thaki na`,
    ],
    [
      'none',
      'help',
      `সাহায্য | সাহায্য করুন | হেল্প | সাহায্য লাগবে | help | shahajjo lagbe | help lagbe | HELP`,
    ],
    ['none', 'start', `start | শুরু | আবার শুরু করুন | abar shuru koren`],
    [
      'wash',
      'unclear',
      `থেমে গেছে | বন্ধ | কাজ করে না | bondho | theme gese | kaj kore na | হ্যালো | আসসালামু আলাইকুম | hello | asdf | ? | আপনি কে? | apni ke | গরু মাঠে | কেমন আছেন`,
    ],
  ] as const),
]
