import { z } from 'zod'

const form = z.record(z.string(), z.union([z.string(), z.array(z.string())]))

const inbound = z
  .looseObject({
    MessageSid: z.string().regex(/^(SM|MM)[0-9a-f]{32}$/i),
    From: z.string().regex(/^\+[1-9]\d{6,14}$/),
    To: z.string().max(40),
    Body: z.string().max(1600).default(''),
  })
  .transform((given) => ({
    sid: given.MessageSid,
    from: given.From,
    body: given.Body,
    // New parameters come without notice: whatever came is kept.
    raw: given as Record<string, unknown>,
  }))

const receipt = z
  .looseObject({
    MessageSid: z.string().regex(/^(SM|MM)[0-9a-f]{32}$/i),
    MessageStatus: z.string().min(1).max(40),
    ErrorCode: z.string().max(20).default(''),
  })
  .transform((given) => ({
    sid: given.MessageSid,
    status: given.MessageStatus,
    code: given.ErrorCode,
    raw: given as Record<string, unknown>,
  }))

export type InboundText = z.output<typeof inbound>
export type Receipt = z.output<typeof receipt>

/** The form of a webhook as the signature sees it: a name given more than once becomes a list. */
export function readForm(body: string): Record<string, string | string[]> {
  const read: Record<string, string | string[]> = {}
  for (const [name, value] of new URLSearchParams(body)) {
    const before = read[name]
    read[name] = before === undefined ? value : [before, value].flat()
  }
  return form.parse(read)
}

export const inboundSchema = inbound
export const receiptSchema = receipt
