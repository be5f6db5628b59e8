'use client'

import { languageNamesInEnglish, languages, type Language } from '@/lib/domain/language'
import type { EntryState } from '../entry/use-entry'
import { Pair } from '../entry/entry-form'
import { isTicked, numberOf, textOf } from '../entry/form-values'
import { Choice, FieldGroup } from '../ui/choice-field'
import { SelectField, TextField } from '../ui/field'

export type Who = {
  name: string
  place: string
  language: Language
  people: number
  infant: boolean
  pregnant: boolean
  elderly: boolean
  ill: boolean
  sourceClass: 'clear' | 'cloudy' | 'very cloudy'
}

type Fields = { who: Partial<Who>; wrong: EntryState['wrong'] }

/** What was written of who lives there and what water they fetch. */
export function whoOf(form: FormData) {
  return {
    name: textOf(form, 'name'),
    place: textOf(form, 'place'),
    language: textOf(form, 'language'),
    people: numberOf(form, 'people'),
    infant: isTicked(form, 'infant'),
    pregnant: isTicked(form, 'pregnant'),
    elderly: isTicked(form, 'elderly'),
    ill: isTicked(form, 'ill'),
    sourceClass: textOf(form, 'sourceClass'),
  }
}

export function NameFields({ who, wrong }: Fields) {
  return (
    <Pair>
      <TextField
        label="Name of the house"
        hint="As texts call it."
        name="name"
        defaultValue={who.name}
        error={wrong('name')}
      />
      <TextField
        label="Where in the area"
        hint="So that a visitor finds it."
        name="place"
        optional
        defaultValue={who.place}
        error={wrong('place')}
      />
    </Pair>
  )
}

export function LanguageField({ who, wrong }: Fields) {
  return (
    <SelectField
      // A new area brings its language: the field begins anew with it.
      key={who.language}
      label="Language they read"
      name="language"
      defaultValue={who.language}
      error={wrong('language')}
    >
      {languages.map((language) => (
        <option key={language} value={language}>
          {languageNamesInEnglish[language]}
        </option>
      ))}
    </SelectField>
  )
}

const vulnerable = [
  ['infant', 'a child under five'],
  ['pregnant', 'somebody pregnant'],
  ['elderly', 'somebody over 65'],
  ['ill', 'somebody ill for long'],
] as const

export function PeopleFields({ who, wrong }: Fields) {
  return (
    <>
      <TextField
        label="People who drink from the filter"
        name="people"
        inputMode="numeric"
        mono
        className="max-w-32"
        defaultValue={who.people}
        error={wrong('people')}
      />
      <FieldGroup legend="Among them">
        <div className="grid sm:grid-cols-2">
          {vulnerable.map(([name, label]) => (
            <Choice key={name} name={name} label={label} defaultChecked={who[name]} />
          ))}
        </div>
      </FieldGroup>
    </>
  )
}

const sources = [
  ['clear', 'clear', 'One can see the bottom of the bucket.'],
  ['cloudy', 'cloudy', 'The bottom is only just seen.'],
  ['very cloudy', 'very cloudy', 'The bottom is not seen, or it settles to mud.'],
] as const

export function SourceFields({ who, wrong }: Fields) {
  return (
    <FieldGroup legend="Their raw water is" error={wrong('sourceClass')}>
      {sources.map(([value, label, hint]) => (
        <Choice
          key={value}
          type="radio"
          name="sourceClass"
          value={value}
          label={label}
          hint={hint}
          defaultChecked={who.sourceClass === value}
        />
      ))}
    </FieldGroup>
  )
}
