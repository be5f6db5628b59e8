import type { Moment } from '@/lib/domain/moments'

/*
 * First edition in French: a draft for a native speaker to check. Words with ç, ê, â, î, ô or û are
 * avoided: a phone's basic alphabet lacks them, and one of them halves the room of a text.
 */

const stage =
  '{stage, select, 1 {le tissu (1 encoche)} 2 {le charbon (2 encoches)} 3 {la partie longue (3 encoches)} 12 {le tissu (1 encoche) et le charbon (2 encoches)} 13 {le tissu (1 encoche) et la partie longue (3 encoches)} 23 {le charbon (2 encoches) et la partie longue (3 encoches)} 123 {les 3 parties} other {la partie}}'
const thenTime = 'Puis chronométrez 1 litre. Envoyez les minutes.'

export const fr: readonly { moment: Moment; body: string }[] = [
  {
    moment: 'welcome',
    body: 'Ici {programme}, pour votre filtre à eau. Nous écrivons quand il demande un soin. Répondez avec vos mots. Pour ne plus rien recevoir, envoyez STOP.',
  },
  {
    moment: 'first-flush',
    body: "Le filtre neuf doit d'abord couler clair. Faites couler 1 litre, puis jetez-le. Puis chronométrez le litre suivant. Envoyez les minutes.",
  },
  {
    moment: 'wash-due',
    body: "{house} : il faut laver la partie longue (3 encoches). Poussez de l'eau propre, 10 coups par bout. Fini ? Envoyez FAIT. Encore lent ? Envoyez LENT.",
  },
  {
    moment: 'wash-nudge',
    body: '{house} : le filtre attend son lavage. Fini ? Envoyez FAIT. Pas le temps ? Envoyez PLUS TARD. Eau lente ? Envoyez LENT.',
  },
  {
    moment: 'change-due',
    body: `{house} : il faut changer ${stage}. Fini ? Envoyez FAIT. Pas de rechange ? Envoyez BESOIN PIECE.`,
  },
  {
    moment: 'change-nudge',
    body: `{house} : il reste à changer ${stage}. Fini ? Envoyez FAIT. Pas de rechange ? Envoyez BESOIN PIECE.`,
  },
  {
    moment: 'flow-check',
    body: '{house} : votre filtre coule-t-il bien ? Remplissez une bouteille de 1 litre. Envoyez les minutes. Le chiffre suffit.',
  },
  {
    moment: 'ask-flow',
    body: "Merci. Combien de minutes pour remplir 1 litre ? Envoyez juste le chiffre. Rien ne coule ? Envoyez PAS D'EAU.",
  },
  {
    moment: 'step-wash-fibre',
    body: `Lavez la partie longue (3 encoches), merci. Poussez de l'eau propre, 10 coups par bout. ${thenTime}`,
  },
  {
    moment: 'step-rinse-cloth',
    body: `Ouvrez le bouchon du haut, merci. Rincez le tissu à l'eau propre. Remettez-le en place. ${thenTime}`,
  },
  {
    moment: 'step-flush-carbon',
    body: `Sortez le charbon (2 encoches), merci. Faites couler 1 litre à travers. Remettez-le en place. ${thenTime}`,
  },
  {
    moment: 'step-bleed-air',
    body: `Chassez l'air du tuyau, merci. Baissez le bout et tapotez. Attendez la fin des bulles. ${thenTime}`,
  },
  {
    moment: 'step-straighten-hose',
    body: `Redressez le tuyau, merci. Rien ne doit le plier ni le serrer. ${thenTime}`,
  },
  {
    moment: 'step-fill-container',
    body: `Remplissez le seau du haut à ras bord, merci. L'eau haute pousse plus fort. ${thenTime}`,
  },
  {
    moment: 'step-refit-cap',
    body: `Vissez à nouveau les deux bouchons, merci. Ils doivent tenir droit et ferme. ${thenTime}`,
  },
  {
    moment: 'step-look-hose',
    body: 'Regardez tout le tuyau, merci. Plié ou serré ? Envoyez 1. Des bulles dedans ? Envoyez 2. Rien de cela ? Envoyez 3.',
  },
  {
    moment: 'step-check-cracks',
    body: 'Regardez bien le filtre, merci. Une fissure ou une fuite ? Envoyez 1. Est-il tombé ou gelé ? Envoyez 2. Rien de cela ? Envoyez 3.',
  },
  {
    moment: 'got-it',
    body: "Merci, nous avons votre message. Quelqu'un de {programme} va vous écrire.",
  },
  {
    moment: 'flowing',
    body: 'Bonne nouvelle : votre filtre coule bien à nouveau. Merci de votre soin. Nous écrirons pour le prochain lavage.',
  },
  {
    moment: 'ask-again',
    body: 'Merci. Chronométrez encore une fois 1 litre. Prenez la bouteille du début. Envoyez les minutes.',
  },
  {
    moment: 'part-owed',
    body: `Il faut renouveler ${stage}. {programme} va vous fournir la pièce. Nous écrirons quand elle sera là.`,
  },
  {
    moment: 'part-ready',
    body: `Nous avons ${stage} pour vous. Passez au point {depot}, merci. Une fois en place, envoyez FAIT.`,
  },
  {
    moment: 'visit-booked',
    body: "Quelqu'un de {programme} vous rend visite le {visitOn}. Pas libre ce jour ? Envoyez un autre jour.",
  },
  {
    moment: 'stop-using',
    body: "Ne buvez pas l'eau du filtre pour l'instant. Il risque d'avoir un défaut. {programme} va vous écrire.",
  },
  {
    moment: 'drink-advice',
    body: "Faites bouillir l'eau à boire, {minutes} min à gros bouillons. Laissez refroidir sous un couvercle. Loin des enfants, car c'est chaud. Bouillir ne retire ni essence ni produit chimique. Odeur suspecte ? Prenez une autre eau.",
  },
  {
    moment: 'unwell',
    body: "Nous sommes désolés. Allez voir un agent de santé aujourd'hui. Si cela empire, allez-y tout de suite. {programme} ne donne pas d'avis médical.",
  },
  {
    moment: 'unwell-now',
    body: "Allez voir un agent de santé MAINTENANT. N'attendez pas notre réponse. {programme} ne donne pas d'avis médical.",
  },
  { moment: 'thanks', body: 'Merci. Nous écrirons quand le filtre demandera un soin.' },
  {
    moment: 'unclear',
    body: "Merci. Une personne de {programme} va lire votre message. Vous pouvez le dire avec d'autres mots.",
  },
  {
    moment: 'stop-or-stopped',
    body: "L'eau ne coule plus ? Envoyez PAS D'EAU. Vous ne voulez plus de messages ? Envoyez STOP.",
  },
  {
    moment: 'stopped',
    body: '{programme} : nous ne vous écrirons plus. Pour reprendre, envoyez START.',
  },
  {
    moment: 'started',
    body: '{programme} : nous vous écrivons à nouveau. Pour ne plus rien recevoir, envoyez STOP.',
  },
  {
    moment: 'help',
    body: '{programme} vous aide à garder votre filtre en marche. Dites le souci avec vos mots. Pour ne plus rien recevoir, envoyez STOP.',
  },
  {
    moment: 'wrong-number',
    body: 'Pardon pour le dérangement. Nous ne vous écrirons plus.',
  },
]
