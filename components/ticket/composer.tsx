import { offendingCharacters, segmentsOf, unitsPerPart } from '@/lib/domain/wording-size'
import { AreaField } from '../ui/field'
import { Ruler } from '../ui/ruler'

/** How far a text fills its parts. */
export function TextRuler({ text }: { text: string }) {
  const { units, segments, encoding } = segmentsOf(text)
  return (
    <Ruler
      units={units}
      segments={segments}
      encoding={encoding}
      perPart={unitsPerPart(encoding, segments)}
      offending={encoding === 'UCS-2' ? offendingCharacters(text) : []}
    />
  )
}

type ComposerProps = {
  label: string
  hint?: string | null
  language: string
  value: string
  onChange: (words: string) => void
}

/** Words to a household, with the ruler under them. */
export function Composer({ label, hint, language, value, onChange }: ComposerProps) {
  return (
    <>
      <AreaField
        mono
        label={label}
        hint={hint}
        lang={language}
        value={value}
        maxLength={800}
        onChange={({ currentTarget }) => onChange(currentTarget.value)}
      />
      <TextRuler text={value} />
    </>
  )
}
