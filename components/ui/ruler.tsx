type RulerProps = {
  /** Units used, as the encoding counts them. */
  units: number
  /** Units that one part holds: 160 or 153, 70 or 67. */
  perPart: number
  segments: number
  encoding: 'GSM-7' | 'UCS-2'
  /** The characters that turned the text from 160 to 70 a part. */
  offending?: readonly string[]
}

const ticksPerPart = 16
const mostNamed = 8

function Ticks({ segments }: { segments: number }) {
  // Long texts get fewer ticks a part, or they would run into a grey bar.
  const every = segments > 3 ? 4 : 1
  const steps = Array.from({ length: (segments * ticksPerPart) / every + 1 }, (_, i) => i * every)
  return steps.map((step) => {
    const x = `${(step / (segments * ticksPerPart)) * 100}%`
    const isPart = step % ticksPerPart === 0
    return (
      <line
        key={step}
        x1={x}
        x2={x}
        y1={isPart ? 2 : 8}
        y2="20"
        className={isPart ? 'stroke-faint' : 'stroke-rule'}
        strokeWidth={isPart ? 1.5 : 1}
      />
    )
  })
}

/** Under a composer: how far a text fills its parts, and which character halved the room. */
export function Ruler({ units, perPart, segments, encoding, offending = [] }: RulerProps) {
  const parts = Math.max(1, segments)
  const room = parts * perPart
  const filled = Math.min(100, (units / room) * 100)
  const words = `${units} of ${room} · ${parts === 1 ? '1 part' : `${parts} parts`}`
  // A text in another script is all of such letters: naming them would help nobody.
  const isFew = offending.length > 0 && offending.length <= mostNamed
  return (
    <div className="mt-3">
      <svg aria-hidden width="100%" height="21" className="block overflow-visible">
        <Ticks segments={parts} />
        <line x1="0" x2="100%" y1="20" y2="20" className="stroke-rule" />
        <rect y="15" width={`${filled}%`} height="5.5" className="fill-water" />
      </svg>
      <div className="mt-1 flex flex-wrap justify-between gap-x-6 text-xs text-faint">
        <span>
          {isFew && (
            <>
              <Offending characters={offending} /> leaves {perPart} letters a part, not{' '}
              {parts === 1 ? 160 : 153}.
            </>
          )}
          {!isFew && encoding === 'UCS-2' && `${perPart} letters a part in this script`}
        </span>
        <span className="ml-auto font-mono">{words}</span>
      </div>
    </div>
  )
}

function Offending({ characters }: { characters: readonly string[] }) {
  return characters.map((character) => (
    <mark
      key={character}
      className="mr-1 border-b-2 border-clay bg-transparent px-1 font-mono text-sm font-semibold text-clay"
    >
      {character}
    </mark>
  ))
}
