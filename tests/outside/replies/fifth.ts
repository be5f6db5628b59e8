import { labelled, type LabelledReply } from './reply-set'
/** A fifth batch, written after the hard ones were mended. */
export const fifthReplies: LabelledReply[] = [
  ...labelled('en', [
    [
      'wash',
      'slow',
      `it drops small small | water finish too slow | flow no good | filling the jug takes till evening | poor flow since last week | only little by little`,
    ],
    ['wash', 'no-flow', `it has blocked | water no dey come | tap gives nothing | the hose is dry`],
    [
      'wash',
      'broken',
      `big crack on body | it leaks from bottom | the bucket burst | handle came off | my boy knocked it to the ground | runs way too fast | it turned to ice`,
    ],
    [
      'change',
      'odd-water',
      `rusty colour water | smell like fish | small insects inside | strange taste | water with oil | muddy`,
    ],
    [
      'none',
      'unwell',
      `vomitting and fever | my kid has watery poop | belly ache in all children | sick since we drank | mama has diarrhea | she is weak and vomiting`,
    ],
    [
      'none',
      'unwell',
      `baby no dey suck breast† | she fainted this morning† | blood dey for him toilet† | fits since night† | child cannot keep anything down†`,
    ],
    [
      'none',
      'stop',
      `remove this number | no messages again | abeg stop texting | I unsubscribe | stop contacting us | take us off`,
    ],
    [
      'none',
      'wrong-number',
      `wrong line | wrong number o | I no know this person | not my number | you have mistaken me for another`,
    ],
    ['wash', 'done', `we don wash am | all clean now | I've just washed it | done it again today`],
    ['wash', 'not-yet', `maybe tomorrow | i no get time | not done | when i return`],
    [
      'flow',
      'flow-figure',
      `24 mint => 24 | around thirteen => 13 | 1.5 hours => 90 | 7 and half => 7.5 | 5m10s => 5.1667`,
    ],
    ['none', 'need-part', `pls bring cap | new hose needed | syringe spoil, need another`],
    ['none', 'ask', `wetin i go do? | can children drink? | how many litres?`],
    ['none', 'moved', `we packed out of that house, moved | now staying in another town`],
  ]),
  ...labelled('es', [
    [
      'wash',
      'slow',
      `gotea lentito nomas | sale bien poquito a poco | el flujo no es bueno | llenar la jarra tarda hasta la tarde | mal flujo desde la semana pasada | cae flaquito`,
    ],
    [
      'wash',
      'no-flow',
      `se tapó todo | no le baja nada | la llave no da nada | la manguera está seca`,
    ],
    [
      'wash',
      'broken',
      `rajadura grande en el cuerpo | se le sale por abajo | se reventó el balde | se salió el asa | mi niño lo tumbó al suelo | corre demasiado rápido | se hizo hielo`,
    ],
    [
      'change',
      'odd-water',
      `agua color óxido | huele a pescado | bichitos adentro | sabor extraño | agua con aceite | lodosa`,
    ],
    [
      'none',
      'unwell',
      `vómito y fiebre | mi niño hace popó aguado | dolor de panza en todos los niños | enfermos desde que tomamos | mamá tiene diarrea | está débil y vomitando`,
    ],
    [
      'none',
      'unwell',
      `el bebé no chupa el pecho† | se desmayó esta mañana† | le sale sangre cuando hace popó† | ataques desde anoche† | el niño no retiene nada†`,
    ],
    [
      'none',
      'stop',
      `quiten este número | no más mensajes otra vez | ya dejen de escribir | me desuscribo | dejen de contactarnos | sáquennos`,
    ],
    [
      'none',
      'wrong-number',
      `línea equivocada | número equivocado pues | yo no conozco a esa persona | no es mi número | me confunde con otra persona`,
    ],
    [
      'wash',
      'done',
      `ya lo lavamos pues | todo limpio ya | recién lo acabo de lavar | hecho otra vez hoy`,
    ],
    ['wash', 'not-yet', `tal vez mañana | no me alcanza el tiempo | no hecho | cuando vuelva`],
    [
      'flow',
      'flow-figure',
      `24 mint => 24 | unos trece => 13 | 1.5 horas => 90 | 7 y medio => 7.5 | 5m10s => 5.1667`,
    ],
    [
      'none',
      'need-part',
      `traigan tapa por favor | hace falta manguera nueva | se malogró la jeringa, necesito otra`,
    ],
    ['none', 'ask', `qué hago? | los niños pueden tomar? | cuántos litros?`],
    ['none', 'moved', `dejamos esa casa, nos mudamos | ahora estamos viviendo en otro pueblo`],
  ]),
  ...labelled('fr', [
    [
      'wash',
      'slow',
      `ça goutte lentement seulement | ça sort petit petit | le débit n'est pas bon | remplir la jarre prend jusqu'au soir | mauvais débit depuis la semaine passée | l'eau vient pas beaucoup`,
    ],
    [
      'wash',
      'no-flow',
      `tout est bouché | ça ne descend pas du tout | le robinet ne donne rien | le tuyau est sec`,
    ],
    [
      'wash',
      'broken',
      `grosse fissure sur le corps | ça fuit par en bas | le seau a éclaté | la poignée s'est enlevée | mon garçon l'a renversé par terre | ça coule beaucoup trop vite | c'est devenu de la glace`,
    ],
    [
      'change',
      'odd-water',
      `eau couleur rouille | ça sent le poisson | petits insectes dedans | goût étrange | eau avec de l'huile | boueuse`,
    ],
    [
      'none',
      'unwell',
      `vomissements et fièvre | mon enfant fait caca liquide | mal de ventre chez tous les enfants | malades depuis qu'on a bu | maman a la diarrhée | elle est faible et vomit`,
    ],
    [
      'none',
      'unwell',
      `le bébé ne suce pas le sein† | elle s'est évanouie ce matin† | il y a du sang quand il fait caca† | des crises depuis la nuit† | l'enfant ne garde rien†`,
    ],
    [
      'none',
      'stop',
      `enlevez ce numéro | plus de messages encore | pardon arrêtez d'écrire | je me désabonne | arrêtez de nous contacter | retirez nous`,
    ],
    [
      'none',
      'wrong-number',
      `mauvaise ligne | mauvais numéro hein | moi je connais pas cette personne | c'est pas mon numéro | vous me confondez avec un autre`,
    ],
    [
      'wash',
      'done',
      `on a déjà lavé ça | tout est propre maintenant | je viens de le laver | refait aujourd'hui`,
    ],
    ['wash', 'not-yet', `peut-être demain | je n'ai pas le temps là | pas fait | quand je reviens`],
    [
      'flow',
      'flow-figure',
      `24 mint => 24 | environ treize => 13 | 1,5 heure => 90 | 7 et demi => 7.5 | 5m10s => 5.1667`,
    ],
    [
      'none',
      'need-part',
      `apportez un bouchon svp | il faut un nouveau tuyau | seringue gâtée, il m'en faut une autre`,
    ],
    ['none', 'ask', `je fais quoi? | les enfants peuvent boire? | combien de litres?`],
    [
      'none',
      'moved',
      `on a quitté cette maison, déménagé | on reste maintenant dans une autre ville`,
    ],
  ]),
  ...labelled('bn', [
    [
      'wash',
      'slow',
      `একটু একটু কইরা পড়ে | পানির ফ্লো ভালো না | জগ ভরতে সন্ধ্যা হয়ে যায়, দেরি হয় | গত সপ্তাহ থেকে পানি কম | ektu ektu kore pore | panir flow valo na | pani beshi ase na`,
    ],
    [
      'wash',
      'no-flow',
      `সব জ্যাম | একটুও নামে না | কলে পানি আসে না | pura jam hoye gese | kole pani ase na`,
    ],
    [
      'wash',
      'broken',
      `গায়ে বড় ফাটল | নিচ দিয়ে লিক | বালতি ফেটে গেছে | হাতল খুলে গেছে | ছেলে মাটিতে ফেলে দিছে | অনেক বেশি জোরে পড়ে | বরফ হয়ে গেছিল | nich diye leak | balti fete gese | chele matite fele dise`,
    ],
    [
      'change',
      'odd-water',
      `লালচে পানি | মাছের গন্ধ | ভিতরে পোকা | অন্যরকম স্বাদ | পানিতে তেল ভাসে | কাদা পানি | lalche pani | macher gondho | vitore poka | kada pani`,
    ],
    [
      'none',
      'unwell',
      `বমি আর জ্বর | বাচ্চার পাতলা পায়খানা হচ্ছে | সব বাচ্চার পেট ব্যথা | পানি খাওয়ার পর থেকে অসুস্থ | মায়ের ডায়রিয়া | দুর্বল আর বমি করতেছে | bomi ar jor | mayer dayria | durbol ar bomi kortese`,
    ],
    [
      'none',
      'unwell',
      `বাচ্চা বুকের দুধ চুষে না† | সকালে অজ্ঞান হয়ে গেছিল† | পায়খানার সাথে রক্ত আসে† | রাত থেকে খিঁচুনি† | bacca buker dudh chuse na† | rat theke khichuni†`,
    ],
    [
      'none',
      'stop',
      `এই নাম্বার বাদ দেন | আর কোনো মেসেজ না | লেখা বন্ধ করেন | আমাদের সাথে যোগাযোগ করবেন না | আমাদের বাদ দেন | ei number bad den | ar kono msg na | amader bad den`,
    ],
    [
      'none',
      'wrong-number',
      `ভুল লাইন, ভুল নাম্বার | আমি এই মানুষরে চিনি না | আমার নাম্বার না এটা | আপনি অন্য কাউকে খুঁজতেছেন, ভুল নাম্বার | ami ei manush re chini na`,
    ],
    [
      'wash',
      'done',
      `আমরা ধুয়ে ফেলছি | সব পরিষ্কার এখন | এইমাত্র ধুইলাম | আজ আবার করছি | amra dhuye felsi | eimatro dhuilam`,
    ],
    [
      'wash',
      'not-yet',
      `হয়তো কাল | সময় পাই না | করা হয় নাই | ফিরে এসে করব | hoyto kal | kora hoy nai`,
    ],
    [
      'flow',
      'flow-figure',
      `২৪ মিনিট => 24 | তেরোর মতো => 13 | দেড় ঘণ্টা => 90 | সাড়ে ৭ => 7.5 | 24 minit => 24 | sare 7 => 7.5`,
    ],
    [
      'none',
      'need-part',
      `একটা ঢাকনা আনেন প্লিজ | নতুন পাইপ দরকার | সিরিঞ্জ নষ্ট, আরেকটা লাগবে | ekta dhakna anen`,
    ],
    ['none', 'ask', `এখন কি করমু? | বাচ্চারা খাইতে পারবে? | কত লিটার? | ekhon ki kormu?`],
    ['none', 'moved', `ঐ বাসা ছেড়ে দিছি, বাসা বদলাইছি | এখন অন্য শহরে থাকি | oi basa chere disi`],
  ]),
]
