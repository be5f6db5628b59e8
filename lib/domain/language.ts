/** The languages the desk writes and reads, as BCP 47 tags. */
export type Language = 'en' | 'es' | 'fr' | 'bn'

/** Every language; the first is the programme's first language, which every moment is worded in. */
export const languages: readonly Language[] = ['en', 'es', 'fr', 'bn']

/** Each language by its own name, for the people who speak it. */
export const languageNames: Record<Language, string> = {
  en: 'English',
  es: 'Español',
  fr: 'Français',
  bn: 'বাংলা',
}

/** Each language by its English name, for staff. */
export const languageNamesInEnglish: Record<Language, string> = {
  en: 'English',
  es: 'Spanish',
  fr: 'French',
  bn: 'Bengali',
}

/** True if the text is the tag of a language the desk has. */
export function isLanguage(text: string): text is Language {
  return (languages as readonly string[]).includes(text)
}

/** A person's own language, from the tags they can serve, own first: English where we have none of them. */
export function ownLanguage(tags: readonly string[]): Language {
  return tags.find(isLanguage) ?? 'en'
}
