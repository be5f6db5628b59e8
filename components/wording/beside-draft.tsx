import { languageNamesInEnglish, languages } from '@/lib/domain/language'
import { costOf } from '@/lib/domain/wording'
import type { WordingCell, WordingEdition } from '@/lib/schemas/wording'
import { MarginBlock } from '../ui/margin-block'
import { PartBoxes } from '../ui/part-boxes'
import { WordingSlip } from './wording-slip'

const firstLanguage = languages[0] ?? 'en'

type BesideDraftProps = { cell: WordingCell; draftParts: number }

/** Beside the draft: what is in use, what the first language says, what the change costs. */
export function BesideDraft({ cell, draftParts }: BesideDraftProps) {
  const { inUse, first, language } = cell
  return (
    <>
      <MarginBlock title={inUse ? `In use: edition ${inUse.edition}` : 'In use: none'}>
        {inUse ? (
          <>
            <WordingSlip language={language}>{inUse.body}</WordingSlip>
            <EditionLine edition={inUse} />
          </>
        ) : (
          <p>
            Households that read {cell.languageNameInEnglish} get the{' '}
            {languageNamesInEnglish[firstLanguage]} words.
          </p>
        )}
        {cell.lags && inUse && first && (
          <p className="mt-1 font-semibold text-clay">
            Lags: it follows edition {inUse.followsEdition} of the{' '}
            {languageNamesInEnglish[firstLanguage]}, and edition {first.edition} is in use.
          </p>
        )}
      </MarginBlock>
      {first && (
        <MarginBlock
          title={`${languageNamesInEnglish[firstLanguage]} in use: edition ${first.edition}`}
        >
          <WordingSlip language={firstLanguage} faint>
            {first.body}
          </WordingSlip>
        </MarginBlock>
      )}
      <MonthCost cell={cell} draftParts={draftParts} />
    </>
  )
}

function EditionLine({ edition }: { edition: WordingEdition }) {
  const { parts, inUseFrom, note } = edition
  return (
    <p className="mt-1.5 text-faint">
      <PartBoxes parts={parts} />
      {inUseFrom && `since ${inUseFrom}`}
      {note && <span className="block italic">{note}</span>}
    </p>
  )
}

function MonthCost({ cell, draftParts }: BesideDraftProps) {
  const { month, pricePerSegment, currency, inUse } = cell
  const cost = (parts: number) =>
    `${costOf({ segments: parts * month.texts, pricePerSegment }).toFixed(2)} ${currency}`
  return (
    <MarginBlock title="Cost a month">
      <p>
        {month.texts === 1 ? '1 text' : `${month.texts} texts`} of this moment went out in this
        language in the last 30 days. A part costs {pricePerSegment} {currency}.
      </p>
      <dl className="mt-2 grid grid-cols-[1fr_auto_auto] gap-x-4 gap-y-1">
        {inUse && <CostRow name="in use" parts={inUse.parts} cost={cost(inUse.parts)} />}
        <CostRow name="as written here" parts={draftParts} cost={cost(draftParts)} />
      </dl>
    </MarginBlock>
  )
}

function CostRow({ name, parts, cost }: { name: string; parts: number; cost: string }) {
  return (
    <div className="contents">
      <dt>{name}</dt>
      <dd className="text-right font-mono">{parts === 1 ? '1 part' : `${parts} parts`}</dd>
      <dd className="text-right font-mono">{cost}</dd>
    </div>
  )
}
