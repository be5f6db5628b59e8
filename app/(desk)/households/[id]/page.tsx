import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { HouseholdSheet } from '@/components/household/household-sheet'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { may } from '@/lib/domain/role'
import { householdSheet } from '@/lib/services/household-sheet'

export const metadata: Metadata = { title: 'A household' }

export default async function HouseholdPage({ params }: { params: Promise<{ id: string }> }) {
  const actor = await deskActor('see households')
  const { id } = await params
  const sheet = await householdSheet(await getDeps(), actor, id)
  if ('ok' in sheet) notFound()
  return (
    <HouseholdSheet key={id} initialData={sheet} mayChange={may(actor.role, 'enter households')} />
  )
}
