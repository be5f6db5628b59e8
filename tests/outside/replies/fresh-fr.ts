import { labelled } from './reply-set'

/** A second French batch, written after the reader passed the first, as other people would text. */
export const freshFrReplies = labelled('fr', [
  [
    'wash',
    'slow',
    `
    bonjour madame voyez vous l'eau vient très peu depuis lundi | frr c trop lent | j'ai poussé avec la seringue comme dit mais le filet reste mince | ça coule presque pas | on attend toute la nuit pour une marmite | avant ça remplissait vite maintenant c'est une tortue | une demi cruche en toute une nuit | l'eau descend tout doucement |
    alors j'ai tout lavé comme il faut mais franchement c'est encore bien lent je sais pas pourquoi | l'eau tombe petit à petit | ça ne suffit pas pour les enfants | ça prend un temps fou | le débit est tout petit | c'est mou comme débit | fait deux fois mais ça coule toujours pas vite`,
  ],
  [
    'wash',
    'no-flow',
    `y a rien qui sort | depuis ce matin pas la moindre goutte | je verse l'eau en haut et rien ne descend | robinet ouvert mais rien | complètement bouché | il a arrêté de donner de l'eau | ça fait 2 jours que ça ne donne pas d'eau | l'eau reste en haut et ne descend pas | ça veut pas couler | totalement sec`,
  ],
  [
    'flow',
    'flow-figure',
    `
    genre 9 minutes => 9 | ça nous a pris onze minutes => 11 | j'ai compté 14 => 14 | 13 à peu près => 13 | commencé 10h fini 10h20 donc 20 minutes => 20 | presque une demi-heure => 30 | le chrono dit 8:45 => 8.75 | six et demi => 6.5 | une heure et 10 minutes => 70 | Bonjour. Cela a pris 17 minutes. Merci. => 17 | 2min 15sec => 2.25 | environ 22 min pour 1 litre => 22 |
    quinze minutes quelque chose comme ça => 15 | 40 secondes => 0.6667 | quarante minutes!! => 40 | autour de 1h => 60 | 19 mns => 19 | la réponse c'est 6 => 6 | 7,5 => 7.5 | vingt-deux minutes => 22`,
  ],
  [
    'wash',
    'broken',
    `
    mon petit-fils l'a fait tomber de l'étagère | l'écrou en plastique s'est fendu en deux | ça goutte au niveau du joint | laissé dehors il est devenu de la glace | le fond du seau s'est ouvert | le robinet ne ferme plus et l'eau n'arrête pas de couler par terre | le chien a mangé le tuyau | l'eau sort en dessous | quelqu'un s'est assis dessus et c'est tordu | ça s'est défait dans mes mains |
    on dirait une petite fissure sur la coque | le tuyau a sauté et a inondé le sol | c'est mouillé tout autour je crois que ça fuit | l'eau file maintenant, beaucoup plus vite que d'habitude | ça m'a glissé des mains sur le ciment`,
  ],
  [
    'change',
    'odd-water',
    `l'eau a changé de couleur | on dirait du thé léger | des petits points noirs flottent | ça a un goût de pièce de monnaie | ma femme dit que l'eau sent le chien mouillé | les enfants refusent d'en boire car ça pue | une odeur genre essence | un peu verdâtre | des bestioles nagent dans le verre | elle est devenue trouble | goût de savon | une sale odeur sort de la jarre | elle est jaune et elle sent`,
  ],
  [
    'none',
    'unwell',
    `
    le bébé va aux toilettes toute la nuit, très liquide | papi a beaucoup de température et des frissons | mon petit est brûlant | elle vomit depuis hier soir | tout le monde à la maison a mal au bide | ma femme a attrapé le choléra | le gosse a la courante | je me sens vraiment mal, des crampes | les selles de ma soeur sont comme de l'eau | on est allés au dispensaire pour le ventre | deux de mes enfants sont tombés malades cette semaine | mon fils n'est pas bien du tout |
    j'ai lavé mais le dernier a attrapé la diarrhée | il passe la journée aux toilettes avec mal au ventre`,
  ],
  [
    'none',
    'unwell',
    `le bébé ne prend plus le sein depuis ce matin† | ma petite reste couchée et ne me répond pas† | elle est trop faible pour boire† | il y avait du sang quand il a fait caca† | il s'est mis à trembler et ses yeux se sont retournés† | on n'arrive pas à le réveiller† | tout ce qu'elle avale ressort† | ma fille s'est évanouie† | le nouveau-né a arrêté de téter† | il est chaud et tellement endormi qu'il ne s'assoit plus†`,
  ],
  [
    'none',
    'stop',
    `
    svp arrêtez de m'envoyer ça | ça suffit les messages | je ne souhaite plus recevoir ces messages | enlevez-moi de cette liste svp | n'écrivez plus sur ce téléphone | supprimez mon num | jveux plus recevoir vos sms | arrêtez avec vos messages | DESABONNEZ MOI | n'envoyez plus de messages à ce numéro | stop!!!! | merci de ne plus m'écrire | j'en ai assez de vos messages stop | veuillez cesser ces messages | m'écris plus`,
  ],
  [
    'none',
    'wrong-number',
    `désolé vous avez la mauvaise personne | salut c'est pas patrick | personne ne s'appelle amina ici | je crois que vous avez confondu les numéros | ce téléphone appartient à quelqu'un d'autre maintenant | jamais entendu parler de filtre, mauvais numéro | vous avez écrit au mauvais téléphone | Je ne suis pas Madame Diallo | erreur sur la personne | c'est qui? je connais aucun programme d'eau, faux numéro`,
  ],
  [
    'wash',
    'done',
    `tout est fait | oui fini ce matin | lavé et remonté | Je l'ai nettoyé, merci | travail fait | fait hier soir | il est lavé maintenant | accompli madame | ma fille l'a nettoyé pour moi | c déjà lavé`,
  ],
  [
    'wash',
    'not-yet',
    `pas eu l'occasion | demain si dieu veut | je le ferai ce week-end | trop occupé, pardon | j'ai pas encore eu le temps | quand la pluie s'arrêtera | pas fait encore, je me suis blessé la main, demain | rappelez-moi la semaine prochaine svp | ce soir quand mon fils rentre | j'allais le faire mais j'ai oublié`,
  ],
  [
    'none',
    'need-part',
    `pourriez-vous apporter une autre seringue | le joint est perdu il m'en faut un nouveau | on n'a plus de tissus | où trouver un tuyau de rechange? | ma seringue a disparu | le bouchon est introuvable | je demande un nouveau charbon | on n'a pas la pièce de rechange`,
  ],
  [
    'none',
    'ask',
    `tous les combien faut nettoyer | il faut bouillir l'eau d'abord? | à quelle heure vient le monsieur | je peux en donner au bébé? | quel côté va en haut | je peux le laisser au soleil? | ça veut dire quoi rétrolavage | vous réparez les seaux aussi? | expliquez encore svp | pourquoi faire ça toutes les deux semaines?`,
  ],
  [
    'none',
    'thanks',
    `merci infiniment pour votre aide | Que Dieu vous bénisse tous | je vous suis très reconnaissant | mille mercis | merci à vous`,
  ],
  [
    'step',
    'yes',
    `oui c'est ça | ouaip oui | bien sûr que oui | ok bien compris | oui madame | tout à fait`,
  ],
  [
    'step',
    'no',
    `non ce n'est pas ça | pas du tout | je ne vois aucune fissure | négatif | non rien de tout ça`,
  ],
  [
    'step',
    'done',
    `ça recoule bien | ah oui beaucoup mieux | l'eau coule joliment maintenant | c'est réparé | ça marche maintenant dieu merci`,
  ],
  [
    'none',
    'moved',
    `nous sommes partis vivre dans la ville voisine | on n'est plus dans cette maison, on a déménagé | je suis allé habiter chez mon frère | la famille a changé de quartier`,
  ],
  [
    'wash',
    'unclear',
    `il s'est arrêté tout seul | ça s'est arrêté | la pompe s'est arrêtée | quelle journée | à la prochaine`,
  ],
])
