'use client'

import { useQuery } from '@tanstack/react-query'
import type { Rounds } from '@/lib/schemas/rounds'
import { getJson } from '../api'
import { EmptyState } from '../ui/empty-state'
import { DayList } from './day-list'
import { RoundStrip } from './round-strip'
import { RoundTable } from './round-table'

/** What goes out in the next fourteen days: drawn, counted, and house by house. */
export function RoundsView({ initial }: { initial: Rounds }) {
  const { data: rounds } = useQuery({
    queryKey: ['rounds'],
    queryFn: () => getJson<Rounds>('/api/rounds'),
    initialData: initial,
    refetchInterval: 60_000,
  })
  if (rounds.texts === 0) {
    return (
      <EmptyState title="Nothing goes out in the next fourteen days.">
        Kits that are in use, on a phone that agreed to be texted, appear here by their dates.
      </EmptyState>
    )
  }
  return (
    <>
      <RoundStrip rounds={rounds} />
      {rounds.cut && (
        <p className="mt-2 font-semibold">There is more than this page counts: it stops early.</p>
      )}
      <div className="mt-8">
        <RoundTable rounds={rounds} />
        <p className="mt-2 text-sm text-faint">
          A text may speak of two things. What households answer brings new dates that are not in
          here yet.
        </p>
      </div>
      {rounds.days
        .filter(({ texts }) => texts > 0)
        .map((day) => (
          <DayList key={day.on} day={day} />
        ))}
    </>
  )
}
