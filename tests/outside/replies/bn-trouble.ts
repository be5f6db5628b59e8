import { labelled } from './reply-set'

/** Bengali replies about the water and the filter, in both scripts, labelled by hand. */
export const bnTroubleReplies = labelled('bn', [
  [
    'wash',
    'slow',
    `
    আস্তে | আস্তে আস্তে | পানি আস্তে আসে | পানি আস্তে আস্তে আসে | পানি ধীরে আসছে | ধীরে ধীরে পড়ে | খুব আস্তে | খুব ধীর | পানি কম | পানি কম আসে | পানি কম পড়ছে | পানি খুব কম আসে | অল্প পানি আসে | একটু একটু আসে | ফোঁটা ফোঁটা পড়ে | ফোটা ফোটা আসে | টিপটিপ করে পড়ে | পানি কমে গেছে |
    গতি কমে গেছে | চাপ কম | পানি চিকন হয়ে আসে | অনেক সময় লাগে | অনেকক্ষণ লাগে | ভরতে অনেক সময় লাগে | সারাদিন লাগে | দেরি হয় | স্লো | পানি স্লো | ফিল্টার স্লো | আগের মতো আসে না | আগের চেয়ে কম | জোরে আসে না | পানি ভালো আসে না | ঠিকমতো আসে না | ধুয়েছি কিন্তু এখনো আস্তে |
    ধুইছি তাও আস্তে আসে | করেছি কিন্তু পানি কম | পরিষ্কার করেছি তবু ধীরে | হ্যাঁ আস্তে | না আস্তে | ধন্যবাদ কিন্তু এখনো আস্তে | পানি এত আস্তে কেন? | দিন দিন কমছে | পানি জোর নাই | আগে ভালো ছিল এখন আস্তে | পানি বেশি আসে না | পানি কম আহে |
    aste | aste aste | pani aste ase | pani aste aste ashe | pani dhire asche | dhire dhire pore | khub aste | pani kom | pani kom ase | pani kom ashe | khub kom pani ase | olpo pani ase | ektu ektu ase | fota fota pore | phota phota ashe | tip tip kore pore | pani kome gese | pani kome geche |
    onek somoy lage | onek shomoy lage | vorte onek time lage | deri hoy | slow | pani slow | filter slow | slow ashtese | pani slow astese | ager moto ase na | ager theke kom | jore ase na | pani valo ase na | thik moto ase na | dhuyechi kintu ekhono aste | dhuisi tao aste ase | wash korsi but slow | korechi kintu pani kom |
    ha slow | na slow | dhonnobad kintu ekhono aste | pani eto aste keno? | jor nai panir | age valo chilo ekhon aste | besi pani ase na | pani chikon hoye ase | slooow | pani astee | done but slow | khub slow vai`,
  ],
  [
    'step',
    'slow',
    `একই | একই রকম | আগের মতোই | এখনো আস্তে | কোনো পরিবর্তন নাই | ভালো হয় নাই | ঠিক হয়নি | eki | eki rokom | same | ekhono slow | kono poriborton nai | valo hoy nai | ager motoi ase | kaj hoy nai`,
  ],
  [
    'wash',
    'no-flow',
    `
    পানি আসে না | পানি আসেনা | পানি আসছে না | পানি আসতেছে না | পানি আসতাছে না | পানি পড়ে না | পানি পড়ছে না | পানি বের হয় না | পানি বের হচ্ছে না | পানি নাই | পানি নেই | কোনো পানি নাই | একদম পানি আসে না | এক ফোঁটাও আসে না | কিছুই আসে না | পানি বন্ধ হয়ে গেছে | পানি পড়া বন্ধ |
    জ্যাম হয়ে গেছে | আটকে গেছে | পাইপ আটকে গেছে | ফিল্টার ব্লক | ধুয়েছি কিন্তু পানি আসে না | করেছি এখন পানি আসে না | কাল থেকে পানি নাই | জল আসছে না | জল নেই | পানি নামে না | পানি আহে না | পানি যায় না | এখন আর পানি আসে না |
    pani ase na | pani asena | pani ashe na | pani asche na | pani astese na | pani ashtese na | pani pore na | pani porche na | pani ber hoy na | pani ber hocche na | pani nai | pani nei | kono pani nai | ekdom pani ase na | ek fotao ase na | kisui ase na | kichui ase na | pani bondho hoye gese |
    pani pora bondho | jam hoye gese | atke gese | pipe atke gese | filter block | dhuyechi kintu pani ase na | wash korsi ekhon pani ase na | kal theke pani nai | jol asche na | jol nei | pani name na | pani ahe na | no water`,
  ],
  ['flow', 'no-flow', `কিছুই না | পানি নাই | kichui na | pani nai | pani ase nai`],
  [
    'wash',
    'broken',
    `
    ভেঙে গেছে | ভাঙা | ভাইঙ্গা গেছে | ক্যাপ ভেঙে গেছে | ঢাকনা ভেঙে গেছে | ফেটে গেছে | ক্যাপ ফেটে গেছে | ফাটা | ঢাকনা ফাটা | ফাটল ধরেছে | ফাইটা গেছে | পাইপ ছিঁড়ে গেছে | পাইপ ফুটা | বালতি ফুটো | ছিদ্র হয়ে গেছে | লিক করে | লিক হইছে | লিক | পাইপ লিক | নিচ দিয়ে পানি পড়ে | পাশ দিয়ে পানি পড়ে |
    জোড়া দিয়ে পানি বের হয় | পানি চুইয়ে পড়ে | পানি পড়ে যাচ্ছে নিচে | পড়ে গেছে | ফিল্টার পড়ে গেছে | হাত থেকে পড়ে গেছে | ছেলে ফেলে দিছে | জমে বরফ | বরফ হয়ে গেছে | পানি খুব জোরে আসে | অতিরিক্ত জোরে পানি পড়ে | হঠাৎ অনেক জোরে আসছে | ইঁদুরে পাইপ কেটে ফেলছে | কল ভেঙে গেছে |
    নষ্ট হয়ে গেছে | কার্টিজ নষ্ট | খুলে গেছে পাইপ | ধুয়েছি কিন্তু ক্যাপ ফাটা | আস্তে আর লিক করে | হ্যাঁ ফাটা | না ফেটে গেছে | আলগা হয়ে গেছে |
    venge gese | bhenge geche | vanga | vainga gese | cap venge gese | dhakna venge gese | fete gese | cap fete gese | fata | dhakna fata | fatol dhorse | pipe sire gese | pipe chire gese | pipe futa | balti futo | chidro hoye gese | leak kore | lik kore | leak hoise | leak | pipe leak |
    nich diye pani pore | pash diye pani pore | jora diye pani ber hoy | pore gese | filter pore gese | hat theke pore gese | chele fele dise | borof hoye gese | pani khub jore ase | otirikto jore pani pore | hothat onek jore asche | indure pipe kete felse | kol venge gese | nosto hoye gese | cartridge nosto |
    dhuyechi kintu cap fata | aste ar leak kore | ha fata | na fete gese | crack hoise | cap crack | broken`,
  ],
  [
    'change',
    'odd-water',
    `
    কালো পানি | পানি কালো | পানি কালো আসে | পানি হলুদ | হলুদ পানি | পানি ঘোলা | ঘোলা পানি আসে | ঘোলা | পানি ময়লা | ময়লা পানি আসছে | পানিতে ময়লা | পানিতে পোকা | পানিতে কাদা | পানিতে বালি | পানি লাল | পানি সবুজ | পানিতে গন্ধ | গন্ধ করে | পানি গন্ধ | দুর্গন্ধ | খারাপ গন্ধ | বাজে গন্ধ আসে |
    পচা গন্ধ | স্বাদ খারাপ | পানির স্বাদ ভালো না | তিতা লাগে | নোনা পানি | কেরোসিনের গন্ধ | তেলের গন্ধ | ডিজেলের গন্ধ | কেমিক্যালের গন্ধ | পানিতে তেল | পানি পরিষ্কার না | পানি খারাপ | ফেনা হয় | বদলেছি কিন্তু পানি কালো | পানিতে শেওলা | পানির রং কেমন | ধুয়েছি কিন্তু ঘোলা |
    kalo pani | pani kalo | pani kalo ase | pani holud | holud pani | pani ghola | ghola pani ase | ghola | pani moyla | moyla pani asche | panite moyla | panite poka | panite kada | panite bali | pani lal | panite gondho | gondho kore | pani gondho | durgondho | kharap gondho | baje gondho ase |
    pocha gondho | shad kharap | panir shad valo na | tita lage | nona pani | kerosiner gondho | teler gondho | dijeler gondho | chemical er gondho | panite tel | pani porishkar na | pani kharap | fena hoy | change korsi kintu pani kalo | panite shaola | pani te gondo`,
  ],
  [
    'none',
    'unwell',
    `
    আমার ছেলের ডায়রিয়া | মেয়ের ডায়রিয়া হয়েছে | ডায়রিয়া | ডাইরিয়া হইছে | পাতলা পায়খানা | বাচ্চার পাতলা পায়খানা | পেট খারাপ | ছেলের পেট খারাপ | পেট ব্যথা | পেটে ব্যথা করে | মেয়ের পেট ব্যথা | বমি | বমি করছে | ছেলে বমি করে | জ্বর | বাচ্চার জ্বর | জ্বর আর বমি | আমার ছেলে অসুস্থ | মেয়ে অসুস্থ | আমরা সবাই অসুস্থ |
    সবাই অসুস্থ | অসুস্থ | শরীর খারাপ | আমার শরীর ভালো না | মায়ের শরীর ভালো না | কলেরা | আমাশয় | টাইফয়েড | হাসপাতালে নিয়ে গেছি | ছেলে হাসপাতালে | ডাক্তার বলছে পানির জন্য | ধুয়েছি কিন্তু ছেলে অসুস্থ | পানি আস্তে আর ছেলের ডায়রিয়া | পানি খেয়ে অসুস্থ | পেট নামছে | বমি বমি লাগে | দাস্ত হইছে | বউয়ের অসুখ |
    amar cheler diarrhea | meyer dayria hoise | diarrhea | dairia hoise | patla paykhana | baccar patla paikhana | pet kharap | cheler pet kharap | pet betha | pete betha kore | meyer pet batha | bomi | bomi kortese | chele bomi kore | jor | baccar jor | jor ar bomi | amar chele osustho | meye asustho | amra sobai osustho |
    sobai asustho | osustho | shorir kharap | amar sorir valo na | mayer shorir bhalo na | kolera | amasha | haspatale niye gesi | chele hospital e | daktar bolse panir jonno | dhuyechi kintu chele osustho | pani aste ar cheler diarrhea | pani kheye osustho | pet namse | bomi bomi lage | amar meye sick | loose motion | fever hoise`,
  ],
  [
    'none',
    'unwell',
    `
    বাচ্চা দুধ খায় না† | বাচ্চা বুকের দুধ টানে না† | বাচ্চা কিছু খায় না† | পানি খেতে পারে না বাচ্চা† | মেয়ে কিছুই খেতে চায় না আর খুব ঘুমায়† | যা খায় সব বমি করে† | সব বমি করে দেয়† | খিঁচুনি হইছে† | ছেলের খিঁচুনি† | অজ্ঞান হয়ে গেছে† | বাচ্চা নিস্তেজ† | নেতিয়ে পড়েছে† | সাড়া দেয় না† |
    পায়খানার সাথে রক্ত† | পায়খানায় রক্ত† | রক্ত আমাশয়† | ডায়রিয়া আর রক্ত যায়† | ছেলের ডায়রিয়া আর খালি ঘুমায়† | বাচ্চা নড়াচড়া করে না† |
    bacca dudh khay na† | baccha buker dudh khay na† | bacca kisu khay na† | pani khete pare na bacca† | meye kichui khete chay na ar khub ghumay† | ja khay sob bomi kore† | sob bomi kore dey† | khichuni hoise† | cheler khichuni† | oggan hoye gese† | bacca nistej† | netiye poreche† | shara dey na† |
    paykhanar sathe rokto† | paikhanay rokto† | rokto amasha† | diarrhea ar rokto jay† | cheler diarrhea ar khali ghumay†`,
  ],
  [
    'flow',
    'flow-figure',
    `
    ১২ => 12 | ৭ => 7 | ৭ মিনিট => 7 | ৭মিনিট => 7 | প্রায় ৭ মিনিট => 7 | ১৫ মিনিট লাগে => 15 | ১২ মিনিট লাগছে => 12 | বারো মিনিট => 12 | পঁচিশ মিনিট => 25 | আধা ঘন্টা => 30 | আধ ঘণ্টা => 30 | এক ঘন্টা => 60 | ১ ঘন্টা => 60 | ১ ঘণ্টা ২০ মিনিট => 80 | দেড় ঘন্টা => 90 | দুই ঘন্টা => 120 |
    সাড়ে চার মিনিট => 4.5 | আড়াই মিনিট => 2.5 | দেড় মিনিট => 1.5 | সাড়ে ৪ => 4.5 | ৪.৫ => 4.5 | ৪:৩০ => 4.5 | ৪ মিনিট ৩০ সেকেন্ড => 4.5 | ৯০ সেকেন্ড => 1.5 | দশ => 10 | দশ মিনিট => 10 | ১০! => 10 | ৫-৬ মিনিট => 5.5 | ৫ থেকে ৬ মিনিট => 5.5 | বিশ মিনিট => 20 | কুড়ি মিনিট => 20 | তিরিশ মিনিট => 30 | পঁয়তাল্লিশ মিনিট => 45 |
    এখন ৮ মিনিট => 8 | ৩ => 3 | ১ => 1 | পৌনে এক ঘন্টা => 45 | আস্তে, ২০ মিনিট => 20 | এখনো আস্তে ২৫ মিনিট => 25 | ধুয়েছি এখন ৫ মিনিট => 5 | বোতল ভরতে ৯ মিনিট => 9 | পাঁচ মিনিট => 5 | 12 => 12 | 7 min => 7 | ১১ মিঃ => 11 | ৭ মিনিট ভাই => 7 |
    12 minit => 12 | 7 minute => 7 | pray 7 minit => 7 | 15 min lage => 15 | 12 minit lagse => 12 | baro minit => 12 | pochish minit => 25 | adha ghonta => 30 | adh ghonta => 30 | ek ghonta => 60 | 1 ghonta => 60 | 1 ghonta 20 minit => 80 | der ghonta => 90 | dui ghonta => 120 | share char minit => 4.5 | sare 4 => 4.5 | arai minit => 2.5 |
    4.5 => 4.5 | 4:30 => 4.5 | 4 minit 30 second => 4.5 | 90 second => 1.5 | dosh => 10 | dosh minit => 10 | 5-6 minit => 5.5 | bish minit => 20 | tirish minit => 30 | ekhon 8 minit => 8 | aste, 20 minit => 20 | wash korsi ekhon 5 minit => 5 | botol vorte 9 minit => 9 | pach minit => 5 | poune ek ghonta => 45 | half hour => 30 | choy minit => 6`,
  ],
  [
    'step',
    'flow-figure',
    `১২ => 12 | ৪ => 4 | 12 => 12 | ১২ মিনিট => 12 | ekhon 6 minit => 6 | ৩ মিনিট => 3`,
  ],
  ['none', 'flow-figure', `১২ => 12 | ১০ মিনিটে বোতল ভরে => 10`],
])
