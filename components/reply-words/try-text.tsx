'use client'

import { useState } from 'react'
import { languageNamesInEnglish, languages, type Language } from '@/lib/domain/language'
import { askedKinds, askedWords } from '@/lib/domain/reply-meaning-words'
import { Button } from '../ui/button'
import { AreaField, SelectField } from '../ui/field'
import { TextTrial } from './trial'
import type { TrialText } from './use-trial'

/** A text to try: how the desk would read it if it came in now. Sends nothing and keeps nothing. */
export function TryText({ language }: { language: Language }) {
  const [tried, setTried] = useState<(TrialText & { at: number }) | null>(null)
  return (
    <>
      <form
        className="grid max-w-reading gap-4 sm:grid-cols-2"
        onSubmit={(event) => {
          event.preventDefault()
          const form = new FormData(event.currentTarget)
          const written = form.get('text')
          const text = typeof written === 'string' ? written.trim() : ''
          const own = languages.find((one) => one === form.get('language'))
          const asked = askedKinds.find((one) => one === form.get('asked'))
          if (text === '' || !own || !asked) return
          setTried({ text, language: own, asked, at: (tried?.at ?? 0) + 1 })
        }}
      >
        <div className="sm:col-span-2">
          <AreaField label="What they might write" name="text" mono rows={2} maxLength={800} />
        </div>
        <SelectField label="The household’s language" name="language" defaultValue={language}>
          {languages.map((one) => (
            <option key={one} value={one}>
              {languageNamesInEnglish[one]}
            </option>
          ))}
        </SelectField>
        <SelectField label="What they were asked" name="asked" defaultValue="none">
          {askedKinds.map((one) => (
            <option key={one} value={one}>
              {askedWords[one]}
            </option>
          ))}
        </SelectField>
        <div className="sm:col-span-2">
          <Button type="submit" kind="main">
            Read it
          </Button>
        </div>
      </form>
      {tried && (
        <div className="mt-6">
          <TextTrial key={tried.at} {...tried} />
        </div>
      )}
    </>
  )
}
