import { fr } from 'date-fns/locale/fr'
import type { HarmPhrases } from './phrases'

/** A draft for a native speaker to check. */
export const frHarmPhrases: HarmPhrases = {
  locale: fr,
  digits: (text) => text,
  people: (count) => (count === 1 ? '1 personne' : `${count} personnes`),
  infant: 'un nourrisson',
  pregnant: 'une grossesse',
  elderly: 'une personne âgée',
  ill: 'une personne malade',
  yesterday: (clock) => `hier ${clock}`,
  hours: (whole, minutes) => `${whole} h ${minutes}`,
  dangerSign: (house) => `Un signe de danger ; ${house}.`,
  toldToGo: 'On leur a dit d’aller tout de suite au centre de santé.',
  notToldToGo: 'On ne leur a pas encore dit d’aller au centre de santé.',
  unwell: (house, since) => `Quelqu’un est malade depuis ${since} ; ${house}.`,
  nothingSafe: (house, since) => `${house} ; rien de sûr à boire depuis ${since}.`,
  unsafe: (house, since) => `${house} ; filtre dangereux encore utilisé depuis ${since}.`,
  noWater: (house, since) => `${house} ; plus d’eau du tout depuis ${since}.`,
  untimed: (people, litresPerDay) =>
    `${people} ; lent, personne n’a mesuré un litre ; il leur faut ${litresPerDay} L par jour.`,
  flow: ({ people, flow, litresPerDay, time, enough }) => {
    const litres = `${flow} L par heure à 20 °C, il leur faut ${litresPerDay} L par jour`
    if (time === null) return `${people} ; ${litres} : pas en un jour.`
    return `${people} ; ${enough ? 'lent mais assez : ' : ''}${litres} : ${time}.`
  },
  unread: (people, since) => `${people} ; mots que personne n’a lus depuis ${since}.`,
  silent: (people, since) => `${people} ; pas de réponse depuis ${since}.`,
}
