import type { Metadata } from 'next'
import Link from 'next/link'
import { notFound } from 'next/navigation'
import { ReadingSheet } from '@/components/frame/sheets'
import { BothReadings } from '@/components/reply-words/proposals'
import { TextTrial } from '@/components/reply-words/trial'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { languageNamesInEnglish } from '@/lib/domain/language'
import { askedWords } from '@/lib/domain/reply-meaning-words'
import { wordProposal } from '@/lib/services/list-proposals'

export const metadata: Metadata = { title: 'A proposal for the reply words' }

type PageProps = { params: Promise<{ id: string }> }

export default async function ProposalPage({ params }: PageProps) {
  const actor = await deskActor('set reply words')
  const { id } = await params
  const proposal = await wordProposal(await getDeps(), actor, id)
  if (!proposal) notFound()
  const { body, language, asked, textId, readingN } = proposal
  return (
    <ReadingSheet
      title={<span lang={language}>“{body}”</span>}
      lead={
        <>
          <Link href={`/reply-words?language=${language}`} className="plain-link">
            All reply words
          </Link>
          {` · ${languageNamesInEnglish[language]} · asked: ${askedWords[asked]}`}
        </>
      }
    >
      <div className="mb-6">
        <BothReadings proposal={proposal} />
      </div>
      <TextTrial text={body} language={language} asked={asked} proposal={{ textId, readingN }} />
    </ReadingSheet>
  )
}
