import { labelled, type LabelledReply } from './reply-set'

/** A sixth batch, by an author who had seen neither the reader nor the older sets. */
export const sixthBnReplies: LabelledReply[] = labelled('bn', [
  [
    'wash',
    'done',
    `hmm done | ছেলের অসুখ সেরে গেছে, ইস্কুলে যায়। ফিল্টার আজ ধুলাম | গরুটা অসুস্থ কিন্তু ফিল্টার ঠিকই ধুয়ে রাখছি |
      dhuye felsi bhai | filtar duisi pani balo ashe | ধোয়া হয়ে গেছে`,
  ],
  ['step', 'no', `না, একদম আস্ত আছে | একদমই না | sob dik dekhlam kothao fata nei | na to`],
  ['flow', 'not-yet', `mapa hoyni, liter er botol ta khuje pacchi na`],
  [
    'step',
    'slow',
    `pipe soja korlam, speed barlo na, agei jemon dhila temon | হাওয়া বের করে দিছি, একটু ভালো হইছে কিন্তু আগের মতন না |
      ঢাকনা ফাটা না, তবু ফোঁটা ফোঁটা পড়ছে`,
  ],
  [
    'wash',
    'not-yet',
    `একটু পরে | এখনো ধুই নাই, টিউবওয়েল নষ্ট | garments e night duty cholche, sukrobar chuti te korbo`,
  ],
  [
    'flow',
    'slow',
    `ghori dekhi nai kintu suta'r moto chikon dhara | এক ওয়াক্ত নামাজ পড়ে আইলাম, বোতল তখনো আধা | bhai eto slow je mapar dhoirjo nai`,
  ],
  ['none', 'thanks', `অনেক ধন্যবাদ, আল্লাহ আপনাদের হায়াত দিক | onek dhonnobad didi 🙏`],
  [
    'flow',
    'flow-figure',
    `shuru 6.05 shesh 6.19 => 14 | ৩.৫ মিঃ => 3.5 | adh ghonta => 30 | দেড় ঘণ্টা, ভাবা যায় => 90 |
      ponero minute, abba ghori dhore bollo => 15 | 75 sec => 1.25 | 3:15 => 3.25 | ৭ => 7 | ৪০ সেকেন্ড => 0.6667 |
      আড়াই মিনিট => 2.5 | ভাইয়ের মোবাইলে স্টপওয়াচ দিয়া দশ মিনিট => 10 | আগে ৪ লাগতো এখন ৯ => 9 | der minute => 1.5 |
      khub slow, kuri minit nilo => 20 | ek ghonta bujhlen!! => 60 | পৌনে দুই মিনিট => 1.75 | সাড়ে চার মিনিট লাগলো => 4.5`,
  ],
  [
    'none',
    'unwell',
    `amar chhoto meyer kal theke patla paykhana, pani r jonno naki | দাদি ঘুম থেকে উঠতেছে না, ডাকলে সাড়া দেয় না† |
      ননদের জন্ডিস, চোখ হলুদ | এই পানি খাওয়ার পর থেকে গা গুলায় আর মাথা ঘোরে সবার |
      ছেলেটা কিছুই গিলতে পারছে না, জলও না, গা পুড়ে যাচ্ছে† | bacchar khichuni hocche chokh ulte gese ki korbo taratari bolen† |
      ja khay shob bomi kore dey, saline o thake na†`,
  ],
  [
    'flow',
    'broken',
    `hothat kore 10 second e bhore jay, age 5 min lagto, filter kortese bole mone hoy na`,
  ],
  [
    'change',
    'need-part',
    `amader kache notun stage nai, pathaite parben? | মোমবাতি একেবারে ক্ষয়ে পাতলা, নতুন একটা দরকার`,
  ],
  [
    'change',
    'unwell',
    `didi shonibar bodlabo, ekhon meyetar shorir kharap or kache achi | পাল্টানো হয়েছে তবে বাড়ির সবার পেট খারাপ`,
  ],
  ['wash', 'ask', `bleaching powder dile hobe? | thanda jol na gorom jol | কিভাবে ধোব`],
  ['flow', 'stop', `আমি আর কোনো বার্তা পেতে চাই না, ধন্যবাদ`],
  ['step', 'yes', `hya thik tai | জি হ্যাঁ | হ`],
  [
    'none',
    'no-flow',
    `filter puro jam, pani ber hoy na | thamen apa age shunen, filter diye pani asa ekebare off`,
  ],
  [
    'wash',
    'broken',
    `done but ceramic e chuler moto ekta fatal dekhlam torch mere | ঘষতে গিয়া সাদা বাতিটার কোনা খইসা গেছে |
      পাইপের জোড়া দিয়ে জল চুঁইয়ে মেঝে ভেজা, ধোয়াটা অবশ্য হয়ে গেছে | chular pashe rakhsilam, plastic goila beka hoye gese`,
  ],
  [
    'step',
    'done',
    `মুখটা টাইট দিছি, চোঁয়ানো বন্ধ হয়ে গেছে, এখন সব ঠিক | ota korlam, ekhon darun cholche`,
  ],
  [
    'none',
    'odd-water',
    `গ্লাসে সবুজ শ্যাওলার মতো পিছলা লেগে থাকে | pani nonta lage keno | ভাত রাঁধলে লালচে হয়ে যায় ফিল্টারের জলে |
      jol e lohar moto swad | পচা ডিমের গন্ধ করে`,
  ],
  [
    'none',
    'slow',
    `পানি নামে কচ্ছপের গতিতে ভাই | ইফতারের আগে ছয়জনের পানি জমাইতে পারি না, এত দেরি করে নামে | jol khub dhire porche koyekdin dhore |
      আমাদের ফিল্টারটা বুড়ো হয়ে গেছে মনে হয়, জল পড়ে যেন অনিচ্ছায় |
      filter to chole but flow ekdom weak, meye school er bottle nite pare na`,
  ],
  ['step', 'not-yet', `পরীক্ষা শেষ হোক, তারপর দেখব এটা`],
  [
    'wash',
    'odd-water',
    `dhoya shesh kintu pani te sabaner gondho | ধুইলাম, কিন্তু পানি চায়ের রঙের মতো আসে`,
  ],
  [
    'step',
    'broken',
    `dhakna thik ache, kol diye pani chuiye pore | ha fata | হাতলটা ভেঙে আমার হাতে চলে এলো`,
  ],
  [
    'none',
    'broken',
    `দার্জিলিংয়ে কাল রাতে যা ঠান্ডা, ফিল্টারের ভিতর জল জমে বরফ | চৌকির উপর থেকে গড়ায়ে পড়ছে, গায়ে একটা দাগ উঠছে ফাটার মতো |
      indur e pipe kete diyeche | আজ সকাল থেকে হঠাৎ হুড়হুড় করে পানি পড়ে, আগে এমন ছিল না |
      নৌকায় আনার সময় ফিল্টারের একটা পা আর স্ক্রু কোথায় পড়ে গেছে, এখন কাত হয়ে চুঁয়ায়`,
  ],
  ['none', 'done', `filter ta ek din o bondho rakhi na, ekdom bhalo cholche`],
  [
    'none',
    'stop',
    `filter leak kore koruk, apnara ar likhben na, unsubscribe | amar number ta list theke kete din please | বন্ধ করুন এসব এসএমএস`,
  ],
  ['change', 'slow', `পাল্টেছি। টিপ টিপ করে পড়ে শুধু | notun ta lagaisi, age ta theke o slow`],
  [
    'flow',
    'unwell',
    `time dekhte parini, choto ta barbar toilet jacche | পাঁচ মিনিট। বাড়িওয়ালার গায়ে জ্বর, কাঁপতেছে`,
  ],
  ['wash', 'moved', `নদী ভাঙনে ভিটা গেছে, আমরা ঢাকায়, ফিল্টার আনি নাই`],
  [
    'wash',
    'slow',
    `brush mere mere hat betha, tobuo pani te jor nai | sorry dada late holo, biye barite chilam. filter dhuyechi, jol kom asche |
      ধুইছি তাও পানি আস্তে আস্তে পড়ে | keu oshustho na alhamdulillah, khali pani ta namte onek deri kore`,
  ],
  ['wash', 'no-flow', `ধুইয়া উল্টা বিপদ, অহন একদম পানি আহে না | ধোয়ার পর এক ফোঁটাও পড়ছে না`],
  ['flow', 'ask', `kon botol e mapbo, mojo'r 500ml ta?`],
  ['flow', 'no-flow', `মাপব কী করে, জলই তো পড়ে না | fojor theke bottle pete rakhsi, khali`],
  [
    'none',
    'ask',
    `কাল একবার এসে দেখিয়ে দিয়ে যাবেন? |
      মাননীয় মহাশয়, নমস্কার নেবেন। পূজার ছুটিতে তিন সপ্তাহ বাড়ি বন্ধ থাকবে, ফিল্টারটি কীভাবে রেখে যাব জানালে বাধিত হব। |
      আর্সেনিকও কি এই ফিল্টারে যায়?`,
  ],
  [
    'step',
    'odd-water',
    `fata nai. tobe filter kora panite kalo kalo gura bhashe | shobai bhalo ache, kintu bonnar por theke panite pocha matir gondho`,
  ],
  ['change', 'stop', `eto sms diye birokto koiren na to`],
  [
    'change',
    'broken',
    `courier theke je stage ta ashche otai bhanga, box khule dekhi duita tukra |
      purano ta khulte giye pech er ek tukra bhenge bhitore roye gese`,
  ],
  [
    'change',
    'done',
    `mongolbar rate bodliye diyechi | নতুনটা লাগানো হইছে, নাতি লাগায়ে দিছে, আল্লাহ আপনাদের ভালো করুক`,
  ],
  [
    'none',
    'need-part',
    `washer ta khoye geche kothay pabo | kol er chabi ta hariye felechi ekta pathan na please`,
  ],
  ['flow', 'odd-water', `চার মিনিট, আর বোতলে ছোট ছোট পোকা নড়ছে ছি`],
  ['step', 'no-flow', `কল খুললাম, কিছুই আসে না | fata o na leak o na, abar pani o nai`],
  [
    'step',
    'unwell',
    `না ভাঙে নাই। আব্বার পায়খানার সাথে রক্ত যাইতেছে† | ha dhila chilo tight korlam. jomoj duitar pet kamray khub`,
  ],
  [
    'wash',
    'unwell',
    `বাচ্চা বুকের দুধ টানে না সকাল থেকে, একদম নেতায়ে গেছে। ফিল্টার ধুই নাই† | আমার ডেঙ্গু ধরা পড়ছে, বিছানায়, কে ধুবে |
      hoye geche. shashuri typhoid e bhorti | reply dite parini, cheleke niye hospital e chilam, dehydration. kal dhobo`,
  ],
  ['wash', 'wrong-number', `ami Rahima apa na, bhul korchen`],
  ['wash', 'need-part', `পোলাপান সিরিঞ্জ হারাইয়া ফেলছে, আরেকটা দেন`],
  ['wash', 'thanks', `ok thanks mone koranor jonno`],
  ['flow', 'wrong-number', `রং নাম্বার ভাই`],
  ['change', 'wrong-number', `eta rickshaw garage er number, kare khujen`],
  ['step', 'unclear', `একটা হ্যাঁ, আরেকটা জানি না, ওকে জিজ্ঞেস করেন`],
  ['wash', 'choice', `২`],
  ['change', 'moved', `ওই বাড়িতে আমরা আর থাকি না`],
  ['none', 'wrong-number', `আপনি কে? আমার তো কোনো ফিল্টার নাই | এখানে শেফালি নামে কেউ থাকে না`],
  ['change', 'odd-water', `bodlanor por pani ghola, dudher moto shada`],
  ['none', 'start', `START`],
  [
    'change',
    'no-flow',
    `notun ta boshanor por theke upor er pani uporei thake, nicher balti shukna`,
  ],
  ['step', 'ask', `bujhlam na, valve mane kon ta`],
  ['none', 'moved', `bon ke diye diyechi filter ta`],
  ['change', 'unclear', `ota ar nei`],
  ['none', 'unclear', `oi Rony khela dekhbi na? 2-1 😂`],
  ['wash', 'stop', `number delete koro bhai eta office er phone | আর মেসেজ দিবেন না`],
  ['change', 'not-yet', `মনেই ছিল না গো, আজ সন্ধ্যায় বদলাব | kal korbo inshallah`],
  ['change', 'ask', `kon dik upore thakbe`],
  ['flow', 'moved', `beche disi, ekhon line er jol pai`],
  ['wash', 'unclear', `বন্ধ হয়ে গেছে`],
])
