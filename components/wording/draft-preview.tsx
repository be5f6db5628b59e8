'use client'

import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { offendingCharacters, renderWording, segmentsOf, unitsPerPart } from '@/lib/domain/wording'
import { exampleValues } from '@/lib/domain/wording-examples'
import type { TriedWording, WordingCell } from '@/lib/schemas/wording'
import { sendJson } from '../api'
import { SelectField } from '../ui/field'
import { Ruler } from '../ui/ruler'
import { WordingSlip } from './wording-slip'

type DraftPreviewProps = { cell: WordingCell; body: string }

function tryHere(cell: WordingCell, body: string): TriedWording {
  const rendered = renderWording(body, exampleValues(), cell.language)
  return rendered.ok
    ? { text: rendered.text, problem: null, examples: [] }
    : { text: null, problem: `${rendered.reason}: ${rendered.detail}`, examples: [] }
}

/** The draft as a household would read it, and how it fills its parts. `body` is what stood still. */
export function DraftPreview({ cell, body }: DraftPreviewProps) {
  const [householdId, setHouseholdId] = useState('')
  const { data: tried } = useQuery({
    queryKey: ['wordings', cell.moment, cell.language, 'try', householdId, body],
    queryFn: () => {
      const path = `/api/wordings/${cell.moment}/${cell.language}/try`
      return sendJson<TriedWording>('post', path, { body, householdId })
    },
    enabled: householdId !== '' && body !== '',
    placeholderData: keepPreviousData,
  })
  const shown = householdId === '' ? tryHere(cell, body) : (tried ?? tryHere(cell, body))
  return (
    <section aria-label="As a household reads it">
      <TextRuler text={shown.text ?? body} language={cell.language} />
      <div className="mt-5 max-w-sm">
        <SelectField
          label="Try it on"
          optional
          value={householdId}
          onChange={(event) => setHouseholdId(event.target.value)}
        >
          <option value="">an invented household</option>
          {cell.households.map(({ id, name, area }) => (
            <option key={id} value={id}>
              {name}, {area}
            </option>
          ))}
        </SelectField>
      </div>
      <div className="mt-3">
        <WordingSlip language={cell.language} faint={shown.text === null}>
          {shown.text ?? shown.problem}
        </WordingSlip>
        {shown.examples.length > 0 && (
          <p className="mt-1 text-sm text-faint">
            Not known of this household yet, so made up: {shown.examples.join(', ')}.
          </p>
        )}
      </div>
    </section>
  )
}

function TextRuler({ text, language }: { text: string; language: WordingCell['language'] }) {
  const { encoding, segments, units } = segmentsOf(text)
  return (
    <Ruler
      units={units}
      segments={segments}
      encoding={encoding}
      perPart={unitsPerPart(encoding, segments)}
      // Bengali is written in letters that a phone's basic alphabet lacks: none of them is at fault.
      offending={language === 'bn' ? [] : offendingCharacters(text)}
    />
  )
}
