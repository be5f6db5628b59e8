import Link from 'next/link'
import { languageNamesInEnglish } from '@/lib/domain/language'
import { askedWords } from '@/lib/domain/reply-meaning-words'
import type { Proposal, ProposalPage } from '@/lib/schemas/reply-words'
import { Band, LineRow } from '../frame/line-row'
import { ButtonLink } from '../ui/button'

type ProposalsProps = {
  page: ProposalPage
  /** The address of the page that holds them, with its language. */
  at: string
  /** Newer ones are on the page before. */
  isLater: boolean
}

/** Texts that a person read otherwise than the desk: what the word lists may lack. */
export function Proposals({ page, at, isLater }: ProposalsProps) {
  const { rows, before } = page
  return (
    <Band name="Proposals" note="texts that a person read otherwise than the desk" id="proposals">
      {rows.length === 0 && (
        <p className="mt-1 pl-lead text-faint">
          None is open. When an agent corrects what a reply was taken to mean, it stands here.
        </p>
      )}
      <ul>
        {rows.map((row, index) => (
          <li key={row.readingN}>
            <ProposalLine proposal={row} ruled={index > 0} />
          </li>
        ))}
      </ul>
      {(isLater || before !== null) && (
        <nav aria-label="Pages of the proposals" className="mt-3 flex gap-4 pl-lead">
          {isLater && (
            <ButtonLink href={`${at}#proposals`} size="small">
              Newest
            </ButtonLink>
          )}
          {before !== null && (
            <ButtonLink href={`${at}&before=${before}#proposals`} size="small">
              Older
            </ButtonLink>
          )}
        </nav>
      )}
    </Band>
  )
}

function ProposalLine({ proposal, ruled }: { proposal: Proposal; ruled: boolean }) {
  const { textId, body, language, asked, day, year, settledByNow } = proposal
  return (
    <LineRow time={day} since={year} bead={settledByNow ? 'half' : 'ring'} ruled={ruled}>
      <p lang={language} className="font-mono">
        <Link href={`/reply-words/proposals/${textId}`} className="plain-link decoration-rule">
          “{body}”
        </Link>
      </p>
      <BothReadings proposal={proposal} />
      <p className="text-sm text-faint">
        {languageNamesInEnglish[language]} · asked: {askedWords[asked]}
        {settledByNow && ' · by now the desk reads it so too'}
      </p>
    </LineRow>
  )
}

/** What the desk took it for, and what a person did. */
export function BothReadings({ proposal }: { proposal: Proposal }) {
  const { desk, person } = proposal
  return (
    <p>
      The desk: {desk.meaning}, <span className="text-faint">{desk.sure}</span>. {person.by}:{' '}
      <strong className="font-semibold">{person.meaning}</strong>.
    </p>
  )
}
