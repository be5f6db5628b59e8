import type { LanguagePack } from './concept'

/** English: illness, and who is ill. */
export const enIllness: LanguagePack['concepts'] = {
  child: `son, daughter, baby, babies, child, children, kid, kids, boy, girl, infant, toddler, newborn, grandson, granddaughter, grandchild, grandchildren,
    little one, twins, bby, babe, nephew, niece, lil one`,
  person: `wife, husband, mother, father, mum, mom, mama, dad, papa, brother, sister, grandmother, grandfather, grandma, grandpa, granny, uncle, aunt, auntie, family, neighbour, neighbor, everyone, everybody,
    people, woman, man, old man, old woman, she, he, we all, somebody, someone, we, us, they, all of us, cousin, in law`,
  stool:
    'stool, stools, poo, poop, pooping, potty, toilet, motion, motions, shit, shitting, feces, faeces, nappy, diaper',
  belly: 'belly, stomach, tummy, tumy, stomac, gut, guts, abdomen, bowel, bowels, insides',
  all: 'everything, every thing, all she eats, all he eats, whatever, anything she eats, anything he eats, all the time, after every, every feed, each time',
  ill: `ill, illness, sick, sik, sickness, sickly, siick, unwell, diarrhoea, diarrhea, diarea, diarrea, diarhea, diahrea, diarhoea, dairrhea, diorrhea, diaria, the runs, runny tummy, runny stomach, running stomach, running tummy, runny belly, running belly, stomach running, tummy running, loose stool*, loose motion*, watery stool*,
    fever, feverish, temperature, cholera, typhoid, dysentery, hepatitis, jaundice, dehydrated, dehydration, nausea, nauseous, nauseated, queasy, cramp, cramps, cramping, hospital, hospitalised, clinic, doctor, poisoning, infection, upset stomach, stomach upset, upset tummy,
    bad stomach, bad belly, bad tummy, stomach bad, stomach bug, tummy bug, worms in her, worms in his, rash, itching, itchy, weak and, very weak, too weak, so weak, dizzy, not well, isnt well, not feeling well, not feeling good, feeling bad, feels bad, feel bad, feeling poorly, is poorly, under the weather, shivering,
    not doing well, bad guts, purging, emojiill, toilet all night, toilet all day, keeps going to the toilet, medicine, pain in, dying`,
  pain: 'pain, pains, painful, paining, ache, aches, aching, hurt, hurts, hurting, sore, stomachache, bellyache, tummyache',
  blood: 'blood, bloody, bleeding, blod',
  vomit: `vomit, vomits, vomiting, vomited, vomitting, vomitin, vommit*, throw up, throws up, throwing up, threw up, thrown up, puke, pukes, puking, puked, being sick, sicking up, cant keep anything down, cant keep food down, bring up everything`,
  sign: `convuls*, seizure*, fits, fitting, having fits, had a fit, has a fit, unconscious, unconcious, not conscious, passed out, passing out, faint, fainted, fainting, collapsed, wont wake, doesnt wake, does not wake, will not wake, cant wake, not waking, cannot wake, hard to wake, dont wake, cant wake him, cant wake her, didnt wake up,
    letharg*, listless, floppy, limp, not responding, doesnt respond, no response, unresponsive, not moving, hardly moves, barely moves, cant breathe, not breathing, hard to breathe, cannot breathe, sunken eyes, eyes sunken, died, dead, jerking, shaking all over, stiff and shaking,
    cant keep anything down, cannot keep anything down, vomits everything, vomiting everything, throws up everything, throwing up everything, pukes everything, everything comes back up, everything comes up, everything she eats comes up, not keeping anything down, keeps nothing down, blood in stool, blood in the stool, blood in poo, blood in her poo, blood in his poo, bloody diarrh*, bloody stool*, bloody poo*, stool has blood, blood in it stool,
    not feeding, wont feed, stopped feeding, refuses breast, refusing breast, refuse breast, wont breastfeed, not breastfeeding, stopped breastfeeding, wont suck, not sucking, cant suck, refuses to suck, wont take breast, wont take the breast, not taking breast, wont nurse, cant breastfeed, cannot breastfeed, refuses to drink, refusing to drink, refuses water, refuses milk, stopped drinking, wont take milk, wont latch, rejects the breast, turns blue, gone blue`,
  sleepy: `sleepy, sleepi, very sleepy, drowsy, drowzy, sleeps all, sleeps all day, sleeping all day, sleeping all the time, only sleeps, just sleeps, always sleeping, keeps sleeping, too sleepy, very tired, so tired, too tired, no energy, dazed, wont stay awake, cant stay awake, confused, out of it`,
  drink: `drink, drinks, drinking, drnk, swallow, breastfeed, breastfeeds, breast feed, breastfeeding, feed, suck, nurse, eat or drink, take milk, take any milk`,
}
