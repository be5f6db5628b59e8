import { expect, it } from 'vitest'
import { isLanguage, languageNames, languages, ownLanguage } from '@/lib/domain/language'

it('every language is named in its own tongue, as the runtime names its tag', () => {
  for (const language of languages) {
    const own = new Intl.DisplayNames([language], { type: 'language' }).of(language)
    expect(languageNames[language].toLocaleLowerCase(language)).toBe(
      own?.toLocaleLowerCase(language),
    )
  }
})

it('only those four are languages of the desk', () => {
  expect(isLanguage('bn')).toBe(true)
  expect(isLanguage('de')).toBe(false)
})

it('a person’s own language is the first of theirs that the desk has', () => {
  expect(ownLanguage(['sw', 'fr', 'en'])).toBe('fr')
  expect(ownLanguage(['sw'])).toBe('en')
  expect(ownLanguage([])).toBe('en')
})
