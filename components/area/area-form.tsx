'use client'

import { useRouter } from 'next/navigation'
import { holidayOfLine } from '@/lib/domain/holiday'
import { languageNamesInEnglish, languages } from '@/lib/domain/language'
import type { AreaInput } from '@/lib/schemas/area'
import { sendJson } from '../api'
import { EntryForm, EntryPart, Pair } from '../entry/entry-form'
import { isTicked, linesOf, numberOf, textOf } from '../entry/form-values'
import { useEntry, type EntryState } from '../entry/use-entry'
import { Choice } from '../ui/choice-field'
import { SelectField, TextField } from '../ui/field'
import { AreaMonths } from './area-months'
import { HolidayField } from './holiday-field'

type AreaFormProps = {
  /** Null for a new area. */
  areaId: string | null
  area: AreaInput | null
  depots: readonly { id: string; name: string }[]
  timeZones: readonly string[]
}

const months = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12]

function areaOf(form: FormData) {
  return {
    name: textOf(form, 'name'),
    timeZone: textOf(form, 'timeZone'),
    language: textOf(form, 'language'),
    windowOpens: textOf(form, 'windowOpens'),
    windowCloses: textOf(form, 'windowCloses'),
    sundaysOff: isTicked(form, 'sundaysOff'),
    holidays: linesOf(form, 'holidays').map(holidayOfLine),
    altitudeMetres: numberOf(form, 'altitudeMetres'),
    wetMonths: months.filter((month) => isTicked(form, `wet-${month}`)),
    // A hole in the list is null in JSON, and so refused at its own place.
    monthCelsius: months.map((month) => numberOf(form, `celsius-${month}`)),
    depotId: textOf(form, 'depotId'),
  }
}

type PartProps = Pick<AreaFormProps, 'area'> & Pick<EntryState, 'wrong'>

function PlaceFields({
  area,
  wrong,
  depots,
  timeZones,
}: PartProps & Pick<AreaFormProps, 'depots' | 'timeZones'>) {
  return (
    <EntryPart title="The place">
      <TextField label="Name" name="name" defaultValue={area?.name} error={wrong('name')} />
      <Pair>
        <SelectField
          label="Time zone"
          name="timeZone"
          defaultValue={area?.timeZone ?? ''}
          error={wrong('timeZone')}
        >
          <option value="">Choose …</option>
          {timeZones.map((zone) => (
            <option key={zone} value={zone}>
              {zone.replaceAll('_', ' ')}
            </option>
          ))}
        </SelectField>
        <TextField
          label="Metres above the sea"
          name="altitudeMetres"
          inputMode="numeric"
          mono
          defaultValue={area?.altitudeMetres ?? 0}
          error={wrong('altitudeMetres')}
        />
      </Pair>
      <Pair>
        <SelectField
          label="Language most speak"
          name="language"
          defaultValue={area?.language ?? ''}
          error={wrong('language')}
        >
          <option value="">Choose …</option>
          {languages.map((language) => (
            <option key={language} value={language}>
              {languageNamesInEnglish[language]}
            </option>
          ))}
        </SelectField>
        <SelectField
          label="Depot that its parts come from"
          name="depotId"
          defaultValue={area?.depotId ?? depots[0]?.id}
          error={wrong('depotId')}
        >
          {depots.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
      </Pair>
    </EntryPart>
  )
}

function WindowFields({ area, wrong }: PartProps) {
  return (
    <EntryPart
      title="When texts may go"
      lead="Local hours. Answers to what a household has just written go at any hour."
    >
      <Pair>
        <TextField
          label="From"
          name="windowOpens"
          mono
          defaultValue={area?.windowOpens ?? '08:00'}
          error={wrong('windowOpens')}
        />
        <TextField
          label="Until"
          name="windowCloses"
          mono
          defaultValue={area?.windowCloses ?? '20:00'}
          error={wrong('windowCloses')}
        />
      </Pair>
      <Choice
        label="Not on Sundays"
        name="sundaysOff"
        defaultChecked={area?.sundaysOff ?? true}
        value="yes"
      />
      <HolidayField holidays={area?.holidays ?? []} wrong={wrong} />
    </EntryPart>
  )
}

/** A plain form to enter an area, or to change one. */
export function AreaForm({ areaId, area, depots, timeZones }: AreaFormProps) {
  const router = useRouter()
  const entry = useEntry({
    send: (form) =>
      areaId === null
        ? sendJson('post', '/api/areas', areaOf(form))
        : sendJson('put', `/api/areas/${areaId}`, areaOf(form)),
    onKept: () => {
      router.push('/areas')
      router.refresh()
    },
  })
  const part = { area, wrong: entry.wrong }
  return (
    <EntryForm entry={entry} keep={areaId === null ? 'Enter the area' : 'Keep the changes'}>
      <PlaceFields {...part} depots={depots} timeZones={timeZones} />
      <WindowFields {...part} />
      <EntryPart
        title="The year"
        lead="How warm the water is, °C, where nobody measured it; and the months in which it runs brown."
      >
        <AreaMonths
          monthCelsius={area?.monthCelsius ?? []}
          wetMonths={area?.wetMonths ?? []}
          wrong={entry.wrong}
        />
      </EntryPart>
    </EntryForm>
  )
}
