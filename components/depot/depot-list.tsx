'use client'

import { useQuery } from '@tanstack/react-query'
import type { Depot, DepotList } from '@/lib/schemas/depot'
import { getJson } from '../api'
import { ButtonLink } from '../ui/button'
import { EmptyState } from '../ui/empty-state'
import { RowTh, Table, Td, Th } from '../ui/table'

function available(count: number): string {
  return count < 0 ? `${-count} short` : String(count)
}

function DepotSection({ depot }: { depot: Depot }) {
  const serves = depot.areas.length > 0 ? `For ${depot.areas.join(', ')}` : 'For no area yet'
  return (
    <section aria-label={depot.name} className="max-w-2xl">
      <div className="flex flex-wrap items-baseline gap-x-4">
        <h2 className="font-title text-lg font-semibold">{depot.name}</h2>
        <p className="text-sm text-faint">{[depot.place, serves].filter(Boolean).join(' · ')}</p>
        <ButtonLink href={`/depots/${depot.id}`} kind="quiet" size="small" className="ml-auto">
          Count or take in
          <span className="sr-only"> at {depot.name}</span>
        </ButtonLink>
      </div>
      <Table caption={`Parts at ${depot.name}`} hideCaption>
        <thead>
          <tr>
            <Th>Part</Th>
            <Th className="text-right">In hand</Th>
            <Th className="text-right">Promised</Th>
            <Th className="text-right">Available</Th>
          </tr>
        </thead>
        <tbody>
          {depot.shelves.map((shelf) => (
            <tr key={shelf.partId}>
              <RowTh>{shelf.name}</RowTh>
              <Td number>{shelf.inHand}</Td>
              <Td number>{shelf.promised}</Td>
              <Td number className={shelf.available < 0 ? 'font-semibold text-clay' : ''}>
                {available(shelf.available)}
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  )
}

/** Every depot with what it has in hand, has promised and can still promise. */
export function Depots({ initialData }: { initialData: DepotList }) {
  const { data } = useQuery({
    queryKey: ['depots'],
    queryFn: () => getJson<DepotList>('/api/depots'),
    initialData,
  })
  const enter = (
    <ButtonLink href="/depots/new" kind="main">
      Enter a depot
    </ButtonLink>
  )
  if (data.depots.length === 0) {
    return (
      <EmptyState title="No depot yet" action={enter}>
        A depot holds the parts that households are promised. Begin with one, then enter its area.
      </EmptyState>
    )
  }
  return (
    <div className="grid gap-9">
      {data.depots.map((depot) => (
        <DepotSection key={depot.id} depot={depot} />
      ))}
      <p>{enter}</p>
    </div>
  )
}
