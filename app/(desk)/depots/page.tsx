import type { Metadata } from 'next'
import { Depots } from '@/components/depot/depot-list'
import { WideSheet } from '@/components/frame/sheets'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { listDepots } from '@/lib/services/list-depots'

export const metadata: Metadata = { title: 'Parts' }

export default async function DepotsPage() {
  const actor = await deskActor('keep stock')
  const depots = await listDepots(await getDeps(), actor)
  return (
    <WideSheet
      title="Parts"
      lead="What each depot has in hand, what of it is promised to a household, and what is left to promise."
    >
      <Depots initialData={depots} />
    </WideSheet>
  )
}
