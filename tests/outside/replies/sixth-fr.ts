import { labelled, type LabelledReply } from './reply-set'

/** A sixth batch, by an author who had seen neither the reader nor the older sets. */
export const sixthFrReplies: LabelledReply[] = labelled('fr', [
  [
    'none',
    'broken',
    `ça gicle à fond depuis ce matin alors qu'avant c'était tranquille | tuyau percé par les souris |
      le seau a dévalé l'escalier, y a un morceau du filtre qui manque | oublié dans le chalet par moins 15, le filtre a gelé raide |
      la termitière a fait basculer le support et le filtre a pris un choc sur la pierre`,
  ],
  [
    'wash',
    'broken',
    `laissé au soleil sur la tôle, le plastique a gondolé et ça ferme plus |
      nickel propre, mais ça pleure au niveau du raccord, flaque sous la table | je crois que j'ai trop serré, ça a fait crac |
      la bougie est ébréchée sur le bord`,
  ],
  [
    'wash',
    'not-yet',
    `tantôt, tantôt | pas encore, la pompe du village est en panne donc pas d'eau pour rincer |
      je suis de garde jusqu'à vendredi je ferai après`,
  ],
  [
    'wash',
    'odd-water',
    `après lavage ça sort couleur bissap | c fait mais l'eau a gout de savon meme rincé trois fois`,
  ],
  [
    'change',
    'no-flow',
    `Suite à la pose de la cartouche, aucune eau ne traverse, je vous prie de m'assister`,
  ],
  ['flow', 'ask', `je remplis le seau du haut à ras bord avant de compter ?`],
  [
    'flow',
    'flow-figure',
    `dix-huit minutes, c'est le petit qui a regardé la pendule => 18 | deux ptites minutes => 2 | trop lent dè, 22 minutes => 22 |
      1 min 30 => 1.5 | trois quarts d'heure, la lessive était finie avant => 45 | une demi heure => 30 |
      quarante secondes => 0.6667 | 2,5 => 2.5 | 7mn => 7 | 3'15 => 3.25 | 5 m et quelque chose comme ça, 5 quoi => 5 |
      avant c'était 4 maintenant c'est 9 => 9 | 1h !!! => 60 | quatre minutes et demie => 4.5 | onz minut => 11 |
      commencé à 18h05 fini à 18h19 => 14 | 75 s => 1.25`,
  ],
  [
    'wash',
    'slow',
    `lavé mais sa coule toujours a peine | pas malade, pas cassé, juste ça traîne pour couler |
      g pompé avec la seringue jusq mal au bra tjr pa de force | frotté rincé refrotté... ça suinte |
      pardon on était aux funérailles au village. lavé hier soir, ça pisse pas fort`,
  ],
  [
    'none',
    'stop',
    `ARRET | c'est bon je sais me débrouiller, plus besoin de vos sms, désinscrivez-moi |
      Veuillez retirer mon numéro de votre liste, cordialement`,
  ],
  [
    'step',
    'broken',
    `La poignée m'est restée dans la main | oui fendu | le couvercle va bien, c'est le robinet qui suinte`,
  ],
  ['none', 'done', `on n'arrête pas de s'en servir, il marche impeccable`],
  ['wash', 'thanks', `ok merci du rappel`],
  [
    'flow',
    'no-flow',
    `bouteille posée depuis ce matin, toujours vide, pas une larme | compter quoi, ya rien qui tombe`,
  ],
  ['wash', 'ask', `combien de fois par mois déja | je peux mettre javel | on lave comment`],
  [
    'none',
    'slow',
    `on est obligé d'acheter des sachets d'eau parce que le filtre ne suit plus |
      mon filtre là il est fatigué deh, l'eau descend doucement doucement |
      Chef faut voir mon filtre, il travaille comme fonctionnaire, une tasse par heure | l'eau vient petit petit la`,
  ],
  ['step', 'no', `nan | j'ai regardé partout, aucune fêlure | Non, il est intact | du tout`],
  [
    'wash',
    'no-flow',
    `lavé hier, depuis plus une goutte | propre mais à sec, en haut c'est plein en bas c'est vide`,
  ],
  [
    'change',
    'slow',
    `Changé. Au compte-gouttes | ba franchement le neuf débite moins bien que l'ancien`,
  ],
  [
    'step',
    'slow',
    `J'ai chassé l'air, c'est un peu mieux mais loin d'être comme au début |
      lè m leve bokit la li koule yon ti kras pi vit, mais c'est encore lent |
      Le tuyau n'est pas plié, le couvercle est sain, et pourtant le débit reste médiocre`,
  ],
  [
    'wash',
    'done',
    `Voilà, récuré avant la messe | la chèvre est malade mais le filtre lui est lavé | jé lavé le filtre sa marche bien | ouep fait |
      plus de fièvre chez le petit depuis une semaine, il joue. filtre nettoyé aujourd'hui aussi | c bon c lavé`,
  ],
  [
    'flow',
    'unwell',
    `8 minutes. tonton a le corps chaud et il grelotte | le dernier fait caca liquide alors j'ai pas eu la tête à chronométrer`,
  ],
  ['flow', 'not-yet', `il fait nuit et pas de courant, je mesurerai au lever du jour`],
  [
    'change',
    'broken',
    `mon gamin a joué au foot avec le neuf avant que je le pose, maintenant on entend un truc qui bouge dedans |
      l'ancien s'est cassé en deux dans le filetage`,
  ],
  [
    'step',
    'unwell',
    `pas cassé non. papa fait du sang dans les selles† |
      oui desserré. Par ailleurs ma femme enceinte a des vertiges et rend son repas chaque matin depuis l'inondation`,
  ],
  [
    'none',
    'unwell',
    `ma belle-soeur a les yeux jaunes, le docteur parle d'hépatite | il n'arrive plus à boire, la tête tombe, les yeux sont creux† |
      ma petite a le ventre qui court depuis hier est ce que c l'eau | depuis qu'on boit ça tout le monde a mal au bide |
      tout ce qu'il avale ressort aussitôt meme l'eau sucrée† | mémé dort depuis hier, on la secoue elle ouvre pas les yeux† |
      la petite convulse depuis tout à l'heure aidez nous†`,
  ],
  ['wash', 'wrong-number', `je ne suis pas tantie Awa, vous vous trompez`],
  [
    'step',
    'no-flow',
    `j'ai aspiré avec la bouche comme vous dites et l'eau veut pas venir du tout | robinet ouvert, que dalle`,
  ],
  ['wash', 'need-part', `la seringue ? introuvable. il m'en faut une`],
  [
    'flow',
    'slow',
    `pas chronométré mais c un filet de rien du tout | une éternité, j'ai abandonné avant que ce soit plein |
      le temps de piler le mil la bouteille n'était pas à moitié`,
  ],
  ['none', 'thanks', `vs etes trop gentils 🙏 | merci beaucoup que Dieu vous le rende`],
  [
    'wash',
    'unwell',
    `on m'a opéré je suis encore faible, c'est ma voisine qui tape |
      désolée j'étais aux urgences avec mon fils pour une gastro. je lave ce soir |
      le bébé refuse de téter et il est tout mou, j'ai pas lavé† | Clouée au lit avec le palu, désolée pour le filtre`,
  ],
  ['flow', 'moved', `vendu quand on a eu l'eau courante`],
  [
    'change',
    'need-part',
    `on n'a pas de rechange ici, vous pouvez envoyer ? | Ma dernière bougie est au bout, vraiment mince. Commande une pour moi`,
  ],
  ['change', 'not-yet', `demain inchallah | il est encore dans le carton`],
  ['none', 'help', `AIDE`],
  ['change', 'unclear', `il est parti`],
  [
    'step',
    'done',
    `j'ai fait ça et c'est reparti comme en quarante | stop la fuite, j'ai resserré le bouchon et plus rien, nickel`,
  ],
  [
    'none',
    'need-part',
    `je voudrais acheter deux cartouches pour la rentrée | où trouver le joint svp le mien est usé`,
  ],
  [
    'none',
    'odd-water',
    `ça schlingue l'oeuf pourri | on dirait du gasoil sur l'eau filtrée, ça brille |
      mes gobelets sont glissants, comme une bave, depuis que je les remplis au filtre | l'eau a un goût de ferraille |
      l'eau du filtre est amère ces jours ci`,
  ],
  [
    'none',
    'wrong-number',
    `Mme Diallo n'a plus ce numéro, c'est le mien maintenant | c ki ? moi g pas de filtre`,
  ],
  ['step', 'yes', `wi | ouais | Oui monsieur c'est bien ça`],
  [
    'change',
    'unwell',
    `c changé mais on est tous barbouillés ici | Bonjour. Le remplacement sera fait samedi car je veille ma fille souffrante.`,
  ],
  [
    'none',
    'no-flow',
    `le filtre est complètement bouché | depuis hier le robinet du filtre il crache que de l'air`,
  ],
  ['none', 'unclear', `le coq a mangé mon crédit hahaha`],
  ['change', 'moved', `Nous n'habitons plus cette maison`],
  ['flow', 'wrong-number', `faux numéro mon ami`],
  ['flow', 'odd-water', `6 min et ya des ptits vers dans la bouteille beurk`],
  ['wash', 'moved', `on est partis à Bouaké, le filtre on l'a pas pris`],
  ['none', 'moved', `je l'ai cédé à ma coépouse, elle habite ailleurs`],
  [
    'flow',
    'broken',
    `d'un coup ça remplit en 8 secondes alors que c'était 5 minutes, bizarre bizarre`,
  ],
  ['wash', 'unclear', `ça s'est arrêté`],
  ['change', 'wrong-number', `Ici c'est la pharmacie du carrefour, vous faites erreur`],
  ['flow', 'stop', `je ne souhaite plus être contactée`],
  [
    'none',
    'ask',
    `Madame, Monsieur, je me permets de vous demander si une éponge métallique peut convenir au nettoyage, ma fille prétend que non. Avec mes respects. |
      On peut y verser l'eau du fleuve directement ou il faut la laisser reposer ? | quelqu'un peut passer à la maison ?`,
  ],
  [
    'change',
    'done',
    `C'est mon neveu qui a posé la nouvelle pièce. Que le Seigneur vous bénisse. | Changée mardi soir`,
  ],
  ['wash', 'stop', `efface mon num stp | arrêtez de m'envoyer des messages`],
  ['change', 'stop', `lachez moi avec vos textos`],
  [
    'step',
    'odd-water',
    `tout le monde se porte bien, mais l'eau sent le marigot |
      Pas de fissure. Par contre des petits points noirs se déposent au fond du verre`,
  ],
  ['step', 'unclear', `moi je dis oui, ma soeur dit non, on se dispute`],
  ['change', 'odd-water', `pièce changée, l'eau sort trouble, pas comme d'habitude`],
  ['step', 'ask', `g pa compris expliké moi doucement svp`],
  ['wash', 'choice', `3`],
  ['change', 'ask', `faut tremper le neuf avant ou je le mets sec`],
  ['step', 'not-yet', `pas eu le temps d'essayer, c'est la récolte`],
])
