import { labelled } from './reply-set'

/** French replies about the water and the filter, labelled by hand for the tests. */
export const frTroubleReplies = labelled('fr', [
  [
    'wash',
    'slow',
    `
    lent | très lent | tres lent | c'est lent | c lent | lente | l'eau coule lentement | ça coule lentement | ca coule doucement | coule tout doucement | l'eau est lente | l'eau sort lentement | le débit est faible | débit faible | faible débit | le debit a baissé |
    peu d'eau | très peu d'eau | il sort peu d'eau | ça sort à peine | coule à peine | goutte à goutte | ça coule goutte à goutte | juste des gouttes | un petit filet d'eau | juste un filet | ça goutte seulement | ça prend trop de temps | ça prend beaucoup de temps | ça met longtemps |
    il faut longtemps pour remplir | ça dure longtemps | trop long | toute la journée pour un seau | ça coule mal | ça coule pas bien | ça ne coule pas bien | ça coule pas vite | pas assez d'eau | moins d'eau qu'avant | ça coule moins vite | coule moins qu'avant | ça ralentit | ralenti |
    fait mais toujours lent | j'ai lavé mais c'est toujours lent | lavé mais ça coule encore lentement | on a fait le lavage mais l'eau reste lente | fait. lent | oui lent | oui c'est lent | non c'est lent | bonjour le filtre est lent | merci mais c'est toujours lent | le filtre est trop lent |
    lennt | letn | l'eau vient doucement | l'eau ne vient pas vite | presque rien ne sort | plus lent qu'avant | de plus en plus lent | c'est devenu lent | depuis hier c'est lent | avant ça allait mais maintenant c'est lent | leau coule lentemen | sa coule lentement | sa coul doucement | pourquoi c'est si lent? |
    la pression est faible | pas beaucoup d'eau | faible | tré lent`,
  ],
  [
    'step',
    'slow',
    `toujours lent | pareil | toujours pareil | c'est pareil | la même chose | pas mieux | aucun changement | ça n'a rien changé | pas d'amélioration | encore lent | un peu mieux mais lent | rien n'a changé | toujours faible`,
  ],
  [
    'wash',
    'no-flow',
    `
    rien ne sort | rien ne coule | ça ne coule pas | ça coule pas | ca coule plus | ça ne coule plus | l'eau ne coule pas | l'eau ne coule plus | l'eau coule plus | l'eau ne sort pas | l'eau sort pas | l'eau ne sort plus | l'eau ne passe pas | l'eau passe plus | pas d'eau | plus d'eau | il n'y a pas d'eau |
    il n'y a plus d'eau | y a pas d'eau | ya plus d'eau | on n'a pas d'eau | nous n'avons plus d'eau | aucune goutte | pas une goutte | zéro eau | c'est bouché | bouché | le filtre est bouché | tuyau bouché | bloqué | c'est bloqué | obstrué | ça ne filtre plus | ne donne pas d'eau |
    j'ai lavé et maintenant rien ne sort | fait mais pas d'eau | lavé mais l'eau ne coule pas | depuis hier pas d'eau | l'eau ne vient pas | l'eau vient plus | l'eau a cessé de couler | ça a arrêté de couler | pa d'eau | sa coule pa | sa coul plus | leau sort pas | l'eau n'arrive plus | rien du tout ne coule`,
  ],
  ['flow', 'no-flow', `rien | zéro | pas d'eau | rien du tout | ça ne remplit pas, pas d'eau`],
  [
    'wash',
    'broken',
    `
    cassé | c'est cassé | le bouchon est cassé | bouchon cassé | le bouchon est fissuré | fissuré | fissure | il y a une fissure | une fissure sur le bouchon | fêlé | le capuchon est fêlé | fendu | le couvercle est fendu | s'est cassé | le robinet s'est cassé | le tuyau est percé | tuyau percé |
    il y a un trou | un trou dans le tuyau | le seau est troué | ça fuit | ça fuit par le bas | fuite | il y a une fuite | fuite d'eau | grosse fuite | l'eau fuit | l'eau coule par le côté | l'eau sort par le côté | ça goutte par le bas | ça coule par terre | ça coule en dessous | le joint fuit |
    c'est gelé | gelé | le filtre a gelé | il a gelé cette nuit | il est tombé | tombé | le filtre est tombé | je l'ai fait tomber | mon fils l'a fait tomber | l'enfant a renversé le filtre | trop vite | ça coule trop vite | l'eau coule trop vite | ça coule très vite tout d'un coup | l'eau jaillit | sort à flots |
    le rat a rongé le tuyau | le chien a mordu le tuyau | le tuyau s'est détaché | la poignée est cassée | abîmé | la cartouche est abîmée | brisé | éclaté | le tuyau a éclaté | fait mais le bouchon est cassé | lent et en plus ça fuit | oui cassé | non c'est cassé | c'est pas lent c'est cassé |
    kassé | fisuré | sa fuit | ça fui | y'a une fente | le joint est déchiré | foutu le robinet est cassé | déboité | pété`,
  ],
  [
    'change',
    'odd-water',
    `
    eau noire | l'eau est noire | l'eau sort noire | noire | eau marron | eau jaune | l'eau est jaunâtre | eau trouble | l'eau est trouble | trouble | eau sale | l'eau est sale | l'eau sort sale | de la boue dans l'eau | eau boueuse | il y a du sable | des saletés dans l'eau | des vers dans l'eau | il y a des vers |
    des insectes dans l'eau | des particules noires | ça sent mauvais | l'eau sent mauvais | mauvaise odeur | odeur bizarre | ça pue | l'eau pue | odeur d'oeuf pourri | mauvais goût | l'eau a mauvais goût | goût bizarre | l'eau a un goût de métal | amère | l'eau est salée | ça sent l'essence | odeur d'essence |
    odeur de gasoil | ça sent le pétrole | goût de produit chimique | odeur chimique | de l'huile dans l'eau | ça sent la peinture | eau verte | l'eau mousse, de la mousse | eau laiteuse | eau rouge | de la rouille | l'eau n'est pas claire | pas claire | l'eau est pas propre | fait mais l'eau est noire |
    changé mais l'eau sort noire | l'eau a une couleur | eau grise | sa pu | sa sent mauvais | leau est sale | l'eau ressemble à du thé couleur thé | trouble et ça sent`,
  ],
  [
    'none',
    'unwell',
    `
    mon fils a la diarrhée | ma fille a la diarrhée | diarrhée | diarhée | la diarrhee | mon bébé a la diarrhée | les enfants ont la diarrhée | mon fils est malade | ma fille est malade | nous sommes malades | on est malade | je suis malade | malade | toute la famille est malade | ma femme est malade |
    mon mari est malade | ma mère ne va pas bien | mon fils ne se sent pas bien | mon fils va mal | il vomit | elle vomit | mon fils vomit | vomissements | elle a vomi toute la nuit | fièvre | il a de la fièvre | mal au ventre | j'ai mal au ventre | mon fils a mal au ventre | maux de ventre | douleurs au ventre |
    crampes | mal à l'estomac | gastro | choléra | typhoïde | dysenterie | intoxication | on l'a amené à l'hôpital | il est à l'hôpital | le docteur dit que c'est l'eau | fait mais mon fils est malade | c'est lent et ma fille a la diarrhée | lavé. les enfants ont la diarrhée | l'eau nous a rendus malades |
    mon petit est malade | malad | mon fils a la diaré | le ventre lui fait mal | ma grand-mère est malade | les gosses sont malades | nausées | mon fils a la chiasse | kolera | le bébé est souffrant`,
  ],
  [
    'none',
    'unwell',
    `
    le bébé ne boit plus et dort tout le temps† | le bébé ne tète plus† | il ne veut pas téter† | refuse le sein† | ma fille ne peut pas boire† | il ne boit rien et il a de la fièvre† | vomit tout† | il vomit tout ce qu'il mange† | il rejette tout† | elle ne garde rien† | convulsions† | mon fils a eu des convulsions† |
    il fait des crises† | inconscient† | il a perdu connaissance† | il s'est évanoui† | ne se réveille pas† | le bébé ne réagit plus† | léthargique† | bébé tout mou† | du sang dans les selles† | selles avec du sang† | diarrhée avec du sang† | caca avec du sang† | mon fils a la diarrhée et il est somnolent† |
    ma fille vomit et dort tout le temps† | le bébé refuse de boire† | il ne bouge plus† | du sang dans la couche du bébé† | ma fille ne veut rien boire†`,
  ],
  [
    'flow',
    'flow-figure',
    `
    12 => 12 | 7 => 7 | 7 minutes => 7 | 7 min => 7 | 7min => 7 | 7mn => 7 | 7 mn => 7 | environ 7 => 7 | environ 15 minutes => 15 | à peu près 15 => 15 | ça prend 12 minutes => 12 | ça a pris 12 => 12 | 12 minutes pour remplir la bouteille => 12 | douze => 12 | douze minutes => 12 | vingt cinq minutes => 25 |
    vingt-cinq => 25 | trente-cinq minutes => 35 | une demi-heure => 30 | demi heure => 30 | 1/2 heure => 30 | une heure => 60 | 1 heure => 60 | 1h => 60 | 1h30 => 90 | 1 h 20 => 80 | une heure et demie => 90 | deux heures => 120 | 2h => 120 | un quart d'heure => 15 | trois quarts d'heure => 45 |
    4:30 => 4.5 | 4.5 => 4.5 | 4,5 => 4.5 | 4mn30 => 4.5 | 4 min 30 => 4.5 | 4 minutes et demie => 4.5 | 4 min 30 s => 4.5 | 4'30" => 4.5 | 4'30 => 4.5 | 90 secondes => 1.5 | 90 sec => 1.5 | 45 s => 0.75 | deux minutes et demie => 2.5 | une minute et demie => 1.5 | dix => 10 | DIX MINUTES => 10 | 10! => 10 | 10. => 10 |
    c'est 10 => 10 | 5 à 6 minutes => 5.5 | entre 10 et 12 minutes => 11 | 20 minuts => 20 | une vingtaine de minutes => 20 | trente => 30 | quarante cinq minutes => 45 | maintenant 8 minutes => 8 | bonjour 8 minutes => 8 | 8 merci => 8 | rempli en 9 minutes => 9 | la bouteille a pris 9 min => 9 | 3 => 3 | 1 => 1 |
    2 min => 2 | une minute => 1 | un litre en 6 minutes => 6 | lent, 20 minutes => 20 | toujours lent 25 min => 25 | lavé, maintenant 5 minutes => 5 | six => 6 | sept minutes => 7 | quatre-vingt-dix secondes => 1.5 | quinze minutes => 15 | seize => 16 | 14 min après lavage => 14 | dix sept minutes => 17 | soixante minutes => 60 | 2,5 => 2.5`,
  ],
  [
    'step',
    'flow-figure',
    `12 => 12 | 4 => 4 | 12 minutes => 12 | maintenant 6 minutes => 6 | 3 minutes => 3`,
  ],
  ['none', 'flow-figure', `12 => 12 | 10 minutes pour remplir => 10`],
])
