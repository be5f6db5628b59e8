import type { LanguagePack } from './concept'

/** French: the filter, its water, and what can be wrong with them. Written without accents. */
export const frWater: LanguagePack['concepts'] = {
  water: 'eau, eaux, leau, deau, lo, o, debit, jet, filet, pression, d eau',
  filter: 'filtre, filtres, filtr, appareil, kit, systeme, purificateur, machine, dispositif',
  piece: `bouchon, bouchons, capuchon, couvercle, couvercles, tuyau, tuyaux, tuyo, tuyeau, tube, tubes, robinet, robinets, cartouche, cartouches, fibre, fibres, membrane, charbon, etage, etages,
    piece, pieces, partie, parties, seringue, seringues, serinque, joint, joints, raccord, raccords, vis, clapet, poignee, rechange, embout, coque, boitier, rondelle, collier, capsule`,
  cloth: 'tissu, tissus, toile, chiffon, linge, prefiltre, pre filtre, tamis',
  container:
    'seau, seaux, bidon, bidons, bac, cuve, recipient, reservoir, bassine, jarre, bouteille, bouteilles, marmite, citerne, fut, jerrican, canari, carafe',
  edge: 'cote, cotes, bas, dessous, fond, bord, bords, jointure, partout, par terre, sol, base, dehors, a travers, l exterieur, dessus, par le haut, jonction, filetage',
  source: 'riviere, puits, marigot, source, fleuve, lac, forage, ruisseau, pluie, etang',
  flow: `coule, coulent, coulait, couler, coulant, sort, sortent, sortait, sortir, sorte, sors, passe, passent, passait, passer, vient, viens, venait, venir, arrive, descend, descent, descendent, descendait, filtre pas, filtre bien, filtre mal, filtre plus, s ecoule, ecoule, ecoulement, donne, tombe dans, remplir, remplit, rempli, remplie, se remplit, kool, koule, kule, cool pas, cool plus, colle pas, laisse passer`,
  drip: 'goutte a goutte, gouttes, goutte, goute, goutes, au compte goutte, compte gouttes, goutelettes, gouttelettes, goutte par goutte, petites gouttes, gout a gout, goutte goutte, petit filet, filet d eau, mince filet, filet, un filet',
  slow: `lent, lente, lents, lentes, lentement, len, lentemen, lentemment, doucement, doucemen, tout doucement, ralenti, ralentie, ralentit, ralentissement, ralentir, ralentis, faible, faibles, faiblement, faiblit, faibl, debit faible, debit bas, debit a baisse, baisse, baissé, diminue, diminué, diminution, diminuer, reduit, reduite, moins vite, moins d eau, moins de debit, moins fort, moins qu avant, moins rapide, pas assez, ne suffit pas, suffit pas, insuffisant, peine, a peine, difficilement, presque rien, presque pas, presque plus, presque pas d eau, presque plus d eau, traine, tortue, escargot, emojislow, peu d eau, pas de pression, plus de pression, sans pression, pas beaucoup, pas grand chose, mollo, petit a petit, peu a peu, au ralenti, tarde, tarder`,
  little:
    'peu, un peu, tres peu, petit peu, moins, pe, peu peu, petit debit, petite quantite, trop peu',
  long: `longtemps, lontemps, lontemp, longtemp, long temps, tro long, long, longue, des heures, toute la journee, toute la nuit, toute la matinee, une eternite, des siecles, beaucoup de temps, bcp de temps, trop de temps, tout le temps pour, plus de temps, demi journee, met du temps, prend du temps, dure, perd du temps, des plombes, un temps fou, heures pour`,
  none: 'rien, vide, zero, sec, seche, a sec, aucune goutte, pas une goutte, pas une seule goutte, plus une goutte, ryen, que dalle, neant, kedal, walou',
  blocked:
    'bouche, bouché, bouchee, bouches, bouchait, bloque, bloquee, bloques, bloqué, obstrue, obstruee, coince, coincee, colmate, colmatee, encrasse, encrassee, engorge, bouch',
  fast: 'vite, rapide, rapidement, rapides, fort, vit, tres fort, forte, rapid, vitesse',
  tooFast: `trop vite, tro vite, trop vit, trop rapide, tro rapide, trop rapidement, beaucoup trop vite, trop fort, a flots, a flot, jaillit, jaillir, gicle pas, d un coup, tout d un coup, plus vite que d habitude, plus vite que la normale, plus vite que normal, plus rapide que d habitude, anormalement vite, anormalement rapide, anormalement rapidement, comme un robinet, traverse direct, passe direct, tout droit, sans filtrer, sans s arreter, sans arret, plus vite que jamais, trop d eau`,
  good: `bien, bon, bonne, parfait, parfaite, nickel, normal, normale, normalement, marche, marchent, fonctionne, super, impeccable, correct, correctement, content, contente, contents, biens, bi1, impec, top, genial, excellent, tres bien, agreable, meilleure forme`,
  bad: 'mal, mauvais, mauvaise, pire, terrible, horrible, nul, moche, grave, pas bon, pas bonne, pas bien, mo, pa bon, pa bien, bizarre etat',
  better: `mieux, meilleur, meilleure, ameliore, amelioré, amelioree, repare, reparé, regle, reglé, resolu, resolue, arrange, plus vite, plus rapide, plus fort, plus rapidement, recoule, ca recoule, recommence a couler, est revenue, est revenu, revenue, comme avant, comme neuf, ca marche, marche bien, remarche, ca remarche, refonctionne, de nouveau, redevenu normal, redevenue normale, debouche, debloque, debouché, coule bien, coule tres bien, coule normalement, retabli, retablie`,
  same: 'pareil, pareille, pareils, meme chose, la meme, le meme, aucun changement, pas de changement, rien change, rien n a change, rien de change, ca change rien, ca ne change rien, inchange, identique, idem, pas mieux, pas d amelioration, aucune amelioration, pas ameliore, pas change, toujours le meme, sans changement, sans effet, pa mieu',
  broken: `casse, cassé, cassee, casses, cassees, kasse, casser, casé, fissure, fissuree, fissures, fissurer, fisure, fisuree, fele, felee, fêlé, fendu, fendue, fendille, fend, fente, fentes, craque, craquee, craquele, craqué, dechire, dechiree, dechirure, perce, percee, percé, troue, trouee, trou, trous, eclate, eclatee, brise, brisee, abime, abimee, abimé, endommage, endommagee, endomage, creve, crevee, fuse, mordu, mordue, ronge, rongee, rongé, grignote, grignoté, coupe, coupee, coupé, fondu, fondue, brule, brulee, detache, detachee, detaché, decolle, decollee, decroche, desserre, devisse, deboite, deboitee, deconnecte, debranche, arrache, arrachee, ecrase, ecrasee, tordu, tordue, s est defait, defait, ouvert tout seul, gate, gatee, foutu, foutue, fichu, rompu, rompue, en morceaux, pete, pété, petee, a lache, lache, est sorti tout seul, s est enleve`,
  leak: `fuit, fuite, fuites, fui, fuis, fuyait, fuient, fuir, fuire, deborde, debordait, suinte, suintement, goutte par, goutte du, goutte de, goutte sur, goutte a cote, coule a cote, coule par, coule partout, coule de partout, coule du, coule en dessous, coule sur, coule dehors, sort par le cote, sort par les cotes, sort de partout, sort partout, sort par le bas, sort en dessous, perd de l eau, perd l eau, perte d eau, pisse, pisse l eau, gicle, eclabousse, flaque, mouille, inonde, s echappe, ruisselle, degouline`,
  fall: 'tombe, tombé, tombee, tombes, tomber, tomba, chute, chuté, renverse, renversee, renversé, laisse tomber, fait tomber, echappe des mains, cogne, heurte, choc, basculé, bascule',
  frozen:
    'gele, gelee, geles, gelé, gel, gelait, congele, congelee, congelé, glace, glacon, glacé, givre, givré, verglas',
  mended:
    'colle, recolle, bricole, rafistole, change le joint, reparee, repare la, repare le, repare la fuite',
  clean: 'claire, clair, propre, limpide, transparente, pure, potable, net, nette, propres',
  odd: `noire, noir, noiratre, noires, nwar, marron, brune, brun, brunatre, jaune, jaunatre, jone,
    verte, vert, verdatre, rouge, rougeatre, orange, grise, gris, grisatre, blanche,
    blanchatre, laiteuse, trouble, troubl, truble, opaque, boueuse, boueux, boue, terre,
    terreuse, sable, couleur, coloree, foncee, fonce, particules, poussiere, poussieres,
    petits points, morceaux, depot, depots, saletes, salete, impuretes, vers, ver, asticots,
    insectes, insecte, bestioles, bestiole, betes, larves, algues, mousse, mousseuse, rouille,
    rouillee, residus, dechets, flotte, flottent, flottants, bave, gluante, visqueuse, suie,
    encre, cendre, vase, tache, taches, poils, moisissure, moisi, debris, pas claire,
    plus claire`,
  oddSmell: `pue, puent, puait, pu, puante, puant, puanteur, nauseabonde, nauseabond, pourri, pourrie, pourriture, fetide, degoutante, degoutant, degeu, degueu, deguelasse, degueulasse, infecte, amere, amer, salee, acide, aigre, metallique, mauvaise odeur, mauvais gout, mauvais odeur, mauvaise gout, drole d odeur, drole de gout, odeur bizarre, gout bizarre, odeur etrange, gout etrange, sent mauvais, sent pas bon, sent bizarre, sent drole, sent fort, sent l, sent le, sent la, sent comme, sen mauvai, sen movai, odeur de, gout de, un gout, gout d, odeur d, gout du, a un gout, a une odeur, odeur forte, egout, savon, javel, chlore`,
  smell: 'odeur, odeurs, odor, l odeur',
  taste: 'gout, gouts, saveur',
  fuel: 'essence, gasoil, gazole, petrole, mazout, kerosene, carburant, huile, huileuse, chimique, chimiques, produit chimique, peinture, solvant, poison, pesticide, pesticides, insecticide, engrais, desherbant, herbicide, white spirit, gaz oil, gaz, diesel, fuel',
  dirty: `sale, sales, salle, crade, dégueu, malpropre`,
}
