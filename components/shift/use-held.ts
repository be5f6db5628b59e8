'use client'

import { useEffect, useRef, useState } from 'react'
import type { Shift } from '@/lib/schemas/shift'
import { holdShift, type ShownBand } from './held-shift'

/** A pointer that rests this long no longer says that somebody reads here. */
const restMilliseconds = 8_000

type Held = {
  bands: ShownBand[]
  newcomers: Shift['bands'][number]['rows']
  /** Lets the newest order in. */
  release: () => void
  /** For the element around the rows. */
  watch: {
    onPointerMove: () => void
    onPointerLeave: () => void
    onFocus: () => void
    onBlur: () => void
  }
}

/** Holds the order of the rows while one of them has the focus or the pointer moves over them. */
export function useHeld(fresh: Shift): Held {
  const [isHeld, setHeld] = useState(false)
  const [base, setBase] = useState(fresh)
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined)
  const isFocused = useRef(false)
  if (!isHeld && base !== fresh) setBase(fresh)
  useEffect(() => () => clearTimeout(timer.current), [])
  const unlessFocused = () => setHeld(isFocused.current)
  return {
    ...holdShift(isHeld ? base : fresh, fresh),
    release: () => setBase(fresh),
    watch: {
      onPointerMove() {
        setHeld(true)
        clearTimeout(timer.current)
        timer.current = setTimeout(unlessFocused, restMilliseconds)
      },
      onPointerLeave: unlessFocused,
      onFocus() {
        isFocused.current = true
        setHeld(true)
      },
      onBlur() {
        isFocused.current = false
        setHeld(false)
      },
    },
  }
}
