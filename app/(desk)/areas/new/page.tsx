import type { Metadata } from 'next'
import { AreaForm } from '@/components/area/area-form'
import { ReadingSheet } from '@/components/frame/sheets'
import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { areaForm } from '@/lib/services/list-areas'

export const metadata: Metadata = { title: 'A new area' }

export default async function NewAreaPage() {
  const actor = await deskActor('set up areas')
  const form = await areaForm(await getDeps(), actor, null)
  const enterDepot = <ButtonLink href="/depots/new">Enter a depot</ButtonLink>
  return (
    <ReadingSheet title="A new area">
      {form && form.depots.length > 0 ? (
        <AreaForm areaId={null} {...form} timeZones={Intl.supportedValuesOf('timeZone')} />
      ) : (
        <EmptyState title="A depot comes first" action={enterDepot}>
          Each area has a depot that its parts come from.
        </EmptyState>
      )}
    </ReadingSheet>
  )
}
