import Link from 'next/link'
import type { PhoneView } from '@/lib/schemas/household'
import { MarginBlock } from '../ui/margin-block'

function History({ history }: Pick<PhoneView, 'history'>) {
  if (history.length === 0) return <p className="text-faint">Nobody has said yes to texts.</p>
  return (
    <ol className="mt-1 grid gap-1.5">
      {history.map(({ n, when, words }) => (
        <li key={n}>
          <span className="text-faint">{when}</span>
          <br />
          {words}
        </li>
      ))}
    </ol>
  )
}

/** How to reach a household by one phone, and what was said to texts on it. */
export function PhoneBlock({ phone }: { phone: PhoneView }) {
  return (
    <MarginBlock title={phone.first ? 'How to reach them' : 'Another phone'}>
      <p className="font-mono text-base">{phone.number}</p>
      {phone.answeredBy && <p>Answered by {phone.answeredBy}.</p>}
      {phone.silentBecause && (
        <p className="font-semibold text-clay">Not texted: {phone.silentBecause}.</p>
      )}
      {phone.sharedWith.length > 0 && (
        <p>
          Shared with{' '}
          {phone.sharedWith.map(({ id, name }, index) => (
            <span key={id}>
              {index > 0 && ', '}
              <Link href={`/households/${id}`} className="plain-link">
                {name}
              </Link>
            </span>
          ))}
          .
        </p>
      )}
      <History history={phone.history} />
    </MarginBlock>
  )
}
