'use client'

import { useQuery } from '@tanstack/react-query'
import type { HouseholdList } from '@/lib/schemas/household'
import { getJson } from '../api'
import { ButtonLink } from '../ui/button'
import { EmptyState } from '../ui/empty-state'
import { HouseholdLine } from './household-row'

type HouseholdsProps = { initialData: HouseholdList; search: string; mayEnter: boolean }

function addressOf(search: string, page: number): string {
  const query = new URLSearchParams()
  if (search) query.set('q', search)
  if (page > 1) query.set('page', String(page))
  const text = query.toString()
  return text ? `?${text}` : ''
}

function Pages({ list, search }: { list: HouseholdList; search: string }) {
  if (list.pages === 1) return null
  const to = (page: number) => `/households${addressOf(search, page)}`
  return (
    <nav aria-label="Pages of the list" className="mt-6 flex items-center gap-4 pl-lead text-sm">
      {list.page > 1 && (
        <ButtonLink href={to(list.page - 1)} size="small">
          Before
        </ButtonLink>
      )}
      <span>
        Page {list.page} of {list.pages}
      </span>
      {list.page < list.pages && (
        <ButtonLink href={to(list.page + 1)} size="small">
          Next
        </ButtonLink>
      )}
    </nav>
  )
}

function Nobody({ search, mayEnter }: { search: string; mayEnter: boolean }) {
  if (search) {
    return (
      <EmptyState
        title={`Nobody found for “${search}”`}
        action={<ButtonLink href="/households">Show all</ButtonLink>}
      >
        A name, an area, a phone number or a kit number finds a household.
      </EmptyState>
    )
  }
  const enter = mayEnter && (
    <ButtonLink href="/households/new" kind="main">
      Enter a household
    </ButtonLink>
  )
  return (
    <EmptyState title="No household yet" action={enter}>
      Each has its people, a phone, a kit, and the day it was handed over.
    </EmptyState>
  )
}

/** One page of the households, by name, each hung by what comes next. */
export function Households({ initialData, search, mayEnter }: HouseholdsProps) {
  const { page } = initialData
  const { data } = useQuery({
    queryKey: ['households', search, page],
    queryFn: () => getJson<HouseholdList>(`/api/households${addressOf(search, page)}`),
    initialData,
  })
  if (data.rows.length === 0) {
    return (
      <div className="mt-4 pl-lead">
        <Nobody search={search} mayEnter={mayEnter} />
      </div>
    )
  }
  return (
    <>
      <ul className="mt-4">
        {data.rows.map((row, index) => (
          <li key={row.key}>
            <HouseholdLine row={row} ruled={index > 0} />
          </li>
        ))}
      </ul>
      <Pages list={data} search={search} />
    </>
  )
}
