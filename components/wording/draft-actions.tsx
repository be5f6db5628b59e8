import { Button } from '../ui/button'
import { Notice } from '../ui/notice'
import type { DraftDesk } from './use-draft'

type DraftActionsProps = { desk: DraftDesk; blocked: boolean }

/** Save, say yes, put away, with the one reason why not yet. */
export function DraftActions({ desk, blocked }: DraftActionsProps) {
  const { cell, busy, changed, send } = desk
  const hindrance = hindranceOf(desk, blocked)
  return (
    <div className="mt-6">
      <DraftNews desk={desk} />
      <div className="flex flex-wrap items-center gap-3">
        <Button kind={changed ? 'main' : 'line'} busy={busy} onClick={() => saveDraft(desk)}>
          Save draft
        </Button>
        <Button
          kind={changed ? 'line' : 'main'}
          busy={busy}
          disabled={hindrance !== null}
          aria-describedby={hindrance ? 'hindrance' : undefined}
          onClick={() => send({ way: 'approve', said: saidAfterYes })}
        >
          {yesWords(cell)}
        </Button>
        {cell.draft && (
          <Button
            kind="quiet"
            busy={busy}
            onClick={() =>
              send({ way: 'retire', said: () => 'The draft is put away. Nothing else changed.' })
            }
          >
            Put the draft away
          </Button>
        )}
      </div>
      {hindrance && (
        <p id="hindrance" className="mt-2 text-sm text-faint">
          {hindrance}
        </p>
      )}
    </div>
  )
}

export function saveDraft({ send, draft }: DraftDesk): void {
  if (draft.body.trim() === '') return
  send({
    way: 'save',
    said: ({ draft: kept }) => `Draft saved as edition ${kept?.edition ?? ''}.`,
  })
}

function yesWords({ safety, draft }: DraftDesk['cell']): string {
  if (!safety) return 'Approve'
  return draft?.state === 'approved' ? 'Give the second yes' : 'Give the first yes'
}

function saidAfterYes({ draft, inUse }: DraftDesk['cell']): string {
  return draft
    ? 'Your yes is noted. It waits for a second person.'
    : `Edition ${inUse?.edition ?? ''} is in use from now on.`
}

function hindranceOf(desk: DraftDesk, blocked: boolean): string | null {
  const { cell, changed } = desk
  if (changed) return 'Save the draft before it is approved.'
  if (!cell.draft) return 'There is no draft: change the words and save.'
  if (blocked) return 'The checks name what must be mended first.'
  if (cell.approvedByMe) return 'You gave the first yes. A second person must give theirs.'
  return null
}

function DraftNews({ desk }: { desk: DraftDesk }) {
  const { error, said, overtaken, takeTheirs } = desk
  return (
    <>
      {overtaken && (
        <Notice tone="due" title="Somebody else changed this draft." live className="mb-4">
          <p>Your words are still here, but they cannot be saved over theirs.</p>
          <Button size="small" onClick={takeTheirs} className="mt-2">
            Show theirs
          </Button>
        </Notice>
      )}
      {error && !overtaken && (
        <Notice tone="danger" title="Not done" live className="mb-4">
          {error.message}
        </Notice>
      )}
      {said && !error && (
        <Notice tone="good" live className="mb-4">
          {said}
        </Notice>
      )}
    </>
  )
}
