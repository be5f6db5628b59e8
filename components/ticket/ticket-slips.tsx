'use client'

import Link from 'next/link'
import { Fragment, useState } from 'react'
import type { SlipPage, SlipView } from '@/lib/schemas/slip'
import { Slip } from '../text/slip'
import { SlipDay, Slips } from '../text/slips'
import { Button } from '../ui/button'
import { ReadAs } from './read-as'

/** So many of the last texts stand below the step at first. */
const SHOWN = 12

type TicketSlipsProps = { page: SlipPage; householdId: string; onChanged: () => void }

/** The texts with the household on a line of their own, the last ones first to hand. */
export function TicketSlips({ page, householdId, onChanged }: TicketSlipsProps) {
  const [isWhole, setWhole] = useState(false)
  const { slips, before } = page
  const shown = isWhole ? slips : slips.slice(-SHOWN)
  if (slips.length === 0) return <p className="text-faint">No text has gone either way yet.</p>
  return (
    <>
      <div className="relative z-10 mb-6 text-center">
        {shown.length < slips.length && (
          <Button size="small" className="bg-paper" onClick={() => setWhole(true)}>
            Earlier texts
          </Button>
        )}
        {isWhole && before !== null && (
          <Link href={`/households/${householdId}`} className="bg-paper px-2 plain-link">
            All texts are on the household’s sheet
          </Link>
        )}
      </div>
      <Slips label="Texts">
        {shown.map((slip, index) => (
          <Fragment key={slip.n}>
            {shown[index - 1]?.day !== slip.day && <SlipDay>{slip.day}</SlipDay>}
            <SlipOf slip={slip} onChanged={onChanged} />
          </Fragment>
        ))}
      </Slips>
    </>
  )
}

function SlipOf({ slip, onChanged }: { slip: SlipView; onChanged: () => void }) {
  const { n: _n, day: _day, textId, under, ...rest } = slip
  if (slip.direction === 'out') return <Slip {...rest} under={under} />
  return <Slip {...rest} under={<ReadAs textId={textId} under={under} onChanged={onChanged} />} />
}
