import type { DraftNote } from '@/lib/domain/wording-checks'

/** What the checks say of the draft as it stands: what must be mended first, what is to be weighed. */
export function DraftChecks({ notes }: { notes: readonly DraftNote[] }) {
  const inOrder = [...notes].sort((one, other) => Number(other.blocks) - Number(one.blocks))
  return (
    <section aria-labelledby="checks">
      <h3 id="checks" className="font-semibold">
        Checks
      </h3>
      <div role="status">
        {inOrder.length === 0 && <p className="mt-1">The checks have nothing to say.</p>}
        <ul className="mt-1 space-y-1.5">
          {inOrder.map(({ kind, detail, blocks }) => (
            <li
              key={`${kind} ${detail}`}
              className={`border-l-4 py-0.5 pl-3 ${blocks ? 'border-clay' : 'border-double border-straw'}`}
            >
              <strong className={`font-semibold ${blocks ? 'text-clay' : ''}`}>
                {blocks ? 'Mend' : 'Weigh'}: {kind}.
              </strong>{' '}
              <span className="break-words">{detail}</span>
            </li>
          ))}
        </ul>
      </div>
    </section>
  )
}
