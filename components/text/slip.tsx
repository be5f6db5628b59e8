import type { ReactNode } from 'react'
import { Bead, type BeadState } from '../ui/bead'

type SlipProps = {
  /** Left of the line what the household wrote, right of it what went out. */
  direction: 'in' | 'out'
  body: string
  /** The language of the body, when known: sets `lang`, and with it hyphens and line height. */
  language?: string | undefined
  /** When: ISO for the machine, and as printed. */
  at: string
  time: string
  /** ring = planned, half = on its way, full = there, broken = failed. */
  receipt: BeadState
  /** The receipt in words: `arrived`, `on its way`, `failed: number not in use`. */
  receiptWords: string
  /** A lighter line: the staff's language of the same wording, or what it was read as. */
  under?: ReactNode
}

/** One text on the fall line: a flat ruled slip, its bead on the line, its time across the line. */
export function Slip(props: SlipProps) {
  const { direction, body, language, under } = props
  const isIn = direction === 'in'
  return (
    <li className="relative my-3 grid grid-cols-[1fr_2rem_1fr] items-start md:grid-cols-[1fr_5.5rem_1fr]">
      <SlipMark {...props} />
      <div
        className={`min-w-0 border border-rule bg-sheet px-3 py-2 max-md:col-span-3 max-md:row-start-2 max-md:mt-1.5 max-md:w-[88%] md:row-start-1 ${
          isIn
            ? 'border-r-[3px] border-r-ink md:col-start-1'
            : 'border-l-[3px] border-l-water max-md:justify-self-end md:col-start-3'
        }`}
      >
        <span className="sr-only">{isIn ? 'They wrote: ' : 'We wrote: '}</span>
        <p
          lang={language}
          className="ruled font-mono text-[0.9375rem] leading-6! whitespace-pre-line"
        >
          {body}
        </p>
        {under && <div className="mt-1 text-sm text-faint italic">{under}</div>}
      </div>
    </li>
  )
}

function SlipMark({ direction, at, time, receipt, receiptWords }: SlipProps) {
  const across = direction === 'in' ? 'col-start-3' : 'col-start-1 text-right'
  return (
    <>
      <Bead
        state={receipt}
        tone={receipt === 'broken' ? 'clay' : 'water'}
        className="relative col-start-2 row-start-1 justify-self-center max-md:mt-0.5 md:mt-3"
      />
      <p className={`row-start-1 font-mono text-xs text-faint md:pt-3 ${across}`}>
        <time dateTime={at}>{time}</time>
        <span
          className={`block font-sans ${receipt === 'broken' ? 'text-clay' : ''} ${
            receipt === 'full' ? 'sr-only' : ''
          }`}
        >
          {receiptWords}
        </span>
      </p>
    </>
  )
}
