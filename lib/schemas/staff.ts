import { z } from 'zod'
import { languages } from '@/lib/domain/language'

/** An account. The password is long rather than strange. */
export const staffInputSchema = z.object({
  email: z.email('Write an e-mail address.').max(200, 'At most 200 characters.'),
  name: z.string({ error: 'Write a name.' }).trim().min(1, 'Write a name.').max(80),
  role: z.enum(['agent', 'coordinator', 'visitor'], 'The role is agent, coordinator or visitor.'),
  languages: z
    .array(z.enum(languages as [string, ...string[]], `Languages are ${languages.join(', ')}.`))
    .min(1, 'Name at least one language.'),
  password: z
    .string({ error: 'Write a password.' })
    .min(12, 'A password has at least 12 characters.')
    .max(200, 'A password has at most 200 characters.'),
})

export type StaffInput = z.output<typeof staffInputSchema>
