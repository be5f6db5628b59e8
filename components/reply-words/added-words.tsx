'use client'

import { useMutation } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import type { AddedWordView, ReplyWords } from '@/lib/schemas/reply-words'
import { sendJson } from '../api'
import { LineRow } from '../frame/line-row'
import { Button } from '../ui/button'
import { FieldError } from '../ui/field'

type AddedWordsProps = Pick<ReplyWords, 'language' | 'added' | 'retired'>

/** The programme's own words of a language, and those it has taken out of force again. */
export function AddedWords({ language, added, retired }: AddedWordsProps) {
  return (
    <>
      {added.length === 0 && (
        <p className="mt-1 pl-lead text-faint">
          {retired.length > 0 ? 'None in force.' : 'None yet.'} Open a proposal, or try a text and
          give a word of it a meaning.
        </p>
      )}
      <ul>
        {added.map((word, index) => (
          <li key={word.id}>
            <AddedLine word={word} language={language} ruled={index > 0} />
          </li>
        ))}
      </ul>
      {retired.length > 0 && (
        <details className="mt-2">
          <summary className="py-2 pl-lead text-sm font-semibold">{retired.length} retired</summary>
          <ul>
            {retired.map((word, index) => (
              <li key={word.id}>
                <AddedLine word={word} language={language} ruled={index > 0} />
              </li>
            ))}
          </ul>
        </details>
      )}
    </>
  )
}

type AddedLineProps = { word: AddedWordView; language: ReplyWords['language']; ruled: boolean }

function AddedLine({ word, language, ruled }: AddedLineProps) {
  const { phrase, meaning, addedBy, from, retiredBy, retiredOn, day, year } = word
  const isRetired = retiredOn !== null
  return (
    <LineRow time={day} since={year} bead={isRetired ? 'broken' : 'full'} ruled={ruled} tight>
      <div className="flex flex-wrap items-start justify-between gap-x-6">
        <div className="min-w-0">
          <p>
            <span lang={language} className="font-mono font-semibold">
              {phrase}
            </span>{' '}
            means {meaning}
          </p>
          <p className="text-sm text-faint">
            Added by {addedBy}
            {from !== null && (
              <>
                , from <q lang={language}>{from}</q>
              </>
            )}
            {isRetired && `. Retired by ${retiredBy ?? 'somebody'} on ${retiredOn}`}
          </p>
        </div>
        {!isRetired && <Retire word={word} />}
      </div>
    </LineRow>
  )
}

function Retire({ word }: { word: AddedWordView }) {
  const router = useRouter()
  const { mutate, isPending, error } = useMutation({
    mutationFn: () => sendJson('post', `/api/reply-words/added/${word.id}/retire`),
    onSuccess: () => router.refresh(),
  })
  return (
    <div>
      <Button size="small" busy={isPending} onClick={() => mutate()}>
        Retire<span className="sr-only"> {word.phrase}</span>
      </Button>
      {error && <FieldError>{error.message}</FieldError>}
    </div>
  )
}
