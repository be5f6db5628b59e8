'use client'

import { useInfiniteQuery } from '@tanstack/react-query'
import { Fragment } from 'react'
import type { SlipPage } from '@/lib/schemas/slip'
import { getJson } from '../api'
import { Slip } from '../text/slip'
import { SlipDay, Slips } from '../text/slips'
import { Button } from '../ui/button'

type TextHistoryProps = { householdId: string; first: SlipPage }

function pathOf(householdId: string, before: number | null): string {
  const query = before === null ? '' : `?before=${before}`
  return `/api/households/${householdId}/texts${query}`
}

/** The texts with a household, the last 50 first and earlier ones when asked for. */
export function TextHistory({ householdId, first }: TextHistoryProps) {
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery({
    queryKey: ['household-texts', householdId],
    queryFn: ({ pageParam }) => getJson<SlipPage>(pathOf(householdId, pageParam)),
    initialPageParam: null as number | null,
    getNextPageParam: (page) => page.before,
    initialData: { pages: [first], pageParams: [null] },
  })
  const slips = data.pages.toReversed().flatMap((page) => page.slips)
  if (slips.length === 0) return <p className="text-faint">No text has gone either way yet.</p>
  return (
    <>
      {hasNextPage && (
        <Button size="small" busy={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          {isFetchingNextPage ? 'Fetching …' : 'Earlier texts'}
        </Button>
      )}
      <div className="mt-7">
        <Slips label="Texts, oldest first">
          {slips.map(({ n, day, ...slip }, index) => (
            <Fragment key={n}>
              {slips[index - 1]?.day !== day && <SlipDay>{day}</SlipDay>}
              <Slip {...slip} />
            </Fragment>
          ))}
        </Slips>
      </div>
    </>
  )
}
