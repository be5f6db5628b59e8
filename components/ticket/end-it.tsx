'use client'

import { useState, type FormEvent, type ReactNode } from 'react'
import { Button } from '../ui/button'
import { SelectField, TextField } from '../ui/field'
import { MarginBlock } from '../ui/margin-block'
import type { TicketAct, TicketDesk } from './use-ticket'

const ways = ['Flowing', 'Part', 'Visit', 'Stop using', 'Kit withdrawn', 'No trouble'] as const
type Way = (typeof ways)[number]

/** The ends a ticket may come to, each with what it wants to know. */
export function EndIt({ desk }: { desk: TicketDesk }) {
  const [way, setWay] = useState<Way | null>(null)
  const act = (done: TicketAct) => {
    setWay(null)
    desk.act(done)
  }
  return (
    <MarginBlock title="End it">
      <div className="flex flex-wrap gap-2">
        {ways.map((name) => (
          <Button
            key={name}
            size="small"
            kind={name === 'Stop using' ? 'danger' : name === way ? 'main' : 'line'}
            aria-expanded={name === way}
            onClick={() => setWay(name === way ? null : name)}
          >
            {name}
          </Button>
        ))}
      </div>
      {way && <EndForm key={way} desk={desk} way={way} act={act} />}
    </MarginBlock>
  )
}

type FormProps = { desk: TicketDesk; way: Way; act: (done: TicketAct) => void }

function EndForm({ desk, way, act }: FormProps) {
  const { causes, stages, visitOn } = desk.ticket
  const end = (name: 'flowing' | 'retired' | 'withdrawn', said: string) => (form: FormData) =>
    act({ name: 'end', body: { end: name, cause: form.get('cause') }, said })
  switch (way) {
    case 'Flowing':
      return (
        <Ask busy={desk.busy} does="End as flowing" onDo={end('flowing', 'Ended: it flows.')}>
          <Causes label="What cured it" causes={causes.flowing} />
        </Ask>
      )
    case 'Part':
      return (
        <Ask
          busy={desk.busy}
          does="Promise the part"
          onDo={(form) =>
            act({
              name: 'promise-part',
              body: { position: Number(form.get('position')) },
              said: 'Promised, and they are told.',
            })
          }
        >
          <SelectField label="Which part" name="position" defaultValue={stages.at(-1)?.position}>
            {stages.map(({ position, words }) => (
              <option key={position} value={position}>
                {words}
              </option>
            ))}
          </SelectField>
        </Ask>
      )
    case 'Visit':
      return (
        <Ask
          busy={desk.busy}
          does="Book the visit"
          onDo={(form) =>
            act({
              name: 'book-visit',
              body: { dueOn: form.get('dueOn'), why: form.get('why') },
              said: 'The visit is booked, and they are told.',
            })
          }
        >
          <TextField
            label="Day of the visit"
            name="dueOn"
            type="date"
            min={visitOn.first}
            defaultValue={visitOn.usual}
          />
          <TextField label="What the visitor is to do" name="why" maxLength={300} />
        </Ask>
      )
    case 'Stop using':
      return (
        <Ask
          busy={desk.busy}
          isDanger
          does="Tell them to stop using it"
          onDo={() =>
            act({
              name: 'stop-using',
              said: 'Out of service. They are told to stop, and what to drink meanwhile.',
            })
          }
        >
          <p>
            The filter goes out of service. They get the fixed words to stop using it, and what to
            drink meanwhile.
          </p>
        </Ask>
      )
    case 'Kit withdrawn':
      return (
        <Ask
          busy={desk.busy}
          does="End, kit withdrawn"
          onDo={end('retired', 'The kit is withdrawn.')}
        >
          <Causes label="Why" causes={causes.retired} />
        </Ask>
      )
    case 'No trouble':
      return (
        <Ask busy={desk.busy} does="End, no trouble" onDo={end('withdrawn', 'Ended.')}>
          <Causes label="Why" causes={causes.withdrawn} />
        </Ask>
      )
  }
}

type AskProps = {
  busy: boolean
  does: string
  isDanger?: boolean
  onDo: (form: FormData) => void
  children: ReactNode
}

function Ask({ busy, does, isDanger, onDo, children }: AskProps) {
  const onSubmit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    onDo(new FormData(event.currentTarget))
  }
  return (
    <form onSubmit={onSubmit} className="mt-3 space-y-3">
      {children}
      <Button type="submit" kind={isDanger ? 'danger' : 'main'} size="small" busy={busy}>
        {does}
      </Button>
    </form>
  )
}

type CausesProps = { label: string; causes: readonly { cause: string; words: string }[] }

function Causes({ label, causes }: CausesProps) {
  return (
    <SelectField label={label} name="cause" defaultValue="">
      <option value="" disabled>
        Choose
      </option>
      {causes.map(({ cause, words }) => (
        <option key={cause} value={cause}>
          {words}
        </option>
      ))}
    </SelectField>
  )
}
