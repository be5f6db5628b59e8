'use client'

import { useMutation } from '@tanstack/react-query'
import { useState } from 'react'
import { replyKinds, replyKindWords } from '@/lib/domain/slip-words'
import { sendJson } from '../api'
import { Button } from '../ui/button'
import { FieldError, SelectField, TextField } from '../ui/field'

type ReadAsProps = { textId: string; under: string | null; onChanged: () => void }

/** What a reply was taken to mean, and setting that right. */
export function ReadAs({ textId, under, onChanged }: ReadAsProps) {
  const [isOpen, setOpen] = useState(false)
  return (
    <>
      {under ?? 'not read yet'}{' '}
      <button
        type="button"
        aria-expanded={isOpen}
        onClick={() => setOpen(!isOpen)}
        className="plain-link not-italic pointer-coarse:min-h-11"
      >
        Correct
      </button>
      {isOpen && (
        <ReadAsForm
          textId={textId}
          onDone={() => {
            setOpen(false)
            onChanged()
          }}
        />
      )}
    </>
  )
}

function ReadAsForm({ textId, onDone }: { textId: string; onDone: () => void }) {
  const [kind, setKind] = useState('')
  const { mutate, isPending, error } = useMutation({
    mutationFn: (body: unknown) => sendJson('post', `/api/texts/${textId}/read-as`, body),
    onSuccess: onDone,
  })
  return (
    <form
      className="mt-2 space-y-2 not-italic"
      onSubmit={(event) => {
        event.preventDefault()
        const minutes = new FormData(event.currentTarget).get('minutes')
        const isTimed = kind === 'flow-figure' && typeof minutes === 'string'
        mutate({ kind, ...(isTimed ? { minutes: Number(minutes.replace(',', '.')) } : {}) })
      }}
    >
      <SelectField
        label="It means"
        value={kind}
        onChange={({ currentTarget }) => setKind(currentTarget.value)}
      >
        <option value="" disabled>
          Choose
        </option>
        {replyKinds.map((one) => (
          <option key={one} value={one}>
            {replyKindWords[one]}
          </option>
        ))}
      </SelectField>
      {kind === 'flow-figure' && (
        <TextField label="Minutes a bottle" name="minutes" inputMode="decimal" mono />
      )}
      {kind === 'stop' && (
        <p className="text-sm">
          Their texts end with this: only the word START from the phone brings them back.
        </p>
      )}
      {error && <FieldError>{error.message}</FieldError>}
      <Button type="submit" size="small" busy={isPending}>
        Keep this reading
      </Button>
    </form>
  )
}
