'use client'

import { keepPreviousData, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useState } from 'react'
import type { Language } from '@/lib/domain/language'
import type { Asked } from '@/lib/domain/reply'
import type { NewWord, TriedReply } from '@/lib/schemas/reply-words'
import { sendJson } from '../api'

export type TrialText = {
  text: string
  language: Language
  asked: Asked
  /** The proposal that the text comes from. */
  proposal?: { textId: string; readingN: number }
}

/** A text with words on trial: what the desk would read, and what may be done with the words. */
export function useTrial({ text, language, asked, proposal }: TrialText) {
  const [words, setWords] = useState<NewWord[]>([])
  const [done, setDone] = useState<'added' | 'set aside' | null>(null)
  const queries = useQueryClient()
  const router = useRouter()
  const input = { text, language, asked, words }
  const tried = useQuery({
    queryKey: ['reply-words', 'try', input],
    queryFn: () => sendJson<TriedReply>('post', '/api/reply-words/try', input),
    placeholderData: keepPreviousData,
  })
  const settle = useMutation({
    mutationFn: (end: 'added' | 'set aside') => {
      if (end === 'added') {
        return sendJson('post', '/api/reply-words/add', { language, words, proposal })
      }
      const path = `/api/reply-words/proposals/${proposal?.textId ?? ''}/set-aside`
      return sendJson('post', path, { readingN: proposal?.readingN })
    },
    onSuccess: (_, end) => {
      setDone(end)
      setWords([])
      void queries.invalidateQueries({ queryKey: ['reply-words'] })
      // A proposal's own page has nothing left to show once it is settled.
      if (!proposal) router.refresh()
    },
  })
  return {
    words,
    mark: (word: NewWord) => {
      setDone(null)
      setWords([...words.filter(({ phrase }) => phrase !== word.phrase), word])
    },
    unmark: (phrase: string) => setWords(words.filter((word) => word.phrase !== phrase)),
    tried: tried.data,
    /** What is shown is of the words before: the new ones are being tried. */
    isTrying: tried.isFetching,
    settle: settle.mutate,
    busy: settle.isPending,
    error: settle.error ?? tried.error,
    done,
  }
}

export type Trial = ReturnType<typeof useTrial>
