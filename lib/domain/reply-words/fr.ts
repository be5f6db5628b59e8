import type { LanguagePack } from './concept'

export const frPack: LanguagePack = {
  spelling: 'latin',
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
