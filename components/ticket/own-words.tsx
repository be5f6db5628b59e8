'use client'

import { useState } from 'react'
import { Button } from '../ui/button'
import { Composer } from './composer'
import type { TicketDesk } from './use-ticket'

type OwnWordsProps = { desk: TicketDesk; kind?: 'quiet' | 'line' }

/** Writing to the household without a step. */
export function OwnWords({ desk, kind = 'quiet' }: OwnWordsProps) {
  const [words, setWords] = useState<string | null>(null)
  if (words === null) {
    return (
      <Button kind={kind} onClick={() => setWords('')}>
        Write to them
      </Button>
    )
  }
  return (
    <form
      className="w-full"
      onSubmit={(event) => {
        event.preventDefault()
        desk.act({ name: 'write', body: { body: words }, said: 'Your words are on their way.' })
        setWords(null)
      }}
    >
      <Composer
        label="Your words to the household"
        language={desk.ticket.household.language}
        value={words}
        onChange={setWords}
      />
      <div className="mt-3 flex flex-wrap gap-2.5">
        <Button type="submit" kind="main" busy={desk.busy} disabled={words.trim() === ''}>
          Send these words
        </Button>
        <Button onClick={() => setWords(null)}>Do not send</Button>
      </div>
    </form>
  )
}
