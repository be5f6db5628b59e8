import type { Metadata } from 'next'
import { Areas } from '@/components/area/area-list'
import { WideSheet } from '@/components/frame/sheets'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { may } from '@/lib/domain/role'
import { listAreas } from '@/lib/services/list-areas'

export const metadata: Metadata = { title: 'Areas' }

export default async function AreasPage() {
  const actor = await deskActor('see households')
  const areas = await listAreas(await getDeps(), actor)
  return (
    <WideSheet title="Areas" lead="Where households live, and when they may be texted.">
      <Areas initialData={areas} mayChange={may(actor.role, 'set up areas')} />
    </WideSheet>
  )
}
