'use client'

import { useState } from 'react'
import type { StepView } from '@/lib/schemas/ticket'
import { Button } from '../ui/button'
import { TextField } from '../ui/field'
import type { TicketDesk } from './use-ticket'

type Props = { desk: TicketDesk; step: StepView }

/** `4,5` and `4.5` are the same minutes; nothing written is none. */
function numberIn(form: FormData, name: string): number | undefined {
  const value = form.get(name)
  if (typeof value !== 'string' || value.trim() === '') return undefined
  return Number(value.replace(',', '.'))
}

/** What the household may have said by phone, each a button; a figure is asked for where one is told. */
export function AnswerButtons({ desk, step }: Props) {
  const [timed, setTimed] = useState<string | null>(null)
  const note = (answer: string, figures: Record<string, number | undefined> = {}) => {
    setTimed(null)
    desk.act({
      name: 'note-answer',
      body: { stepId: step.id, answer, ...figures },
      said: 'Noted.',
    })
  }
  return (
    <div className="mt-3.5 border-t border-dashed border-rule pt-3.5">
      <div className="flex flex-wrap items-center gap-2">
        <span className="text-faint">If they answer by phone:</span>
        {step.answers.map(({ answer, label, withMinutes }) => (
          <Button
            key={answer}
            size="small"
            busy={desk.busy}
            aria-expanded={withMinutes ? timed === answer : undefined}
            onClick={() =>
              withMinutes ? setTimed(timed === answer ? null : answer) : note(answer)
            }
          >
            {label}
          </Button>
        ))}
      </div>
      {timed !== null && <Figures onNote={(figures) => note(timed, figures)} busy={desk.busy} />}
    </div>
  )
}

type FiguresProps = {
  busy: boolean
  onNote: (figures: { minutes: number | undefined; celsius: number | undefined }) => void
}

function Figures({ busy, onNote }: FiguresProps) {
  return (
    <form
      className="mt-3 flex flex-wrap items-end gap-3"
      onSubmit={(event) => {
        event.preventDefault()
        const form = new FormData(event.currentTarget)
        onNote({ minutes: numberIn(form, 'minutes'), celsius: numberIn(form, 'celsius') })
      }}
    >
      <div className="w-40">
        <TextField label="Minutes a bottle" name="minutes" inputMode="decimal" mono />
      </div>
      <div className="w-48">
        <TextField label="Water, °C" name="celsius" inputMode="decimal" mono optional />
      </div>
      <Button type="submit" kind="main" busy={busy}>
        Note it
      </Button>
    </form>
  )
}
