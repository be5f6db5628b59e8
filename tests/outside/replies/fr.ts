import { frTroubleReplies } from './fr-trouble'
import { labelled, type LabelledReply } from './reply-set'

/** French replies, labelled by hand for the tests; every kind, with the hard ones. */
export const frReplies: LabelledReply[] = [
  ...frTroubleReplies,
  ...labelled('fr', [
    [
      'wash',
      'done',
      `
      fait | Fait | FAIT | c'est fait | c fait | cest fait | c'est bon | c bon | ok c'est fait | oui c'est fait | fini | terminé | j'ai fini | j'ai terminé | lavé | je l'ai lavé | j'ai lavé le filtre | on a lavé | nettoyé | j'ai nettoyé hier | rincé | déjà fait | c'est déjà fait | ça y est | fait merci | bonjour c'est fait |
      voilà c'est fait | fai | je l'ai fait ce matin | on l'a fait hier | filtre lavé | sé fait | nous avons lavé le filtre`,
    ],
    [
      'change',
      'done',
      `changé | je l'ai changé | remplacé | j'ai mis le nouveau | on a changé la cartouche | j'ai remplacé le charbon | nouveau posé`,
    ],
    [
      'step',
      'done',
      `mieux | c'est mieux | beaucoup mieux | ça coule bien maintenant | ça coule mieux | réparé | ça marche | ça remarche | ce n'est plus lent | plus rapide maintenant | l'eau est revenue | c'était lent mais maintenant ça coule bien | débouché | j'ai redressé le tuyau | seau rempli le`,
    ],
    [
      'wash',
      'not-yet',
      `
      pas encore | pa encore | non pas encore | demain | demain matin | je le ferai demain | plus tard | tout à l'heure | ce soir | cet après-midi | dimanche | j'ai oublié | oublié | désolé j'ai oublié | je n'ai pas lavé | j'ai pas lavé | pas lavé | pas fait | je ne l'ai pas fait | je l'ai pas encore fait | je n'ai pas pu |
      pas le temps | je n'ai pas le temps | pas eu le temps | je suis occupé | occupée | je suis au travail | quand je rentre | la semaine prochaine | je vais le laver | je vais le faire | pas maintenant | je suis en voyage | pas encore mais merci | dem1 | toujours pas | bientôt | dans 10 minutes | je le fais demain | attendez | pas aujourd'hui`,
    ],
    [
      'change',
      'not-yet',
      `pas encore changé | je ne l'ai pas changé | je vais le changer samedi | je change demain`,
    ],
    [
      'none',
      'need-part',
      `
      j'ai besoin d'un bouchon | besoin d'un bouchon | il me faut une seringue | il nous faut une cartouche | envoyez moi un tuyau | envoyez-nous une seringue svp | nous avons perdu la seringue | seringue perdue | je ne trouve pas la seringue | je n'ai pas de seringue | on n'a pas de seringue | pas de seringue | plus de charbon |
      il manque le bouchon | la seringue manque | je voudrais un nouveau tuyau | où trouver une cartouche? | on nous a volé le robinet | apportez un nouveau filtre | besoin de pièces | bezoin seringue | je veux une nouvelle cartouche | pouvez vous envoyer un tuyau`,
    ],
    [
      'none',
      'ask',
      `
      comment laver? | comment je fais | comment on lave le filtre? | combien de fois avec la seringue? | quand changer le tissu? | quand venez-vous? | quand est-ce que vous venez | peut-on boire l'eau? | on peut boire? | que faire? | que dois-je faire | je ne comprends pas | je comprends pas | j'ai pas compris | ça veut dire quoi? |
      pourquoi? | à quoi sert la seringue? | avec de l'eau chaude? | faut-il bouillir l'eau? | combien de temps j'attends? | j'ai une question | est-ce que je peux utiliser du savon? | c'est combien? | c'est normal? | je ne sais pas comment faire | qui va venir? | c koi la suite? | est ce bon pour le bébé?`,
    ],
    [
      'none',
      'thanks',
      `merci | Merci! | merci beaucoup | merci bcp | mrc | merci madame | merci bien | que dieu vous bénisse | ok merci | merci pour le filtre | c'est gentil | bonne journée | 🙏 | grand merci | je vous remercie | mersi`,
    ],
    [
      'step',
      'yes',
      `oui | Oui | OUI | ouais | oui madame | ok | d'accord | dac | bien sûr | c'est ça | oui oui | 👍 | entendu | wi | okay | exact | ouii`,
    ],
    [
      'step',
      'no',
      `non | Non | NON | non non | non monsieur | nan | pas du tout | c'est pas fissuré | pas cassé | il n'y a pas de fuite | pas de fuite | ça ne fuit pas | aucune fissure | il n'est pas tombé | personne n'est malade | ça ne sent pas mauvais | pas d'odeur`,
    ],
    [
      'step',
      'choice',
      `1 => 1 | 2 => 2 | 3 => 3 | 1. => 1 | n°2 => 2 | un => 1 | deux => 2 | trois => 3 | 1 merci => 1 | le 2 => 2`,
    ],
    [
      'none',
      'stop',
      `
      STOP | stop | arrêt | arret | ARRET | arrête | arrêtez | arretez | arretez svp | stop svp | arrêtez de m'écrire | arrêtez de m'envoyer des messages | arrêtez les messages | arrête de m'envoyer des sms | ne m'écrivez plus | ne m'écrivez plus svp | n'écrivez plus | ne m'envoyez plus de messages | plus de messages |
      plus de messages svp | plus de sms | je ne veux plus de messages | je veux plus de messages | je ne veux plus recevoir de messages | je ne souhaite plus recevoir vos messages | désabonner | me désabonner | désinscription | désinscrivez moi | désabonnez-moi | retirez-moi de la liste | retirez mon numéro | supprimez mon numéro |
      effacez mon numéro | laissez-moi tranquille | laissez nous tranquilles | ne me contactez plus | ne me dérangez plus | ça suffit | assez | je ne suis plus intéressé | pas intéressé | j'en ai marre de vos messages | stop aux messages | unsubscribe | annuler | please stop | m'envoyez plus rien | ecrivez plus | arretter | arrette`,
    ],
    [
      'none',
      'wrong-number',
      `
      mauvais numéro | mauvai numero | faux numéro | erreur de numéro | vous vous trompez de numéro | vous vous êtes trompé | vous faites erreur | ce n'est pas le bon numéro | pas le bon numéro | je ne suis pas marie | c'est pas moussa | je ne suis pas cette personne | ce n'est pas mon numéro | ce n'est plus son numéro |
      je ne connais pas cette personne | connais pas | c'est quelqu'un d'autre | numéro incorrect | quel filtre? mauvais numéro | elle n'habite pas ici | je n'ai pas de filtre, erreur | wrong number | mauvaise personne | je viens d'acheter cette puce`,
    ],
    [
      'none',
      'moved',
      `on a déménagé | nous avons déménagé | j'ai déménagé | demenagé | je n'habite plus là | on habite plus là | on vit dans un autre village, nouvelle adresse | nouvelle adresse | nous avons changé de maison | on est partis vivre en ville`,
    ],
    ['none', 'help', `aide | AIDE | aidez moi | j'ai besoin d'aide | au secours | help | info`],
    ['none', 'start', `start | recommencer | reprendre les messages | je veux recevoir à nouveau`],
    [
      'wash',
      'unclear',
      `ça s'est arrêté | ça s'arrête | l'eau s'est arrêtée | marche pas | ça ne marche pas | en panne | mdr | bonjour | asdf | ? | ma vache est au champ | le bus s'arrête au marché | c'est qui?`,
    ],
  ] as const),
]
