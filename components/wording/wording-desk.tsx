'use client'

import { useEffect } from 'react'
import { checkDraft } from '@/lib/domain/wording-checks'
import { partsOf } from '@/lib/domain/wording-examples'
import type { WordingCell } from '@/lib/schemas/wording'
import { Keys } from '../ui/kbd'
import { BesideDraft } from './beside-draft'
import { DraftActions, saveDraft } from './draft-actions'
import { DraftChecks } from './draft-checks'
import { DraftEditor, DraftNoteField } from './draft-editor'
import { DraftPreview } from './draft-preview'
import { Editions } from './editions'
import { useDebounced } from './use-debounced'
import { useDraft, type DraftDesk } from './use-draft'

const settledAfterMilliseconds = 200

/** One moment in one language: the draft with its ruler and checks, what is in use beside it. */
export function WordingDesk({ initial }: { initial: WordingCell }) {
  const desk = useDraft(initial)
  const { cell, draft } = desk
  const body = useDebounced(draft.body, settledAfterMilliseconds)
  const notes = checkDraft({ moment: cell.moment, language: cell.language, body })
  useSaveKey(desk)
  return (
    <>
      <div className="grid grid-cols-1 gap-x-12 gap-y-10 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <section aria-labelledby="draft">
          <h2 id="draft" className="mb-3 font-title text-lg font-semibold">
            {draftTitle(cell)}
          </h2>
          <DraftEditor desk={desk} />
          <DraftPreview cell={cell} body={body} />
          <div className="mt-6">
            <DraftChecks notes={notes} />
          </div>
          <DraftNoteField desk={desk} />
          <DraftActions desk={desk} blocked={notes.some(({ blocks }) => blocks)} />
        </section>
        <aside aria-label="Beside the draft" className="text-sm">
          <BesideDraft cell={cell} draftParts={partsOf(body, cell.language)} />
        </aside>
      </div>
      <Editions cell={cell} />
      <div className="-ml-lead">
        <Keys keys={[{ press: ['ctrl', 's'], does: 'save the draft' }]} />
      </div>
    </>
  )
}

function draftTitle({ draft, editions }: WordingCell): string {
  if (!draft) return `To be edition ${(editions[0]?.edition ?? 0) + 1}`
  const by = draft.writtenBy ? ` by ${draft.writtenBy}` : ''
  return `Draft of edition ${draft.edition}${by}`
}

function useSaveKey(desk: DraftDesk) {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.key !== 's' || !(event.ctrlKey || event.metaKey) || event.altKey) return
      event.preventDefault()
      if (!desk.busy) saveDraft(desk)
    }
    window.addEventListener('keydown', onKey)
    return () => window.removeEventListener('keydown', onKey)
  }, [desk])
}
