'use client'

import { useEffect, useRef } from 'react'
import { ApiError } from '../api'
import { AreaField, TextField } from '../ui/field'
import type { DraftDesk } from './use-draft'

/** Where the draft is written: its words, and the values it may speak of. */
export function DraftEditor({ desk }: { desk: DraftDesk }) {
  const { cell, draft, setBody, error } = desk
  const area = useRef<HTMLTextAreaElement>(null)
  useEffect(() => {
    // What was typed while the page was still waking stands in the field, but nowhere else.
    const typed = area.current?.value
    if (typed !== undefined) setBody(typed)
    // Once, when the page has woken.
    // oxlint-disable-next-line react-hooks/exhaustive-deps
  }, [])
  const insert = (name: string) => {
    const at = area.current
    if (!at) return
    // Through the field itself, so that undo takes it back and the caret ends behind it.
    at.setRangeText(`{${name}}`, at.selectionStart, at.selectionEnd, 'end')
    setBody(at.value)
    at.focus()
  }
  return (
    <>
      <AreaField
        ref={area}
        label="What the text says"
        mono
        rows={6}
        lang={cell.language}
        value={draft.body}
        onChange={(event) => setBody(event.target.value)}
        error={fieldError(error, 'body')}
      />
      <div className="mt-2 flex flex-wrap items-baseline gap-x-2 gap-y-1 text-sm">
        <span className="text-faint">Put in:</span>
        {cell.values.map((name) => (
          <button
            key={name}
            type="button"
            onClick={() => insert(name)}
            className="rounded-paper border border-rule bg-sheet px-2 py-1 font-mono text-xs hover:border-ink pointer-coarse:min-h-11"
          >
            {`{${name}}`}
          </button>
        ))}
      </div>
    </>
  )
}

/** A word for whoever reads the draft next. */
export function DraftNoteField({ desk }: { desk: DraftDesk }) {
  const { draft, setNote, error } = desk
  return (
    <div className="mt-6">
      <TextField
        label="Note"
        hint="For whoever reads the draft next. It is not sent."
        optional
        value={draft.note}
        onChange={(event) => setNote(event.target.value)}
        error={fieldError(error, 'note')}
      />
    </div>
  )
}

function fieldError(error: unknown, name: string): string | undefined {
  return error instanceof ApiError ? error.field(name) : undefined
}
