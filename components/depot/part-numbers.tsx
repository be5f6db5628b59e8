'use client'

import { numberOf, textOf } from '../entry/form-values'
import { FieldError, TextField } from '../ui/field'

export type PartChoice = { id: string; name: string; inHand?: number }

type Sent = { partId: string; quantity: number | null }

/** A number for each part of a depot; what cannot be read goes as null, so that it is refused and not passed over. */
export function stockOf(form: FormData, parts: readonly PartChoice[]): Sent[] {
  const written = parts.filter(({ id }) => textOf(form, `part-${id}`) !== '')
  return written.map(({ id }) => ({ partId: id, quantity: numberOf(form, `part-${id}`) ?? null }))
}

type PartNumbersProps = {
  parts: readonly PartChoice[]
  wrong: (field: string) => string | undefined
}

/** One small field a part. Faults come by the place in what was sent, so they are said once, below. */
export function PartNumbers({ parts, wrong }: PartNumbersProps) {
  const faults = parts.map((_part, index) => wrong(`stock.${index}.quantity`))
  const fault = faults.find(Boolean)
  return (
    <div>
      <div className="grid grid-cols-2 gap-5 sm:grid-cols-3">
        {parts.map(({ id, name, inHand }) => (
          <TextField
            key={id}
            label={name}
            hint={inHand === undefined ? undefined : `${inHand} in hand`}
            name={`part-${id}`}
            inputMode="numeric"
            mono
            required={false}
          />
        ))}
      </div>
      {fault && <FieldError>{fault}</FieldError>}
    </div>
  )
}
