'use client'

import { useMutation } from '@tanstack/react-query'
import { useEffect, useRef, type SubmitEvent } from 'react'
import type { ApiError } from '../api'

type Entry<T> = {
  /** Sends what was written; throws `ApiError`. */
  send: (form: FormData) => Promise<T>
  onKept: (kept: T) => void
}

/** A form that is kept through the API: what is wrong comes back by field, and the first such field gets the focus. */
export function useEntry<T>({ send, onKept }: Entry<T>) {
  const sent = useRef<HTMLFormElement>(null)
  const { mutate, error, isPending } = useMutation<T, ApiError, FormData>({
    mutationFn: send,
    onSuccess: onKept,
  })
  useEffect(() => {
    if (error) sent.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus()
  }, [error])
  return {
    onSubmit: (event: SubmitEvent<HTMLFormElement>) => {
      event.preventDefault()
      sent.current = event.currentTarget
      mutate(new FormData(event.currentTarget))
    },
    /** What is wrong with a field. */
    wrong: (field: string) => error?.field(field),
    /** What is wrong altogether. */
    reason: error?.message ?? null,
    busy: isPending,
  }
}

export type EntryState = Omit<ReturnType<typeof useEntry>, 'wrong'> & {
  wrong: (field: string) => string | undefined
}
