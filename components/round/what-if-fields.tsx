import type { CycleLengths, CycleName } from '@/lib/domain/cycle-words'
import { weeksAhead } from '@/lib/schemas/what-if'
import { FieldGroup } from '../ui/choice-field'
import { SelectField, TextField } from '../ui/field'

type FieldsProps = {
  standing: CycleLengths
  wrong: (field: string) => string | undefined
}

type Named = readonly (readonly [CycleName, string])[]

const washes: Named = [
  ['washClear', 'Clear water'],
  ['washCloudy', 'Cloudy water'],
  ['washVeryCloudy', 'Very cloudy water'],
  ['wetPercent', 'Wet month, %'],
]

const changes: Named = [
  ['change1', 'Cloth'],
  ['change2', 'Carbon'],
  ['change3', 'Fibre'],
]

/** Every cycle as it stands, to be changed. A field left empty leaves its cycle as each kit has it. */
export function WhatIfFields({ standing, wrong }: FieldsProps) {
  const fields = (named: Named) =>
    named.map(([name, label]) => (
      <TextField
        key={name}
        label={<span className="text-sm">{label}</span>}
        name={name}
        inputMode="numeric"
        mono
        required={false}
        defaultValue={standing[name] ?? ''}
        error={wrong(name)}
      />
    ))
  return (
    <>
      <FieldGroup
        legend="Days between washes"
        hint="In a wet month only a share of the days is left."
      >
        <div className="grid max-w-4xl grid-cols-2 items-start gap-x-5 gap-y-4 md:grid-cols-4">
          {fields(washes)}
        </div>
      </FieldGroup>
      <FieldGroup legend="Months to a change" hint="Empty: as each kit model has it.">
        <div className="grid max-w-4xl grid-cols-2 items-start gap-x-5 gap-y-4 md:grid-cols-4">
          {fields(changes)}
        </div>
      </FieldGroup>
      <div className="grid max-w-4xl grid-cols-2 items-start gap-x-5 gap-y-4 md:grid-cols-4">
        <TextField
          label={<span className="text-sm">Days to a flow check</span>}
          name="flowCheckDays"
          inputMode="numeric"
          mono
          required={false}
          defaultValue={standing.flowCheckDays ?? ''}
          error={wrong('flowCheckDays')}
        />
        <SelectField
          label={<span className="text-sm">Look ahead</span>}
          name="weeks"
          defaultValue="13"
          error={wrong('weeks')}
        >
          {weeksAhead.map((weeks) => (
            <option key={weeks} value={weeks}>
              {weeks} weeks
            </option>
          ))}
        </SelectField>
      </div>
    </>
  )
}
