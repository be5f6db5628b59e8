import type { Metadata } from 'next'
import Link from 'next/link'
import { notFound } from 'next/navigation'
import { WideSheet } from '@/components/frame/sheets'
import { WordingDesk } from '@/components/wording/wording-desk'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { isLanguage, languageNamesInEnglish } from '@/lib/domain/language'
import { momentInfo } from '@/lib/domain/moments'
import { wordingCell } from '@/lib/services/wording-cell'

type PageProps = { params: Promise<{ moment: string; language: string }> }

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  const { moment, language } = await params
  const name = momentInfo(moment)?.name ?? 'Wording'
  return { title: isLanguage(language) ? `${name}, ${languageNamesInEnglish[language]}` : name }
}

export default async function WordingCellPage({ params }: PageProps) {
  const actor = await deskActor('see wording')
  const cell = await wordingCell(await getDeps(), actor, await params)
  if ('ok' in cell) notFound()
  return (
    <WideSheet
      title={
        <>
          {cell.momentName} <span className="font-normal text-faint">in </span>
          {cell.languageNameInEnglish}
        </>
      }
      lead={
        <>
          <Link href="/wording" className="plain-link">
            All wordings
          </Link>
          {cell.safety && ' · A safety wording: two people approve it.'}
        </>
      }
    >
      <WordingDesk key={`${cell.moment}/${cell.language}`} initial={cell} />
    </WideSheet>
  )
}
