'use client'

import { useState } from 'react'
import { Pair } from '../entry/entry-form'
import { textOf } from '../entry/form-values'
import type { EntryState } from '../entry/use-entry'
import { Choice, FieldGroup } from '../ui/choice-field'
import { SelectField, TextField } from '../ui/field'

type Wrong = { wrong: EntryState['wrong'] }

type PhoneFieldsProps = Wrong & {
  /** Where the phone stands in what is sent: `phones.0` or `phone`. */
  path: string
  label: string
  phone?: { number: string; answeredBy: string }
  fault?: string | undefined
}

/** A phone: its number and who answers it. */
export function PhoneFields({ path, label, phone, wrong, fault }: PhoneFieldsProps) {
  return (
    <Pair>
      <TextField
        label={label}
        hint="With the country code, as +1 505 555 0142."
        name={`${path}.number`}
        type="tel"
        mono
        required={!path.endsWith('1')}
        defaultValue={phone?.number}
        error={wrong(`${path}.number`) ?? fault}
      />
      <TextField
        label="Who answers it"
        hint="A neighbour’s phone is read by a neighbour."
        name={`${path}.answeredBy`}
        optional
        defaultValue={phone?.answeredBy}
        error={wrong(`${path}.answeredBy`)}
      />
    </Pair>
  )
}

export function phoneOf(form: FormData, path: string) {
  return {
    number: textOf(form, `${path}.number`),
    answeredBy: textOf(form, `${path}.answeredBy`),
  }
}

/** The yes that was written down, or null where it is still to be asked. */
export function consentOf(form: FormData) {
  if (textOf(form, 'consent') !== 'yes') return null
  return { how: textOf(form, 'consent.how'), by: textOf(form, 'consent.by') }
}

/** Whether the family wants texts, and how it said so. */
export function ConsentFields({ wrong }: Wrong) {
  const [isGiven, setIsGiven] = useState(false)
  return (
    <>
      <FieldGroup legend="Do they want texts?" hint="Without a yes nothing is sent.">
        <Choice
          type="radio"
          name="consent"
          value="yes"
          label="Yes, they said so"
          checked={isGiven}
          onChange={() => setIsGiven(true)}
        />
        <Choice
          type="radio"
          name="consent"
          value="no"
          label="Not asked yet, or no"
          checked={!isGiven}
          onChange={() => setIsGiven(false)}
        />
      </FieldGroup>
      {isGiven && (
        <Pair>
          <SelectField label="How it was given" name="consent.how" error={wrong('consent.how')}>
            <option value="on paper">on paper</option>
            <option value="by word of mouth">by word of mouth</option>
            <option value="on the telephone">on the telephone</option>
          </SelectField>
          <TextField label="Who gave it" name="consent.by" error={wrong('consent.by')} />
        </Pair>
      )}
    </>
  )
}
