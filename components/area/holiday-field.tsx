'use client'

import { useMutation, useQuery } from '@tanstack/react-query'
import { useId, useState, type ReactNode } from 'react'
import { lineOfHoliday, withHolidays, type Holiday } from '@/lib/domain/holiday'
import type { Countries, PublicHolidays } from '@/lib/schemas/holiday'
import { getJson } from '../api'
import { Button } from '../ui/button'
import { AreaField, FieldError, SelectField } from '../ui/field'

type HolidayFieldProps = {
  holidays: readonly Holiday[]
  wrong: (field: string) => string | undefined
}

/** What is wrong with the lines, each fault once. */
function faultsOf(wrong: HolidayFieldProps['wrong'], lines: number): string | undefined {
  const faults = Array.from({ length: lines }, (_, index) => [
    wrong(`holidays.${index}.on`),
    wrong(`holidays.${index}.name`),
  ]).flat()
  return [...new Set([wrong('holidays'), ...faults])].filter(Boolean).join(' ') || undefined
}

function linesIn(text: string): string[] {
  return text.split('\n').filter((line) => line.trim() !== '')
}

/** The days without prompts, one a line, which a country's calendar can fill in to be looked over. */
export function HolidayField({ holidays, wrong }: HolidayFieldProps) {
  const [text, setText] = useState(holidays.map(lineOfHoliday).join('\n'))
  const add = (more: readonly Holiday[]) => {
    const before = linesIn(text)
    const after = withHolidays(before, more)
    setText(after.join('\n'))
    return after.length - before.length
  }
  return (
    <div className="grid gap-3">
      <AreaField
        label="Not on these days"
        hint="One a line, as 2026-12-25 Midwinter day."
        name="holidays"
        mono
        optional
        rows={6}
        value={text}
        onChange={(event) => setText(event.target.value)}
        error={faultsOf(wrong, 200)}
      />
      <CountryFill add={add} />
    </div>
  )
}

/** Fetched when it is opened: most areas are looked at without it. */
function CountryFill({ add }: { add: (more: readonly Holiday[]) => number }) {
  const [open, setOpen] = useState(false)
  return (
    <details onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="cursor-pointer py-2 text-sm font-semibold">
        Fill in a country’s public holidays
      </summary>
      {open && <CountryChoice add={add} />}
    </details>
  )
}

function CountryChoice({ add }: { add: (more: readonly Holiday[]) => number }) {
  const said = useId()
  const [country, setCountry] = useState('')
  const [added, setAdded] = useState<ReactNode>(null)
  const { data, error } = useQuery({
    queryKey: ['holiday countries'],
    queryFn: () => getJson<Countries>('/api/holidays'),
    staleTime: Infinity,
  })
  const fill = useMutation({
    mutationFn: () => getJson<PublicHolidays>(`/api/holidays/${country}`),
    onMutate: () => setAdded(null),
    onSuccess: (found) => setAdded(addedWords(found, add(found.holidays))),
  })
  const fault = error?.message ?? fill.error?.message
  return (
    <div className="grid gap-3 pt-1 pb-2">
      <div className="flex flex-wrap items-end gap-3">
        <div className="min-w-56 grow">
          <SelectField
            label="Country"
            optional
            value={country}
            onChange={(event) => setCountry(event.target.value)}
            disabled={!data}
          >
            <option value="">{data ? 'Choose …' : 'Fetching the list …'}</option>
            {data?.countries.map(({ code, name }) => (
              <option key={code} value={code}>
                {name}
              </option>
            ))}
          </SelectField>
        </div>
        <Button
          onClick={() => fill.mutate()}
          busy={fill.isPending}
          disabled={country === ''}
          aria-describedby={said}
        >
          Fill in
        </Button>
      </div>
      <p id={said} role="status" className="text-sm">
        {added}
      </p>
      {fault && <FieldError>{fault}</FieldError>}
      <p className="text-sm text-faint">
        From the collection date-holidays (CC BY-SA 3.0). Look each day over: feasts that follow the
        moon may lie a day off, and those of one region are missing.
      </p>
    </div>
  )
}

function addedWords({ country, holidays }: PublicHolidays, added: number): string {
  if (holidays.length === 0) return `Nothing is known of public holidays in ${country}.`
  if (added === 0) return `All ${holidays.length} days of ${country} are there already.`
  return `${added} ${added === 1 ? 'day' : 'days'} of ${country} put in above. Kept with the changes, not before.`
}
