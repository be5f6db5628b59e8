import type { Language } from '@/lib/domain/language'
import type { SourceClass } from '@/lib/domain/cycle'

/** An invented river valley. Nothing of it resembles a real place or programme. */
export type Place = {
  name: string
  language: Language
  depot: string
  /** Three digits of the fictional numbers +1 AAA 555-01xx. */
  areaCode: string
  altitudeMetres: number
  households: number
  source: readonly SourceClass[]
  wetMonths: readonly number[]
  monthCelsius: readonly number[]
  families: readonly string[]
}

/** Days off of the valley, in days after the day the demo's past begins on; null is everywhere. */
export const feasts: readonly { place: string | null; day: number; name: string }[] = [
  { place: 'Loma Clara', day: 31, name: 'Ford fair' },
  { place: 'Char Nodi', day: 31, name: 'Feast of boats' },
  { place: null, day: 37, name: 'Valley day' },
]

const mild = [24, 25, 25, 24, 22, 20, 19, 20, 21, 23, 24, 24]
const high = [14, 14, 13, 12, 10, 9, 9, 10, 11, 12, 13, 14]

export const timeZone = 'Africa/Abidjan'

export const places: readonly Place[] = [
  {
    name: 'Loma Clara',
    language: 'es',
    depot: 'Vado depot',
    areaCode: '202',
    altitudeMetres: 640,
    households: 26,
    source: ['cloudy', 'cloudy', 'clear'],
    wetMonths: [4, 5, 10],
    monthCelsius: mild,
    families: [
      'Orellana',
      'Quispe',
      'Belmonte',
      'Carranza',
      'Duarte',
      'Escalona',
      'Farfán',
      'Gallardo',
      'Huerta',
      'Ibáñez',
      'Jurado',
      'Lozano',
      'Machuca',
      'Nieto',
      'Olmedo',
      'Paredes',
      'Quiroga',
      'Robledo',
      'Salcedo',
      'Tapia',
      'Urrutia',
      'Villegas',
      'Yáñez',
      'Zárate',
      'Aguirre',
      'Bustos',
      'Cordero',
      'Delgado',
      'Espinar',
      'Fuentes',
    ],
  },
  {
    name: 'Ferry Bank',
    language: 'en',
    depot: 'Ferry depot',
    areaCode: '303',
    altitudeMetres: 610,
    households: 18,
    source: ['cloudy', 'clear', 'clear'],
    wetMonths: [4, 5, 10],
    monthCelsius: mild,
    families: [
      'Whitlock',
      'Harrow',
      'Adeyo',
      'Marlow',
      'Tansley',
      'Okello',
      'Pettifer',
      'Quill',
      'Rowan',
      'Sedge',
      'Thorne',
      'Umber',
      'Vane',
      'Wicker',
      'Yarrow',
      'Alder',
      'Birch',
      'Calder',
      'Dunmore',
      'Elm',
    ],
  },
  {
    name: 'Pont-Blanc',
    language: 'fr',
    depot: 'Ferry depot',
    areaCode: '404',
    altitudeMetres: 2140,
    households: 12,
    source: ['clear', 'clear', 'cloudy'],
    wetMonths: [5],
    monthCelsius: high,
    families: [
      'Perrin',
      'Aubier',
      'Brossard',
      'Chazelle',
      'Desnoyers',
      'Estève',
      'Fontaine',
      'Garance',
      'Hamelin',
      'Jourdan',
      'Lacaze',
      'Maurel',
      'Noblet',
      'Ortie',
    ],
  },
  {
    name: 'Char Nodi',
    language: 'bn',
    depot: 'Char depot',
    areaCode: '505',
    altitudeMetres: 580,
    households: 14,
    source: ['very cloudy', 'cloudy', 'cloudy'],
    wetMonths: [5, 6, 7, 8, 9],
    monthCelsius: mild,
    families: [
      'Sarkar',
      'Majumdar',
      'Biswas',
      'Dewan',
      'Ghorami',
      'Haldar',
      'Jolil',
      'Khatun',
      'Lashkar',
      'Mollah',
      'Naskar',
      'Pramanik',
      'Roy',
      'Sheikh',
      'Talukdar',
      'Bepari',
    ],
  },
]
