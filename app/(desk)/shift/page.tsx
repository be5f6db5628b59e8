import type { Metadata } from 'next'
import { ShiftView } from '@/components/shift/shift-view'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { listShift } from '@/lib/services/list-shift'

export const metadata: Metadata = { title: 'Shift' }

export default async function ShiftPage() {
  const actor = await deskActor('see the shift')
  return <ShiftView initial={await listShift(await getDeps(), actor)} />
}
