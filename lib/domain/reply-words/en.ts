import type { LanguagePack } from './concept'
import { enBreach } from './en-breach'
import { enCare } from './en-care'
import { enContact } from './en-contact'
import { enEveryday } from './en-everyday'
import { enIll } from './en-ill'
import { enOdd } from './en-odd'
import { enPeople } from './en-people'
import { enTalk } from './en-talk'
import { enWant } from './en-want'
import { enWater } from './en-water'

/** English as people text it. */
export const enPack: LanguagePack = {
  spelling: 'latin',
  concepts: {
    ...enWater,
    ...enBreach,
    ...enOdd,
    ...enPeople,
    ...enIll,
    ...enCare,
    ...enTalk,
    ...enWant,
    ...enContact,
  },
  numbers: `two 2, three 3, four 4, five 5, six 6, seven 7, eight 8, nine 9, ten 10, eleven 11, twelve 12,
    thirteen 13, fourteen 14, fifteen 15, sixteen 16, seventeen 17, eighteen 18, nineteen 19,
    twenty 20, thirty 30, forty 40, fourty 40, fifty 50, sixty 60, seventy 70, eighty 80,
    ninety 90, hundred 100, a hundred 100, twelv 12, fiveteen 15, fivteen 15, twenti 20`,
  weakNumbers: `one 1, a 1, an 1, a couple of 2, couple of 2, a couple 2, half 0.5, a half 0.5`,
  units: {
    minute:
      'minute, minutes, min, mins, minuts, minuets, minites, minits, minit, minet, minets, mints, mn, mns, m, minuit, minuits, minz, mnts, mnt, mint',
    hour: 'hour, hours, hr, hrs, h, our, ours, hrz, houres',
    second: 'second, seconds, sec, secs, s, scnds, seconde',
    other: `litre*, liter*, l, ml, lt, gallon*, bottle, bottles, cup, cups, mug, jug, jugs, bucket, buckets, glass, glasses, day, days, week, weeks, month, months, year, years, yr, yrs, time, times, x, kid, kids, child, children, people, persons, person, member, members, son, sons, daughter, daughters, boy, girl, boys, girls, stroke, strokes, syringe, syringes, filter, filters, stage, stages, part, parts, cap, caps, pm, am, oclock, percent, degrees, dollars, of, drop, drops, nights, night, mornings, thing, things, others, more, cm, inch, inches, house, houses, th, nd, rd, st`,
  },
  spans: `half an hour 30, half hour 30, half hr 30, half an hr 30, half a hour 30, half n hour 30,
    hour and a half 90, an hour and a half 90, one hour and a half 90, quarter of an hour 15,
    a quarter of an hour 15, quarter hour 15, quarter hr 15, three quarters of an hour 45,
    three quarter of an hour 45, half a minute 0.5, half minute 0.5, half min 0.5, half a min 0.5,
    minute and a half 1.5, a minute and a half 1.5, one and a half hours 90, an hour 60,
    a minute 1, quarter to an hour 45`,
  halves: `an a quarter 0.25, and three quarters 0.75, an a half 0.5, an half 0.5, nd a half 0.5, and a half 0.5, and half 0.5, n half 0.5,
    n a half 0.5, and a quarter 0.25, and quarter 0.25`,
  light: `give gives giving given let lets a an the any my our your his her its their this that these those it to be been being have had having got get getting really even ever yet all so too very as like one single more longer anymore i im u you we he she they there is are was were am do does did seem seems look looks feel feels feeling want wants going go able of on at for with still enough much quite properly good well fully quick completely again`,
  common: `${enEveryday} hmm lol haha jaja asdf the a an this that these those there here it its is are
    am be been being was were do does did have has had having and for from with at by to of in on
    off up down out over under into onto about than then so as also all any some each every both
    such own i im ive id ill we weve he hes she shes they theyre them his her hers our ours their
    him who whom whose what when where why how which my your yours yourself myself shop step slop
    stow snow show shot stoop sleep slope soap same sale safe save send sent seen seed seem sell
    side sign size sick sing site sit six take took taken make made making give gave given put let
    keep kept try tried use used using say says said tell told know knew think thought hope find
    found look looks looking looked like liked love home house door room table kitchen garden road
    town city village day days night week weeks month months year years hour minute time times
    morning evening sunday monday tuesday wednesday thursday friday saturday first second last
    next once twice work job money price cost pay paid buy bought food rice bread milk tea coffee
    sugar salt fish meat egg eggs eat eats ate cook cooking man men woman women friend neighbor
    teacher school church market rain sun wind hot cold warm cool new old big large small short
    high hard easy open close closed shut full half one two three much many more most lot lots
    really maybe perhaps probably should would could might must shall ought because since until
    while during before after always often sometimes usually never ever else though plan plane
    place plate plastic paper glass metal wood stone hand hands head eyes feet foot hair face left
    right front back top turn turned push pushed pull pulled press pressed hold held hang hung
    lift lifted stand stood set sat lay laid walk walked went going gone leave live lives lived
    mine main mind mean means meant mom need near news name named nine none noon note dinner lunch
    breakfast god lord jesus allah amen bible please pls kindly speak talk talking heard hear
    listen call called phone cell charge battery network picture photo pic image video strop shops
    stops stoic store story storm staff stuff stick still sport spot spots slot slots slip slap
    stamp drip trip tip tap tape tops pop hop mop crop drop prop cracker corner cover done dome
    bone tone cone lone line lines move mover fill fell feel fall fuel wall well will bell fiver
    river fever lever liver cider older folder golden silver sister mister master matter letter
    later water wafer better butter bitter litter latter ready reach read rude ride rode rest west
    best test text nest neat heart heat health healthy earth east gud bad dad sad mad bed red fed
    wed led maid aid books real posted shipping reserved pages following access property value
    stock september blog quote cars gold collection past style rules rock tips fact choose wide
    loss clothing teens cable score follow flash fund summer contract purpose deal tree success
    horse rule testing leading trust fees string spain remote steel driver showing blogs parent
    diet selling sheet root shirt saint creating separate chain truth follows camp gene brain
    flower soul aids stated prepared train followed blow battle wire filed married sharing bags
    wales bars reviewed rise dell bids cape guess connected containing fear convention beat layer
    clock bass pair peak wheel greek walking lane kits leaving plain checking holy buddy cotton
    meter relating tested bowl inspection cambridge potter painting greece vary visiting clicking
    misc shell hunting suit indexed cartoon bright ports boots pulse flashing sitting putting
    amended bills bold aged camping peer rail cache shipped prayer quiet crown fellow lies horses
    discovered harris skill chairs filing foster tissue crash counting count happy birthday whoosh
    thot alot advised`,
}
