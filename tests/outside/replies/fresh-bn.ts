import { labelled } from './reply-set'

/** A second Bengali batch, written after the reader passed the first, as other people would text. */
export const freshBnReplies = labelled('bn', [
  [
    'wash',
    'slow',
    `
    আপা সোমবার থেকে পানি একদম অল্প অল্প আসতেছে | ভাই অনেক স্লো | সিরিঞ্জ দিয়ে ধুইলাম তাও ধারা চিকন | পানি আসেই না বলতে গেলে, খুব সামান্য | এক কলস ভরতে সারা রাত লাগে | আগে তাড়াতাড়ি ভরত এখন অনেক দেরি | পানি পড়ার গতি কম | সব করলাম তবুও আস্তে আস্তে পড়তেছে কেন জানি না | বাচ্চাদের জন্য পানি কুলায় না |
    pani khub e kom astese somobar theke | bhai onek slow | syringe diye dhuilam tao chikon kore pore | ek kolos vorte sara rat lage | age taratari vorto ekhon onek deri hoy | panir goti kom | sob korlam tarpor o aste porche | duibar dhuisi tao slow | pani ekdom dhire pore`,
  ],
  [
    'wash',
    'no-flow',
    `কিছুই পড়তেছে না | সকাল থেকে এক ফোঁটা পানিও আসে নাই | উপরে পানি ঢালি নিচে কিছু পড়ে না | কল খুললাম পানি নাই | পুরাপুরি বন্ধ হয়ে গেছে পানি | দুই দিন ধরে পানি দেয় না | পানি উপরে জমে থাকে নামে না | kisu pore na | sokal theke ek fota panio ase nai | upore pani dhali niche kisu pore na | kol khule dekhi pani nai | pura jam | dui din dhore pani dey na | pani upore thake, name na`,
  ],
  [
    'flow',
    'flow-figure',
    `
    ৯ মিনিটের মতো => 9 | এগারো মিনিট লাগল => 11 | গুনে দেখলাম ১৪ => 14 | ১৩ এর মতো => 13 | প্রায় আধা ঘণ্টা => 30 | সাড়ে ছয় মিনিট => 6.5 | এক ঘণ্টা দশ মিনিট => 70 | আসসালামু আলাইকুম। ১৭ মিনিট লেগেছে। ধন্যবাদ। => 17 | ২ মিনিট ১৫ সেকেন্ড => 2.25 | এক লিটারে ২২ মিনিট => 22 | পনেরো মিনিট হবে => 15 | চল্লিশ সেকেন্ড => 0.6667 | ১৯ মিনিট লাগে ভাই => 19 |
    9 miniter moto => 9 | egaro minit laglo => 11 | gune dekhlam 14 => 14 | pray adha ghonta => 30 | share choy minit => 6.5 | ek ghonta dosh minit => 70 | 17 minit legeche apa => 17 | 2 min 15 sec => 2.25 | ek litre 22 minit => 22 | chollish minit => 40 | 7.5 => 7.5 | der minit => 1.5`,
  ],
  [
    'wash',
    'broken',
    `
    নাতি তাক থেকে ফেলে দিছে | প্লাস্টিকের প্যাঁচটা ফেটে দুই ভাগ | জোড়ার কাছ দিয়ে পানি চুয়ায় | বাইরে ছিল জমে বরফ হয়ে গেছে | বালতির তলা ফেটে গেছে | কল বন্ধ হয় না পানি পড়তেই থাকে | কুকুরে পাইপ কামড়ায়া ছিঁড়া ফেলছে | নিচ দিয়ে পানি বাইর হইতেছে | মনে হয় চিকন একটা ফাটল আছে | পাইপ খুলে মেঝে ভেসে গেছে | পানি এখন আগের চেয়ে অনেক জোরে যায় | হাত ফসকে পড়ে ভেঙে গেছে |
    nati tak theke fele dise | plastic ta fete dui vag hoye gese | jorar kase diye pani pore | baire chilo jome borof hoye gese | baltir tola fete gese | kukure pipe kamraya chira felse | nich diye pani bair hoitese | mone hoy chikon ekta fatol ase | pipe khule gese | pani ekhon ager cheye onek jore jay | hat foske pore venge gese`,
  ],
  [
    'change',
    'odd-water',
    `পানির রং বদলে গেছে | দেখতে চায়ের মতো | কালো কালো গুঁড়া ভাসে | লোহার মতো স্বাদ | বউ বলে পানিতে গন্ধ | বাচ্চারা খায় না গন্ধের জন্য | পেট্রোলের মতো গন্ধ | একটু সবুজ সবুজ | গ্লাসে ছোট ছোট পোকা নড়ে | পানি ঘোলা হয়ে গেছে | panir rong bodle gese | dekhte chayer moto | kalo kalo gura vase | lohar moto shad | bou bole panite gondho | petroler moto gondho | ektu sobuj sobuj | glass e choto choto poka nore | pani ghola hoye gese | holud ar gondho ase`,
  ],
  [
    'none',
    'unwell',
    `
    বাবুটা সারারাত বাথরুমে গেছে, পানির মতো পায়খানা | দাদার অনেক জ্বর আর কাঁপুনি | ছেলের গা পুড়ে যাচ্ছে জ্বরে | কাল রাত থেকে বমি | বাড়ির সবার পেটে সমস্যা | বউয়ের কলেরা হইছে | পোলাডার পাতলা পায়খানা | শরীরটা খুব খারাপ লাগে পেট মোচড়ায় | পেটের সমস্যার জন্য হাসপাতালে গেছিলাম | আমার দুই বাচ্চা এই সপ্তাহে অসুস্থ হইছে | ধুইছি কিন্তু ছোটটার ডায়রিয়া ধরছে |
    babu ta sararat bathroome gese panir moto paykhana | dadar onek jor | seler ga pure jay jore | kal rat theke bomi | barir sobar pete somossa | bouer kolera hoise | polar patla paykhana | sorir ta khub kharap lage | peter jonno haspatal gesilam | amar dui bacca osustho hoise | dhuisi kintu chototar dayria dhorse`,
  ],
  [
    'none',
    'unwell',
    `বাচ্চা সকাল থেকে বুকের দুধ নেয় না† | মেয়েটা শুয়ে আছে ডাকলে সাড়া দেয় না† | এত দুর্বল যে পানি খেতে পারে না† | পায়খানার সময় রক্ত গেছে† | কাঁপতে কাঁপতে চোখ উল্টে গেছে† | ঘুম থেকে জাগাতে পারছি না† | যা গিলে সব বের হয়ে যায়† | মেয়ে অজ্ঞান হয়ে গেল† | bacca sokal theke buker dudh ney na† | meyeta shuye ase dakle shara dey na† | eto durbol je pani khete pare na† | paykhanar somoy rokto gese† | ghum theke jagate parchi na† | meye oggan hoye gelo†`,
  ],
  [
    'none',
    'stop',
    `
    দয়া করে আর এসব পাঠাবেন না | মেসেজ দেওয়া থামান | আমি আর এই মেসেজ পেতে চাই না | লিস্ট থেকে আমার নাম বাদ দেন | এই ফোনে আর মেসেজ কইরেন না | আমার নাম্বার মুছে দেন | আর মেসেজ দিয়া জ্বালাইয়েন না | এই নাম্বারে আর লিখবেন না | বন্ধ করেন এইসব মেসেজ | আর কখনো মেসেজ দিবেন না |
    doya kore ar esob pathaben na | msg deoa thaman | ami ar ei message pete chai na | list theke amar nam bad den | ei phone e ar msg koiren na | amar number muche den | ar msg diya jalaien na | ei numbere ar likhben na | bondho koren eisob msg | ar kokhono message diben na`,
  ],
  [
    'none',
    'wrong-number',
    `দুঃখিত ভুল মানুষকে মেসেজ দিছেন | হ্যালো আমি জসিম না | এই বাড়িতে আমিনা নামে কেউ থাকে না | মনে হয় নাম্বার গুলায়া ফেলছেন, ভুল নাম্বার | এই ফোন এখন অন্য মানুষের | ফিল্টার টিল্টার চিনি না, রং নাম্বার | ভুল ফোনে মেসেজ পাঠাইছেন | vul manushke msg disen | hello ami josim na | ei barite amina name keu thake na | ei phone ekhon onno manusher | filter tilter chini na, rong number | vul phone e message pathaisen`,
  ],
  [
    'wash',
    'done',
    `সব শেষ | হ সকালে ধুইছি | ধুয়ে আবার লাগায় দিছি | পরিষ্কার করে ফেলছি, ধন্যবাদ | কাজ শেষ | গতকাল বিকালে করছি | মেয়ে ধুয়ে দিছে | sob sesh | sokale dhuisi | dhuye abar lagay disi | porishkar kore felsi, dhonnobad | kaj sesh | meye dhuye dise`,
  ],
  [
    'wash',
    'not-yet',
    `সুযোগ পাই নাই | কাল ইনশাআল্লাহ | শুক্রবারে করব | খুব ব্যস্ত ছিলাম, সরি | বৃষ্টি থামলে করব | হাতে ব্যথা তাই কাল করব | সামনের সপ্তাহে মনে করায় দিয়েন | করতে চাইছিলাম ভুলে গেছি | sujog pai nai | kal inshallah | khub besto chilam, sorry | bristi thamle korbo | samner soptahe mone koray dien | rate chele ashle korbo`,
  ],
  [
    'none',
    'need-part',
    `আরেকটা সিরিঞ্জ আনতে পারবেন | ওয়াশার হারায় গেছে নতুন লাগবে | কাপড় শেষ, আর নাই | আরেকটা পাইপ কই পাব? | সিরিঞ্জটা পাইতেছি না | ঢাকনা নাই হয়ে গেছে, হারাইছি | arekta syringe ante parben | washer haray gese notun lagbe | arekta pipe koi pabo? | syringe ta paitesi na`,
  ],
  [
    'none',
    'ask',
    `কত দিন পর পর পরিষ্কার করতে হয় | আগে কি পানি ফুটাতে হবে? | লোকটা কয়টায় আসবে | বাচ্চাকে দেওয়া যাবে? | কোন দিক উপরে থাকবে | রোদে রাখা যাবে? | আবার বুঝায় বলেন | koto din por por porishkar korte hoy | age ki pani futate hobe? | lokta koytay asbe | baccake deya jabe? | kon dik upore thakbe | abar bujhay bolen`,
  ],
  [
    'none',
    'thanks',
    `আপনাদের অনেক ধন্যবাদ | আল্লাহ আপনাদের ভালো রাখুক | অনেক উপকার হইছে ধন্যবাদ | onek dhonnobad apnader | allah valo rakhuk apnader`,
  ],
  ['step', 'yes', `জি ঠিক | হ্যাঁ ভাই | আচ্ছা বুঝছি | হ | ji thik | ha vai | accha bujhsi`],
  ['step', 'no', `না ভাই | কোনো ফাটল দেখি না | না এরকম কিছু না | na vai | kono fatol dekhi na`],
  [
    'step',
    'done',
    `আবার ভালো পড়তেছে | এখন অনেক ভালো | এখন সুন্দর পানি আসে | ঠিক হইয়া গেছে | abar valo portese | ekhon onek valo | thik hoiya gese`,
  ],
  [
    'none',
    'moved',
    `আমরা পাশের শহরে চলে গেছি | ঐ বাসায় আর থাকি না | ভাইয়ের বাড়িতে উঠছি, বাসা ছাড়ছি | amra pasher shohore chole gesi | oi basay ar thaki na`,
  ],
  ['wash', 'unclear', `হঠাৎ থেমে গেছে | পাম্প বন্ধ | কি একটা দিন | theme gese hothat | pump bondho`],
])
