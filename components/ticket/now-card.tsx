import type { ReactNode } from 'react'
import { Bead } from '../ui/bead'
import { NameTrouble } from './name-trouble'
import { OtherSteps } from './other-steps'
import { OwnWords } from './own-words'
import { StepCard } from './step-card'
import { TakeIt } from './take-it'
import type { TicketDesk } from './use-ticket'

type Props = { desk: TicketDesk }

/** What there is to do now: a step to send, or what a person has to decide. */
export function NowCard({ desk }: Props) {
  const { now, isDanger } = desk.ticket
  return (
    <div className="border border-rule bg-sheet px-4 py-5 sm:px-6">
      {isDanger && now.kind !== 'danger' && now.kind !== 'ended' && <FixedAnswers desk={desk} />}
      {now.kind === 'step' ? (
        <StepCard key={now.step.id} desk={desk} step={now.step} />
      ) : (
        <Plain desk={desk} />
      )}
    </div>
  )
}

function Plain({ desk }: Props) {
  const { now, isOpen } = desk.ticket
  return (
    <>
      {now.kind === 'end' && (
        <Said lead="Where the walk has come to" title={now.title}>
          {now.why}
        </Said>
      )}
      {now.kind === 'ended' && (
        <Said lead={`Ended ${now.why}`} title={now.title}>
          Nothing more is to do. If it comes back, a new ticket opens.
        </Said>
      )}
      {now.kind === 'words' && <Words words={now.words} />}
      {now.kind === 'danger' && <Danger desk={desk} />}
      {now.kind === 'silent' && (
        <Said lead="Silence" title="They have not answered, after two nudges">
          Silence is not working water. Ask once more in a few words, or book a visit.
        </Said>
      )}
      {isOpen && <Doing desk={desk} />}
    </>
  )
}

/** What a person may do where no step stands ready. */
function Doing({ desk }: Props) {
  const { holder, now } = desk.ticket
  if (holder.kind !== 'you') return <TakeIt desk={desk} />
  return (
    <>
      {now.kind === 'words' && <NameTrouble desk={desk} />}
      <div className="mt-4 flex flex-wrap items-center gap-2.5">
        <OwnWords desk={desk} kind="line" />
        <OtherSteps desk={desk} />
      </div>
    </>
  )
}

function Said({ lead, title, children }: { lead: string; title: string; children: ReactNode }) {
  return (
    <>
      <p className="text-faint">{lead}</p>
      <h2 className="font-title text-xl font-semibold">{title}</h2>
      <p className="mt-1 max-w-reading text-faint">{children}</p>
    </>
  )
}

function Words({ words }: { words: string | null }) {
  return (
    <>
      <p className="text-faint">Unread words</p>
      <h2 className="font-title text-xl font-semibold">What is this about?</h2>
      {words && <p className="mt-3 border-l-2 border-ink pl-3.5 font-mono">{words}</p>}
    </>
  )
}

function Danger({ desk }: Props) {
  const { fixed, trouble } = desk.ticket
  const hasGone = fixed.some(({ receipt }) => receipt !== 'broken')
  return (
    <>
      <Said
        lead={`Danger · ${trouble}`}
        title={
          hasGone
            ? 'The fixed answer went; a person does the rest'
            : 'The fixed answer did not reach them: find another way'
        }
      >
        No walk goes by itself here. See that they were reached, and that somebody who can help
        knows.
      </Said>
      <FixedAnswers desk={desk} />
    </>
  )
}

/** The fixed texts that went for this trouble, with how far each has come. */
function FixedAnswers({ desk }: Props) {
  const { fixed } = desk.ticket
  if (fixed.length === 0) {
    return <p className="my-3 font-semibold text-clay">No fixed answer could be sent.</p>
  }
  return (
    <ul aria-label="Fixed answers" className="my-3 space-y-1.5">
      {fixed.map(({ name, receipt, receiptWords }) => (
        <li key={`${name}${receiptWords}`} className="flex items-baseline gap-3">
          <Bead state={receipt} tone={receipt === 'broken' ? 'clay' : 'water'} />
          <span>
            {name} <span className="text-sm text-faint">{receiptWords}</span>
          </span>
        </li>
      ))}
    </ul>
  )
}
