import type { Metadata } from 'next'
import { WideSheet } from '@/components/frame/sheets'
import { RoundsView } from '@/components/round/rounds-view'
import { WhatIf } from '@/components/round/what-if'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { cyclesStanding } from '@/lib/services/cycles-standing'
import { listRounds } from '@/lib/services/list-rounds'

export const metadata: Metadata = { title: 'Rounds' }

export default async function RoundsPage() {
  const actor = await deskActor('see rounds')
  const deps = await getDeps()
  const rounds = await listRounds(deps, actor)
  const standing = await cyclesStanding(deps, actor)
  return (
    <WideSheet
      title="Rounds"
      lead={
        <>
          What goes out in the next fourteen days, by the day and hour of each household’s own area.{' '}
          <a href="#what-if" className="plain-link">
            Try other cycles
          </a>
          .
        </>
      }
    >
      <RoundsView initial={rounds} />
      <WhatIf standing={standing} />
    </WideSheet>
  )
}
