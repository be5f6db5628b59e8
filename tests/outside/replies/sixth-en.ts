import { labelled, type LabelledReply } from './reply-set'

/** A sixth batch, by an author who had seen neither the reader nor the older sets. */
export const sixthEnReplies: LabelledReply[] = labelled('en', [
  ['wash', 'moved', `We shifted to Nakuru in june, filter stayed behind with the landlord`],
  [
    'step',
    'no',
    `not leaking at all | no crack that i can see | nope | Looked all over it with my glasses on and it isn't broken anywhere`,
  ],
  ['flow', 'wrong-number', `wrong person bro`],
  [
    'flow',
    'flow-figure',
    `one minute flat => 1 | 90 sec => 1.5 | 3:15 => 3.25 | a whole hour for one litre!! => 60 | two min thirty => 2.5 | 45s => 0.75 |
      started 6.10 finished 6.22 => 12 | 2m15s => 2.25 | quarter of an hour by my husbands watch => 15 |
      four and a half minutes => 4.5 | its very slow today it took abt 20 mnts => 20 |
      Hour an a half. I did the ironing in between => 90 | half an hour can you beleive => 30 | 3 and half minute madam => 3.5 |
      My daughter counted on the phone and it was 8mins exactly. God bless you people => 8 | last week it was 6 today its 11 => 11 |
      7 => 7`,
  ],
  ['step', 'unclear', `one of them maybe, the other one i dont know, ask him`],
  [
    'flow',
    'broken',
    `was always 5 min, today 10 seconds whoosh. never seen that |
      2 minutes but half of it runs down the outside from a hole near the bottom`,
  ],
  ['wash', 'wrong-number', `Think you want my neighbour, I'm not Beatrice`],
  ['change', 'moved', `we don't live at that house anymore`],
  [
    'step',
    'unwell',
    `no not cracked. But grandfather is passing blood when he goes to toilet† |
      Yes it was loose, tightened. Is it normal the twins are purging?`,
  ],
  [
    'step',
    'odd-water',
    `no crack. theres little black bits floating in the clean side |
      Nobody is ill thank God. But the water stinks like a pond since the flood`,
  ],
  [
    'wash',
    'need-part',
    `the plunger is gone from the syringe do you sell only that | Cant wash it, the children played with the syringe and now its lost`,
  ],
  [
    'wash',
    'done',
    `all washed and running nice | kk did it | Don wash am | our goat is sick but the filter is clean, i washed it myself |
      the boy was ill last week, he is fine and back at school now. filter washed on monday |
      thot it wud b hard but took 2 min, flowing fast as it should`,
  ],
  [
    'change',
    'not-yet',
    `ill do it tmrw after the market | Left it in the box still, husband does these things and he's back Thursday`,
  ],
  ['none', 'need-part', `pls where do i get the rubber ring it is worn flat`],
  [
    'change',
    'slow',
    `new cartridge in since sunday n its worse than the old one, a trickle | Swapped it just now. Slower then a snail on Sunday`,
  ],
  [
    'none',
    'stop',
    `quit texting me | how do i make these msgs end?? take me off | please remove my number from your list`,
  ],
  [
    'none',
    'broken',
    `the bucket fell off the stand this morning and now theres a line down the side |
      Since this morning it is pouring like a river no more filtering it seems | rat chew the pipe |
      we left it on the porch and it froze solid last night. it thawed is it ok to use`,
  ],
  ['none', 'wrong-number', `sorry no Mama Asha here | who is this? I never had any filter`],
  [
    'step',
    'slow',
    `cap not cracked, hose is fine, water still coming small small |
      let the air out. came strong one minute then went back to a dribble |
      yes i lifted the bucket higher. little bit better but not like when it was new`,
  ],
  ['step', 'yes', `yebo | Yeah it is | affirmative`],
  [
    'none',
    'odd-water',
    `why is my water red. is it rust | the filtered water leaves a green slime on the glass |
      my tea has a rainbow skin on top like petrol when i use filter water | water tasting like pennies | smells of egg, the bad one`,
  ],
  ['none', 'thanks', `tysm 🙏🙏 | asante sana, you are too kind`],
  ['change', 'ask', `Which side goes up? the arrow or the blue end`],
  ['none', 'done', `we will never stop using this filter, gives us sweet water every day`],
  ['wash', 'ask', `can i use bleach | hot water or cold? | how do i wash it`],
  [
    'wash',
    'not-yet',
    `soon soon | am on night shift this wk remind me sunday | not yet, no clean water to wash with till the borehole opens`,
  ],
  [
    'wash',
    'no-flow',
    `washed it and now not one drop | after the backwash it blocked. left it overnite and the container was bone dry at 6am`,
  ],
  [
    'wash',
    'odd-water',
    `did it, now tastes of soap even after rinsing three times | Washed, but what's coming out is the colour of weak tea`,
  ],
  [
    'wash',
    'broken',
    `goat knocked it over. the white candle thing is chipped at the bottom |
      washed it but now water is coming out where the hose joins and the floor is wet |
      my nephew boiled the filter by mistake and it has gone a funny shape, kind of melted |
      done but there's a hairline in the ceramic, you only see it with a torch`,
  ],
  ['none', 'unclear', `happy birthday uncle!! 🎂`],
  [
    'flow',
    'slow',
    `thread of water thin like sewing cotton thats what we have |
      didnt time it sorry but grandma says its slower than her knees lol |
      went to cook ugali and came back and the bottle wasnt even half`,
  ],
  ['flow', 'odd-water', `4 min and there is small worms swimming in the bottle!!`],
  [
    'wash',
    'slow',
    `did the washing twice since morning but it is still dripping like a tap somebody forgot to close |
      Washed. Still crawling im afraid | nobody sick, nothing leaking, it just dont give much water even after i scrubbed |
      I don do am as you talk but the water no dey rush like before |
      Sorry for late, took baby for vaccination she is well. Filter washed yesterday evening, flow is still very weak.`,
  ],
  [
    'flow',
    'unwell',
    `didnt time, everybody in this house has belly pain | 6 minutes. also me and my wife been throwing up but maybe it was the fish`,
  ],
  [
    'none',
    'ask',
    `can someone stop by tomorrow and show us again |
      Dear Sir/Madam, I hope this finds you well. I would be grateful to know how often the filter ought to be washed during the dry season, as my late husband used to see to it. |
      Is it safe to use rain water from the iron roof in it?`,
  ],
  [
    'change',
    'need-part',
    `ours finished 2 months ago need new candle | we do not have another stage here, can you send`,
  ],
  ['change', 'unclear', `it's gone`],
  [
    'step',
    'not-yet',
    `I have not had the chance to try it, I am travelling and only my mother in law is there`,
  ],
  [
    'none',
    'slow',
    `takes forever now. kids thirsty just standing there waiting | why our water coming drip drip drip these days |
      Hello Rillpost. Since the rains began our filter has become lazy. It gives water but we wait the whole evening to have enough for tea. |
      it used to fill the jug before the news finish. now news finish, weather finish, jug is not full`,
  ],
  [
    'step',
    'broken',
    `handle came off in my hand | yep split right through | not the cap, the cap is good. its the tap that is leaking`,
  ],
  [
    'change',
    'done',
    `we have changed it | the new one is in place, my grandson put it for me. water is good, thank you my daughter`,
  ],
  [
    'wash',
    'unwell',
    `washed yes. my son fainted twice today and does not answer when we call† |
      baby wont take the breast since morning and she is floppy. filter not washed† |
      Haven't got round to it I've been in bed with a bug since Friday | done ok. my mum is down with typhoid they say |
      sorry late reply was at the hospital all night with my boy, fever. washed it now`,
  ],
  ['none', 'help', `HELP`],
  [
    'none',
    'no-flow',
    `top bucket full bottom bucket dry since last night |
      the water has stopped coming out of the filter since tuesday what did we do |
      Good evening sir, please our filter has refused to give water completely`,
  ],
  [
    'change',
    'broken',
    `the kids dropped the new one on the cement before i could put it. it rattles inside |
      When I unscrewed the old stage a piece of the plastic snapped and stayed inside`,
  ],
  ['change', 'choice', `2`],
  [
    'none',
    'unwell',
    `cant wake the little one properly he keeps falling back asleep and he had the diarea 2 days† |
      everything we give him comes back up, even a spoon of water† | she is shaking all over and eyes turned up pls what do we do† |
      auntie's skin and eyes have gone yellow colour | we no dey fine for this house o, three pikin dey shit water |
      My last born has running stomach since yesterday, is it the water`,
  ],
  ['wash', 'stop', `STOP | I'm begging you people leave me alone with these texts`],
  [
    'step',
    'done',
    `it quit leaking once i tightened the cap, all good | did that. works a treat now`,
  ],
  [
    'step',
    'no-flow',
    `Opened the valve like u said. nothing | no crack no leak but not even a dribble either`,
  ],
  [
    'change',
    'unwell',
    `Will change saturday God willing, my wife got cholera and we are at the treatment camp | Changed. Kids all got the runs tho`,
  ],
  ['flow', 'ask', `from when do I start counting, when I open the tap or when first drop falls`],
  ['change', 'stop', `unsubscribe. also it leaks but i dont care anymore`],
  ['change', 'no-flow', `i fixed the new one and zero water is passing`],
  ['wash', 'thanks', `ok thanks for reminding`],
  ['change', 'odd-water', `New stage is in and now water come out milky`],
  ['flow', 'not-yet', `havent measured, bottle is lost somewhere will look tonight`],
  [
    'change',
    'wrong-number',
    `This number used to belong to somebody else, I just bought the sim last week`,
  ],
  ['none', 'moved', `gave the filter to my sister, she needed it more`],
  ['flow', 'no-flow', `cant time it theres nothing coming out to time`],
  ['wash', 'unclear', `it stopped`],
  ['flow', 'stop', `No more messages please, my phone is for business only`],
  ['step', 'ask', `i dont understand that one, explain slowly for an old woman`],
  ['flow', 'moved', `I sold it when we left for the city sorry`],
])
