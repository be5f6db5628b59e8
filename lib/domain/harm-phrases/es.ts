import { es } from 'date-fns/locale/es'
import type { HarmPhrases } from './phrases'

/** A draft for a native speaker to check. */
export const esHarmPhrases: HarmPhrases = {
  locale: es,
  digits: (text) => text,
  people: (count) => (count === 1 ? '1 persona' : `${count} personas`),
  infant: 'un bebé',
  pregnant: 'un embarazo',
  elderly: 'una persona mayor',
  ill: 'una persona enferma',
  yesterday: (clock) => `ayer ${clock}`,
  hours: (whole, minutes) => `${whole} h ${minutes}`,
  dangerSign: (house) => `Señal de peligro; ${house}.`,
  toldToGo: 'Ya se le dijo que vaya ahora al puesto de salud.',
  notToldToGo: 'Aún no se le dijo que vaya al puesto de salud.',
  unwell: (house, since) => `Alguien está enfermo desde ${since}; ${house}.`,
  nothingSafe: (house, since) => `${house}; nada seguro que beber desde ${since}.`,
  unsafe: (house, since) => `${house}; usan un filtro inseguro desde ${since}.`,
  noWater: (house, since) => `${house}; nada de agua desde ${since}.`,
  untimed: (people, litresPerDay) =>
    `${people}; lento, nadie ha medido un litro; necesitan ${litresPerDay} L al día.`,
  flow: ({ people, flow, litresPerDay, time, enough }) => {
    const litres = `${flow} L por hora a 20 °C, necesitan ${litresPerDay} L al día`
    if (time === null) return `${people}; ${litres}: no alcanza en un día.`
    return `${people}; ${enough ? 'lento pero alcanza: ' : ''}${litres}: ${time}.`
  },
  unread: (people, since) => `${people}; palabras sin leer desde ${since}.`,
  silent: (people, since) => `${people}; sin respuesta desde ${since}.`,
}
