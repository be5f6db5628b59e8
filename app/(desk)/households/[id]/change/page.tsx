import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { ReadingSheet } from '@/components/frame/sheets'
import { HouseholdChange } from '@/components/household/household-change'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { householdSheet } from '@/lib/services/household-sheet'

export const metadata: Metadata = { title: 'Change a household' }

export default async function ChangePage({ params }: { params: Promise<{ id: string }> }) {
  const actor = await deskActor('enter households')
  const { id } = await params
  const sheet = await householdSheet(await getDeps(), actor, id)
  if ('ok' in sheet) notFound()
  return (
    <ReadingSheet title={sheet.name} lead="What is changed here holds from the next text on.">
      <HouseholdChange sheet={sheet} />
    </ReadingSheet>
  )
}
