import type { LanguagePack } from './concept'

/** French: illness, and who is ill. */
export const frIllness: LanguagePack['concepts'] = {
  child: `fils, fille, filles, bebe, bebes, bb, enfant, enfants, enfan, petit fils, petite fille, petit, petite, petits, gosse, gosses, garcon, garcons, gamin, gamine, nourrisson, nouveau ne, nouveau nee, jumeaux, neveu, niece, mome, mon grand, fiston, le petit, la petite, tout petit, gamins`,
  person: `femme, mari, mere, pere, maman, papa, frere, soeur, grand mere, grand pere, mamie, papi,
    mamy, papy, tante, oncle, famille, voisin, voisine, voisins, tout le monde, tous,
    toute la famille, gens, nous, vieux, vieille, quelqu un, moi, belle mere, cousin, cousine,
    epouse`,
  stool:
    'selle, selles, caca, cacas, kaka, excrements, couche, couches, va aux toilettes, popo, pot',
  belly: 'ventre, estomac, bide, bidon mal, intestin, intestins, ventr, vantre, boyaux',
  all: 'tout, tout ce qu, tout ce que, tous les repas, a chaque fois, tou, chaque repas, sans arret',
  ill: `malade, malades, malad, maladie, maladies, souffrant, souffrante, souffre, souffrent,
    diarrhee, diarrhees, diarrhe, diarhee, diare, diaree, diarree, diarhe, diaré, chiasse,
    courante, gastro, ventre qui coule, ventre coule, fievre, fievres, fiever, fiebre,
    temperature, cholera, kolera, typhoide, dysenterie, hepatite, jaunisse, deshydrate,
    deshydratee, deshydratation, nausee, nausees, envie de vomir, mal au coeur, crampe,
    crampes, hopital, opital, clinique, docteur, medecin, dispensaire, centre de sante,
    intoxication, intoxique, intoxiquee, empoisonne, empoisonnee, infection, boutons,
    demangeaisons, demange, vertige, vertiges, est tres faible, indigestion,
    ne se sent pas bien, se sent pas bien, ne va pas bien, va pas bien, va tres mal, va mal,
    vont mal, se sent mal, me sens mal, se sentent mal, pas en forme, pas dans son assiette,
    mal en point, emojiill, paludisme, parasites, colique, coliques, toilettes toute la nuit,
    toilettes tout le temps, toilettes sans arret, toilette tout le temps, rend malade,
    rendu malade, rendus malades, tombe malade, tombee malade, tombes malades, mourant,
    mourir`,
  pain: 'douleur, douleurs, mal au, mal aux, mal a l, mal a la, mal de, mal o, a mal, ai mal, ont mal, avons mal, fait mal, font mal, doulleur, maux, maux de',
  blood: 'sang, saigne, saignement, saignements, sanglante, sanglant, ensanglante',
  vomit: `vomi, vomis, vomit, vomissement, vomissements, vomir, vomissent, vomissait, vomie, vomisse, vomisement, rend tout, gerbe, gerber, degobille, rejette tout, crache tout, remet tout`,
  sign: `convuls*, convulsion, convulsions, convulse, crise, crises, inconscient, inconsciente, evanoui, evanouie, evanouit, s est evanoui, perdu connaissance, perd connaissance, sans connaissance, coma, s evanouit, syncope, malaise, ne se reveille pas, se reveille pas, ne se reveille plus, se reveille plus, reveille plus, reveille pas, impossible a reveiller, arrive pas a la reveiller, arrive pas a le reveiller, ne reagit pas, reagit pas, ne reagit plus, reagit plus, ne repond plus, ne bouge plus, bouge plus, bouge pas, ne bouge pas, lethargi*, letargi*, amorphe, apathique, inerte, abattu, abattue, mou, tout mou, toute molle, tres mou, tres molle, respire mal, ne respire pas, respire plus, respire pas, du mal a respirer, yeux enfonces, yeux creux, mort, morte, decede, decedee, est mort, est morte, deces, tremble de partout, secousses, raide, tout bleu, toute bleue,
    vomit tout, vomi tout, vomis tout, vomissait tout, tout vomir, ne garde rien, garde rien, rejette tout, rend tout ce qu, vomit tout ce, vomit chaque, sang dans les selles, sang dans ses selles, sang dans le caca, sang dans son caca, sang dans les couches, sang dans la couche, selles avec du sang, selle avec du sang, selles sanglantes, caca avec du sang, diarrhee avec du sang, diarrhee sanglante, diarrhee de sang, fait du sang, du sang quand elle va, du sang quand il va, ne tete plus, ne tete pas, tete plus, tete pas, refuse le sein, refuse de teter, refuse le biberon, refuse de boire, refuse tout, refuse l eau, refuse le lait, ne veut pas teter, veut pas teter, ne veut plus teter, veut plus teter, ne prend pas le sein, prend pas le sein, ne prend plus le sein, prend plus le sein, ne prend plus le biberon, arrive pas a teter, n arrive pas a teter, peut pas teter, n avale rien, avale plus, avale rien, n avale plus, n arrive plus a boire, arrive plus a boire, arrive pas a boire, n arrive pas a boire, ne boit plus, boit plus, boit plus rien, ne boit rien, boit rien, ne veut rien boire, veut rien boire, ne veut plus boire, veut plus boire, ne veut pas boire, veut pas boire, ne peut pas boire, peut pas boire, ne peut plus boire, peut plus boire, ne boit pas, n accepte rien`,
  sleepy: `dort, dort tout le temps, dort beaucoup, dors tout le temps, ne fait que dormir, fait que dormir, fait rien que dormir, dort sans arret, dort toute la journee, dort trop, somnolent, somnolente, somnole, endormi, endormie, tres endormi, tres endormie, tres fatigue, tres fatiguee, trop fatigue, trop fatiguee, plus de force, plus de forces, sans force, sans forces, sans energie, plus d energie, epuise, epuisee, assoupi, assoupie, tout endormi, toute endormie, fatigue fatigue, dort encore et encore`,
  drink:
    'boire, boit, bois, boivent, boi, bu, buvait, teter, tete, avaler, avale, boire ni manger, manger ni boire, allaiter, allaite, buvons, buvez',
  pronoun: `elle, il, ils, elles, on`,
  frail: `faible, faibles, fatigue, fatiguee, sans force`,
}
