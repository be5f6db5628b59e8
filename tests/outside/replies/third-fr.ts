import { labelled } from './reply-set'

/** A third French batch, written after the second was mended. */
export const thirdFrReplies = labelled('fr', [
  [
    'wash',
    'slow',
    `Juste un petit fil d'eau | l'eau tombe goutte après goutte | le seau était plein le soir et au matin seulement deux tasses | après lavage c'était mieux un jour et maintenant c'est encore lent | c'est un peu lent quoi | ça sort très peu | le débit a beaucoup diminué aidez svp | pourquoi c'est devenu si lent | leau vient lentemen | il faut attendre des heures pour un verre | faible pression depuis la pluie | ce n'est plus rapide comme avant | ça prend du temps`,
  ],
  [
    'wash',
    'no-flow',
    `pas dautre eau, rien ne vient | il ne nous donne pas d'eau | le filtre ne laisse pas passer l'eau | l'eau refuse de sortir | ça a complètement arrêté de passer | il n'y a aucun débit | robinet ouvert rien ne tombe | le tuyau est coincé pas d'eau | zéro débit aujourd'hui | tout est sec, rien`,
  ],
  [
    'flow',
    'flow-figure',
    `Je pense 18 min => 18 | à peu près 25 => 25 | trois minutes trente secondes => 3.5 | 1h05 => 65 | il faut 33 minutes => 33 | 12mn30 => 12.5 | 9'20 => 9.3333 | un quart d'heure => 15 | ça a mis 26 mins aujourd'hui => 26 | cinquante => 50 | 14 minutes pour la bouteille, merci => 14 | une demi minute => 0.5 | soixante-quinze secondes => 1.25`,
  ],
  [
    'wash',
    'broken',
    `La coque a une grosse fissure | le plastique est fendu au col | mon filtre s'est cassé | un trou au fond du seau du haut | ça fuit beaucoup | ça goutte là où le tuyau se branche | l'eau s'échappe autour du couvercle | le gel l'a pris cette nuit, de la glace dedans | les enfants l'ont laissé tomber dans l'escalier | il est tombé de la table | tuyau déchiré | l'eau jaillit comme sans filtre | ça coule trop rapidement aujourd'hui | un rat a fait un trou dans le tuyau | le robinet est cassé, que faire`,
  ],
  [
    'change',
    'odd-water',
    `la couleur de l'eau n'est pas normale | elle est brunâtre | l'eau vient avec de la terre | on voit des petits vers | le goût a changé, c'est amer | l'odeur est terrible | odeur de produits chimiques dans l'eau | il y a un film d'huile dessus | de la poudre noire sort | l'eau n'est pas claire aujourd'hui | toujours trouble même après lavage | goût de plastique | il y a du sable dans mon verre | ça pue la javel`,
  ],
  [
    'none',
    'unwell',
    `mon bébé a le ventre dérangé | il a la diarrhée depuis 3 jours | nous deux on se sent mal après avoir bu | ma fille a vomi deux fois | l'enfant a mal au ventre | la fièvre a commencé aujourd'hui | j'ai des crampes et la diarhée | mon gosse se sent malade | ma femme ne va pas bien depuis mardi | notre fils a le choléra | elle est en train de vomir | les jumeaux ont encore la diarrhée | nausées chaque matin | c'est l'eau qui rend mon fils malade? | on a emmené mon mari à l'hôpital`,
  ],
  [
    'none',
    'unwell',
    `mon bébé ne boit rien† | l'enfant refuse de boire et il est très faible† | elle est inconsciente aidez nous† | selles avec sang depuis hier† | il vomit tout et dort beaucoup† | mon fils fait tout le temps des convulsions† | elle ne se réveille pas bien† | le bébé n'a pas tété de la journée et il est tout mou†`,
  ],
  [
    'none',
    'stop',
    `plus de sms svp | enlevez-moi svp | arrêtez maintenant | je ne veux pas recevoir de messages | arrêtez d'envoyer ça | pouvez-vous arrêter d'envoyer des messages sur mon téléphone | retirez mon nom | ne me dérangez plus | veuillez annuler ces messages | je suis fatigué de vos messages | laissez-moi tranquille svp | ça suffit maintenant arrêtez`,
  ],
  [
    'none',
    'wrong-number',
    `Mauvais numéro svp | vous écrivez à un mauvais numéro | ce numéro n'est pas celui de Grâce | je ne suis pas cette personne | pas moi, mauvais numéro | je ne sais pas qui vous êtes, faux numéro | ce n'est pas la famille Traoré | j'ai acheté cette puce la semaine dernière`,
  ],
  [
    'wash',
    'done',
    `lavage fait | il est propre maintenant, je l'ai lavé | on a fait le lavage | nettoyage terminé | oui je l'ai lavé monsieur | fait ✅ | faittt | je l'ai lavé hier soir | lavé et ça marche`,
  ],
  [
    'wash',
    'not-yet',
    `désolé pas encore | je lave demain | je le nettoie ce week-end | pas trouvé le temps | plus tard aujourd'hui | je voyage, la semaine prochaine | pas encore lavé | ma seringue est chez ma soeur, demain | je compte le faire dimanche | encore oublié lol`,
  ],
  [
    'none',
    'need-part',
    `svp il me faut un autre robinet | le tissu est déchiré il en faut un nouveau | est-ce possible d'avoir une nouvelle seringue? | plus de charbon, apportez svp | besoin d'une cartouche de rechange | on veut un nouveau tuyau | mon bouchon est perdu`,
  ],
  [
    'none',
    'ask',
    `comment savoir s'il est propre? | c'est quand la prochaine visite | quel est le prix | on peut utiliser l'eau de pluie? | comment l'ouvrir | pourquoi vous demandez | qui dois-je appeler | quand dois-je changer le tissu`,
  ],
  [
    'none',
    'thanks',
    `Merci à Dieu et à vous | merci ma chère | ok merci | mercii bcp | j'apprécie, merci`,
  ],
  ['step', 'yes', `oui monsieur | oui je crois | oui ça l'est | d'accord bien | correct`],
  [
    'step',
    'no',
    `non monsieur ce n'est pas ça | nan | aucune fissure du tout | ça ne goutte pas | pas du tout`,
  ],
  ['step', 'choice', `1 => 1 | option 2 => 2 | numéro 3 => 3 | 2 svp => 2`],
  ['wash', 'unclear', `ma chèvre est perdue | il pleut | haha | le bus s'est arrêté | ok?`],
])
