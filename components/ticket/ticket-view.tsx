'use client'

import Link from 'next/link'
import type { TicketSheetView } from '@/lib/schemas/ticket'
import { TicketSheet } from '../frame/ticket-sheet'
import { Cutaway } from '../kit/cutaway'
import { Notice } from '../ui/notice'
import { NowCard } from './now-card'
import { TicketActions } from './ticket-actions'
import { TicketMargin } from './ticket-margin'
import { TicketSlips } from './ticket-slips'
import { useTicket, type TicketDesk } from './use-ticket'

/** One household's trouble: the column with its suspects, what is to do now, the texts, the margin. */
export function TicketView({ initial }: { initial: TicketSheetView }) {
  const desk = useTicket(initial)
  const { title, titleLanguage, household, column, slips } = desk.ticket
  return (
    <TicketSheet
      title={<span lang={titleLanguage}>{title}</span>}
      place={
        <Link
          href={`/households/${household.id}`}
          className="underline decoration-rule decoration-2 underline-offset-4 hover:decoration-water"
        >
          {household.house}, {household.area}
        </Link>
      }
      actions={<TicketActions desk={desk} />}
      column={<TicketColumnView column={column} />}
      step={
        <>
          <TicketNews desk={desk} />
          <NowCard desk={desk} />
        </>
      }
      slips={<TicketSlips page={slips} householdId={household.id} onChanged={desk.refresh} />}
      margin={<TicketMargin desk={desk} />}
    />
  )
}

function TicketColumnView({ column }: { column: TicketSheetView['column'] }) {
  const { stages, suspects, labels, verdict, oddsFrom, also, ...rest } = column
  return (
    <Cutaway
      {...rest}
      also={
        <div className="space-y-2">
          {verdict && <p className="text-ink">{verdict}</p>}
          {also && <p>{also}</p>}
          {oddsFrom && <p>{oddsFrom}</p>}
        </div>
      }
      stages={stages.map((stage) => {
        const suspect = suspects.find(({ position }) => position === stage.position)?.word
        return suspect ? { ...stage, suspect } : stage
      })}
      labels={labels.map(({ notes, ...label }) => ({
        ...label,
        note: notes.map((line) => <p key={line}>{line}</p>),
      }))}
    />
  )
}

/** What came of the last thing that was pressed. */
function TicketNews({ desk: { refused, said } }: { desk: TicketDesk }) {
  if (refused) {
    return (
      <Notice tone="danger" title="Not done" live className="mb-4">
        {refused} The sheet shows how it stands now.
      </Notice>
    )
  }
  if (!said) return null
  return (
    <Notice tone="good" live className="mb-4">
      {said}
    </Notice>
  )
}
