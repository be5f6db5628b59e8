import { Button } from '../ui/button'
import type { TicketDesk } from './use-ticket'

/** Taking a ticket is what lets a person work on it; from then on no step goes by itself. */
export function TakeIt({ desk }: { desk: TicketDesk }) {
  const { holder } = desk.ticket
  if (holder.kind === 'another') {
    return (
      <div className="mt-4 flex flex-wrap items-center gap-4">
        <p>{holder.words}.</p>
        <Button
          size="small"
          busy={desk.busy}
          onClick={() =>
            desk.act({
              name: 'hand-on',
              body: { staffId: desk.ticket.holder.me },
              said: 'It is yours now.',
            })
          }
        >
          Take it over
        </Button>
      </div>
    )
  }
  return (
    <div className="mt-4 flex flex-wrap items-center gap-4">
      <Button
        kind="main"
        busy={desk.busy}
        onClick={() => desk.act({ name: 'take', said: 'It is yours. No step goes by itself now.' })}
      >
        Take it
      </Button>
      {holder.words === 'Walking by itself' && (
        <p className="text-sm text-faint">Until then the steps go out by themselves.</p>
      )}
    </div>
  )
}
