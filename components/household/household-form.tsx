'use client'

import { useState } from 'react'
import type { Language } from '@/lib/domain/language'
import type { EnteredHousehold } from '@/lib/schemas/household-entry'
import { sendJson } from '../api'
import { EntryForm, EntryPart, Pair } from '../entry/entry-form'
import { textOf } from '../entry/form-values'
import { useEntry } from '../entry/use-entry'
import { SelectField } from '../ui/field'
import { Entered } from './entered'
import { KitFields, kitOf, readingOf } from './kit-fields'
import { ConsentFields, consentOf, PhoneFields, phoneOf } from './phone-fields'
import { LanguageField, NameFields, PeopleFields, SourceFields, whoOf } from './who-fields'

type HouseholdFormProps = {
  areas: readonly { id: string; name: string; language: Language; today: string }[]
  models: readonly { id: string; name: string; bottleLitres: number }[]
}

function householdOf(form: FormData) {
  const phones = [phoneOf(form, 'phones.0'), phoneOf(form, 'phones.1')]
  return {
    ...whoOf(form),
    areaId: textOf(form, 'areaId'),
    phones: phones.filter(({ number }, index) => index === 0 || number !== ''),
    consent: consentOf(form),
    kit: kitOf(form),
    reading: readingOf(form),
  }
}

type FieldsProps = HouseholdFormProps & { onKept: (made: EnteredHousehold) => void }

function Fields({ areas, models, onKept }: FieldsProps) {
  const [areaId, setAreaId] = useState(areas[0]?.id ?? '')
  const area = areas.find(({ id }) => id === areaId)
  const entry = useEntry({
    send: (form) => sendJson<EnteredHousehold>('post', '/api/households', householdOf(form)),
    onKept,
  })
  const { wrong } = entry
  const who = area ? { language: area.language } : {}
  return (
    <EntryForm entry={entry} keep="Enter the household">
      <EntryPart title="The house">
        <NameFields who={who} wrong={wrong} />
        <Pair>
          <SelectField
            label="Area"
            name="areaId"
            value={areaId}
            onChange={(event) => setAreaId(event.target.value)}
            error={wrong('areaId')}
          >
            {areas.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </SelectField>
          <LanguageField who={who} wrong={wrong} />
        </Pair>
        <PeopleFields who={who} wrong={wrong} />
        <SourceFields who={who} wrong={wrong} />
      </EntryPart>
      <EntryPart title="How to reach them" lead="Two houses may share a phone.">
        <PhoneFields path="phones.0" label="Phone number" wrong={wrong} fault={wrong('phones')} />
        <PhoneFields path="phones.1" label="Another phone (optional)" wrong={wrong} />
        <ConsentFields wrong={wrong} />
      </EntryPart>
      <EntryPart title="The kit" lead="Its number is given when the household is entered.">
        <KitFields key={area?.today} models={models} today={area?.today} wrong={wrong} />
      </EntryPart>
    </EntryForm>
  )
}

/** A plain form to enter a household; then its kit’s number, and a fresh form for the next. */
export function HouseholdForm(props: HouseholdFormProps) {
  const [made, setMade] = useState<EnteredHousehold | null>(null)
  if (made) return <Entered made={made} onAnother={() => setMade(null)} />
  return <Fields {...props} onKept={setMade} />
}
