import type { Transaction } from '@/db/client'
import { insertAudit, listCoordinators } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'

/** Puts a letter to the coordinators on its way, with the address of the ticket and nothing of the household. */
export async function tellCoordinator(
  tx: Transaction,
  deps: Deps,
  { subject, ticketId }: { subject: string; ticketId: string },
): Promise<void> {
  await deps.queue.add(tx, 'tell-coordinator', {
    subject,
    body: `${subject}.\n\n${deps.publicBaseUrl}/tickets/${ticketId}\n`,
  })
  await insertAudit(tx, {
    staffId: null,
    act: 'coordinator told',
    subject: 'ticket',
    subjectId: ticketId,
    detail: { subject },
    at: deps.clock.now(),
  })
}

/** Sends the letter to every coordinator. */
export async function mailCoordinators(
  deps: Deps,
  { subject, body }: { subject: string; body: string },
): Promise<void> {
  const coordinators = await listCoordinators(deps.store.db)
  for (const { email, id } of coordinators) {
    const messageId = `<${deps.clock.now()}.${id}@rillpost.invalid>`
    await deps.mail.send({ to: email, subject: `Rillpost: ${subject}`, body, messageId })
  }
}
