import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { TicketView } from '@/components/ticket/ticket-view'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { ticketSheet } from '@/lib/services/ticket-sheet'

export const metadata: Metadata = { title: 'Ticket' }

type PageProps = { params: Promise<{ id: string }> }

export default async function TicketPage({ params }: PageProps) {
  const actor = await deskActor('work tickets')
  const { id } = await params
  const ticket = await ticketSheet(await getDeps(), actor, { ticketId: id })
  if ('ok' in ticket) notFound()
  return <TicketView key={ticket.id} initial={ticket} />
}
