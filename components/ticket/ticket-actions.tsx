'use client'

import { useState } from 'react'
import { Button } from '../ui/button'
import { SelectField } from '../ui/field'
import type { TicketDesk } from './use-ticket'

type Props = { desk: TicketDesk }

/** Right of the title: how long it waits, who has it, and passing it to somebody else. */
export function TicketActions({ desk }: Props) {
  const { waited, since, holder, isOpen } = desk.ticket
  const [isHandingOn, setHandingOn] = useState(false)
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
      <p className="font-mono text-sm">
        {waited} <span className="sr-only">{since}</span>
      </p>
      {isOpen && <p className="text-sm text-faint">{holder.words}</p>}
      {isOpen && holder.kind === 'you' && (
        <Button
          aria-expanded={isHandingOn}
          onClick={() => {
            setHandingOn(!isHandingOn)
          }}
        >
          Hand on
        </Button>
      )}
      {isHandingOn && holder.kind === 'you' && (
        <HandOn desk={desk} onDone={() => setHandingOn(false)} />
      )}
    </div>
  )
}

function HandOn({ desk, onDone }: Props & { onDone: () => void }) {
  const [to, setTo] = useState('')
  return (
    <form
      className="flex w-full flex-wrap items-end gap-3"
      onSubmit={(event) => {
        event.preventDefault()
        desk.act({
          name: 'hand-on',
          body: { staffId: to === '' ? null : to },
          said: to === '' ? 'It is back in the shift.' : 'Handed on.',
        })
        onDone()
      }}
    >
      <SelectField
        label="Hand on to"
        value={to}
        required={false}
        onChange={({ currentTarget }) => setTo(currentTarget.value)}
      >
        <option value="">Back to the shift</option>
        {desk.ticket.colleagues.map(({ staffId, words }) => (
          <option key={staffId} value={staffId}>
            {words}
          </option>
        ))}
      </SelectField>
      <Button type="submit" kind="main" busy={desk.busy}>
        Hand it on
      </Button>
    </form>
  )
}
