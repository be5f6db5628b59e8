import type { Metadata } from 'next'
import { Band } from '@/components/frame/line-row'
import { LineSheet } from '@/components/frame/sheets'
import { AddedWords } from '@/components/reply-words/added-words'
import { Proposals } from '@/components/reply-words/proposals'
import { TryText } from '@/components/reply-words/try-text'
import { WordLists } from '@/components/reply-words/word-lists'
import { WordsMargin } from '@/components/reply-words/words-margin'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { languageNamesInEnglish } from '@/lib/domain/language'
import { replyWordsQuerySchema } from '@/lib/schemas/reply-words'
import { listWordProposals } from '@/lib/services/list-proposals'
import { replyWords } from '@/lib/services/reply-words'

export const metadata: Metadata = { title: 'Reply words' }

type Search = { searchParams: Promise<Record<string, string | string[] | undefined>> }

export default async function ReplyWordsPage({ searchParams }: Search) {
  const actor = await deskActor('set reply words')
  const query = replyWordsQuerySchema.catch({ language: 'en' }).parse(await searchParams)
  const { language } = query
  const deps = await getDeps()
  const { groups, added, retired } = await replyWords(deps, actor, query)
  const proposals = await listWordProposals(deps, actor, query)
  const name = languageNamesInEnglish[language]
  return (
    <LineSheet
      title="Reply words"
      lead="What the desk takes the words of a reply for, and what a programme adds to them."
      margin={<WordsMargin language={language} />}
    >
      <Proposals
        page={proposals}
        at={`/reply-words?language=${language}`}
        isLater={query.before !== undefined}
      />
      <Band name="Try a text" id="try" note="nothing is sent or kept">
        <div className="mt-3 pl-lead">
          <TryText key={language} language={language} />
        </div>
      </Band>
      <Band name="Added by the programme" id="added" note={name}>
        <AddedWords language={language} added={added} retired={retired} />
      </Band>
      <Band name="The words" id="words" note={`${name}, as they came with the desk`}>
        <div className="pl-lead">
          <p className="mt-1 max-w-reading text-sm text-faint">
            A star stands for any ending, ~ for up to two words of any kind, a full stop for the end
            of a clause. Accents and capitals do not count.
          </p>
          <WordLists language={language} groups={groups} />
        </div>
      </Band>
    </LineSheet>
  )
}
