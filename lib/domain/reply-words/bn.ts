import type { LanguagePack } from './concept'

export const bnPack: LanguagePack = {
  spelling: 'bengali',
  concepts: {},
  numbers: {},
  weakNumbers: {},
  units: { minute: 'min', hour: 'h', second: 's', other: '' },
  spans: {},
  halves: {},
  about: '',
  timeOfDay: '',
  common: '',
}
