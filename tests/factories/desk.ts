import { desc } from 'drizzle-orm'
import { tickets } from '@/db/schema/ticket'
import type { Actor } from '@/lib/domain/role'
import type { TicketSheetView } from '@/lib/schemas/ticket'
import { sendDueTexts } from '@/lib/services/send-text'
import { ticketSheet } from '@/lib/services/ticket-sheet'
import type { TicketRef, Worked } from '@/lib/services/ticket-work'
import type { TestDeps } from './deps'
import { say } from './world'

/** The newest ticket, as its row stands. */
export async function lastTicket(deps: TestDeps) {
  const [row] = await deps.store.db.select().from(tickets).orderBy(desc(tickets.openedAt)).limit(1)
  if (!row) throw new Error('There is no ticket.')
  return row
}

/** The newest ticket as its sheet shows it. */
export async function sheetOf(
  deps: TestDeps,
  actor: Actor,
  step?: string,
): Promise<TicketSheetView> {
  const { id } = await lastTicket(deps)
  const sheet = await ticketSheet(deps, actor, { ticketId: id, ...(step ? { step } : {}) })
  if ('ok' in sheet) throw new Error(sheet.reason)
  return sheet
}

/** Works on the newest ticket as it stands, and throws where that is refused. */
export async function work(deps: TestDeps, act: (ref: TicketRef) => Promise<Worked>) {
  const { id, version } = await lastTicket(deps)
  const done = await act({ ticketId: id, version })
  if (!done.ok) throw new Error(done.reason)
}

/** The household reads what was sent and answers. */
export async function answer(deps: TestDeps, number: string, words: string): Promise<void> {
  await sendDueTexts(deps)
  await say(deps, number, words)
}
