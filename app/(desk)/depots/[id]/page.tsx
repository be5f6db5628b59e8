import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { StockForm } from '@/components/depot/stock-form'
import { ReadingSheet } from '@/components/frame/sheets'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { listDepots } from '@/lib/services/list-depots'

export const metadata: Metadata = { title: 'A depot' }

export default async function DepotPage({ params }: { params: Promise<{ id: string }> }) {
  const actor = await deskActor('keep stock')
  const { id } = await params
  const { depots } = await listDepots(await getDeps(), actor)
  const depot = depots.find((one) => one.id === id)
  if (!depot) notFound()
  return (
    <ReadingSheet title={depot.name} lead={depot.place}>
      <StockForm depot={depot} />
    </ReadingSheet>
  )
}
