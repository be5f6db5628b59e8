import type { CarrierClock } from './clock'
import type { FaultList } from './faults'
import type { Message } from './message'
import type { ShelfPhone } from './phones-file'
import type { Settings } from './settings'
import type { CarrierState } from './state'

/** What every part of the fake shares. */
export type Carrier = {
  settings: Settings
  /** Where this fake itself can be reached, for links to media. */
  origin: string
  clock: CarrierClock
  state: CarrierState
  /** The second host, where the bytes of media are. */
  mediaOrigin: string
  /** Messages by sid, and those that still have steps ahead: both derived from `state`. */
  bySid: Map<string, Message>
  pending: Set<Message>
  faults: FaultList
  /** Webhooks under way, so that a test can wait for the last of them. */
  underWay: Set<Promise<unknown>>
  /** The phones that FAKE_PHONES_FILE puts on the shelf. */
  shelf(): ShelfPhone[]
  /** Grows with every change, so that a page can ask cheaply whether to look again. */
  version: number
  /** Marks the state as changed, for the file it may be kept in. */
  changed(): void
}
