import type { ReactNode } from 'react'
import { homeOf, wordsFor } from '@/components/frame/desk-words'
import { Head } from '@/components/frame/head'
import { QueryProvider } from '@/components/frame/query-provider'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { isLanguage, languageNamesInEnglish } from '@/lib/domain/language'

export default async function DeskLayout({ children }: { children: ReactNode }) {
  const actor = await deskActor()
  const { practice } = await getDeps()
  const languages = actor.languages.filter(isLanguage).map((tag) => languageNamesInEnglish[tag])
  return (
    <QueryProvider>
      <Head
        words={wordsFor(actor.role, practice !== null)}
        person={{ name: actor.name, languages }}
        home={homeOf(actor.role)}
      />
      {children}
    </QueryProvider>
  )
}
