import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { AreaForm } from '@/components/area/area-form'
import { ReadingSheet } from '@/components/frame/sheets'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { areaForm } from '@/lib/services/list-areas'

export const metadata: Metadata = { title: 'An area' }

export default async function AreaPage({ params }: { params: Promise<{ id: string }> }) {
  const actor = await deskActor('set up areas')
  const { id } = await params
  const form = await areaForm(await getDeps(), actor, id)
  if (!form?.area) notFound()
  return (
    <ReadingSheet title={form.area.name} lead="Texts that wait already keep their hour.">
      <AreaForm areaId={id} {...form} timeZones={Intl.supportedValuesOf('timeZone')} />
    </ReadingSheet>
  )
}
