'use client'

import { useRouter } from 'next/navigation'
import type { Depot } from '@/lib/schemas/depot'
import { sendJson } from '../api'
import { EntryForm, EntryPart } from '../entry/entry-form'
import { textOf } from '../entry/form-values'
import { useEntry } from '../entry/use-entry'
import { Choice, FieldGroup } from '../ui/choice-field'
import { FieldError } from '../ui/field'
import { PartNumbers, stockOf } from './part-numbers'

/** Writes down a delivery, or what was counted on the shelf. */
export function StockForm({ depot }: { depot: Depot }) {
  const router = useRouter()
  const parts = depot.shelves.map(({ partId, name, inHand }) => ({ id: partId, name, inHand }))
  const entry = useEntry({
    send: (form) =>
      sendJson('post', `/api/depots/${depot.id}/stock`, {
        why: textOf(form, 'why'),
        stock: stockOf(form, parts),
      }),
    onKept: () => {
      router.push('/depots')
      router.refresh()
    },
  })
  const noNumber = entry.wrong('stock')
  return (
    <EntryForm entry={entry} keep="Write it down">
      <FieldGroup legend="What happened" error={entry.wrong('why')}>
        <Choice
          type="radio"
          name="why"
          value="received"
          label="Parts came in"
          hint="The numbers below are added to what is in hand."
        />
        <Choice
          type="radio"
          name="why"
          value="counted"
          label="The shelf was counted"
          hint="The numbers below are what lies there now."
        />
      </FieldGroup>
      <EntryPart title="Parts" lead="Leave empty what did not change.">
        <PartNumbers parts={parts} wrong={entry.wrong} />
        {noNumber && <FieldError>{noNumber}</FieldError>}
      </EntryPart>
    </EntryForm>
  )
}
