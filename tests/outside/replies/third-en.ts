import { labelled } from './reply-set'

/** A third English batch, written after the second was mended. */
export const thirdEnReplies = labelled('en', [
  [
    'wash',
    'slow',
    `Only a thread of water comes | the water drips down one by one | my bucket was full at night and in the morning just two cups | after washing it improved for one day now slow again | its kinda slow ngl | water output very poor | flow reduced a lot please advise | could you tell me why it has become so slow | waterr is comin slowlyy | it goes too slow | we have to wait hours for one glass | pressure very low since rain started | not as quick as it was`,
  ],
  [
    'wash',
    'no-flow',
    `no watter comes | it gives us no water | the filter is not passing water | water refuses to come out | it completely stopped passing water | there's no flow whatsoever | tap is open nothing drops | the pipe is jammed no water | zero flow today | dried up, nothing`,
  ],
  [
    'flow',
    'flow-figure',
    `I think 18 min => 18 | roughly 25 => 25 | three minutes thirty seconds => 3.5 | 1hr 5min => 65 | it needs 33 minutes => 33 | 12minutes30 => 12.5 | 9'20 => 9.3333 | ten past? no, 11 minutes => 11 | quarter hour => 15 | 0.5 hours => 30 | took 26 mins today => 26 | fifty => 50 | 14 minutes for the bottle, thanks => 14`,
  ],
  [
    'wash',
    'broken',
    `The housing has a big crack | the plastic is cracked at the neck | my filter snapped | hole at bottom of the top bucket | it is leeking badly | drips from where the hose joins | water is escaping around the lid | the frost got it last nite, solid ice inside | kids dropped it down the stairs | it tumbled off the stand | hose torn | fiber came out of the tube | the water gushes like no filter | it came out too quickly today | a rat made a hole in the pipe | the tap has snapped off, what now`,
  ],
  [
    'change',
    'odd-water',
    `water colour not normal | its brownish | water is coming with dirt | we see small worms | the taste has changed, it's bitter | the smell is terrible | smell of chemicals in the water | there is an oily film on top | black powder coming out | the water isn't clear today | its cloudy even after washing | tastes like plastic | there is sand in my glass | it stinks of bleach`,
  ],
  [
    'none',
    'unwell',
    `my babys tummy is upset | he's had the runs for 3 days | we both feel sick after drinking it | daughter vomited twice | the child has belly pain | fever started today | i have cramps and diarrea | my kid is feeling ill | wife not well since tuesday | our son got cholera | she is throwing up | the twins have loose motions again | nausea every morning | is the water making my son sick? | my husband was taken to hospital`,
  ],
  [
    'none',
    'unwell',
    `my baby is not drinking anything† | child refuses to drink and is very weak† | she's unconscious please help† | bloody stool since yesterday† | he vomits everything and is very sleepy† | my son keeps having seizures† | she won't wake up properly† | baby hasn't fed all day and is limp†`,
  ],
  [
    'none',
    'stop',
    `no more sms please | please remove me | stop it now | I don't want to be texted | quit sending this | can you stop messaging my phone | take my name off | dont bother me again | please cancel these messages | i am tired of your messages | leave me alone please | stop this nonsense`,
  ],
  [
    'none',
    'wrong-number',
    `Wrong number please | you're texting a wrong number | this number isn't Grace's | I am not that person | not me, wrong number | I have no idea who you are, wrong number | this is not the Mensah family | i bought this sim last week`,
  ],
  [
    'wash',
    'done',
    `washing done | it is clean now, i washed it | we did the wash | finished the cleaning | yes i have washed it sir | done ✅ | doneeee | I washed it yesterday evening | cleaned and working`,
  ],
  [
    'wash',
    'not-yet',
    `sorry not yet | will wash tmr | i will clean it this weekend | haven't found time | later today | im travelling, next week | not yet washed | my syringe is at my sister's, tomorrow | i plan to do it sunday | forgot again lol`,
  ],
  [
    'none',
    'need-part',
    `please I need another tap | our cloth is torn out, need new one | is it possible to get a new syringe? | no more carbon, please bring | need a replacement cartridge | we want a new hose | my cap is lost`,
  ],
  [
    'none',
    'ask',
    `how will i know it is clean? | when is the next visit | what is the price | can we use rain water? | how do you open it | why do you ask | who do i call | when should i change the cloth`,
  ],
  [
    'none',
    'thanks',
    `Thanks be to God and to you | thank you my dear | ok thanks | thnks alot | I appreciate it`,
  ],
  ['step', 'yes', `yes sir | yes i think so | yeah it is | okay sure | correct`],
  ['step', 'no', `no sir it is not | nope | no crack at all | no leaking | not at all`],
  ['step', 'choice', `1 => 1 | option 2 => 2 | number 3 => 3 | 2 please => 2`],
  ['wash', 'unclear', `my goat is lost | rain today | haha | the bus stopped | ok?`],
])
