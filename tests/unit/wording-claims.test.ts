import { describe, expect, it } from 'vitest'
import type { Language } from '@/lib/domain/language'
import { actionsIn } from '@/lib/domain/wording-actions'
import { claimsOfSafety } from '@/lib/domain/wording-claims'

describe('claims of safety', () => {
  it.each<[Language, string, boolean]>([
    ['en', 'It is SAFE to drink.', true],
    ['en', 'This removes 100% of germs.', true],
    ['en', 'Now your water is pure.', true],
    ['en', 'Germ-free water for all', true],
    ['en', 'It kills all germs.', true],
    ['en', 'It is never safe to skip a wash.', false],
    ['en', 'Do not use: unsafe filter.', false],
    ['en', 'The cap is secure and purple.', false],
    ['es', 'Agua pura y sin gérmenes', true],
    ['es', 'Es 100 % agua', true],
    ['es', 'No es potable.', false],
    ['es', 'Apure el paso.', false],
    ['fr', "L'eau est sûre.", true],
    ['fr', 'Eau sans microbes', true],
    ['fr', "Posez le filtre sur l'eau.", false],
    ['fr', "Elle n'est pas sûre.", false],
    ['bn', 'পানি জীবাণুমুক্ত।', true],
    ['bn', 'পানি ১০০% ভালো।', true],
    ['bn', 'নিরাপদ না।', false],
    ['bn', 'খাঁজ দেখুন।', false],
  ])('%s: %s', (language, text, isClaim) => {
    expect(claimsOfSafety(text, language).length > 0).toBe(isClaim)
  })
})

describe('actions', () => {
  it.each<[Language, string, string[]]>([
    ['en', 'Washed? Text DONE.', []],
    ['en', 'Fill a 1 litre bottle. Text us the minutes.', []],
    ['en', 'Fill the top container to the brim.', ['fill the container']],
    ['en', 'Boil your drinking water.', ['boil']],
    ['en', 'Boiling does not remove fuel.', []],
    ['es', 'Mida el tiempo de 1 litro.', []],
    ['es', 'Hierva el agua.', ['boil']],
    ['fr', 'Envoyez les minutes.', []],
    ['fr', "Faites bouillir l'eau.", ['boil']],
    ['bn', 'কত মিনিট লাগে লিখুন।', []],
    ['bn', 'পানি ফোটান।', ['boil']],
  ])('%s: %s', (language, text, actions) => {
    expect(actionsIn(text, language)).toEqual(actions)
  })
})
