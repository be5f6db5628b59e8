'use client'

import { useRouter } from 'next/navigation'
import { sendJson } from '../api'
import { EntryForm, EntryPart } from '../entry/entry-form'
import { textOf } from '../entry/form-values'
import { useEntry } from '../entry/use-entry'
import { TextField } from '../ui/field'
import { PartNumbers, stockOf, type PartChoice } from './part-numbers'

/** A plain form to enter a depot with what lies in it. */
export function DepotForm({ parts }: { parts: readonly PartChoice[] }) {
  const router = useRouter()
  const entry = useEntry({
    send: (form) =>
      sendJson('post', '/api/depots', {
        name: textOf(form, 'name'),
        place: textOf(form, 'place'),
        stock: stockOf(form, parts),
      }),
    onKept: () => {
      router.push('/depots')
      router.refresh()
    },
  })
  return (
    <EntryForm entry={entry} keep="Enter the depot">
      <EntryPart title="The depot">
        <TextField label="Name" name="name" error={entry.wrong('name')} />
        <TextField
          label="Where it is"
          name="place"
          hint="As a household would be told."
          optional
          error={entry.wrong('place')}
        />
      </EntryPart>
      <EntryPart title="What lies there" lead="Counted today. Leave empty what it has none of.">
        <PartNumbers parts={parts} wrong={entry.wrong} />
      </EntryPart>
    </EntryForm>
  )
}
