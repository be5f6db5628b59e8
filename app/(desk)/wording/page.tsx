import type { Metadata } from 'next'
import { WideSheet } from '@/components/frame/sheets'
import { Matrix } from '@/components/wording/matrix'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { wordingMatrix } from '@/lib/services/wording-matrix'

export const metadata: Metadata = { title: 'Wording' }

export default async function WordingPage() {
  const actor = await deskActor('see wording')
  const matrix = await wordingMatrix(await getDeps(), actor)
  return (
    <WideSheet
      title="Wording"
      lead="Each moment in a filter’s life, in each language. A cell shows how many parts a text costs, which edition is in use, and whether it lags behind the English."
    >
      <Matrix initial={matrix} />
    </WideSheet>
  )
}
