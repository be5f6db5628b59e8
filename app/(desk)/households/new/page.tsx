import type { Metadata } from 'next'
import { ReadingSheet } from '@/components/frame/sheets'
import { HouseholdForm } from '@/components/household/household-form'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { may } from '@/lib/domain/role'
import { householdForm } from '@/lib/services/household-form'

export const metadata: Metadata = { title: 'A new household' }

export default async function NewHouseholdPage() {
  const actor = await deskActor('enter households')
  const form = await householdForm(await getDeps(), actor)
  const mayEnter = may(actor.role, 'set up areas')
  return (
    <ReadingSheet title="A new household">
      {form.areas.length > 0 ? (
        <HouseholdForm {...form} />
      ) : (
        <EmptyState
          title="An area comes first"
          action={mayEnter && <ButtonLink href="/areas/new">Enter an area</ButtonLink>}
        >
          {mayEnter
            ? 'A household’s area gives its hours and its depot.'
            : 'A coordinator enters areas.'}
        </EmptyState>
      )}
    </ReadingSheet>
  )
}
