/**
 * Everyday French words without a meaning here: those that a slip of the finger would make of a word
 * that has one, and the commonest. They keep guesses at spelling off.
 */
export const frEveryday = `abaisse academique accompagne achats acier acquis actifs action actions active activite
  activites actuel actuelle affiche affirme agences agree ait allemand allies ambiance analystes
  anime animes annonce appartement apprend associee assorti assortie assurance assurant
  assurement assurent assureur assureurs augmente automobile autorites avaient avantages avril
  ayant bacteries bailleur balle bars battu benefice benefices boisson boissons bouillon brasseur
  brillante brillantes brillants brille britannique but cache cadre cahier calculer call campagne
  campagnes capacite capitale capitaux categorie cave centrale chanter chapeau chapelle
  chargement chemise chemises chevaux chic chiffres choisi choisir choix cinema clairement clarte
  client clients climat cliquet collecte colloque comites commercial commerciale commun concentre
  concentrer concept concepteur concepteurs concepts concernant concerne concernee concernees
  concernent concernes concert concerts concession concessions concevoir conclu conclure conclus
  conclusions conclut concours concret concretiser concrets concurrence concurrent concurrents
  condition conditions confiance conforme conformes confusion conge conjoncture connaissent
  connecter consenti consentis consequence conserver consiste constitue constituent conteste
  continents contraire contraste contrat convenu convient cooperation coulisses coupon courent
  couvert couvrant couvre couvrir creation crime croire croissance date dates davantage debarque
  debiteur debiteurs decalage decembre decision declares decor decoule decouvrir decrire delai
  delegue demeure departement dependent depenses deroulement desordre detient developpant
  developpe developpee developpees developpent developper developpes devenir devenu devenue
  devient devoir devolu devra devraient devrait difference differentes differents direction
  dirigeants disait disponible disponibles dispose disque divers diverses dividende division
  documents doivent dollar dollars domaine dossier dotes double doublement durement ecoute effets
  efficace egalement elections emettre emis emission endettement enormement enregistre epoque
  estime etc etendu etrangers etude europeen europeenne europeennes europeens eux evaluation
  evalue evaluee evaluer evolution existe exotique experience exporte expose exposees exposes
  expositions fabrication facile facteurs faillite fautes faveur favorable fevrier fiable fiables
  fier fierte figure filiale financement financier financiers firme fisc fiscal fiscale fixe
  formation fortement four frais fruits fusion futur future futures futurs gagner garantie gauche
  generale generation genre graphique griffe grille grossesse habitant habitants habitues hausse
  hauteur herbes immobilier imposable incite inciter industriel industriels informer injection
  instance instances interdit interessant janvier jeunes jouissent juge juillet laquelle large
  largement latine lecteur legalement lequel lesquels lettres liberte limite lisse locaux
  logiciel logiciels look loue made magnetique mai maintenir majorite marbre marin masse match
  materiel maximum melodies membres memoire merite meritent methode metier metteur milieu
  milliard milliards million millions minimum ministre modo module modules mondial monetaire
  montant montee motif motifs mouvement musee musees musique nature neanmoins necessaire
  necessaires necessite necessitent neerlandais nerveux neutre neuve nombreuses nombreux nourrir
  novembre objectifs obligation obligations obtenir obtenu octobre oeuvre oeuvres offre offrir
  operation operations options ordinateur paiement paille paisible pantalon pari parite parlent
  parole partenaire partent paru passage patrimoine pension percevoir periode permet permettant
  permis pese pile placement plaisir plupart politique politiques ponts population positif
  potentiel pratiquee precisement precompte presence presente presse preuve prevenu prevenus
  prevoit prime principal principaux principe prise prive privee proceder procedure processus
  proche production profit progression projet projets propose protection provisions publicite
  publics publique publiques puisque puisse purete put puts qualite rachat rachete rachetee
  racheter raffinement rapport rares rarete rating ratio rebond recemment recente recette
  recevront recommande recommander recompense recule reculer redige rediger redonner reduction
  reellement reference regime region reglage regrette regroupe regulation regulier reguliers
  relations releve remporte rencontre rendement rentabilite repli replique repondent represente
  repression reprises reproche reservee resister responsable ressources restent resultant
  resultat resultats resulte retard reussi revers risque risques ristourne roue roues rues ruines
  rythme saison salaires secteur secteurs securite seduire seduisant sejours semble semblent
  semestre senateur sensible separe separee seraient serie serieux seront signature signatures
  signaux signe signee signer signes sites situation situe social sociale sociales soient
  solution songe sourire soutien stand statut strategie structure subtil succession suivant suivi
  sujet superieur superieure supplement surprendre tableau tailleur taux taxe technique
  techniques technologie tenait tendance tenu terme termes terminal terminaux terrain tiers
  tirage tirent totale totalement touchent traitement traitent transport travaux trimestre type
  unique uniquement usine usines vacances vallee vapeur varie vecu vehicule veritable veritables
  version versions verticale veste veulent vigueur virage visent visite vitres vivement vives
  volonte volume voor voulu wallon wallonne warrant`
