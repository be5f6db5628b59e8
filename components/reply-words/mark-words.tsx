'use client'

import { useState } from 'react'
import { conceptNames } from '@/lib/domain/reply-concept-names'
import type { Language } from '@/lib/domain/language'
import { offeredGroups } from '@/lib/domain/reply-offered'
import { tokenise } from '@/lib/domain/reply-tokens'
import type { NewWord } from '@/lib/schemas/reply-words'
import { Button } from '../ui/button'
import { FieldError, SelectField } from '../ui/field'
import { pickedAfter, type Picked } from './picked'
import type { Trial } from './use-trial'

type MarkWordsProps = { text: string; language: Language; trial: Trial }

/** The text's own words to pick from, one or some in a row, and what they mean. */
export function MarkWords({ text, language, trial }: MarkWordsProps) {
  const [picked, setPicked] = useState<Picked | null>(null)
  const [concept, setConcept] = useState<NewWord['concept'] | ''>('')
  const tokens = tokenise(text)
  const phrase = picked
    ? tokens
        .slice(picked.from, picked.to)
        .map((token) => token.text)
        .join(' ')
    : ''
  const canMark = phrase !== '' && concept !== ''
  return (
    <fieldset className="mt-6">
      <legend className="font-title text-lg font-semibold">Give words of it a meaning</legend>
      <p className="text-sm text-faint">
        Pick one word, or some that stand in a row. Nothing changes until you add them.
      </p>
      <div lang={language} className="mt-2 flex flex-wrap gap-2">
        {tokens.map((token, at) =>
          token.kind === 'word' ? (
            <button
              key={`${at} ${token.text}`}
              type="button"
              aria-pressed={picked !== null && picked.from <= at && at < picked.to}
              onClick={() => setPicked(pickedAfter(picked, at))}
              className="min-h-9 rounded-paper border border-faint bg-sheet px-2.5 py-1 font-mono hover:border-ink aria-pressed:border-ink aria-pressed:bg-ink aria-pressed:text-paper pointer-coarse:min-h-11"
            >
              {token.text}
            </button>
          ) : (
            <span key={`${at} ${token.text}`} className="self-center font-mono text-faint">
              {token.text}
            </span>
          ),
        )}
      </div>
      <div className="mt-3 flex max-w-md flex-wrap items-end gap-3">
        <div className="min-w-56 flex-1">
          <MeaningField value={concept} onChange={setConcept} />
        </div>
        <Button
          disabled={!canMark}
          onClick={() => {
            if (concept === '') return
            trial.mark({ phrase, concept })
            setPicked(null)
            setConcept('')
          }}
        >
          Try it
        </Button>
      </div>
      <MarkedList language={language} trial={trial} />
    </fieldset>
  )
}

type MeaningFieldProps = {
  value: NewWord['concept'] | ''
  onChange: (concept: NewWord['concept'] | '') => void
}

function MeaningField({ value, onChange }: MeaningFieldProps) {
  const offered = offeredGroups.flatMap(({ concepts }) => concepts)
  return (
    <SelectField
      label="It means"
      optional={false}
      value={value}
      onChange={({ currentTarget }) =>
        onChange(offered.find(({ concept }) => concept === currentTarget.value)?.concept ?? '')
      }
    >
      <option value="">Choose</option>
      {offeredGroups.map((group) => (
        <optgroup key={group.name} label={group.name}>
          {group.concepts.map(({ concept, name }) => (
            <option key={concept} value={concept}>
              {name}
            </option>
          ))}
        </optgroup>
      ))}
    </SelectField>
  )
}

/** The words on trial, each with its meaning, and why one may not be added. */
function MarkedList({ language, trial }: Omit<MarkWordsProps, 'text'>) {
  if (trial.words.length === 0) return null
  return (
    <ul aria-label="Words on trial" className="mt-4 space-y-2">
      {trial.words.map(({ phrase, concept }) => {
        const refused = trial.tried?.refused.find((one) => one.phrase === phrase)
        return (
          <li key={phrase}>
            <span lang={language} className="font-mono font-semibold">
              {phrase}
            </span>{' '}
            means {conceptNames[concept]}{' '}
            <Button kind="quiet" size="small" onClick={() => trial.unmark(phrase)}>
              Take off<span className="sr-only"> {phrase}</span>
            </Button>
            {refused && <FieldError>{refused.reason}</FieldError>}
          </li>
        )
      })}
    </ul>
  )
}
