'use client'

import { useSyncExternalStore } from 'react'

const place = 'rillpost-shift-keys'
const changed = 'rillpost-shift-keys-changed'

function subscribe(onChange: () => void): () => void {
  window.addEventListener(changed, onChange)
  return () => window.removeEventListener(changed, onChange)
}

const isOn = () => localStorage.getItem(place) !== 'off'

/** Whether the shift listens to single letters, kept in this browser. */
export function useKeysChoice(): { keysOn: boolean; toggle: () => void } {
  const keysOn = useSyncExternalStore(subscribe, isOn, () => true)
  const toggle = () => {
    localStorage.setItem(place, keysOn ? 'off' : 'on')
    window.dispatchEvent(new Event(changed))
  }
  return { keysOn, toggle }
}
