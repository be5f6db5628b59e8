import type { WordingCell, WordingEdition } from '@/lib/schemas/wording'
import { PartBoxes } from '../ui/part-boxes'
import { RowTh, Table, Td, Th } from '../ui/table'

/** Every edition there has been, newest first. */
export function Editions({ cell }: { cell: WordingCell }) {
  if (cell.editions.length === 0) return null
  return (
    <section aria-labelledby="editions" className="mt-12">
      <h2 id="editions" className="mb-2 font-title text-lg font-semibold">
        Editions
      </h2>
      <Table caption="Editions, newest first" hideCaption>
        <thead>
          <tr>
            <Th>Edition</Th>
            <Th>Words</Th>
            <Th>State</Th>
            <Th>Written</Th>
            <Th>Approved</Th>
          </tr>
        </thead>
        <tbody>
          {cell.editions.map((edition) => (
            <EditionRow key={edition.edition} edition={edition} cell={cell} />
          ))}
        </tbody>
      </Table>
    </section>
  )
}

function EditionRow({ edition, cell }: { edition: WordingEdition; cell: WordingCell }) {
  const { writtenBy, writtenOn, approvedBy, secondApprovedBy, inUseFrom, note } = edition
  return (
    <tr>
      <RowTh className="whitespace-nowrap">
        <PartBoxes parts={edition.parts} />
        {edition.edition}
      </RowTh>
      <Td className="min-w-64">
        <span lang={cell.language} className="font-mono text-xs whitespace-pre-line">
          {edition.body}
        </span>
        {note && <span className="block text-faint italic">{note}</span>}
      </Td>
      <Td className="whitespace-nowrap">
        {stateWords(edition)}
        {inUseFrom && <span className="block text-faint">from {inUseFrom}</span>}
      </Td>
      <Td className="min-w-32">
        {writtenBy ?? 'came with the desk'}
        <span className="block whitespace-nowrap text-faint">{writtenOn}</span>
      </Td>
      <Td className="min-w-32">
        {[approvedBy, secondApprovedBy].filter(Boolean).join(' and ') || unapprovedWords(edition)}
      </Td>
    </tr>
  )
}

/** The editions that a desk starts with stand without anybody's yes. */
function unapprovedWords({ state, inUseFrom }: WordingEdition): string {
  if (state === 'draft') return 'nobody yet'
  return inUseFrom === null ? 'nobody' : 'came with the desk'
}

function stateWords({ state, inUseFrom }: WordingEdition): string {
  if (state === 'approved') return 'waits for a second yes'
  if (state === 'retired' && inUseFrom === null) return 'put away unused'
  return state
}
