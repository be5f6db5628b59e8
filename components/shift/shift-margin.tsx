import type { Ref } from 'react'
import type { Shift } from '@/lib/schemas/shift'
import { Button } from '../ui/button'
import { TextField } from '../ui/field'
import { MarginBlock, MarginFigure } from '../ui/margin-block'
import { Notice } from '../ui/notice'

type ShiftMarginProps = {
  shift: Shift
  busy: boolean
  error: Error | null
  onTakeNext: () => void
  findRef: Ref<HTMLInputElement>
  onFind: (sought: string) => void
}

const count = (n: number, one: string) => `${n} ${n === 1 ? one : `${one}s`}`

function takenWords(taken: number): string {
  if (taken === 0) return 'none is'
  return taken === 1 ? '1 is' : `${taken} are`
}

function todayWords({ flowing, parts, visits }: Shift['today']): string {
  const done = [
    flowing > 0 && `${flowing} brought back to flowing`,
    parts > 0 && `${count(parts, 'part')} promised`,
    visits > 0 && `${count(visits, 'visit')} booked`,
  ].filter(Boolean)
  return done.length > 0 ? `${done.join(', ')}.` : 'Nothing has come back to flowing yet.'
}

/** How many wait, the one main button, what came of today, and a field that finds a row. */
export function ShiftMargin(props: ShiftMarginProps) {
  const { shift, busy, error, onTakeNext, findRef, onFind } = props
  const { waiting, taken, longest, next, today } = shift
  return (
    <>
      <MarginFigure figure={waiting}>
        {waiting === 1 ? 'waits' : 'wait'}, {takenWords(taken)} taken.
        {longest && ` The longest since ${longest}.`}
      </MarginFigure>
      <p role="status" className="sr-only">
        {waiting} {waiting === 1 ? 'waits' : 'wait'} in the shift
      </p>
      <Button kind="main" busy={busy} disabled={!next.ticketId} onClick={onTakeNext}>
        Take the next
      </Button>
      <p className="mt-1.5 text-faint">{next.words}</p>
      {error && (
        <Notice tone="danger" title="Not taken" live className="mt-3">
          {error.message}
        </Notice>
      )}
      <div className="mt-4.5 border-t border-rule pt-3 max-md:hidden">
        <MarginBlock title="Today">{todayWords(today)}</MarginBlock>
      </div>
      <div className="mt-4.5 border-t border-rule pt-3">
        <TextField
          ref={findRef}
          label="Find in the shift"
          type="search"
          required={false}
          onChange={({ currentTarget }) => onFind(currentTarget.value)}
        />
      </div>
    </>
  )
}
