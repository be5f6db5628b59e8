'use client'

import { useEffect, useState } from 'react'

const place = 'rillpost-shift-keys'

/** Whether the shift listens to single letters, kept in this browser. */
export function useKeysChoice(): { keysOn: boolean; toggle: () => void } {
  const [keysOn, setKeysOn] = useState(true)
  useEffect(() => {
    if (localStorage.getItem(place) === 'off') setKeysOn(false)
  }, [])
  const toggle = () => {
    localStorage.setItem(place, keysOn ? 'off' : 'on')
    setKeysOn(!keysOn)
  }
  return { keysOn, toggle }
}
