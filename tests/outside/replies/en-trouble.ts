import { labelled } from './reply-set'

/** English replies about the water and the filter, labelled by hand for the tests. */
export const enTroubleReplies = labelled('en', [
  [
    'wash',
    'slow',
    `
    slow | very slow | its slow | it is slow | water is slow | the water is coming slow | water comes out slowly | SLOW | Slow. |
    slooow | sloww | slw | slwo | low flow | low pressure | flow is very low | the flow is weak | only a trickle | just a trickle now |
    trickling | it trickles | only drips | dripping only | drop by drop | drip drip drip | very little water comes out | little water |
    not much water coming | hardly any water | barely any water comes out | barely flowing | hardly comes | takes forever | it takes so long |
    takes a long time to fill | takes all day to fill | it is taking too long | not flowing well | its not coming fast | water not coming good |
    not running like before | less water than before | slower than last month | slowed down | it has slowed a lot | getting slower every day |
    done but still slow | washed it but still slow | i washed it and its still slow | did the wash but water still slow | cleaned, no change, still slow |
    we did what you said but it is still slow | done. slow | ok done but the water is weak | finished washing but no improvement still slow |
    yes slow | no its slow | hi the water is slow again | good morning madam the filter is slow | thanks but still slow | filter too slow we wait and wait |
    it slow down again | flow dropped | the flow has dropped | water has dropped a lot | not enough water for us | water is few | small water coming |
    the water dey come small small slow | slow since sunday | it was fine but now its slow | wtr is slow | water comes slowly slowly | why is it so slow?`,
  ],
  [
    'step',
    'slow',
    `
    still slow | same | the same | no change | no better | not better | no difference | its the same | still the same | nothing changed still slow |
    did it still slow | not improved | it did not improve | little better but slow | still weak | still dripping slowly | didnt help | no improvement`,
  ],
  [
    'wash',
    'no-flow',
    `
    no water | no water coming | no water comes out | nothing comes out | nothing is coming out | water not coming | water is not coming out |
    not flowing | no flow | no flow at all | it is not running | not a drop | not one drop | zero water | it doesn't flow anymore | doesnt flow | dont flow |
    water wont come | water won't come out | stopped flowing | it stopped flowing | the water stopped coming out | water has stopped flowing |
    blocked | it is blocked | its blocked completely | filter is clogged | clogged up | the hose is blocked | plugged | no more water |
    there is no water | we have no water | we have no water since yesterday | dry, nothing | nothing coming since morning | filter blocked no water |
    washed it and now nothing comes | done but no water comes | i cleaned it but no water | no water at all pls help | not even a drop comes |
    water does not pass | water cant get through | it wont run | no watr | noting comes out | water isnt coming`,
  ],
  [
    'flow',
    'no-flow',
    `nothing | none | no water | nothing came | zero | it never filled, no water comes`,
  ],
  [
    'wash',
    'broken',
    `
    the cap is cracked | cap cracked | cracked | it cracked | crack in the cap | there is a crack | its broken | broken | it broke | the tap broke |
    the hose is broken | hose split | the pipe burst | the container has a hole | there is a hole in the hose | leaking | it leaks | its leaking | it is leaking from the bottom |
    water leaks from the side | leak | big leak | leek from cap | leakin bad | water comes out from the side | water coming out of the joint | dripping from the cap |
    it drips from the bottom | filter froze | it froze last night | frozen | frozen solid | it was frozen this morning | i dropped it | dropped it | it fell | it fell down |
    the filter fell on the floor | my son dropped the filter | my kid knocked it over | fell off the table | the handle snapped | cap chipped | rats chewed the hose | goat bit the hose |
    the thread is damaged | the fibre is damaged | cartridge cracked | craked | crackd cap | it is crack | it crack | the lid broke off | hose came off | the hose came loose and leaks |
    the water is too fast | too fast | it runs too fast now | suddenly very fast | water gushing out | it pours straight through | faster than it should be |
    done but the cap cracked | washed it and cap broke | slow and leaking | its slow and also cracked | yes cracked | no it is cracked | no its not slow its leaking |
    help its leaking everywhere | water all over the floor | the seal is torn | bucket cracked | brocken cap | my daughter broke the tap`,
  ],
  [
    'change',
    'odd-water',
    `
    black water | the water is black | water came out black | water is brown | brown water | yellow water | the water looks yellow | cloudy | water cloudy | cloudy water |
    water is not clear | muddy water coming out | dirty water | water is dirty | the water comes out dirty | bits in the water | black bits in water | there are worms in the water |
    small insects in water | water smells | it smells | smells bad | bad smell | the water stinks | it stinks | smells like eggs | smells of rotten eggs | taste bad | bad taste |
    tastes funny | it tastes of metal | funny taste | the water tastes weird | water is bitter | salty water | smells like petrol | smell of diesel | fuel smell |
    water smells of kerosene | oil on the water | chemical smell | tastes like chemicals | smells like paint | green water | slimy water | foam in the water |
    water is milky | red water | rusty water | grey water from the filter | done but water is black | changed it, water comes black | water look like tea |
    the water has colour | sand in the water | smelly | stinky water | its cloudy n smells | not clear water | water is not clean | wat smels bad`,
  ],
  [
    'none',
    'unwell',
    `
    my son has diarrhoea | my daughter has diarrhea | diarrhoea | diarea | my boy has diarhea since last night | baby has loose motion | children have runny stomach | running stomach |
    my kids are sick | my child is sick | we are sick | we are all sick | i am sick | my wife is ill | my mother is unwell | grandmother not well | my son is not well |
    my daughter is not feeling well | he is vomiting | she vomits | my girl threw up all night | throwing up | vomitting | my son is puking | fever | my baby has fever | high fever and diarrhoea |
    stomach pain | stomach ache | my belly hurts | tummy ache | stomach cramps | her stomach hurts | my stomach is paining | cholera | typhoid | dysentery | food poisoning maybe |
    my son is ill | the baby is ill | whole family sick after drinking | we got sick from the water | took him to hospital | my child is in the hospital | the doctor says it is the water |
    done but my son is sick | slow and my son has diarrhoea | washed it. kids have the runs | my husband has bad stomach | bad belly | upset stomach | ok but baby sick |
    sick | ill | my twins are sick | diarhoea and vomiting | siick child | my son got diarreha | kids got tummy bug | my neighbour is sick too | the little one is poorly | feeling sick`,
  ],
  [
    'none',
    'unwell',
    `
    baby cant drink n sleepy† | stool has blood† | blood in stool† | there is blood in his poo† | bloody diarrhoea† | diarrhoea with blood† | my baby cannot drink† |
    baby wont drink† | my son does not drink anything and has fever† | she cannot breastfeed† | baby wont feed† | baby not breastfeeding† | vomits everything† |
    he vomits everything he eats† | throwing up everything† | my child had convulsions† | she is having fits† | seizure† | my son is unconscious† | baby is unconcious† | he passed out† |
    child very sleepy and has diarrhoea† | my daughter is very sleepy and wont drink† | baby wont wake up† | he is lethargic† | baby is floppy† | my girl is not responding† |
    cant stop vomiting everything comes up† | baby is not moving† | sick baby sleeps all day and wont drink† | blood when my son goes toilet and diarrhoea†`,
  ],
  [
    'flow',
    'flow-figure',
    `
    12 => 12 | 7 => 7 | 7 minutes => 7 | 7 min => 7 | 7min => 7 | 7 mins => 7 | 7m => 7 | about 7 => 7 | about 15 minutes => 15 | 15 min. => 15 | it took 12 minutes => 12 | it takes 12 => 12 |
    12 minutes to fill the bottle => 12 | twelve => 12 | twelve minutes => 12 | twenty five minutes => 25 | twenty-five => 25 | half an hour => 30 | half hour => 30 | 1/2 hour => 30 | an hour => 60 |
    one hour => 60 | 1 hour => 60 | 1h => 60 | 1h30 => 90 | 1 hour 20 min => 80 | hour and a half => 90 | an hour and a half => 90 | one and a half hours => 90 | two hours => 120 | 2 hrs => 120 |
    quarter of an hour => 15 | three quarters of an hour => 45 | 4:30 => 4.5 | 4.5 => 4.5 | 4,5 => 4.5 | 4 and a half => 4.5 | 4 1/2 min => 4.5 | 4 min 30 => 4.5 | 4 min 30 sec => 4.5 | 4m30s => 4.5 |
    4'30" => 4.5 | 90 seconds => 1.5 | 90 sec => 1.5 | 45 s => 0.75 | two and a half minutes => 2.5 | 2 and half minutes => 2.5 | ten => 10 | TEN MINUTES => 10 | 10! => 10 | 10. => 10 | #10 => 10 | ~10 => 10 |
    5-6 minutes => 5.5 | 5 to 6 min => 5.5 | between 10 and 12 minutes => 11 | 20 minuts => 20 | 20 minits => 20 | 20 munites => 20 | thirty => 30 | forty five minutes => 45 | 8 minutes now => 8 |
    it is 8 min => 8 | 8 thanks => 8 | hello 8 minutes => 8 | the bottle took 9 minutes => 9 | 3 => 3 | 1 => 1 | 2 min => 2 | a minute and a half => 1.5 | one minute => 1 | 1 litre in 6 minutes => 6 |
    1 liter takes 6 min => 6 | slow, 20 minutes => 20 | still slow 25 min => 25 | 14 mins after washing => 14 | washed it, now 5 minutes => 5 | ১২ => 12 | ١٢ => 12 | १२ => 12 | １２ => 12 |
    timed it 11 min => 11 | 16min to fill => 16 | my phone says 13 minutes => 13 | 6 minutes 40 seconds => 6.6667 | it filled in 9 minutes => 9`,
  ],
  [
    'step',
    'flow-figure',
    `12 => 12 | 12 min => 12 | now 6 minutes => 6 | 5 => 5 | 3 minutes => 3 | still 18 min => 18 | 2 min => 2`,
  ],
  [
    'none',
    'flow-figure',
    `12 => 12 | 10 minutes to fill the bottle => 10 | bottle fills in 8 min => 8`,
  ],
])
