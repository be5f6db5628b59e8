import { labelled, type LabelledReply } from './reply-set'

/** A seventh batch, written in five parts while the reader was widened: each was read before it was learnt from. */
export const seventhBnReplies: LabelledReply[] = labelled('bn', [
  [
    'wash',
    'unwell',
    `korbo, kintu bon ta sokaler nasta bomi kore felse | ekhon parbo na, mar jor onek, ma ke dekhtesi | deri hoilo sorry, dengue hoye bichanay chilam | filter dhuisi. ar dada kal rat theke kaptese`,
  ],
  [
    'none',
    'unwell',
    `ওই পানি খাওয়ার পর থেকে পেট গুড়গুড় করে | বাবুর মুখে ঘা আর পাতলা হাগু | amra tin jon sara rat bathroome | oggan hoye pore ase, mukh diye fena† | বাচ্চা সারাদিন দুধ মুখে নেয় নাই, মুখ ফিরায়† |
      bari shuddho sobai bichanay | amr meyer bomi ar diaria kalke theke | বাবু খায়না গা অনেক গরম | or jor ar mathabetha | ১০ বার পাতলা পায়খানা হইসে আজকে | sobar pete mochor dey | পোলার পেট ছুটছে |
      se oggan hoye gese help koren† | পায়খানার লগে রক্ত যায়† | ammu sokale oggan hoye pore gese† | choto cheleta kal rat theke khali bathroome jay | আমার আর আমার বউয়ের পেটের অবস্থা খারাপ |
      যারা এই পানি খাইছে সবাই দাস্ত করতেছে | meyeta ja khay tai ber kore dey† | জমজ দুইটারে স্যালাইন দিছে | ভাগ্নে পইড়া আছে, চোখ মেলে না† | dadar paykhanay rokto jay† | গোসল করার পর থেকে সারা গায়ে চুলকানি |
      jaldi ashen amar cheler khichuni hocche† | নানি কাল থেকে পেটে কিছুই রাখতে পারতেছে না† | amra sobai barbar bathroom e jacchi | আমার স্বামীকে পেটের জন্য ডাক্তারের কাছে নিতে হইছে | baccar potty te rokto† |
      ছোটটার পেট ছাড়ছে | বাচ্চা এত দুর্বল দুধ টানতে পারে না† | pani khawar por bacchara bomi kore | gaye onek jor, kaptese | matha ghurtese ar pet gulaitese | ঠিকমতো জাগতেছে না মেয়েটা† |
      choto baccata khay na, pet dhore kande | ফিল্টার নেওয়ার পর থেকে বাচ্চাদের বারবার পাতলা পায়খানা, এর জন্য নাকি? | বউ টাইফয়েড নিয়ে মেডিকেলে ভর্তি | chokh gorte dhuke gese, shorir chhere dise† |
      সারা শরীর কাঁপলো আর চোখ উল্টায়া গেল† | ki jani khaisi, saradin toilet e`,
  ],
  ['change', 'unwell', `লাগাইছি। দাদির গা গুলায় এইটা কি স্বাভাবিক`],
  [
    'flow',
    'unwell',
    `jani na, chele ke niye hospital e asi | 9 minute, kintu baccar patla paykhana | ১২ মিনিট। আর মেয়েটার সোমবার থেকে পেট খারাপ | 8 minute, kintu baccar gaye jor`,
  ],
  [
    'step',
    'unwell',
    `কল ঠিক। পোলাডা ঠিক নাই, গা পুইড়া যায় | না ফাটা নাই, কিন্তু বউ হাসপাতালে | ঢাকনা ঠিক আছে, আমরা ঠিক নাই, সবার পেট মোচড়ায়`,
  ],
  [
    'none',
    'broken',
    `fot kore shobdo holo ekhon pani chitke ashe | কিনার থেকে এক টুকরা উইঠা গেছে | kukur chana pipe ta dhorse kamrai | প্যাঁচ কাইটা গেছে নড়ে | filter siri diye goraiya porse | gorom pani dhalte giye fete gelo |
      হঠাৎ একদিনে পানি ডাবল আসে, আজব | এত ঠান্ডা ছিল যে জইমা বরফ | filtar ta poira vainga gese | nicher theke pani chuya pore | কলডা নষ্ট হইয়া গেছে পানি পইড়াই থাকে | balti fata | indure pipe kaitta felse |
      chele achar mairা vangse | চাইরপাশ দিয়া পানি পড়ে | biral table theke fele dise, ekhon nor bor kore | গায়ে লম্বা একটা ফাটা দাগ, ভিজা ভিজা | vai van er chaka diye pipe chapa dise |
      chulae kache rakhsilam, norom hoye beke gese | সকালে দেখি ভিতরে বরফ | kol ta hate khule chole ashche | রোজ সকালে নিচে পানি জমে থাকে | কে যেন পাড়া দিছে ফিল্টারে | রাবার আর আটকায় না, কিনারা দিয়া পানি বাইর হয় |
      ছাগলে পাইপ চাবায়া ফেলছে | পানি হুড়মুড় কইরা নামে যেন ভিতরে কিছুই নাই | raate baire chilo, jome borof hoye gese | পাইপটা ছিইড়া গেছে | chele ra filter niye football khelse | তলা দিয়া সারাদিন পানি চুয়ায়, টেবিল ভিজা |
      হাতল ভাইঙ্গা কুয়ায় পইড়া গেছে | রাতে গাড়িতে ছিল, ঠান্ডায় জমে শক্ত | emon vabe pore jeno vitore kichu nai, age fota fota porto`,
  ],
  [
    'wash',
    'broken',
    `হইছে কিন্তু এখন নিচ দিয়া ফোঁটা পড়ে | পাইপ যেখানে ঢোকে সেইখান দিয়া পানি বাইর হয় | dhuite giye hat theke pore sink e bari khaise | dhoyar somoy vitorer jinish ta ber hoye gese, ar dhuke na`,
  ],
  [
    'step',
    'broken',
    `ha ase, makorshar jaler moto pashe | হ সাইডে একটু ফাডা | ঢাকনা টাইট দিতে গিয়া কড়াৎ কইরা শব্দ হইছে | ha niche ekta chikon fata ase | dekhlam jorar kache chikon fatol`,
  ],
  [
    'none',
    'odd-water',
    `panite tulor moto ki jani | পানি পিচ্ছিল লাগে | khaile date bali lage | পেট্রোলের গন্ধ | bacchara bole poisha poisha lage | bengachi!! | panir rong khoyeri | পানিত গন্দ করে | vitre poka dekhlm | পানির কালার সোডার মতন |
      pani tita lage eikoydin | glass e badami dag pore | cup er moddhe ki jani nore | নালার মতো গন্ধ | mone hoy lohar poisha chatchi emon lage | ছোট ছোট সাদা সুতা ভাসে জগে | পানিটা হলদেটে হয়ে গেছে |
      panir sathe choto choto kalo kona ashe | ট্যাংকে সবুজ কি জানি হইছে পানিও সবুজ | shad onno rokom, lohar moto | পচা ডিমের মতো গন্ধ | গ্লাসে একটা ছোট পোকা দেখছি | dudher moto dekhay | পানির উপর তেলের মতো আস্তর |
      glass er tolay bali jome | মাটির স্বাদ`,
  ],
  [
    'wash',
    'odd-water',
    `আজ সকালে ধুইছি, বাদামি পানি বের হইছে | ধুইলাম কিন্তু পানি এখন পাতলা চায়ের মতো | dhuilam kintu pani theke ekhono gondho ashe | kal dhuisi, aj pani shobuj shobuj`,
  ],
  [
    'none',
    'stop',
    `আমি আর নাই এর মধ্যে, আর না | amar phone ta bad diye den please | আপনাদের মেসেজে বাচ্চা জাইগা যায়, আর দিয়েন না | amar phone ta ke shanti te thakte den | ক্যানসেল করতে চাই | ar msg diyen na to | মেসেজ দেওন বন্ধ করেন |
      amr nmbr ta kaita den | doya kore ei number ta vule jan | আপনাদের মেসেজের ঠেলায় অতিষ্ঠ | apnader reminder ar lagbe na | আমাকে লিস্ট থেকে কেটে দেন | protidin khali msg ar msg, ebar charen |
      doya kore eisob pathano bondho koren | আমি আর এইটার মধ্যে থাকতে চাই না | keno bar bar msg den?? bondho koren | আপনাদের লিস্ট থেকে আমাকে বাদ দেন | doya kore amar number ta system theke shoraye den | অনেক হইছে আর না |
      ami to ei msg nite raji hoi nai | আমরা আর আগ্রহী না ধন্যবাদ | MSG PATHANO BONDHO KOREN`,
  ],
  [
    'none',
    'wrong-number',
    `ei program er nam o shuni nai | আমার নাম কাশেম জুতা বেচি, আপনার ভুল হইতেছে | ei phone age Maryr chilo ekhon amar | আমাদের লাইনের পানি, আমরা না | vul nmbr | ভুল মাইনষেরে দিছেন | amar to kono filter nai apne kedা |
      এটা ইমাম সাহেবের নাম্বার, কাকে চান | apni mone hoy ager malik ke khujtesen | আমাদের এইসব কিছু নাই, খাতা দেখেন | mone hoy vul lok ke pathaisen | মাফ করবেন আপনি যাকে খুঁজছেন আমি সে না | ei number ekhon onno joner |
      আমিনা কে? ভুল নাম্বার | apnar vul hocche, ami Beauty, Salma na | এটা রহমান পরিবারের নাম্বার না | goto mase sim kinsi, malik ke chini na | ফিল্টার? কিসের ফিল্টার`,
  ],
  [
    'wash',
    'done',
    `dhuisi sob, kono leak nai keu osustho na | dhuya disi | সকালে হইয়া গেছে ধন্নবাদ | ok korsi | meye sokale sob mejhe ghoshe dhuye rekheche, jhokjhok korche | ধুয়ে একদম ঝকঝকে করে ফেলছি | কোমর ব্যথা তাও ধুইছি |
      goto soptahe or jor chilo ekhon khelche, filter aj sokale dhuisi | ha mongolbar dhowa hoise | সব শেষ, মনে করাইয়া দেওয়ার জন্য ধন্যবাদ | ধোয়া শেষ, এখন অনেক তাড়াতাড়ি আসে ধন্যবাদ |
      apnar kotha moto aj sokale porishkar korsi`,
  ],
  [
    'step',
    'no',
    `ফাটা নাই, লিক নাই, সব শুকনা | নাগো | kono fata dekhi na | না সব টাইট আছে | lik o na, fata o na, kichu na | na, kichu vange nai | আমার চোখে তো পড়ে না | নাহ | na fata nai | শুকনা, কোনো লিক নাই`,
  ],
  [
    'none',
    'done',
    `dhonnobad chele sustho ekhon ar filter valo chole | filter o valo amrao valo | kono somossa nai, darun cholche, keu osustho na | সব ভালো, অনেক পানি আসে | hello filter valo chole ta janailam`,
  ],
  [
    'wash',
    'slow',
    `সব ধুইছি কিন্তু ধৈর্য লাগে | hoise kintu ekhno aste | ধুইছি কিন্তু এহনো খুব আস্তে পড়ে | bolar moto dhuilam kintu ekta jog vorte natok shesh hoye jay | ধুইছি ঠিকই কিন্তু মরা মরা ভাবে পানি পড়ে |
      duibar dhuilam, kono lav nai | 3 bar dhuisi, kono unnoti nai | ha dhuisi kintu dhara kom | ভালো করে ধুইছি তাও ঢিমা | ধোয়ার পরে তেমন পার্থক্য নাই | ধুইছি কিন্তু মনে হয় এখনো জ্যাম, খালি ফোঁটা পড়ে`,
  ],
  [
    'none',
    'slow',
    `jog vorte puro sokal | fota fota pore khali | পানি অনেক কইমা গেছে | onk time lagtase | shit porar por theke filterer jor chole gese | আট জনের সংসার, এই পানিতে হয় না | ek cup panir jonno boshe boshe cha thanda |
      ইদানীং সারাদিন লাগে | age 10 minit lagto ekhon pray ek ghonta | শুধু চিকন একটা ধারা | din din aro aste hocche`,
  ],
  [
    'none',
    'no-flow',
    `pani ekdmi ase na | kissu ber hoyna | কলটা মরুভূমির মতো শুকনা | uporer balti vora, nicher ta khali | রবিবার থেকে এক ফোঁটা পানিও নাই | ekebare shukay gese | কাল বিকাল থেকে এক ফোঁটাও না`,
  ],
  [
    'wash',
    'no-flow',
    `পানি এক্কেরেই বাইর হয়না | ধোয়ার পর থেকে আর কিছুই নামতেছে না | dhuilam ekhon kichui ber hoy na | dhuilam kintu pani jaite chay na`,
  ],
  [
    'flow',
    'flow-figure',
    `15 mint er mto => 15 | ১০ মিঃ => 10 | pochis minit => 25 | ২ ঘন্টা => 120 | 7min30 => 7.5 | 7.15 theke 7.32 => 17 | সাড়ে এগারো মিনিট => 11.5 | আগে ৫ লাগত এখন ১৪ => 14 | ১ ঘন্টা ৫ মিনিট => 65 |
      chollish second moto => 0.6667 | poune ek ghonta => 45 | 4.10 e dilam 4.25 e vorlo => 15 | poner minit er moto => 15 | সাত মিনিট ত্রিশ সেকেন্ড => 7.5 | botol vorte 25 minute lagse => 25 | ৩ মিনিট ৪৫ => 3.75 |
      mone hoy 22 minit => 22 | ৬ মিনিট ২০ সেকেন্ড => 6.3333 | ek ghonta bish minit => 80 | সাড়ে চার মিনিট হবে => 4.5`,
  ],
  ['change', 'done', `bodlay felsi | কার্টিজ বসানো হইছে | নতুন কাপড় দিছি`],
  [
    'wash',
    'not-yet',
    `ekhno hoyni | কাইলকা ধুমু | kaje asi bari jaia korum | রবিবার পর্যন্ত সময় দেন, ধান কাটার কাজ | বাড়িতে ধোয়ার পানি নাই আজ, কাল ধুব | আমি বাইরে আছি, শুক্রবার ফিরব | vai ke bolbo chutir dine kore dite |
      রাতে বাচ্চারা ঘুমাইলে ধুব | sorry vule gesi, kortesi | গ্রামে জানাজায় আসছি`,
  ],
  [
    'none',
    'need-part',
    `arekta siringe lagto | কাপড় পাঠান আমাগোডা ছিড়া শেষ | choto rubber er ring ta poche gese, ekta diben? | সিরিঞ্জ টানা যায় না, নতুন একটা লাগবে | arekta rubber pathate parben | ফিল্টারের নতুন বাতি লাগবে |
      siring kothay kinte pabo | arekta pipe paoa jabe amarta purano | কাপড় ক্ষয় হয়ে গেছে পাঠান | basa bodlanor somoy syringe haraise`,
  ],
  [
    'none',
    'ask',
    `kmne dhumu | কয়টায় আইবেন | tir chinno ta upore na niche | গরম পানি দেওয়া যাবে | apnader lok kobe ashbe amader dike | দুই নম্বর ধাপটা মাথায় ঢুকে নাই | কত দিন পর পর ধুইতে হয় | eta ki chlorine dur kore |
      পাশের বাড়ির ভাবিও একটা চায়, কিভাবে পাবে? | কুয়ার পানিতে চলবে | backwash mane ki | কখন বাতি বদলাতে হবে কিভাবে বুঝব | phone den, lekha bujhi na`,
  ],
  [
    'none',
    'moved',
    `আমরা ঐহান থিকা চইলা আইছি | boro diner somoy oi bari chere asi | ফিল্টার এখন ননদের কাছে, আমাদের আর নাই | amra ar okhane thaki na | গ্রামে মাকে দিয়ে দিছি ওটা | amra Khulna chole aschi |
      আমরা আসার সময় ফিল্টার পাশের বাড়িরে দিয়া আসছি`,
  ],
  [
    'none',
    'thanks',
    `tnx vaia | আপনারা আল্লাহর কাজ করতেছেন | onek dhonnobad ma, valo theko | হাজারটা ধন্যবাদ | অনেক অনেক ধন্যবাদ`,
  ],
  ['step', 'yes', `hmmm ha | হ তাই | ha dekhsi, ase | ha tight ase`],
  [
    'none',
    'unclear',
    `ki obostha | hahaha vul group e pathaisi | আজকে কে জিতবে বাংলাদেশ না ভারত | khelay dekha hobe | phone diyen | আচ্ছা মা ৬টায় দেখা হবে | ??`,
  ],
  [
    'change',
    'slow',
    `নতুন বাতি লাগাইলাম, আগেরটার চেয়ে ভালো কিছু না | বদলাইছি তাও ফোঁটায় ফোঁটায় পড়ে | notun ta lagaisi, pani ekhono kom`,
  ],
  [
    'step',
    'no-flow',
    `uthailam, thokailam, kichutei kichu hoy na, ek fotao na | কল পুরা খুলছি কিছুই আসে না`,
  ],
  [
    'flow',
    'broken',
    `15 second e vore gelo, eta to thik na | ekhon 20 second e vore jay, onek beshi jore`,
  ],
  [
    'change',
    'not-yet',
    `rasta dube gese, jinish ta post office e pore ase | স্বামী আসুক তারপর | notun part ekhono pai nai`,
  ],
  ['flow', 'not-yet', `ghori nosto, pasher barir ta niye mapbo | সকালে মেপে জানাব`],
  ['wash', 'unclear', `হুম দেখি | থেমে গেছে`],
  ['wash', 'yes', `ji apa`],
  ['change', 'broken', `notun ta vanga ashche | নতুন পার্টস লাগে না ঠিকমতো, চারপাশ দিয়ে পানি বের হয়`],
  ['flow', 'odd-water', `5 min kintu ghola | সাত মিনিট, কিন্তু গন্ধ`],
  ['wash', 'stop', `eisob ar na`],
  ['step', 'slow', `korlam, ektu jore kintu ekhono aste`],
  ['flow', 'no-flow', `মাপতে পারি না, কিছুই আসে না`],
  ['step', 'done', `korlam ekhon valo pore | tight disi, fota pora bondho`],
  ['step', 'ask', `কোন ঢাকনা উপরেরটা না নিচেরটা?`],
  ['none', 'help', `সাহায্য`],
])
