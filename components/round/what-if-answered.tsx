import type { WhatIfAnswer, WhatIfFigures } from '@/lib/schemas/what-if'
import { RowTh, Table, Td, Th } from '../ui/table'
import { WhatIfWeeks } from './what-if-weeks'

/** Both sets of cycles side by side, their difference, what was taken for granted, and week by week. */
export function WhatIfAnswered({ answer }: { answer: WhatIfAnswer }) {
  const { weeks, from, until, changed, cut, kits } = answer
  return (
    <div className="mt-8">
      <h3 className="font-title text-base font-semibold">
        {weeks} weeks, {from} to {until}
      </h3>
      <p className="mt-1 max-w-reading text-sm">
        {changed.length === 0
          ? 'No cycle is other than it stands: both columns are today’s.'
          : `${changed.join('. ')}.`}
      </p>
      {cut && (
        <p className="mt-2 font-semibold">
          There are more kits than this counts: it stops at the first {kits.toLocaleString('en')}.
        </p>
      )}
      <div className="mt-4 max-w-3xl">
        <Comparison answer={answer} />
      </div>
      <Assumptions answer={answer} />
      <WhatIfWeeks answer={answer} />
    </div>
  )
}

function Comparison({ answer: { today, other, currency } }: { answer: WhatIfAnswer }) {
  const change = (stage: number) => (figures: WhatIfFigures) => figures.changes[stage] ?? 0
  const rows: readonly [string, (figures: WhatIfFigures) => number][] = [
    ['Texts', ({ texts }) => texts],
    ['Washes', ({ washes }) => washes],
    ['Changes of cloth', change(0)],
    ['Changes of carbon', change(1)],
    ['Changes of fibre', change(2)],
    ['Flow checks', ({ flowChecks }) => flowChecks],
  ]
  return (
    <Table caption="Today’s cycles and these cycles" hideCaption>
      <thead>
        <tr>
          <Th>In all these weeks</Th>
          <Th className="text-right">Today’s cycles</Th>
          <Th className="text-right">These cycles</Th>
          <Th className="text-right">Difference</Th>
        </tr>
      </thead>
      <tbody>
        {rows.map(([name, of]) => (
          <Row key={name} name={name} today={of(today)} other={of(other)} />
        ))}
        <Row
          name={`Cost of texts, ${currency}`}
          today={today.cost}
          other={other.cost}
          decimals={2}
        />
        <BusiestRow today={today} other={other} />
      </tbody>
    </Table>
  )
}

type RowProps = { name: string; today: number; other: number; decimals?: number }

function Row({ name, today, other, decimals = 0 }: RowProps) {
  const words = (value: number) =>
    value.toLocaleString('en', { minimumFractionDigits: decimals, maximumFractionDigits: decimals })
  const more = other - today
  const isSame = words(Math.abs(more)) === words(0)
  return (
    <tr>
      <RowTh className="font-normal">{name}</RowTh>
      <Td number>{words(today)}</Td>
      <Td number className="font-medium">
        {words(other)}
      </Td>
      <Td number className={isSame ? 'text-faint' : ''}>
        {isSame ? 'same' : signed(more, words)}
        {!isSame && today > 0 && (
          <span className="block text-faint">
            {signed((more / today) * 100, (value) => value.toFixed(0))} %
          </span>
        )}
      </Td>
    </tr>
  )
}

function signed(value: number, words: (value: number) => string): string {
  return `${value < 0 ? '−' : '+'}${words(Math.abs(value))}`
}

function BusiestRow({ today, other }: Pick<WhatIfAnswer, 'today' | 'other'>) {
  const cell = ({ busiest }: WhatIfFigures) =>
    busiest && (
      <>
        <span className="font-mono">{busiest.texts.toLocaleString('en')}</span>
        <span className="block text-faint">{busiest.day}</span>
      </>
    )
  const more = (other.busiest?.texts ?? 0) - (today.busiest?.texts ?? 0)
  return (
    <tr>
      <RowTh className="font-normal">Texts on the busiest day</RowTh>
      <Td className="text-right">{cell(today) ?? '–'}</Td>
      <Td className="text-right">{cell(other) ?? '–'}</Td>
      <Td number className={more === 0 ? 'text-faint' : ''}>
        {more === 0 ? 'same' : signed(more, (value) => value.toLocaleString('en'))}
      </Td>
    </tr>
  )
}

/** How the busiest day stands to what the sender carries. */
function carriedWords({ carriesADay, today, other }: WhatIfAnswer): string {
  if (carriesADay === 0) return ''
  const share = ({ busiest }: WhatIfFigures) => {
    const percent = ((busiest?.texts ?? 0) / carriesADay) * 100
    return percent > 0 && percent < 1 ? 'under 1 %' : `${Math.round(percent)} %`
  }
  const carried = `The sender can carry ${carriesADay.toLocaleString('en')} texts a day: the busiest day takes`
  return share(today) === share(other)
    ? `${carried} ${share(other)} of that either way.`
    : `${carried} ${share(today)} of that today, ${share(other)} with these cycles.`
}

function Assumptions({ answer }: { answer: WhatIfAnswer }) {
  const { kits, unreached, pricePerSegment, currency, segmentsOfText } = answer
  const mean = (segments: number) => Number(segments.toFixed(1))
  return (
    <div className="mt-3 grid max-w-reading gap-2 text-sm text-faint">
      <p>{carriedWords(answer)}</p>
      <p>
        A change takes one part. Taken for granted: all is done on the day it is due; what is
        overdue falls on the first day; no nudges, no answers, no new hand-outs, no trouble. Days
        off and the weekly limit move a text, they do not save it. {kits.toLocaleString('en')}{' '}
        {kits === 1 ? 'kit is' : 'kits are'} in use
        {unreached > 0
          ? `; ${unreached.toLocaleString('en')} of them no text reaches, so they count for washes and parts only`
          : ''}
        .
      </p>
      <p>
        Cost: {pricePerSegment} {currency} for each part of a text. By the wordings in use, with
        example names, and who reads which, a wash takes {mean(segmentsOfText.wash)} parts on the
        average, a change {mean(segmentsOfText.change)}, a flow check{' '}
        {mean(segmentsOfText.flowCheck)}.
      </p>
    </div>
  )
}
