import { enTroubleReplies } from './en-trouble'
import { labelled, type LabelledReply } from './reply-set'

/** English replies, labelled by hand for the tests; every kind, with the hard ones. */
export const enReplies: LabelledReply[] = [
  ...enTroubleReplies,
  ...labelled('en', [
    [
      'wash',
      'done',
      `
      done | Done | DONE | done! | done. | all done | its done | it is done | i did it | did it | i have done it | we did it yesterday | washed | washed it | i washed it today | filter washed |
      i have washed the filter | cleaned | cleaned it | we cleaned it this morning | finished | finish | completed | ok done | yes done | done thanks | done thank you | hello done | doen | dnoe | donee |
      ready | already did | already done | done madam | just finished washing | rinsed it and put back | i flushed it`,
    ],
    [
      'change',
      'done',
      `changed | changed it | i changed the cartridge | replaced | we replaced it | put the new one in | new one fitted | swapped it | done changing | it has been changed`,
    ],
    [
      'step',
      'done',
      `
      better now | it is better | much better | fixed | its fixed | works again | working again | water is flowing again | flows well now | it flows good now | back to normal | no longer slow | not slow anymore |
      faster now | it was slow but now its good | done its good now | straightened the hose | refilled the bucket`,
    ],
    [
      'wash',
      'not-yet',
      `
      not yet | no not yet | tomorrow | tomorow | tmrw | i will do it tomorrow | will do it later | later | l8r | i'll do it tonight | ill do it on sunday | i forgot | sorry i forgot | forgot | i have not washed it |
      havent washed it yet | haven't done it | didnt do it | not done | no time | no time today | busy | i am busy at work | when i get home | next week | i will wash it this evening | going to wash it | gonna do it later |
      not yet but thanks | i couldn't do it yet | we are away | not home now | i will | will do | in 10 minutes | ok tomorrow | i have not had time | 2moro | not today`,
    ],
    [
      'change',
      'not-yet',
      `not changed yet | i have not changed it | will change it on saturday | tomorrow i change it`,
    ],
    [
      'none',
      'need-part',
      `
      i need a new cap | need new cap | need a cartridge | send me a new hose | please send a syringe | we need a new filter | we lost the syringe | lost the cap | i cant find the syringe | no syringe |
      i dont have the syringe | we dont have a syringe | can i get a new tap | bring us a new hose please | we ran out of carbon | need spare parts | where can i get a new cartridge | want a new cap |
      the syringe is missing | syringe got stolen | send another cloth | please bring new fibre`,
    ],
    [
      'none',
      'ask',
      `
      how do i wash it? | how do i wash it | how to clean the filter | how many times do i push the syringe? | when do i change the cloth? | when will you come? | can we drink the water? | can i drink it |
      is it safe to drink? | what do you mean? | what does this mean | i dont understand | don't understand | where is the syringe hole? | why? | why do i need to wash it? | which side is up? | what should i do | what do i do now? |
      do i wash with hot water? | should i boil the water? | how long do i wait? | hw do i do it | i have a question | can i use soap? | how much does it cost? | is this normal? | who will come and when | do we need to change the carbon now?`,
    ],
    [
      'none',
      'thanks',
      `
      thanks | thank you | thx | thank u | tnx | ty | thanks a lot | thank you very much | thank you so much madam | god bless you | god bless | many thanks | we are grateful | thank you for the filter | 🙏 | ok thank you bye | thankyou sir | thanx`,
    ],
    [
      'step',
      'yes',
      `yes | Yes | y | yeah | yep | yess | ya | yes it is | sure | ok | okay | ok ok | of course | 👍 | yes please | yea | k | alright | yes madam`,
    ],
    [
      'step',
      'no',
      `no | No | nope | nah | no no | not really | no sir | NO. | no madam | not cracked | no cracks | no leak | its not leaking | not broken | no it isn't | nobody is sick`,
    ],
    [
      'step',
      'choice',
      `1 => 1 | 2 => 2 | 3 => 3 | 1. => 1 | #2 => 2 | 2) => 2 | one => 1 | two => 2 | 1 thanks => 1 | number 2 => 2`,
    ],
    [
      'none',
      'stop',
      `
      STOP | stop | Stop. | STOP!! | stop please | please stop | unsubscribe |   unsubscribe | end | quit | cancel | revoke | opt out | opt-out | OPT OUT please | stopall | STPO | stopp | stop it | no mas |
      dont text me | don't text me | do not text me again | stop texting me | please stop texting me | stop sending me messages | no more texts | no more messages please | stop these messages | leave me alone |
      remove me | remove my number | take me off your list | i dont want these messages | i don't want your texts anymore | stop messaging me | quit texting me | dont message me again | do not contact me | please remove me from this |
      i do not want to receive messages | stop bothering me | enough messages stop | stop sms | delete my number | stop the texts now | pls stop sending | no more sms | stop stop stop | dont send me any more`,
    ],
    [
      'none',
      'wrong-number',
      `
      wrong number | Wrong number. | wrong num | rong number | wrong person | you have the wrong number | u have wrong number | sorry wrong number | i think you have the wrong number | this is the wrong number |
      this is not maria | this isn't her number | not my filter wrong number | i dont know any maria | i am not the person you are looking for | this is not his number anymore | i don't have a filter, wrong number |
      wrng number | you are texting the wrong person | someone else's number | i just got this number | what filter? wrong number`,
    ],
    [
      'none',
      'moved',
      `we moved | i moved | we have moved to another village | we moved house | moving to the city | i no longer live there | new address | we live somewhere else now | i moved to my mothers house | we shifted to another village`,
    ],
    [
      'none',
      'help',
      `help | HELP | info | help me | i need help | please help | can someone help me`,
    ],
    ['none', 'start', `START | start | unstop | start again please | Unstop`],
    [
      'wash',
      'unclear',
      `
      it stopped | it stop | water stop | it stopped dripping | water end? | the filter will stop | shop | step | asdf | hmm | lol | . | ? | my cow is in the field | call me | hello | hi | good morning | not working | it does not work |
      jajaja | the bus stops at the market | how are you`,
    ],
  ] as const),
]
