import { labelled } from './reply-set'

/** A second English batch, written after the reader passed the first, as other people would text. */
export const freshEnReplies = labelled('en', [
  [
    'wash',
    'slow',
    `
    Hello my dear the water is only coming a bit at a time since monday | bruh its so slow | good evening, I washed it as told however the stream remains thin | it be taking forever fr | we get maybe one cup an hour |
    used to fill fast now it hardly moves | half a jug all night | i pushed the syringe 10 times and it still crawls | water coming like tears | my mother says it is slower than when you came | pls its not giving enough for the kids |
    so i did the wash and everything but honestly it is still very slow i dont know why | the flow aint good no more | speed is bad | done it twice but it still takes ages`,
  ],
  [
    'wash',
    'no-flow',
    `
    ain't nothing coming out | since this morning not a single drop has come through | the thing stopped giving water | i fill the top but bottom stays empty | we pour water in but nothing goes down | tap open but no water | completely blocked up | it quit flowing yesterday | hasnt given any water in 2 days | water just sits there and does not go through`,
  ],
  [
    'flow',
    'flow-figure',
    `
    bout 9 mins => 9 | took us eleven minutes => 11 | I counted 14 => 14 | 13ish => 13 | started 10:00 finished 10:20 so 20 minutes => 20 | nearly half an hour => 30 | it says 8:45 on the stopwatch => 8.75 | six and a half => 6.5 | an hour and 10 minutes => 70 | Good morning. It took 17 minutes. Thank you. => 17 |
    2min 15sec => 2.25 | approx 22 min for 1 litre => 22 | fifteen mins or so => 15 | 40 seconds => 0.6667 | forty minutes!! => 40 | around 1 hr => 60 | 5mins 5secs => 5.0833 | 19 mnts => 19 | ans is 6 => 6 | 7.5 => 7.5`,
  ],
  [
    'wash',
    'broken',
    `
    my grandson knocked the whole thing off the shelf | the little plastic nut split in two | theres water dribbling from the seam | it got left outside and turned to ice | the bottom of the bucket has split open | the tap wont close and water keeps pouring out | the dog has bitten through the tube | water is pouring out from under it | someone sat on the filter and bent it |
    it came apart in my hands | seems there is a hairline crack on the casing | the hose popped off and flooded the floor | wet all round the base so i think it leaks | the water flies through now, way quicker than normal | it slipped from my hands onto the concrete`,
  ],
  [
    'change',
    'odd-water',
    `
    the water has turned a funny colour | it looks like weak tea | there r tiny black specks floating | tastes like pennies | my wife says the water smells like a wet dog | kids refuse to drink because it stinks | water got a petrol kind of smell | sort of greenish | little wiggly things swimming in the glass | it's gone all cloudy | tastes soapy |
    a bad odour from the jug | the water is yellowish and smells`,
  ],
  [
    'none',
    'unwell',
    `
    the baby has been running to the toilet all night, very watery | grandpa has a high temp and the shakes | my little boy is burning up | she has been puking since last nite | everybody in the house has tummy trouble | wife is down with cholera they say | kid got the squits | i feel really rough, belly cramps | sister's stool is like water | we went to the clinic because of stomach problems | two of my children fell sick this week | my son is not feeling too good |
    done the wash but our youngest came down with diarrhea | hes been on the toilet all day with his stomach | nan is poorly and cant keep food down†`,
  ],
  [
    'none',
    'unwell',
    `
    the baby will not take the breast since morning† | my little girl just lies there and does not answer me† | she is too weak to drink† | there was blood when he pooped† | he started shaking and his eyes rolled back† | we cannot wake him up† | everything she swallows comes back up† | my daughter fainted† | newborn stopped sucking† | he is hot and so drowsy he can't sit up†`,
  ],
  [
    'none',
    'stop',
    `
    can you please stop sending me these | enough with the texts | I no longer wish to receive these messages | take me off this list please | stop msging this phone | pls remove my num | i dont wanna get these anymore | quit it with the messages | UNSUBSCRIBE ME | do not message this number again | stop!!!! | kindly stop texting | im done with these texts stop | please end these messages | dont write to me again ok`,
  ],
  [
    'none',
    'wrong-number',
    `
    sorry you've got the wrong person here | hi this isnt patrick | nobody called amina lives here | i think u mixed up the numbers | this phone belongs to someone else now | never heard of any filter, wrong number mate | you texted the wrong phone | I am not Mrs Okafor | wrong # | who is this? I don't know any water program, wrong number`,
  ],
  [
    'wash',
    'done',
    `all sorted | yep finished it this morning | washed and put back together | I have cleaned it, thank you | job done | did that yesterday evening | its washed now | completed madam | my daughter cleaned it for me | i hv done it`,
  ],
  [
    'wash',
    'not-yet',
    `not had the chance | tmrw inshallah | I'll get to it on the weekend | been too busy, sorry | havent gotten round to it | will do once the rain stops | not done it yet, my hand is hurt so tomorrow | remind me next week please | in the evening when my son is home | i was going to but forgot`,
  ],
  [
    'none',
    'need-part',
    `could you bring another syringe | the tap washer is gone need a new one | we have no more cloth filters | where do I get a replacement hose? | my syringe is lost | the cap went missing | requesting new carbon stage | we dont have the spare part`,
  ],
  [
    'none',
    'ask',
    `how often should this be cleaned | does the water need boiling first? | what time will the man come | is it ok to give to the baby? | which end goes up | can I leave it in the sun? | what does backwash mean | do you guys fix buckets too? | explain again please | why must i do this every two weeks?`,
  ],
  [
    'none',
    'thanks',
    `thank you so much for your help | God bless you all | much appreciated | cheers | ta very much thanks | thanks a million`,
  ],
  ['step', 'yes', `yes it does | yup | sure thing | yes ma'am | that's right`],
  [
    'step',
    'no',
    `no it isn't | nope not at all | no cracks that i can see | negative | no nothing like that`,
  ],
  [
    'step',
    'done',
    `it's running well again | oh thats much better | flowing nicely now | all fixed | it works now thank God`,
  ],
  [
    'none',
    'moved',
    `we've gone to live in the next town | not in that house anymore, we moved | I have shifted to my brothers place | our family relocated`,
  ],
  [
    'wash',
    'unclear',
    `it just stopped | it has stopped | stopped | the pump stopped | what a day | see you`,
  ],
])
