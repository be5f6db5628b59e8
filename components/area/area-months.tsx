'use client'

import { monthNames } from '@/lib/domain/month-names'
import { FieldError } from '../ui/field'

type AreaMonthsProps = {
  monthCelsius: readonly number[]
  wetMonths: readonly number[]
  wrong: (field: string) => string | undefined
}

type MonthProps = { month: number; celsius: number | undefined; wet: boolean; wrong: boolean }

function Month({ month, celsius, wet, wrong }: MonthProps) {
  const name = monthNames[month - 1] ?? ''
  return (
    <fieldset className="border-t border-rule pt-2">
      <legend className="sr-only">{name}</legend>
      <label className="block text-sm font-semibold">
        <span aria-hidden>{name.slice(0, 3)}</span>
        <span className="sr-only">{name}, °C</span>
        <input
          name={`celsius-${month}`}
          inputMode="decimal"
          defaultValue={celsius}
          aria-invalid={wrong || undefined}
          className={`mt-1 block min-h-11 w-full rounded-paper border-[1.5px] bg-sheet px-2 font-mono ${
            wrong ? 'border-clay' : 'border-faint'
          }`}
        />
      </label>
      <label className="flex min-h-11 items-center gap-2 text-sm">
        <input
          type="checkbox"
          name={`wet-${month}`}
          defaultChecked={wet}
          className="size-5 shrink-0 accent-ink"
        />
        wet
      </label>
    </fieldset>
  )
}

/** A year of the area’s water: how warm each month, and which months bring brown water. */
export function AreaMonths({ monthCelsius, wetMonths, wrong }: AreaMonthsProps) {
  const faults = monthNames.map((_name, index) => wrong(`monthCelsius.${index}`))
  const said = wrong('monthCelsius') ?? faults.find(Boolean)
  return (
    <div>
      <div className="grid grid-cols-3 gap-x-3 gap-y-4 sm:grid-cols-6">
        {monthNames.map((name, index) => (
          <Month
            key={name}
            month={index + 1}
            celsius={monthCelsius[index]}
            wet={wetMonths.includes(index + 1)}
            wrong={Boolean(faults[index])}
          />
        ))}
      </div>
      {said && <FieldError>{said}</FieldError>}
    </div>
  )
}
