import { labelled } from './reply-set'
/** A fourth French batch, written after the third was mended. */
export const fourthFrReplies = labelled('fr', [
  [
    'wash',
    'slow',
    `le jet a baissé | l'eau coule tout doux | même pas une tasse par heure | très lent aujourd'hui | ça devient lent | lent encore | jet faible | pas assez d'eau pour nous | une demi-journée par seau | juste des gouttes | comme un escargot`,
  ],
  [
    'wash',
    'no-flow',
    `rien ne coule | ça descend pas | goutte même pas | arrêté, plus d'eau | ça passe pas | je crois c'est bouché`,
  ],
  [
    'flow',
    'flow-figure',
    `12 mins environ => 12 | 1 h 15 => 75 | dix-huit min => 18 | 3min => 3 | trente-deux => 32 | 6:15 => 6.25 | 11 ou 12 => 11.5 | 100 secondes => 1.6667 | 45 => 45 | c'est 9 => 9`,
  ],
  [
    'step',
    'broken',
    `oui il y a une fissure | fissure sur le côté | oui ça fuit | il a un trou | tombé la semaine dernière | oui il a gelé | le tube est fendu`,
  ],
  [
    'step',
    'no',
    `pas de fissures | il n'est pas tombé | pas gelé | rien de cassé | pas de trous | jamais tombé`,
  ],
  [
    'wash',
    'broken',
    `le bouchon est sorti et s'est cassé | le filtre est brisé | couvercle fissuré en ouvrant | l'eau sort de partout | le seau fuit au robinet | tuyau coupé par un rat | le gel l'a fissuré | le bébé l'a jeté par terre`,
  ],
  [
    'change',
    'odd-water',
    `eau grisâtre | goût de terre | mauvaise odeur | noire comme l'encre | odeur d'huile | goût de pétrole | un ver dans le verre | odeur de pourri | ça mousse | couleur rouille`,
  ],
  [
    'none',
    'unwell',
    `mon enfant a mal au bidon | diarrhée à la maison | maman vomit | enfant fiévreux | tombés malades après avoir bu | j'ai très mal au ventre | la courante depuis dimanche | il est hospitalisé | disenterie | le garçon va pas bien`,
  ],
  [
    'none',
    'unwell',
    `il est inconscient† | l'enfant ne veut pas boire† | vomit tout le temps tout† | sang dans le caca† | elle a fait une crise† | bébé trop endormi pour téter†`,
  ],
  [
    'none',
    'stop',
    `arrêtez d'écrire | n'envoyez pas | je veux sortir | desabonement | pas de sms | svp n'écrivez plus | stop!!! | enlevez moi de ça | annuler | assez maintenant stop`,
  ],
  [
    'none',
    'wrong-number',
    `mauvais num | mauvais numéro frère | pas Fatima | c'est le téléphone de Jean pas le sien | vous avez la mauvaise personne | qui? faux numéro`,
  ],
  [
    'wash',
    'done',
    `j'ai lavé | lavé ce matin | Fait, ça coule bien | lavage ok | ok je l'ai fait | oui lavé | fini maintenant`,
  ],
  [
    'wash',
    'not-yet',
    `pas maintenant | plutar | dans la soirée | je vais laver | demain matin | pas le temps encore | désolé occupé | j'ai pas lavé`,
  ],
  [
    'none',
    'need-part',
    `bouchon perdu | besoin de filtre | envoyez seringue | le tuyau manque | je veux un nouveau tissu`,
  ],
  [
    'none',
    'ask',
    `comment? | quand changer? | ça signifie quoi? | je peux boire? | où habitez-vous`,
  ],
  ['none', 'thanks', `mrc | merci monsieur | soyez bénis | merci à tous | merciii`],
  [
    'none',
    'moved',
    `changé de maison | on vit en ville maintenant, nouvelle adresse | déménagé le mois dernier`,
  ],
  ['step', 'yes', `oui svp | ouais | ok bien | oui c'est`],
])
