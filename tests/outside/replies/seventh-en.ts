import { labelled, type LabelledReply } from './reply-set'

/** A seventh batch, written in five parts while the reader was widened: each was read before it was learnt from. */
export const seventhEnReplies: LabelledReply[] = labelled('en', [
  [
    'wash',
    'unwell',
    `will do, only that my sister is throwing up her breakfast | cant now am nursing my mother she is burning with fever | sorry for late reply i was down with malaria |
      filter washed. by the way grandpa is shivering since last night`,
  ],
  [
    'none',
    'unwell',
    `my tummy sings since i drank that water | the infant has sores in the mouth and loose poop | three of us spent the night squatting outside | he's out cold and foaming† |
      my baby hasn't had a drop of milk today, she turns away† | whole compound is down | my doughter is vomitting n has diarhoea since yestaday | baby no dey chop, body dey hot | he as fever and hedache |
      kid pooping watery like 10 times today | stumach cramps all of us | pikin dey purge | shes unconsious pls help† | there is bludd in his stool† | my mum collapsed this morning† |
      small boy has been running to the toilet since last night | me and the wife have bad tummies | everyone who drank from it is squatting in the bush | daughter cant hold food down† |
      the twins are on a drip at the health centre | my nephew is just lying there, he doesnt even open his eyes† | grandpa passing red water when he goes† | i have a rash all over since i started bathing with it |
      please come quick my son is convulsing† | grandmother has not kept anything down since yesterday† | we are all visiting the toilet too much | my husband had to see the doctor about his stomach |
      the child's poop has blood in it† | my little one has the squirts | baby too weak to suckle† | kids throwing up after drinking | He hasn't been himself, very hot and shivering | i feel dizzy and my belly is turning |
      she wont wake up properly† | my last born is refusing food and crying holding his tummy | Since we started with this filter my kids keep getting the runs, is it connected? | wife in labour ward with typhoid they say |
      her eyes are sunk and she is limp† | he shook all over and his eyes went white† | got food poison or something, been on the loo all day`,
  ],
  ['change', 'unwell', `changed it. is it ok that my granny feels nauseous`],
  [
    'flow',
    'unwell',
    `dont know, at the health centre with my boy | 9 minutes but the baby has been purging | 12 min. also my daughter has a bad stomach since monday | 8 min but my baby has a temperature`,
  ],
  [
    'step',
    'unwell',
    `tap ok. kid not ok, boiling hot | no crack but my wife is in hospital | cap is fine. its us who are not fine, everyone has cramps`,
  ],
  [
    'none',
    'broken',
    `i heard a pop and now its spraying | theres a chip out of the rim | my puppy got to the tube | the screw part is stripped and it wobbles | the filter went for a swim down the stairs | it cracked when i poured hot water |
      flow doubled overnight, strange | it was so cold the thing is a brick of ice | the fliter fell down n broke | its leeking from the botom | d tap don spoil e dey leak | the bukket cracked | hose has bin cut by rats |
      my son trow am for ground | water comin out the sides | the cat pushed it off the counter and now it wobbles | there is a line running down the side of the housing and its damp |
      my brother drove over the hose with the wheelbarrow | left it too near the fire, it's gone soft and bent | we found ice inside this morning | the top half and bottom half dont hold together anymore |
      the tap came off in my hand | theres a puddle under it every morning | somebody stepped on it | The seal doesn't hold anymore, water escaping round the rim | goat chewed the pipe |
      water just gushes through it like theres nothing in there | it was outside in the snow and froze | the tube got a tear | my kids used it as a football | water drips from the base all day so the cupboard is soaked |
      the handle broke and it fell in the well | left in the truck overnight, it was minus ten | it pours like nothing is inside, used to drip slowly`,
  ],
  [
    'wash',
    'broken',
    `done but now it dribbles from underneath | water is running out from where the pipe enters | it slipped while i was washing and hit the sink | when i was washing the inside part popped out and will not go back`,
  ],
  [
    'step',
    'broken',
    `yes there is, like a spider web on the side | yes its craked small at the side | when i tightened the cap it went crack | yes theres a hairline crack near the bottom | i looked and there is a thin split along the seam`,
  ],
  [
    'none',
    'odd-water',
    `something like cotton in the water | the water feels slimy | it leaves my teeth gritty | petrol smell | the kids say it tastes like pennies | tadpoles!! | water is browm | the watr smels bad | i see worms insde |
      water get colour like soda | tasting bitter these days | the glass leaves a brown ring | there's something wriggling in my cup | it has a whiff of drains about it | tastes like licking a coin |
      little white threads are floating in the jug | water has turned yellowish | little black bits coming out with the water | there is green stuff growing in the tank and the water is green too |
      it tastes different, sort of metallic | smells like rotten egg | I saw a small worm in my glass | looks like milk | the water has an oily skin on top | theres grit at the bottom of my cup | tastes of earth`,
  ],
  [
    'wash',
    'odd-water',
    `cleaned it this morning, came out brown | washed it but now the water looks like weak tea | i washed but the water still smells | washed yesterday, today the water is greenish`,
  ],
  [
    'none',
    'stop',
    `i'm done with this, no more | please unregister my phone | your texts wake the baby, stop them | leave my phone in peace | i want to cancel | stop msging me | abeg no send me message again | pls remov my numba |
      do me a favour and lose this number | i've had it up to here with these texts | please i dont need your reminders any longer | cancel me | every day message message message, leave us | please stop sending me these |
      I don't want to be part of this anymore | why do you keep texting me?? stop it | take me off your list pls | kindly remove my contact from your system | enough now | i did not agree to receive these messages |
      we are not interested anymore thanks | STOP SENDING`,
  ],
  [
    'none',
    'wrong-number',
    `never heard of this programme | my name is Otieno i sell shoes, you are mistaken | we have piped water, not us | rong numba | u got d wrong person oh | i no get filter o, who be this | who? this is Pastor Ben's line |
      you must be looking for the previous owner of this line | we dont own any filter, check your records | I think you've got the wrong person | sorry i'm not the one you're looking for |
      this number belongs to somebody else now | who is Amina? wrong number | sorry you have the wrong lady, I am Beatrice not Akinyi | this is not the number for the Mwangi family |
      I bought this simcard last month, i dont know the owner | filter? what filter`,
  ],
  [
    'wash',
    'done',
    `washed and all, no leaks nobody sick | i av washd it | dun it this mornin tnx | okay done | madam the bucket is sparkling, my daughter took care of everything this morning |
      scrubbed the thing till my fingers hurt lol its flowing lovely | My leg is paining from standing but I washed it | he had fever last week but he's up and playing, filter washed this morning |
      Yes it was washed on Tuesday | all done, thank you for the reminder | finished washing, it's much faster now thank you | I cleaned it this morning as you advised`,
  ],
  [
    'step',
    'no',
    `no cracks, no leaks, all dry | nope its nt | no cracks that i could see | nah its all tight | not leaking, not cracked, nothing | no, nothing is broken | not that i can see | nope | no it isnt cracked |
      dry, no leak at all`,
  ],
  [
    'none',
    'done',
    `thanks, my son got well and the filter runs fine | all is well with the filter and with us | no problems, works great, nobody ill | everything good here, plenty of water | hi just to say filter is working fine`,
  ],
  [
    'wash',
    'slow',
    `did all the washing but patience is needed | done but stil slow | washd it but its stil very slo | ive washed it like you said still it takes the whole of my soap opera to fill one jug |
      honestly it just pees a little, like my grandfather | since harmattan the filter has lost its strength | did it twice. stubborn thing | Cleaned it 3 times, no improvement at all | yes washed but the flow is poor |
      i washed it thoroughly yet it remains sluggish | not much difference after washing | ok i washed it but i think its still clogged, only drops`,
  ],
  [
    'none',
    'slow',
    `the jar takes all morning | e dey drop small small | flow as reduced alot | takin 2 long | we are eight in the house and the filter cannot cope | by the time i collect a cup my tea is cold |
      it's taking forever these days | used to take 10 min now nearly an hour | only a thin trickle | its getting slower by the day`,
  ],
  [
    'none',
    'no-flow',
    `watr not comin at all | notin dey come out of am | the tap of it is dry like desert | the top bucket stays full the bottom one stays empty | no water at all since sunday | it has dried up completely |
      no drop since yesterday evening`,
  ],
  [
    'wash',
    'no-flow',
    `no wata dey come out | not a bead of water since the children washed it | washed it and now nothing comes out | we washed but water refuses to pass`,
  ],
  [
    'flow',
    'flow-figure',
    `abt 15mins => 15 | 10 mnt => 10 | it tuk twenty five minits => 25 | 2hrs => 120 | 7min30 => 7.5 | from 7.15 to 7.32 => 17 | eleven n a half mins mzee => 11.5 | used to be 5 but this week its 14 => 14 | 1hr 5 => 65 |
      like 40 secs => 0.6667 | quarter past hour? no sorry i mean 15 min => 15 | Put it at 4:10pm, came back 4:25pm it was full => 15 | about a quarter of an hour | between 9 and 10 mins so say 10 => 10 |
      it was seven minutes and thirty seconds => 7.5 | took us 25 minutes to fill the bottle => 25 | 3mins 45 => 3.75 | It's about 22 minutes I think => 22 | 6 minutes 20 seconds => 6.3333 | an hour and twenty => 80 |
      less than 5, maybe 4 and half => 4.5 | half past... sorry, 35 min => 35`,
  ],
  ['change', 'done', `changd alredy | the cartridge is in | i have put the new cloth`],
  [
    'wash',
    'not-yet',
    `nt yet | wil do it tomoro | i dey work now, wen i reach house | give me till sunday, harvest time | water finish for house so i no fit wash am today | I'm travelling, back on Friday |
      will ask my brother to do it at the weekend | ill do it tonight when the kids sleep | sorry i forgot will do | am at a funeral upcountry`,
  ],
  [
    'none',
    'need-part',
    `i nid a new seringe | pls send cloth, our own don tear finish | please the little rubber ring has perished, any spare | the syringe plunger is stiff and useless, can you give another one |
      what do i pay for a new candle, mine is finished | could you send another o-ring | we need a new filter candle please | where can i buy a syringe | can i get a replacement hose mine is old |
      the cloth is worn out please send | our syringe got lost in the move`,
  ],
  [
    'none',
    'ask',
    `hw do i wash it | wat tym are u coming | do i put the arrow up or down | is it alright to put hot water | when is your man passing by our side | sorry teacher, i did not grasp step two |
      can the goats drink from it as well | how often should we wash it | does it remove chlorine | My neighbour wants one too, how can she get it? | can i use it for well water | what do you mean by backwash |
      how do i know when to change the candle | please call me i dont understand the text`,
  ],
  [
    'none',
    'moved',
    `we don pack commot from there | we left that compound at christmas | the filter went to my sister inlaw, i no longer have it | we don't live there any more | I gave it to my mum in the village |
      we have shifted to Nakuru | neighbour took over the filter when we left`,
  ],
  [
    'none',
    'thanks',
    `tanx alot | you people are doing gods work | thank you my daughter, stay blessed | thanks a million | thank you so much`,
  ],
  ['step', 'yes', `yess | it is yes | yes i checked it is | yeah its tight`],
  [
    'none',
    'unclear',
    `hw far | lol wrong group | ok but which one is winning, arsenal or man u | see you at the match | call me | ok mum see you at 6 | ??`,
  ],
  [
    'change',
    'slow',
    `swapped the candle, no better than the old one to be fair | changed it and it is still dripping one drop at a time | new stage in, flow still weak`,
  ],
  [
    'step',
    'no-flow',
    `lifted it, tapped it, prayed over it. zilch | opened the tap full and nothing`,
  ],
  [
    'flow',
    'broken',
    `filled in a blink, 15 seconds, that cannot be right | it fills in 20 seconds now, way too fast`,
  ],
  [
    'change',
    'not-yet',
    `the rains have cut the road, the part is still at the post office | waiting for my husband to come home | i have not received the new part yet`,
  ],
  ['flow', 'not-yet', `my phone timer is spoilt, will borrow one | i'll time it in the morning`],
  ['wash', 'unclear', `hmm | it stopped`],
  ['wash', 'yes', `sure thing boss`],
  [
    'change',
    'broken',
    `the new one arrived broken | the new piece doesnt fit, water comes out around it`,
  ],
  ['flow', 'odd-water', `5 min but its cloudy | seven minutes, but it stinks`],
  ['wash', 'stop', `no more of this`],
  ['step', 'slow', `tried that, a bit faster but still slow`],
  ['flow', 'no-flow', `cant measure, nothing is coming`],
  ['step', 'done', `did it and now it runs well | tightened it and the drip stopped`],
  ['step', 'ask', `which cap the top one or bottom one?`],
  ['none', 'help', `help`],
])
