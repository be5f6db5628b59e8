'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import type { HouseholdSheet } from '@/lib/schemas/household'
import type { ChangedHousehold } from '@/lib/schemas/household-entry'
import { sendJson } from '../api'
import { EntryForm, EntryPart } from '../entry/entry-form'
import { useEntry } from '../entry/use-entry'
import { ButtonLink } from '../ui/button'
import { Notice } from '../ui/notice'
import { ConsentFields, consentOf, PhoneFields, phoneOf } from './phone-fields'
import { LanguageField, NameFields, PeopleFields, SourceFields, whoOf } from './who-fields'

function Kept({ id, notes }: { id: string; notes: readonly string[] }) {
  return (
    <div className="grid max-w-2xl gap-6">
      <Notice tone="good" title="Kept." live />
      {notes.map((note) => (
        <Notice key={note} tone="due">
          {note}
        </Notice>
      ))}
      <p>
        <ButtonLink href={`/households/${id}`} kind="main">
          Back to the sheet
        </ButtonLink>
      </p>
    </div>
  )
}

/** A plain form to change who lives there, their language, their water and their phone. */
export function HouseholdChange({ sheet }: { sheet: HouseholdSheet }) {
  const router = useRouter()
  const [notes, setNotes] = useState<string[] | null>(null)
  const entry = useEntry({
    send: (form) =>
      sendJson<ChangedHousehold>('put', `/api/households/${sheet.id}`, {
        ...whoOf(form),
        phone: phoneOf(form, 'phone'),
        consent: consentOf(form),
      }),
    onKept: (kept) => {
      router.refresh()
      if (kept.notes.length === 0) router.push(`/households/${sheet.id}`)
      else setNotes(kept.notes)
    },
  })
  if (notes) return <Kept id={sheet.id} notes={notes} />
  const { wrong } = entry
  const phone = sheet.phones.find(({ first }) => first)
  const back = (
    <ButtonLink href={`/households/${sheet.id}`} kind="quiet">
      Leave it as it was
    </ButtonLink>
  )
  return (
    <EntryForm entry={entry} keep="Keep the changes" beside={back}>
      <EntryPart title="The house">
        <NameFields who={sheet} wrong={wrong} />
        <LanguageField who={sheet} wrong={wrong} />
        <PeopleFields who={sheet} wrong={wrong} />
        <SourceFields who={sheet} wrong={wrong} />
      </EntryPart>
      <EntryPart
        title="How to reach them"
        lead="Texts go to this phone. A new number wants its own yes."
      >
        <PhoneFields
          path="phone"
          label="Phone number"
          {...(phone ? { phone: { number: phone.number, answeredBy: phone.answeredBy } } : {})}
          wrong={wrong}
        />
        <ConsentFields wrong={wrong} />
      </EntryPart>
    </EntryForm>
  )
}
