'use client'

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import type { WordingCell } from '@/lib/schemas/wording'
import { getJson, sendJson } from '../api'

type Draft = { body: string; note: string; readAt: number | null }

function draftOf(cell: WordingCell): Draft {
  const { draft, inUse } = cell
  return {
    body: draft?.body ?? inUse?.body ?? '',
    note: draft?.note ?? '',
    readAt: draft?.writtenAt ?? null,
  }
}

type Sending = { way: 'save' | 'approve' | 'retire'; said: (after: WordingCell) => string }

const addresses = {
  save: { method: 'put', path: 'draft' },
  approve: { method: 'post', path: 'approve' },
  retire: { method: 'post', path: 'retire' },
} as const

/** The draft on the screen, apart from the one on the desk, and what may be done with it. */
export function useDraft(initial: WordingCell) {
  const path = `/api/wordings/${initial.moment}/${initial.language}`
  const queryKey = ['wordings', initial.moment, initial.language]
  const queries = useQueryClient()
  const { data: cell } = useQuery({
    queryKey,
    queryFn: () => getJson<WordingCell>(path),
    initialData: initial,
  })
  const [draft, setDraft] = useState(() => draftOf(initial))
  const [said, setSaid] = useState<string | null>(null)
  const sending = useMutation({
    mutationFn: ({ way }: Sending) => {
      const body = way === 'save' ? draft : { readAt: draft.readAt }
      return sendJson<WordingCell>(addresses[way].method, `${path}/${addresses[way].path}`, body)
    },
    onMutate: () => setSaid(null),
    onSuccess: (after, { said: words }) => {
      queries.setQueryData(queryKey, after)
      void queries.invalidateQueries({ queryKey: ['wordings'], exact: true })
      setDraft(draftOf(after))
      setSaid(words(after))
    },
    onError: () => void queries.invalidateQueries({ queryKey }),
  })
  const kept = draftOf(cell)
  return {
    cell,
    draft,
    setBody: (body: string) => setDraft((now) => ({ ...now, body })),
    setNote: (note: string) => setDraft((now) => ({ ...now, note })),
    /** Somebody else has written here since this draft was read. */
    overtaken: kept.readAt !== draft.readAt,
    takeTheirs: () => {
      sending.reset()
      setDraft(kept)
    },
    changed: draft.body.trim() !== kept.body || draft.note.trim() !== kept.note,
    send: (sent: Sending) => sending.mutate(sent),
    busy: sending.isPending,
    error: sending.error,
    said,
  }
}

export type DraftDesk = ReturnType<typeof useDraft>
