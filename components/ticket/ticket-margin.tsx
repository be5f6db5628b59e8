import { Button } from '../ui/button'
import { MarginBlock } from '../ui/margin-block'
import { EndIt } from './end-it'
import { NameTrouble } from './name-trouble'
import { NoteVisit } from './note-visit'
import type { TicketDesk } from './use-ticket'

type Props = { desk: TicketDesk }

function Lines({ lines }: { lines: readonly string[] }) {
  return lines.map((line) => <p key={line}>{line}</p>)
}

/** What is known beside the step: the house, cautions, what is owed, what comes after, how it came here. */
export function TicketMargin({ desk }: Props) {
  const { people, careful, ifThisFails, isOpen, history, now, mayBe } = desk.ticket
  return (
    <>
      <MarginBlock title="In the house">
        <Lines lines={people} />
      </MarginBlock>
      {careful.length > 0 && (
        <MarginBlock title="Careful">
          <Lines lines={careful} />
        </MarginBlock>
      )}
      <Owed desk={desk} />
      {ifThisFails && <MarginBlock title="If this fails">{ifThisFails}</MarginBlock>}
      {isOpen && <EndIt desk={desk} />}
      {isOpen && mayBe.length > 0 && now.kind !== 'words' && (
        <details className="mt-4.5 border-t border-rule pt-3">
          <summary className="min-h-11 py-2 font-semibold">Something worse was said</summary>
          <NameTrouble desk={desk} />
        </details>
      )}
      <MarginBlock title="What happened">
        <ol className="space-y-2">
          {history.map(({ n, when, words }) => (
            <li key={n}>
              {words}
              <span className="block text-xs text-faint">{when}</span>
            </li>
          ))}
        </ol>
      </MarginBlock>
    </>
  )
}

function Owed({ desk }: Props) {
  const { owed, isOpen } = desk.ticket
  return (
    <MarginBlock title="Owed">
      <p>{owed.promise ?? 'No part is promised.'}</p>
      {owed.promise && isOpen && (
        <Button
          size="small"
          className="my-1.5"
          busy={desk.busy}
          onClick={() =>
            desk.act({
              name: 'hand-over',
              said: 'Handed over: its cycle starts anew, and they are asked how the water runs.',
            })
          }
        >
          Hand over
        </Button>
      )}
      {owed.visit && <p className="mt-1.5">{owed.visit}</p>}
      {owed.visit && isOpen && <NoteVisit desk={desk} />}
      <p className="mt-1.5 text-faint">{owed.depot}</p>
    </MarginBlock>
  )
}
