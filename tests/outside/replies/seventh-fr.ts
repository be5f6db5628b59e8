import { labelled, type LabelledReply } from './reply-set'

/** A seventh batch, written in five parts while the reader was widened: each was read before it was learnt from. */
export const seventhFrReplies: LabelledReply[] = labelled('fr', [
  [
    'wash',
    'unwell',
    `je vais le faire, mais ma soeur est en train de rendre son petit déjeuner | je peux pas là je garde ma mère elle est brûlante | désolé du retard j'étais cloué avec le palu |
      filtre lavé. au fait papi grelotte depuis hier soir`,
  ],
  [
    'none',
    'unwell',
    `mon ventre chante depuis que j'ai bu cette eau | le nourrisson a des plaies dans la bouche et des selles molles | trois d'entre nous ont passé la nuit dehors accroupis |
      il est étendu sans connaissance avec de la mousse à la bouche† | mon bébé n'a rien bu de la journée, il tourne la tête† | ma fille vomi et a la diaré depui hier | bb mange pa il a le corp cho |
      il a la fievr et mal o tete | caca liquid 10 foi ojourdui | mal o ventre tou le monde | le petit coule du ventre | elle es inconsciente aidé nou† | ya du san dan ses selle† |
      ma mere es tombé sans connaissance ce matin† | le petit n'arrête pas d'aller aux toilettes depuis hier | ma femme et moi on a le ventre retourné | tous ceux qui ont bu ont la courante |
      ma fille ne garde rien dans l'estomac† | les jumeaux sont sous perfusion au centre | mon neveu reste couché, il n'ouvre même pas les yeux† | papi fait du sang aux toilettes† |
      j'ai des boutons partout depuis que je me lave avec | venez vite mon fils convulse† | mamie ne garde rien depuis hier† | on va tous trop souvent aux toilettes | mon mari a dû voir le médecin pour son ventre |
      il y a du sang dans le caca du petit† | ma petite a la chiasse | bébé trop faible pour téter† | les enfants vomissent après avoir bu | il n'est pas dans son assiette, très chaud et il tremble |
      j'ai la tête qui tourne et le ventre qui gargouille | elle ne se réveille pas bien† | mon dernier refuse de manger et pleure en se tenant le ventre |
      depuis qu'on a ce filtre mes enfants ont souvent la diarrhée, c'est lié? | ma femme est hospitalisée pour la typhoïde | elle a les yeux creux et elle est toute molle† |
      il a tremblé de partout et ses yeux se sont révulsés† | on a mangé ou bu un truc, toute la journée aux toilettes`,
  ],
  ['change', 'unwell', `changé. c'est normal que mamie ait des nausées`],
  [
    'flow',
    'unwell',
    `je sais pas, je suis au dispensaire avec mon fils | 9 minutes mais le bébé a la diarrhée | 12 min. et ma fille a mal au ventre depuis lundi | 8 min mais mon bébé a de la température`,
  ],
  [
    'step',
    'unwell',
    `robinet ok. l'enfant non, il est bouillant | pas de fissure mais ma femme est à l'hôpital | le bouchon va bien c'est nous qui n'allons pas bien, tous des crampes`,
  ],
  [
    'none',
    'broken',
    `j'ai entendu un pop et maintenant ça gicle | il manque un éclat au bord | le chiot s'est attaqué au tuyau | le pas de vis est foiré et ça bouge | le filtre a dégringolé l'escalier |
      il s'est fendu quand j'ai versé l'eau chaude | le débit a doublé du jour au lendemain, bizarre | il a fait tellement froid que c'est un bloc de glace | le filtr es tombé et cassé | sa fui par en ba |
      le robiné es gaté il fuit | le so es fissuré | les ra on coupé le tuyo | mon fis la jeté par terre | lo sort par les coté | le chat l'a poussé de la table, maintenant il branle |
      il y a un trait le long de la coque et c'est humide | mon frère a roulé sur le tuyau avec la brouette | trop près du feu, il a ramolli et il est tout tordu | ce matin il y avait de la glace dedans |
      le robinet m'est resté dans la main | chaque matin il y a une flaque dessous | quelqu'un a marché dessus | le joint ne tient plus, l'eau s'échappe autour | la chèvre a mâché le tuyau |
      l'eau traverse d'un coup comme s'il n'y avait rien dedans | il est resté dehors dans la neige et il a gelé | le tuyau a une déchirure | les enfants ont joué au ballon avec |
      ça goutte par le socle toute la journée, le meuble est trempé | l'anse a cassé et il est tombé dans le puits | resté dans le camion la nuit à moins dix | ça coule comme s'il n'y avait rien dedans, avant ça gouttait`,
  ],
  [
    'wash',
    'broken',
    `fait mais maintenant ça goutte par en dessous | l'eau sort là où le tuyau rentre | il m'a glissé des mains en lavant et a tapé l'évier | en lavant la pièce de dedans est sortie et ne rentre plus`,
  ],
  [
    'step',
    'broken',
    `oui il y en a, comme une toile d'araignée sur le côté | oui peti fissure sur le coté | en serrant le bouchon ça a fait crac | oui une petite fissure près du fond | j'ai regardé il y a une fine fente sur la jointure`,
  ],
  [
    'none',
    'odd-water',
    `il y a comme du coton dans l'eau | l'eau est gluante | ça crisse sous les dents | odeur d'essence | les enfants disent que ça a un goût de pièce | des têtards !! | lo es maron | lo sen movai | je voi des ver dedan |
      lo a la couleur soda | gou amer ces jour ci | ça laisse un rond marron dans le verre | y a un truc qui gigote dans mon gobelet | ça sent le caniveau | un goût de pièce de monnaie |
      des petits fils blancs flottent dans la carafe | l'eau est devenue jaunâtre | des petits morceaux noirs sortent avec l'eau | un truc vert pousse dans le seau et l'eau est verte aussi |
      le goût a changé, un peu métallique | ça sent l'oeuf pourri | j'ai vu un petit ver dans mon verre | on dirait du lait | il y a une pellicule grasse dessus | du sable au fond de mon verre | goût de terre`,
  ],
  [
    'wash',
    'odd-water',
    `nettoyé ce matin, sorti marron | lavé mais l'eau a une couleur de thé | j'ai lavé mais l'eau sent toujours | lavé hier, aujourd'hui l'eau est verdâtre`,
  ],
  [
    'none',
    'stop',
    `j'arrête avec ça, plus rien svp | veuillez désinscrire mon téléphone | vos textos réveillent le bébé, cessez | laissez mon téléphone tranquille | je veux annuler | arété de menvoyé des messages | plus de mesage svp |
      suprimé mon numéro | rendez-moi service, oubliez ce numéro | j'en ai par-dessus la tête de vos textos | je n'ai plus besoin de vos rappels | rayez-moi | chaque jour message sur message, lâchez-nous |
      arrêtez de m'envoyer ça svp | je ne veux plus faire partie de ça | pourquoi vous m'écrivez tout le temps?? arrêtez | enlevez-moi de votre liste | merci de retirer mon contact de votre système | ça suffit maintenant |
      je n'ai jamais accepté de recevoir ces messages | ça ne nous intéresse plus merci | ARRETEZ D'ENVOYER`,
  ],
  [
    'none',
    'wrong-number',
    `jamais entendu parler de ce programme | je m'appelle Kouadio je vends des chaussures, vous vous trompez | ce téléphone était à Marie mais elle me l'a vendu | on a l'eau du robinet, ce n'est pas nous | movai numéro |
      vou vou trompé de personne | moi g pa de filtre c ki ca | ici c'est le pasteur, vous devez chercher quelqu'un d'autre | vous cherchez sûrement l'ancien propriétaire de la puce |
      nous n'avons jamais eu ça, vérifiez vos listes | je crois que vous avez la mauvaise personne | désolé je ne suis pas celle que vous cherchez | ce numéro est à quelqu'un d'autre maintenant |
      c'est qui Amina? mauvais numéro | désolée vous vous trompez de dame, je suis Béatrice pas Aïcha | ce n'est pas le numéro de la famille Traoré | j'ai acheté cette puce le mois passé, je ne connais pas le propriétaire |
      filtre ? quel filtre`,
  ],
  [
    'wash',
    'done',
    `lavé et tout, pas de fuite et personne n'est malade | je lé lavé | c fé se matin mrc | ok fé | voilà chef, tout est propre, ma fille s'en est chargée ce matin | récuré de fond en comble, ça coule à merveille |
      j'ai mal au dos mais je l'ai lavé | il avait la fièvre la semaine passée mais il court partout maintenant, filtre lavé ce matin | oui il a été lavé mardi | c'est fait, merci du rappel |
      fini de laver, c'est beaucoup plus rapide merci | je l'ai nettoyé ce matin comme conseillé`,
  ],
  [
    'step',
    'no',
    `ni fissure ni fuite, tout est sec | non pa du tou | aucune fissure que je voie | nan tout est bien serré | ni fuite ni fêlure rien | non, rien n'est cassé | pas que je voie | nan | non il n'est pas fissuré |
      sec, aucune fuite`,
  ],
  [
    'none',
    'done',
    `merci, mon fils est guéri et le filtre coule bien | tout va bien pour le filtre et pour nous | aucun problème, ça marche super, personne malade | tout va bien ici, beaucoup d'eau |
      bonjour juste pour dire que le filtre marche bien`,
  ],
  [
    'wash',
    'slow',
    `tout lavé mais il faut de la patience | fait mé toujour lent | g lavé mé c toujour tré lent | j'ai lavé comme vous avez dit mais ça coule toujours au compte-gouttes | franchement ça fait juste un petit pipi |
      deux lavages et c'est toujours la galère | nettoyé 3 fois, aucune amélioration | oui lavé mais le débit est pauvre | lavé à fond et pourtant il reste paresseux | pas grande différence après lavage |
      ok lavé mais je crois qu'il est encore bouché, que des gouttes`,
  ],
  [
    'none',
    'slow',
    `la carafe prend toute la matinée | sa coul peti peti | le débi a bocou baissé | sa pren tro de tan | depuis l'harmattan le filtre n'a plus de souffle | on est huit à la maison, ça ne suffit pas du tout |
      le temps d'avoir une tasse mon thé est froid | ça prend une éternité ces temps-ci | avant 10 min maintenant presque une heure | juste un mince filet | de plus en plus lent chaque jour`,
  ],
  [
    'none',
    'no-flow',
    `lo sort pa du tou | rien ne sor | le robinet est sec comme le désert | le seau du haut reste plein et celui du bas reste vide | pas d'eau du tout depuis dimanche | il est complètement à sec |
      pas une goutte depuis hier soir`,
  ],
  [
    'wash',
    'no-flow',
    `ya pa do ki sor | depuis le lavage plus rien ne descend | lavé et maintenant rien ne sort | on a lavé mais l'eau refuse de passer`,
  ],
  [
    'flow',
    'flow-figure',
    `env 15mns => 15 | 10 mn => 10 | vin cinq minute => 25 | 2h => 120 | 7min30 => 7.5 | de 7h15 à 7h32 => 17 | onze minutes et demie => 11.5 | avant 5 mais cette semaine 14 => 14 | 1h05 => 65 |
      une quarantaine de secondes => 0.6667 | trois quarts d'heure facile => 45 | posé à 16h10, plein à 16h25 => 15 | environ un quart d'heure => 15 | c'était sept minutes et trente secondes => 7.5 |
      il nous a fallu 25 minutes pour remplir la bouteille => 25 | 3min 45 => 3.75 | environ 22 minutes je pense => 22 | 6 minutes 20 secondes => 6.3333 | une heure vingt => 80 | moins de 5, peut-être 4 et demi => 4.5`,
  ],
  ['change', 'done', `chanjé déja | la cartouche est en place | j'ai mis le nouveau tissu`],
  [
    'wash',
    'not-yet',
    `pa encor | je le fé demin | je sui o boulo, kan je rentre | laissez moi jusqu'à dimanche, c'est la récolte | plus d'eau au village donc impossible de laver aujourd'hui | je suis en voyage, retour vendredi |
      je vais demander à mon frère ce week-end | je le fais ce soir quand les enfants dorment | pardon j'ai oublié, je vais le faire | je suis à des funérailles au village`,
  ],
  [
    'none',
    'need-part',
    `besoin dune otre seringue | envoyé tissu pour nou c déchiré | le petit joint est mort, vous en avez un autre ? | la seringue est bloquée, il m'en faut une | pourriez-vous envoyer un autre joint |
      il nous faut une nouvelle bougie svp | où acheter une seringue | je peux avoir un autre tuyau le mien est vieux | le tissu est usé envoyez svp | on a perdu la seringue dans le déménagement`,
  ],
  [
    'none',
    'ask',
    `koman je le lave | vou vené a kel heure | la flèche vers le haut ou vers le bas ? | on peut mettre de l'eau chaude | quand est-ce que votre agent passe chez nous | excusez moi j'ai pas saisi l'étape deux |
      tous les combien faut-il le laver | est-ce que ça enlève le chlore | ma voisine en veut un aussi, comment elle fait? | ça marche pour l'eau de puits | c'est quoi le contre-lavage |
      comment savoir quand changer la bougie | appelez-moi svp je ne comprends pas le message`,
  ],
  [
    'none',
    'moved',
    `on a demenagé | on a quitté la cour à noël | le filtre est parti chez ma belle-soeur | on n'habite plus là-bas | je l'ai donné à ma mère au village | nous sommes partis à Ségou |
      le voisin a repris le filtre quand on est partis`,
  ],
  [
    'none',
    'thanks',
    `mersi bcp | vous faites le travail de Dieu | merci ma fille, sois bénie | mille fois merci | merci infiniment`,
  ],
  ['step', 'yes', `ouiii | oui c'est exact | oui j'ai vérifié c'est ça | ouais c'est serré`],
  [
    'none',
    'unclear',
    `koi 2 9 | mdr mauvais groupe | bon alors qui gagne ce soir le psg ou l'om | on se voit au match | rappelez-moi | ok maman à ce soir 18h | ??`,
  ],
  [
    'change',
    'slow',
    `nouvelle bougie posée, pas mieux que l'ancienne | changé et ça goutte toujours goutte par goutte | nouvel étage posé, débit toujours faible`,
  ],
  [
    'step',
    'no-flow',
    `soulevé, tapoté, rien à faire, pas une goutte | robinet ouvert à fond et rien`,
  ],
  [
    'flow',
    'broken',
    `rempli en 15 secondes, c'est pas normal | il se remplit en 20 secondes maintenant, beaucoup trop vite`,
  ],
  [
    'change',
    'not-yet',
    `la route est coupée, la pièce est encore à la poste | j'attends que mon mari rentre | je n'ai pas encore reçu la nouvelle pièce`,
  ],
  [
    'flow',
    'not-yet',
    `mon chrono est gâté, je vais emprunter une montre | je chronomètre demain matin`,
  ],
  ['wash', 'unclear', `hmm | c'est arrêté`],
  ['wash', 'yes', `pas de souci chef`],
  [
    'change',
    'broken',
    `la nouvelle est arrivée cassée | la nouvelle pièce ne va pas, l'eau sort autour`,
  ],
  ['flow', 'odd-water', `5 min mais elle est trouble | sept minutes mais ça pue`],
  ['wash', 'stop', `plus de ça merci`],
  ['step', 'slow', `essayé, un peu plus vite mais encore lent`],
  ['flow', 'no-flow', `impossible de mesurer, rien ne vient`],
  ['step', 'done', `je l'ai fait et maintenant ça coule bien | resserré et ça ne goutte plus`],
  ['step', 'ask', `quel bouchon celui du haut ou du bas ?`],
  ['none', 'help', `aide`],
])
