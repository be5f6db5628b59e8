import { z } from 'zod'
import { languages, type Language } from '@/lib/domain/language'

export const languageSchema = z.enum(languages as readonly [Language, ...Language[]], {
  error: 'Choose a language.',
})
