/** The states the carrier's published description knows; `read` and the deprecated ones never occur on plain SMS. */
export type MessageStatus =
  | 'accepted'
  | 'scheduled'
  | 'queued'
  | 'sending'
  | 'sent'
  | 'delivered'
  | 'undelivered'
  | 'failed'
  | 'canceled'
  | 'received'

export type Direction = 'inbound' | 'outbound-api' | 'outbound-reply'

/** One step still ahead of a message. `at` is an instant of the carrier's clock in epoch milliseconds. */
export type PlannedStep = {
  at: number
  to: MessageStatus
  errorCode?: number
  /** The handset shows the text from this step on. */
  landsOnHandset?: boolean
}

export type Media = { sid: string; contentType: string; base64: string; createdAt: number }

export type Message = {
  sid: string
  /** Order of creation, for paging that holds still while new messages come in. */
  sequence: number
  direction: Direction
  from: string | null
  to: string
  body: string
  segments: number
  status: MessageStatus
  errorCode: number | null
  messagingServiceSid: string | null
  statusCallback: string | null
  validitySeconds: number
  createdAt: number
  updatedAt: number
  sentAt: number | null
  media: Media[]
  /** Links of media the desk asked to be sent; the carrier does not fetch them here. */
  mediaUrls: string[]
  plan: PlannedStep[]
}

const ended: readonly MessageStatus[] = [
  'delivered',
  'undelivered',
  'failed',
  'canceled',
  'received',
]

export function hasEnded(status: MessageStatus): boolean {
  return ended.includes(status)
}
