'use client'

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useCallback, useRef, useState } from 'react'
import type { Shift } from '@/lib/schemas/shift'
import type { WorkedView } from '@/lib/schemas/ticket-work'
import { getJson, sendJson } from '../api'
import { LineSheet } from '../frame/sheets'
import { Button } from '../ui/button'
import { Keys } from '../ui/kbd'
import { ShiftList } from './shift-list'
import { ShiftMargin } from './shift-margin'
import { useKeysChoice } from './use-keys-choice'
import { useShiftKeys } from './use-shift-keys'

const refreshMilliseconds = 4_000

function useTakeNext() {
  const router = useRouter()
  const queries = useQueryClient()
  const { mutate, isPending, error } = useMutation({
    mutationFn: () => sendJson<WorkedView>('post', '/api/shift/take-next'),
    onSuccess: ({ ticketId }) => router.push(`/tickets/${ticketId}`),
    onSettled: () => queries.invalidateQueries({ queryKey: ['shift'] }),
  })
  const takeNext = useCallback(() => {
    if (!isPending) mutate()
  }, [isPending, mutate])
  return { takeNext, busy: isPending, error }
}

/** The shift: open tickets in bands by the harm they do. It refreshes itself. */
export function ShiftView({ initial }: { initial: Shift }) {
  const { data: shift } = useQuery({
    queryKey: ['shift'],
    queryFn: () => getJson<Shift>('/api/shift'),
    initialData: initial,
    refetchInterval: refreshMilliseconds,
  })
  const [sought, setSought] = useState('')
  const rows = useRef<HTMLDivElement>(null)
  const find = useRef<HTMLInputElement>(null)
  const { takeNext, busy, error } = useTakeNext()
  const { keysOn, toggle } = useKeysChoice()
  useShiftKeys({ rows, find, takeNext, enabled: keysOn })
  return (
    <LineSheet
      title={shift.title}
      margin={
        <ShiftMargin
          shift={shift}
          busy={busy}
          error={error}
          onTakeNext={takeNext}
          findRef={find}
          onFind={setSought}
        />
      }
    >
      <div ref={rows}>
        <ShiftList shift={shift} sought={sought} />
      </div>
      <ShiftFoot keysOn={keysOn} onToggle={toggle} />
    </LineSheet>
  )
}

function ShiftFoot({ keysOn, onToggle }: { keysOn: boolean; onToggle: () => void }) {
  return (
    <div className="pointer-coarse:hidden">
      {keysOn && (
        <Keys
          keys={[
            { press: ['j', 'k'], does: 'down, up' },
            { press: ['enter'], does: 'open' },
            { press: ['t'], does: 'take the next' },
            { press: ['/'], does: 'find' },
          ]}
        />
      )}
      <p className="mt-1 pl-lead text-sm">
        <Button kind="quiet" size="small" onClick={onToggle}>
          {keysOn ? 'Turn the keys off' : 'Turn the keys on'}
        </Button>
      </p>
    </div>
  )
}
