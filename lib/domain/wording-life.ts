/** Where an edition of a wording stands. At one place one may be open (draft or approved), one in use. */
export type WordingState = 'draft' | 'approved' | 'in use' | 'retired'

export type ApprovalRefusal =
  | 'There is no draft to approve.'
  | 'The draft was changed while you were reading it. Read it again.'
  | 'You have given your yes. A second person must give theirs.'
  | 'The checks refuse this draft. Mend what they name.'

export type Approval =
  { ok: true; next: 'in use' | 'waits for a second yes' } | { ok: false; reason: ApprovalRefusal }

type OpenDraft = { state: WordingState; approvedBy: string | null; writtenAt: number }

/**
 * What a person's yes does to a draft. `readAt` is the version that this person saw. A safety wording
 * takes two people: the same one twice is not two. A draft that the checks block gets no yes at all.
 */
export function approval({
  open,
  safety,
  staffId,
  readAt,
  blocked,
}: {
  open: OpenDraft | null
  safety: boolean
  staffId: string
  readAt: number
  blocked: boolean
}): Approval {
  if (!open) return { ok: false, reason: 'There is no draft to approve.' }
  if (open.writtenAt !== readAt) {
    return { ok: false, reason: 'The draft was changed while you were reading it. Read it again.' }
  }
  if (blocked) return { ok: false, reason: 'The checks refuse this draft. Mend what they name.' }
  if (!safety) return { ok: true, next: 'in use' }
  if (open.state === 'draft') return { ok: true, next: 'waits for a second yes' }
  return open.approvedBy === staffId
    ? { ok: false, reason: 'You have given your yes. A second person must give theirs.' }
    : { ok: true, next: 'in use' }
}

/** Whether an edition follows an older edition of the first language than is in use there. */
export function lags({
  followsEdition,
  firstEditionInUse,
}: {
  followsEdition: number
  firstEditionInUse: number | null
}): boolean {
  return firstEditionInUse !== null && followsEdition < firstEditionInUse
}
