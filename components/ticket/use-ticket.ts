'use client'

import { keepPreviousData, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import type { TicketSheetView } from '@/lib/schemas/ticket'
import type { WorkedView } from '@/lib/schemas/ticket-work'
import { ApiError, getJson, sendJson } from '../api'

const refreshMilliseconds = 4_000

/** What a person does with a ticket: the last part of its address, and what goes with it. */
export type TicketAct = {
  name: string
  body?: Record<string, unknown>
  /** Said when it is done. */
  said: string
}

export type TicketDesk = {
  ticket: TicketSheetView
  busy: boolean
  /** Why the last act was refused, in plain words. */
  refused: string | null
  said: string | null
  act: (act: TicketAct) => void
  /** Shows another step than the one proposed; null goes back. */
  choose: (stepId: string | null) => void
  /** Reads the ticket again. */
  refresh: () => void
}

function useSheet(initial: TicketSheetView, step: string | null) {
  const { id } = initial
  const query = step === null ? '' : `?step=${encodeURIComponent(step)}`
  const { data } = useQuery({
    queryKey: ['ticket', id, step],
    queryFn: () => getJson<TicketSheetView>(`/api/tickets/${id}${query}`),
    initialData: step === null ? initial : undefined,
    placeholderData: keepPreviousData,
    refetchInterval: refreshMilliseconds,
  })
  return data ?? initial
}

/** A ticket that refreshes itself, and what can be done with it as it was last seen. */
export function useTicket(initial: TicketSheetView): TicketDesk {
  const queries = useQueryClient()
  const [step, setStep] = useState<string | null>(null)
  const ticket = useSheet(initial, step)
  const refresh = () => queries.invalidateQueries({ queryKey: ['ticket', ticket.id] })
  const { mutate, isPending, error, data, variables } = useMutation({
    mutationFn: ({ name, body }: TicketAct) =>
      sendJson<WorkedView>('post', `/api/tickets/${ticket.id}/${name}`, {
        version: ticket.version,
        ...body,
      }),
    onSuccess: () => setStep(null),
    onSettled: async () => {
      void queries.invalidateQueries({ queryKey: ['shift'] })
      await refresh()
    },
  })
  return {
    ticket,
    busy: isPending,
    refused: error && refusalOf(error),
    said: data && !error ? (variables?.said ?? null) : null,
    act: (act) => mutate(act),
    choose: setStep,
    refresh: () => void refresh(),
  }
}

function refusalOf(error: Error): string {
  const [first] = error instanceof ApiError ? error.problems : []
  return first?.message ?? error.message
}
