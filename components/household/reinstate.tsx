'use client'

import { useQueryClient } from '@tanstack/react-query'
import type { PhoneView } from '@/lib/schemas/household'
import { sendJson } from '../api'
import { textOf } from '../entry/form-values'
import { useEntry } from '../entry/use-entry'
import { Button, ButtonLink } from '../ui/button'
import { TextField } from '../ui/field'
import { Notice } from '../ui/notice'

type ReinstateProps = { phone: PhoneView; householdId: string; mayChange: boolean }

function ReinstateForm({ phone, householdId }: Omit<ReinstateProps, 'mayChange'>) {
  const client = useQueryClient()
  const entry = useEntry({
    send: (form) =>
      sendJson('post', `/api/phones/${phone.id}/reinstate`, { how: textOf(form, 'how') }),
    onKept: () => {
      void client.invalidateQueries({ queryKey: ['household', householdId] })
    },
  })
  const wrong = entry.wrong('how')
  return (
    <form onSubmit={entry.onSubmit} noValidate className="mt-3 grid gap-3">
      <TextField
        label="Talked to"
        hint="With whom, and how: it is kept with the consent."
        name="how"
        error={wrong ?? entry.reason ?? undefined}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" size="small" busy={entry.busy}>
          Text this phone again
        </Button>
        <ButtonLink href={`/households/${householdId}/change`} kind="quiet" size="small">
          Enter another number
        </ButtonLink>
      </div>
    </form>
  )
}

/** A phone that is not texted any more: why, and what to do after talking to the family. */
export function Suspended({ phone, householdId, mayChange }: ReinstateProps) {
  const what = phone.state === 'gone' ? 'The number is gone' : 'The phone is suspended'
  return (
    <Notice
      tone="danger"
      title={`${what}${phone.stateWhy ? `: ${phone.stateWhy}` : ''}`}
      className="my-4"
    >
      <p>
        Nothing is sent to <span className="font-mono whitespace-nowrap">{phone.number}</span>. Talk
        to the family: was it a slip, or has the phone another owner?
      </p>
      {mayChange && <ReinstateForm phone={phone} householdId={householdId} />}
    </Notice>
  )
}
