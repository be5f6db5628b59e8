import { labelled } from './reply-set'
/** A fourth English batch, written after the third was mended. */
export const fourthEnReplies = labelled('en', [
  [
    'wash',
    'slow',
    `the flow has gone down | water seeps out slow | barely a cup an hour | v slow today | it's slowing | slow again after 2 days | weak stream | not fast enough | takes half a day per bucket | just a dribble | runs like a snail`,
  ],
  [
    'wash',
    'no-flow',
    `nothin | no wota | doesn't drip even | all stopped no water comes | water isn't going through | blocked i think`,
  ],
  [
    'flow',
    'flow-figure',
    `12 mins roughly => 12 | 1 h 15 => 75 | eighteen min => 18 | 3min => 3 | thirty two => 32 | 6:15 => 6.25 | 11 or 12 => 11.5 | 100 seconds => 1.6667 | 45 => 45 | it's 9 => 9`,
  ],
  [
    'step',
    'broken',
    `yes there's a crack | crack on the side | yes it leaks | it has a hole | fell last week | yes it was frozen | the tube is split`,
  ],
  [
    'step',
    'no',
    `no cracks | it did not fall | not frozen | nothing broken | no holes | never dropped it`,
  ],
  [
    'wash',
    'broken',
    `cap came off and broke | filter got smashed | lid cracked when i opened | water coming from everywhere | bucket leaking from the tap | pipe cut by rat | overnight frost cracked it | baby threw it`,
  ],
  [
    'change',
    'odd-water',
    `greyish water | water tastes of soil | bad odor | its black like ink | some oil smell | kerosene taste | worm in glass | rotten smell | foamy | rust colour`,
  ],
  [
    'none',
    'unwell',
    `kid has tummyache | diarrhoea in the house | my mum is vomiting | feverish child | got sick after drinking | my stomach hurts bad | runny tummy since sunday | he is in hospital | dysentry | boy not well`,
  ],
  [
    'none',
    'unwell',
    `he is unconscious† | child won't drink† | vomiting everything† | blood in poop† | she had a fit† | baby too sleepy to feed†`,
  ],
  [
    'none',
    'stop',
    `stop messaging | do not send | I want out | unsubcribe | no texts | please don't message | stop!!! | take me off this | cancel | enough now stop`,
  ],
  [
    'none',
    'wrong-number',
    `wrong no. | wrong number bro | not Fatima | this is John's phone not hers | you got wrong person | who? wrong number`,
  ],
  [
    'wash',
    'done',
    `i washed | washed this morning | Done, flowing good | did wash | ok i did it | yes washed | finished now`,
  ],
  [
    'wash',
    'not-yet',
    `not now | l8er | in the evening | will wash | tomorrow morning | no time yet | sorry busy | didn't wash`,
  ],
  ['none', 'need-part', `cap lost | need filter | send syringe | hose is missing | want new cloth`],
  ['none', 'ask', `how? | when to change? | what does it mean? | can i drink? | where do you live`],
  ['none', 'thanks', `tnx | thanks sir | bless you | thanks very much | thank youuu`],
  ['none', 'moved', `moved house | we live in town now, new address | relocated last month`],
  ['step', 'yes', `yes pls | yea | ok fine | it is yes`],
])
