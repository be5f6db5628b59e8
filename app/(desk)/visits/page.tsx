import type { Metadata } from 'next'
import { ReadingSheet } from '@/components/frame/sheets'
import { DueVisits } from '@/components/visit/due-visits'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { listVisits } from '@/lib/services/list-visits'

export const metadata: Metadata = { title: 'Visits' }

export default async function VisitsPage() {
  const actor = await deskActor('see own visits')
  const visits = await listVisits(await getDeps(), actor)
  return (
    <ReadingSheet
      title="Visits"
      lead="The households to go to, the earliest first. When you have been there, tell the desk what you saw: an agent notes it on the ticket."
    >
      <DueVisits visits={visits} />
    </ReadingSheet>
  )
}
