import { labelled } from './reply-set'

/** A third Bengali batch, written after the second was mended. */
export const thirdBnReplies = labelled('bn', [
  [
    'wash',
    'slow',
    `সুতার মতো চিকন পানি পড়ে | এক ফোঁটা এক ফোঁটা করে পড়ে | ধোয়ার পর একদিন ভালো ছিল এখন আবার আস্তে | পানির ফ্লো অনেক কমে গেছে কি করব | এত আস্তে কেন হলো | এক গ্লাসের জন্য ঘন্টার পর ঘন্টা বসে থাকি | বৃষ্টির পর থেকে প্রেসার কম | আগের মতো জোরে না | একটু স্লো আর কি | sutar moto chikon pani pore | dhoar por ekdin valo chilo ekhon abar slow | panir flow onek kome gese | eto slow keno holo | ek glass er jonno onek somoy lage | bristir por theke pressure kom | ager moto jore na | pani khub e aste aste ashe bhai`,
  ],
  [
    'wash',
    'no-flow',
    `পানি দেয় না | ফিল্টার দিয়ে পানি যায় না | পানি বাইর হয় না | একেবারে পানি আসা বন্ধ | কল খোলা কিন্তু কিছু পড়ে না | পাইপ জ্যাম পানি নাই | আজ কোনো পানি নাই | শুকনা, কিছু নাই | pani dey na | filter diye pani jay na | pani bair hoy na | kol khola kintu kisu pore na | pipe jam pani nai | aj kono pani nai`,
  ],
  [
    'flow',
    'flow-figure',
    `মনে হয় ১৮ মিনিট => 18 | মোটামুটি ২৫ => 25 | তিন মিনিট ত্রিশ সেকেন্ড => 3.5 | ১ ঘণ্টা ৫ মিনিট => 65 | ৩৩ মিনিট লাগবে => 33 | ২৬ মিনিট লাগছে আজকে => 26 | পঞ্চাশ => 50 | ১৪ মিনিট বোতলে, ধন্যবাদ => 14 | সোয়া এক ঘণ্টা => 75 | সাড়ে সাত => 7.5 | mone hoy 18 minit => 18 | motamuti 25 => 25 | tin minit trish second => 3.5 | 33 minit lagbe => 33 | ponchash => 50 | share sat => 7.5 | 26 min lagse ajke => 26`,
  ],
  [
    'wash',
    'broken',
    `বডিতে বড় একটা ফাটল | গলার কাছে প্লাস্টিক ফাটা | ফিল্টারটা ভাইঙ্গা গেছে | উপরের বালতির তলায় ফুটা | অনেক লিক করতেছে | পাইপের জোড়া থেকে ফোঁটা ফোঁটা পড়ে | ঢাকনার পাশ দিয়ে পানি বের হয় | রাতের ঠান্ডায় জমে বরফ | বাচ্চারা সিঁড়ি থেকে ফেলে দিছে | টেবিল থেকে পড়ে গেছে | পাইপ ছিঁড়া | আজ পানি অতিরিক্ত জোরে আসতেছে | ইঁদুর পাইপে ফুটা করছে | body te boro ekta fatol | golar kase plastic fata | filter ta vainga gese | uporer baltir tolay futa | onek leak kortese | dhaknar pash diye pani ber hoy | bacchara siri theke fele dise | table theke pore gese | pipe sira | aj pani otirikto jore astese | indur pipe e futa korse`,
  ],
  [
    'change',
    'odd-water',
    `পানির রং স্বাভাবিক না | বাদামি রঙের পানি | পানির সাথে মাটি আসে | ছোট পোকা দেখি | স্বাদ বদলায় গেছে, তিতা | গন্ধটা খুব বাজে | পানিতে কেমিক্যালের গন্ধ | উপরে তেল ভাসে | কালো গুঁড়া বের হয় | আজ পানি পরিষ্কার না | ধোয়ার পরেও ঘোলা | প্লাস্টিকের গন্ধ | গ্লাসে বালু | panir rong thik na | badami ronger pani | panir sathe mati ase | choto poka dekhi | gondhota khub baje | panite chemical er gondho | upore tel vase | aj pani porishkar na | dhoar poreo ghola | glass e balu`,
  ],
  [
    'none',
    'unwell',
    `বাবুর পেট খারাপ হইছে | তিন দিন ধরে পাতলা পায়খানা | এই পানি খেয়ে আমরা দুইজন অসুস্থ | মেয়ে দুইবার বমি করছে | বাচ্চার পেটে ব্যথা | আজ জ্বর আসছে | আমার পেট কামড়ায় আর ডায়রিয়া | বউ মঙ্গলবার থেকে অসুস্থ | ছেলের কলেরা হয়েছে | প্রতিদিন সকালে বমি বমি ভাব | পানির জন্য কি ছেলে অসুস্থ? | স্বামীকে হাসপাতালে নিছি | babur pet kharap hoise | tin din dhore patla paykhana | ei pani kheye amra osustho | meye duibar bomi korse | baccar pete betha | aj jor asche | bou mongolbar theke osustho | cheler kolera hoyeche | panir jonno ki chele osustho? | shamike haspatale nisi`,
  ],
  [
    'none',
    'unwell',
    `বাবু কিছুই খাচ্ছে না† | বাচ্চা পানি খেতে চায় না আর খুব দুর্বল† | মেয়েটা অজ্ঞান সাহায্য করেন† | কাল থেকে পায়খানায় রক্ত† | যা খায় সব বমি আর শুধু ঘুমায়† | ছেলের বারবার খিঁচুনি হচ্ছে† | babu kichui khacche na† | bacca pani khete chay na ar khub durbol† | meyeta oggan help koren† | kal theke paykhanay rokto† | cheler bar bar khichuni hocche†`,
  ],
  [
    'none',
    'stop',
    `আর এসএমএস না প্লিজ | আমাকে বাদ দেন প্লিজ | এখনই বন্ধ করেন | আমি মেসেজ চাই না | এইসব পাঠানো বন্ধ করেন | আমার ফোনে মেসেজ দেওয়া বন্ধ করতে পারবেন | আমার নাম কেটে দেন | আর বিরক্ত কইরেন না | মেসেজগুলা বন্ধ করেন | আপনাদের মেসেজে বিরক্ত হয়ে গেছি | ar sms na please | amake bad den please | ekhoni bondho koren | ami msg chai na | eisob pathano bondho koren | amar nam kete den | ar birokto koiren na | msg gula bondho koren`,
  ],
  [
    'none',
    'wrong-number',
    `ভুল নাম্বার ভাই | ভুল নাম্বারে লিখতেছেন | এটা রুবিনার নাম্বার না | আমি সেই মানুষ না | আমি না, ভুল নাম্বার | আপনি কে চিনি না, রং নাম্বার | গত সপ্তাহে এই সিম কিনছি | vul number vai | vul numbere likhtesen | eta rubinar number na | ami sei manush na | apni ke chini na, rong number | goto soptahe ei sim kinsi`,
  ],
  [
    'wash',
    'done',
    `ধোয়া হইছে | এখন পরিষ্কার, ধুইছি | আমরা ধুয়েছি | পরিষ্কার করা শেষ | জি ভাই ধুইছি | করছি ✅ | গতকাল সন্ধ্যায় ধুইছি | dhoya hoise | amra dhuyechi | porishkar kora sesh | ji vai dhuisi | done ✅ | gotokal sondhay dhuisi`,
  ],
  [
    'wash',
    'not-yet',
    `সরি এখনো করি নাই | কাল ধুবো | শুক্রবার পরিষ্কার করব | সময় পাচ্ছি না | আজকে পরে | বাইরে আছি, সামনের সপ্তাহে | এখনো ধোয়া হয় নাই | আবার ভুলে গেছি | sorry ekhono kori nai | kal dhubo | somoy pacchi na | baire achi, samner soptahe | ekhono dhoya hoy nai | abar vule gesi`,
  ],
  [
    'none',
    'need-part',
    `একটা নতুন কল লাগবে | কাপড় ছিঁড়ে গেছে আরেকটা লাগবে | আরেকটা সিরিঞ্জ পাওয়া যাবে? | কার্বন নাই, আনেন প্লিজ | আমার ক্যাপ হারাইছে | ekta notun kol lagbe | arekta syringe paoa jabe? | carbon nai, anen please | amar cap haraise`,
  ],
  [
    'none',
    'ask',
    `পরিষ্কার হইছে বুঝব কেমনে? | পরের বার কবে আসবেন | দাম কত | বৃষ্টির পানি দেওয়া যাবে? | কেমনে খুলে | কাকে ফোন দিব | কাপড় কখন বদলাব | porishkar hoise bujhbo kemne? | porer bar kobe asben | dam koto | bristir pani dite parbo? | kemne khule | kapor kokhon bodlabo`,
  ],
  [
    'none',
    'thanks',
    `আল্লাহর শুকরিয়া আর আপনাদের ধন্যবাদ | ওকে ধন্যবাদ | ok dhonnobad | onek thanks vai`,
  ],
  ['step', 'yes', `জি স্যার | হ্যাঁ মনে হয় | ওকে ঠিক আছে | ji sir | ha mone hoy`],
  ['step', 'no', `না স্যার | কোনো ফাটল নাই | লিক করতেছে না | na sir | kono fatol nai`],
  ['step', 'choice', `১ => 1 | ২ নাম্বার => 2 | 2 number => 2 | ৩ => 3`],
  ['wash', 'unclear', `আমার ছাগল হারাইছে | আজ বৃষ্টি | হাহা | বাস থেমে গেছে | ok?`],
])
