import type { LanguagePack } from './concept'
import { frBreach } from './fr-breach'
import { frCare } from './fr-care'
import { frContact } from './fr-contact'
import { frEveryday } from './fr-everyday'
import { frIll } from './fr-ill'
import { frOdd } from './fr-odd'
import { frPeople } from './fr-people'
import { frTalk } from './fr-talk'
import { frWant } from './fr-want'
import { frWater } from './fr-water'

/** French as people text it; elided words stand apart ("l eau", "n est"), without accents. */
export const frPack: LanguagePack = {
  spelling: 'french',
  concepts: {
    ...frWater,
    ...frBreach,
    ...frOdd,
    ...frPeople,
    ...frIll,
    ...frCare,
    ...frTalk,
    ...frWant,
    ...frContact,
  },
  numbers: `deux 2, trois 3, troi 3, quatre 4, katre 4, cinq 5, cink 5, sept 7, huit 8, dix 10, onze 11,
    douze 12, treize 13, quatorze 14, quinze 15, kinze 15, seize 16, dix sept 17, dix huit 18,
    dix neuf 19, vingt 20, vint 20, vin 20, trente 30, quarante 40, cinquante 50, soixante 60,
    soixante dix 70, quatre vingt 80, quatre vingts 80, quatre vingt dix 90, cent 100, six 6,
    onz 11, douz 12, trez 13, katorz 14, kinz 15, sez 16, trant 30, karant 40, cinkant 50,
    une dizaine de 10, dizaine de 10, une quinzaine de 15, quinzaine de 15, une vingtaine de 20,
    vingtaine de 20, une trentaine de 30, trentaine de 30, une quarantaine de 40,
    quarantaine de 40, une cinquantaine de 50, cinquantaine de 50, vingt et un 21, trente et un 31,
    quarante et un 41`,
  weakNumbers: `un 1, une 1, neuf 9, demi 0.5, demie 0.5`,
  units: {
    minute:
      'minute, minutes, min, mins, mn, mns, mnt, mnts, minut, minuts, m, minite, minites, minu, mint',
    hour: 'heure, heures, h, hr, hrs, heur, heurs, eur, ere, hres',
    second: 'seconde, secondes, sec, secs, s, segonde, segondes, second, sgd',
    other: `litre*, lt, l, bouteille*, seau, seaux, verre, verres, tasse, tasses, cruche, bidon*, jour, jours, semaine*, mois, an, ans, annee*, fois, fs, enfant, enfants, fils, filles, fille, personne, personnes, seringue*, filtre*, piece, pieces, partie*, bouchon, bouchons, tuyau, goutte*, nuit, nuits, peu, chose, choses, cm, francs, familles, maisons, gosses, bebe, probleme, question, petit, petite, autre, nouveau, nouvelle, cartouche*, de, des, moment, instant, aide`,
  },
  spans: `demi heure 30, demie heure 30, une demi heure 30, une demie heure 30, heure et demie 90,
    une heure et demie 90, une heure et demi 90, quart d heure 15, un quart d heure 15,
    trois quarts d heure 45, trois quart d heure 45, demi minute 0.5, une demi minute 0.5,
    une minute et demie 1.5, une heure 60, une minute 1, une dizaine de minutes 10,
    dizaine de minutes 10, une quinzaine de minutes 15, quinzaine de minutes 15,
    une vingtaine de minutes 20, vingtaine de minutes 20, trentaine de minutes 30,
    quarantaine de minutes 40, demi eure 30, une trentaine de minutes 30`,
  halves: `et trois quarts 0.75, moins le quart -0.25, moins un quart -0.25, et demie 0.5, et demi 0.5, et quart 0.25, et un quart 0.25, et dmi 0.5`,
  light: `donner donne donnait laisse laisser est sont suis a ai as ont avons avez ete etre bien tres trop tro assez du de des la le les l d un une en y ce c ca que qu pu encore vraiment tellement peux peut veut veux peuvent si tout plus beaucoup completement`,
  common: `${frEveryday} sien sienne siens mien tien leurs verse haut cruche marmite joliment
    franchement le la les l un une des de du d a au aux et ou mais donc or ni car que qu qui quoi
    dont ce cet cette ces c ca cela sa son ses mon ma mes ton ta tes notre nos votre vos leur je
    j tu il elle on nous vous ils elles me m te t se s lui y en ne n pas plus est es suis sommes
    etes sont etait sera soit ete etre ai as avons avez ont avait aura avoir eu fait faire fais
    font faut va vais vont allez aller vient venir veut veux voulez peut peux pouvez pouvoir doit
    dois devez sait sais savoir voit vois voir dit dire dis met mets mettre mis prend prends
    prendre pris tient tenir laisse laisser bien mal tres trop peu beaucoup assez moins aussi
    encore toujours jamais souvent parfois deja bientot hier demain aujourdhui maintenant ici bas
    dans sur sous avec sans pour par vers chez entre depuis pendant avant apres contre jusqu
    comme comment quand combien pourquoi parce si non oui tout tous toute toutes autre autres
    meme rien personne quelque quelques chaque plusieurs aucun aucune maison chambre cuisine
    porte table sol terre champ village ville ecole eglise marche travail route chemin jour jours
    nuit matin soir midi semaine mois an annee heure temps fois homme femme ami amie voisin gens
    dieu main mains tete yeux pied pieds bras coeur corps grand grande petit petite nouveau
    nouvelle vieux vieille premier premiere dernier derniere seul seule long court chaud froid
    plein pleine ouvert ferme fermee bon bonne beau belle joli manger mange riz pain lait the
    cafe sucre sel viande poisson oeuf cuisiner acheter achete payer vendre argent prix telephone
    reseau batterie photo image credit cours cour coup cou cout course couleur couler colle col
    sole sale salle sortie sorte port part parti partir poule pouce coude boule roule moule foule
    blanc bleu vert jaune rouge noir gris lune dune hune lundi lit lire livre vivre ivre libre
    litre titre filtre fille file fil fin faim bain gain chose choses idee mot mots nom question
    reponse probleme raison histoire chance peur soleil vent pluie feu lumiere arbre fleur animal
    chien chat vache tante tente lente lentille lent dent cent sent ment sang rang rond fond pont
    mont valeur loin cause juin septembre position pages telle realite vaut gros gamme revanche
    tour creer decide commerce bons taille voie continue reduire style classique bout tels
    atteindre collection peau contrats poste pouvait voix affaire contexte nord facilement
    devises telles constate marge avis pourront poursuit assure lancement tonnes equipe donnent
    profiter passant defaut complexe recours vise films code gerer sentiment debat elevee suit
    correction comporte langue continuer classe paie reelle portant investir caisse surprise
    vaste demarche veille vend mises contient lies centaines critique conception avenir consacre
    forcement notion branche depit profession verite lien document aime portent ford connue
    peintre loyer voient precision cite menages resoudre jeunesse constater dettes reconnaissance
    chasse centaine rentable liee appris creee soin calme tours russe composition modifications
    echange fund stress convention repose allant mons attentes stable souffle liees revu
    reactions vote recession rejoindre constante investit tapis venus pistes investis critiques
    auteur vivent complexes basse clause atout prepare fruit douceur comptant attendue trait
    consacrer effort gras vols voies fasse seduit comptent stock couronne cycliques conversion
    retenue pousse consacree revendre rapporte leasing separation attache dommage connexion
    portrait peuple fiat classes prevision inflation intention compenser tester evite perception
    reveler egale toit coree hiver conviction demarrage lutter marquee prince palette terrasse
    bouillir bouilli bouillie retrolavage abord remonte remonter debite entend entendre entends
    entendu plie plier seigneur eponge ancien ancienne desert comble ballon debite debiter
    dorment dormir pendule crisse dents`,
}
