import type { Metadata } from 'next'
import { LineSheet } from '@/components/frame/sheets'
import { Households } from '@/components/household/household-list'
import { HouseholdsMargin } from '@/components/household/household-margin'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { may } from '@/lib/domain/role'
import { householdQuerySchema } from '@/lib/schemas/household'
import { listHouseholds } from '@/lib/services/list-households'

export const metadata: Metadata = { title: 'Households' }

type Search = { searchParams: Promise<Record<string, string | string[] | undefined>> }

export default async function HouseholdsPage({ searchParams }: Search) {
  const actor = await deskActor('see households')
  const query = householdQuerySchema.catch({ q: '', page: 1 }).parse(await searchParams)
  const list = await listHouseholds(await getDeps(), actor, query)
  const mayEnter = may(actor.role, 'enter households')
  return (
    <LineSheet
      title="Households"
      margin={<HouseholdsMargin total={list.total} search={query.q} mayEnter={mayEnter} />}
    >
      <Households
        key={`${query.q} ${list.page}`}
        initialData={list}
        search={query.q}
        mayEnter={mayEnter}
      />
    </LineSheet>
  )
}
