import { labelled, type LabelledReply } from './reply-set'
/** Replies chosen to trip a reader: denials, two meanings, mixed languages, questions about figures. */
export const hardReplies: LabelledReply[] = [
  ...labelled('en', [
    [
      'wash',
      'slow',
      `not broken just slow | no leak but slow | its not fast | cleaned but not better | its ok but slow | slow slow slow | pani is slow | muy slow | agua slow today | no crack, slow only`,
    ],
    [
      'wash',
      'done',
      `done and no longer slow | yes i did wash | washed n its faster now | listo done | ok washed. all good | finished, water is fine`,
    ],
    [
      'wash',
      'not-yet',
      `no i havent done it | never washed it | not washed | nope not yet | i have not cleaned the filter | dont have time today | mañana`,
    ],
    [
      'wash',
      'no-flow',
      `no agua | water not come | nothing since morning | 0 water | not a drop since we washed it`,
    ],
    [
      'wash',
      'broken',
      `not slow but leaking | no not ok its broke | filter dropped but ok | dropped and now slow | the cap isnt ok, cracked | it doesnt drip it leaks | kid dropped it, seems fine`,
    ],
    [
      'wash',
      'odd-water',
      `not clean water | water isnt clear | its running but brown | flow ok but smells | tastes fine but yellow | no slow but dirty water`,
    ],
    [
      'none',
      'unwell',
      `not slow but my son is ill | filter good, kids sick | no diarrhoea but fever | wife ill, how to wash? | sick baby, stop? | he is better but still has diarrhoea | ok thanks my baby is sick | fiebre en mi hijo`,
    ],
    [
      'step',
      'no',
      `no it is not cracked | not leaking | it never fell | no smell | no its not frozen`,
    ],
    [
      'none',
      'stop',
      `stop pls | STOP texting | dont msg me | por favor stop | stop sms now | no more | pls dont text again | STOP. wrong number`,
    ],
    [
      'none',
      'wrong-number',
      `wrong number but good luck | number is wrong | sorry im not maria | u r texting wrong person`,
    ],
    [
      'flow',
      'flow-figure',
      `not 10, 12 minutes => 12 | twelve mins slow => 12 | 5 now, thanks => 5 | 10mins!!! => 10 | like 7ish => 7 | 2min30 => 2.5 | abt 20 => 20`,
    ],
    [
      'none',
      'ask',
      `is 12 minutes ok? | what if it is slow? | how long should it take | stop or continue washing? | do i stop washing?`,
    ],
    ['none', 'thanks', `no problem thanks | thanks no issues | ok ty`],
  ]),
  ...labelled('es', [
    [
      'wash',
      'slow',
      `no está roto, solo lento | no gotea pero sale lento | no es rápido | limpio pero no mejora | slow el agua | sale bien pero poquita | ya no sale rápido`,
    ],
    [
      'wash',
      'done',
      `listo y ya no está lento | sí lo lavé ya | done ya | ok lavado, todo bien | ya lo limpie y sale bien`,
    ],
    [
      'wash',
      'not-yet',
      `no lo he hecho | nunca lo lavé | sin lavar todavía | no nada todavía | no tengo tiempo hoy | tomorrow`,
    ],
    [
      'wash',
      'no-flow',
      `no water | agua no sale | nada desde la mañana | 0 agua | ni una gota desde que lo lavamos`,
    ],
    [
      'wash',
      'broken',
      `no lento pero gotea por abajo | se cayó pero parece bien | se cayó y ahora lento | la tapa no está bien, rajada | no gotea, se fuga`,
    ],
    [
      'wash',
      'odd-water',
      `agua no limpia | sale pero café | corre bien pero huele | sabe bien pero amarilla | no lento pero sucia el agua`,
    ],
    [
      'none',
      'unwell',
      `no está lento pero mi hijo está enfermo | el filtro bien, los niños enfermos | no diarrea pero fiebre | esposa enferma, cómo lavo? | ya está mejor pero sigue con diarrea | gracias mi bebé está malito | my son is sick`,
    ],
    [
      'step',
      'no',
      `no, no está rajado | no hay fuga | nunca se cayó | no huele | no está congelado`,
    ],
    [
      'none',
      'stop',
      `stop porfa | ya no mas mensajes | please stop | no me mande msj | ya déjeme en paz | ALTO por favor | STOP. numero equivocado`,
    ],
    [
      'none',
      'wrong-number',
      `el número está mal, equivocado | perdón no soy maria | se equivocó de número amigo`,
    ],
    [
      'flow',
      'flow-figure',
      `no 10, 12 minutos => 12 | doce min lento => 12 | 5 ahora, gracias => 5 | 10mins!!! => 10 | 2min30 => 2.5 | como unos 20 => 20`,
    ],
    [
      'none',
      'ask',
      `12 minutos está bien? | y si está lento? | cuánto debe tardar | dejo de lavar?`,
    ],
  ]),
  ...labelled('fr', [
    [
      'wash',
      'slow',
      `pas cassé juste lent | pas de fuite mais lent | c'est pas rapide | nettoyé mais pas mieux | c slow | ça coule bien mais peu | ça coule plus vite du tout c'est lent`,
    ],
    [
      'wash',
      'done',
      `oui je l'ai bien lavé | done c fait | ok lavé, tout va bien | nettoyé et ça coule bien`,
    ],
    [
      'wash',
      'not-yet',
      `non je l'ai pas fait | jamais lavé | pas lavé encore | non toujours pas | pas le temps aujourd'hui | tomorrow`,
    ],
    [
      'wash',
      'no-flow',
      `no water | l'eau vient pas | rien depuis ce matin | 0 eau | pas une goutte depuis le lavage`,
    ],
    [
      'wash',
      'broken',
      `pas lent mais ça fuit | tombé mais ça a l'air bien | tombé et maintenant lent | le bouchon va pas, fissuré | ça goutte pas ça fuit`,
    ],
    [
      'wash',
      'odd-water',
      `eau pas propre | ça coule mais marron | coule bien mais sent mauvais | bon goût mais jaune | pas lent mais eau sale`,
    ],
    [
      'none',
      'unwell',
      `pas lent mais mon fils est malade | filtre ok, enfants malades | pas de diarrhée mais fièvre | femme malade, comment laver? | il va mieux mais a encore la diarrhée | merci mon bébé est malade | my son is sick`,
    ],
    ['step', 'no', `non c'est pas fissuré | ça fuit pas | jamais tombé | pas d'odeur | pas gelé`],
    [
      'none',
      'stop',
      `stop svp | plus de msg | please stop | m'envoyez plus de sms | fichez moi la paix | ARRET svp | STOP. mauvais numero`,
    ],
    [
      'none',
      'wrong-number',
      `le numéro est mauvais | désolé je suis pas marie | vous vous trompez de personne`,
    ],
    [
      'flow',
      'flow-figure',
      `pas 10, 12 minutes => 12 | douze min lent => 12 | 5 maintenant, merci => 5 | 10mins!!! => 10 | 2min30 => 2.5 | genre 20 => 20`,
    ],
    ['none', 'ask', `12 minutes c'est bien? | et si c'est lent? | combien ça doit prendre`],
  ]),
  ...labelled('bn', [
    [
      'wash',
      'slow',
      `ভাঙা না শুধু আস্তে | লিক নাই কিন্তু আস্তে | জোরে না | ধুইছি কিন্তু ভালো হয় নাই | pani slow hoye gese | leak nai kintu slow | thik ase kintu aste`,
    ],
    [
      'wash',
      'done',
      `ধুইছি এখন আর আস্তে না | জি ধুইছি | done korsi | ওকে ধোয়া শেষ, সব ঠিক | wash kore disi`,
    ],
    [
      'wash',
      'not-yet',
      `না করি নাই | কখনো ধুই নাই | ধোয়া হয় নাই | na ekhono na | আজ সময় নাই | tomorrow korbo`,
    ],
    [
      'wash',
      'no-flow',
      `no water | পানি আসতাসে না | সকাল থেকে কিছু না আসে নাই পানি | pani astase na | ধোয়ার পর এক ফোঁটাও না`,
    ],
    [
      'wash',
      'broken',
      `আস্তে না কিন্তু লিক করে | পড়ে গেছিল কিন্তু ঠিক আছে | pore gese ekhon slow | cap thik nai, fata | leak kortese vai`,
    ],
    [
      'wash',
      'odd-water',
      `পানি পরিষ্কার না | আসে কিন্তু হলুদ | পানি ভালো পড়ে কিন্তু গন্ধ | slow na kintu pani moyla | valo pore kintu gondho`,
    ],
    [
      'none',
      'unwell',
      `আস্তে না কিন্তু ছেলে অসুস্থ | ফিল্টার ভালো, বাচ্চারা অসুস্থ | ডায়রিয়া না কিন্তু জ্বর | bou osustho, kivabe dhubo? | ekhon valo kintu diarrhea ase | dhonnobad amar baccha osustho | my son is sick`,
    ],
    ['step', 'no', `না ফাটা না | লিক হয় না | গন্ধ নাই | jome nai`],
    [
      'none',
      'stop',
      `stop please | আর মেসেজ না | please stop | msg diyen na ar | disturb koiren na vai | STOP. vul number`,
    ],
    ['none', 'wrong-number', `নাম্বারটা ভুল | sorry ami maria na | apni vul lok ke msg disen`],
    [
      'flow',
      'flow-figure',
      `১০ না, ১২ মিনিট => 12 | baro min slow => 12 | ৫ এখন, ধন্যবাদ => 5 | 10min!!! => 10 | 2min30 => 2.5`,
    ],
    ['none', 'ask', `১২ মিনিট কি ঠিক আছে? | আস্তে হলে কি করব? | koto somoy laga uchit`],
  ]),
]
