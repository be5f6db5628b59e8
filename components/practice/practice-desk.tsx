'use client'

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import type { Moved, MoveClock, Practice } from '@/lib/schemas/practice'
import { getJson, sendJson } from '../api'
import { Button } from '../ui/button'
import { Notice } from '../ui/notice'
import { PracticeClocks } from './practice-clocks'

const moves: readonly { name: string; by: MoveClock }[] = [
  { name: 'An hour', by: { hours: 1 } },
  { name: 'A day', by: { hours: 24 } },
  { name: 'A week', by: { hours: 7 * 24 } },
  { name: 'To the next text', by: { toNext: true } },
]

/** The practice time, the buttons that move it, and what came of the last move. */
export function PracticeDesk({ initial }: { initial: Practice }) {
  const queries = useQueryClient()
  const { data: practice } = useQuery({
    queryKey: ['practice'],
    queryFn: () => getJson<Practice>('/api/practice'),
    initialData: initial,
    refetchInterval: 15_000,
  })
  const move = useMutation({
    mutationFn: (by: MoveClock) => sendJson<Moved>('post', '/api/practice/move', by),
    onSuccess: ({ practice: after }) => {
      queries.setQueryData(['practice'], after)
      // Everything on the desk is older by as much as the clock has moved.
      void queries.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'practice' })
    },
  })
  return (
    <>
      <PracticeClocks practice={practice} />
      <section aria-labelledby="forward" className="mt-8">
        <h2 id="forward" className="font-title text-lg font-semibold">
          Forward by
        </h2>
        <p className="mt-1 max-w-reading text-faint">
          On the way the desk plans, sends and follows up what falls due, hour by hour. It never
          goes back.
        </p>
        <div className="mt-3 flex flex-wrap gap-3">
          {moves.map(({ name, by }) => (
            <Button key={name} busy={move.isPending} onClick={() => move.mutate(by)}>
              {name}
            </Button>
          ))}
        </div>
        <div className="mt-5">
          <MoveNews pending={move.isPending} moved={move.data} error={move.error} />
        </div>
      </section>
      {practice.phonesUrl && (
        <p className="mt-8">
          <a href={practice.phonesUrl} className="plain-link">
            The practice phones
          </a>
          : read what households got, and answer as they would.
        </p>
      )}
    </>
  )
}

type MoveNewsProps = { pending: boolean; moved: Moved | undefined; error: Error | null }

function MoveNews({ pending, moved, error }: MoveNewsProps) {
  if (pending) return <Notice live>The hours are going by …</Notice>
  if (error) {
    return (
      <Notice tone="danger" title="The clock did not move as asked" live>
        {error.message}
      </Notice>
    )
  }
  if (!moved) return null
  const { prompts, texts, tickets } = moved
  const count = (n: number, one: string) => `${n === 0 ? 'no' : n} ${one}${n === 1 ? '' : 's'}`
  return (
    <Notice tone="good" title={`${moved.moved} went by`} live>
      {count(prompts, 'prompt')} planned, {count(texts, 'text')} sent, {count(tickets, 'ticket')}{' '}
      opened.
    </Notice>
  )
}
