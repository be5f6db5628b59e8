import { Button } from '../ui/button'
import type { TicketDesk } from './use-ticket'

const sentence = (words: string) => `${words[0]?.toUpperCase() ?? ''}${words.slice(1)}`

/** Says what the words are about: it can only make the trouble weigh more. */
export function NameTrouble({ desk }: { desk: TicketDesk }) {
  return (
    <div className="mt-4">
      <p className="text-faint">They mean:</p>
      <div className="mt-1.5 flex flex-wrap gap-2">
        {desk.ticket.mayBe.map(({ trouble, words }) => (
          <Button
            key={trouble}
            size="small"
            busy={desk.busy}
            onClick={() =>
              desk.act({ name: 'name-trouble', body: { trouble }, said: `Now: ${words}.` })
            }
          >
            {sentence(words)}
          </Button>
        ))}
      </div>
    </div>
  )
}
