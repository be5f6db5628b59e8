'use client'

import { Pair } from '../entry/entry-form'
import { numberOf, textOf } from '../entry/form-values'
import type { EntryState } from '../entry/use-entry'
import { SelectField, TextField } from '../ui/field'

type KitFieldsProps = {
  models: readonly { id: string; name: string; bottleLitres: number }[]
  today: string | undefined
  wrong: EntryState['wrong']
}

export function kitOf(form: FormData) {
  return { modelId: textOf(form, 'kit.modelId'), handedOverOn: textOf(form, 'kit.handedOverOn') }
}

/** The first reading, or null where nobody filled a bottle. */
export function readingOf(form: FormData) {
  if (textOf(form, 'reading.minutes') === '') return null
  const celsius = textOf(form, 'reading.celsius')
  return {
    minutes: numberOf(form, 'reading.minutes'),
    celsius: celsius === '' ? null : numberOf(form, 'reading.celsius'),
  }
}

/** Which kit, since when, and how it flowed when it was new. */
export function KitFields({ models, today, wrong }: KitFieldsProps) {
  const litres = models[0]?.bottleLitres ?? 1
  return (
    <>
      <Pair>
        <SelectField label="Kit" name="kit.modelId" error={wrong('kit.modelId')}>
          {models.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
        <TextField
          label="Handed over on"
          name="kit.handedOverOn"
          type="date"
          mono
          defaultValue={today}
          max={today}
          error={wrong('kit.handedOverOn')}
        />
      </Pair>
      <Pair>
        <TextField
          label={`Minutes to fill ${litres} litre${litres === 1 ? '' : 's'}`}
          hint="After the first flush, container full. Later readings are held against it."
          name="reading.minutes"
          inputMode="decimal"
          mono
          optional
          error={wrong('reading.minutes')}
        />
        <TextField
          label="Water’s temperature, °C"
          hint="Where nobody measured it the area’s month stands in."
          name="reading.celsius"
          inputMode="decimal"
          mono
          optional
          error={wrong('reading.celsius')}
        />
      </Pair>
    </>
  )
}
