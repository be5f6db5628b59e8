import type { Metadata } from 'next'
import { DepotForm } from '@/components/depot/depot-form'
import { ReadingSheet } from '@/components/frame/sheets'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { listDepots } from '@/lib/services/list-depots'

export const metadata: Metadata = { title: 'A new depot' }

export default async function NewDepotPage() {
  const actor = await deskActor('keep stock')
  const { parts } = await listDepots(await getDeps(), actor)
  return (
    <ReadingSheet title="A new depot">
      <DepotForm parts={parts} />
    </ReadingSheet>
  )
}
