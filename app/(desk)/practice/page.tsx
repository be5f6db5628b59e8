import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { ReadingSheet } from '@/components/frame/sheets'
import { PracticeDesk } from '@/components/practice/practice-desk'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { practiceDesk } from '@/lib/services/practice'

export const metadata: Metadata = { title: 'Practice' }

export default async function PracticePage() {
  const actor = await deskActor('move the practice clock')
  const practice = await practiceDesk(await getDeps(), actor)
  if ('ok' in practice) notFound()
  return (
    <ReadingSheet
      title="Practice"
      lead="This desk is not real: its clock can be moved, and its texts reach practice phones only."
    >
      <PracticeDesk initial={practice} />
    </ReadingSheet>
  )
}
