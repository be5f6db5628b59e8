'use client'

import { useEffect, useState } from 'react'

/** The value once it has stood still for a moment: for work that need not follow every letter. */
export function useDebounced<T>(value: T, delayMilliseconds: number): T {
  const [settled, setSettled] = useState(value)
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), delayMilliseconds)
    return () => clearTimeout(timer)
  }, [value, delayMilliseconds])
  return settled
}
