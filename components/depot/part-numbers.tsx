'use client'

import { numberOf, textOf } from '../entry/form-values'
import { TextField } from '../ui/field'

export type PartChoice = { id: string; name: string; inHand?: number }

/** A number for each part, null where nothing was written; what cannot be read goes as it is, to be refused. */
export function stockOf(form: FormData, parts: readonly PartChoice[]) {
  return parts.map(({ id }) => {
    const written = textOf(form, `part-${id}`)
    const quantity = written === '' ? null : (numberOf(form, `part-${id}`) ?? written)
    return { partId: id, quantity }
  })
}

type PartNumbersProps = {
  parts: readonly PartChoice[]
  wrong: (field: string) => string | undefined
}

/** One small field a part. */
export function PartNumbers({ parts, wrong }: PartNumbersProps) {
  return (
    <div className="grid grid-cols-2 gap-5 sm:grid-cols-3">
      {parts.map(({ id, name, inHand }, index) => (
        <TextField
          key={id}
          label={name}
          hint={inHand === undefined ? undefined : `${inHand} in hand`}
          name={`part-${id}`}
          inputMode="numeric"
          mono
          required={false}
          error={wrong(`stock.${index}.quantity`)}
        />
      ))}
    </div>
  )
}
