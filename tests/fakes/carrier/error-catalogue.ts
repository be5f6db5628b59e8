/** A refusal as the REST interface gives it: `{ code, message, more_info, status }`. */
export type Refusal = { status: number; code: number; message: string }

const texts: Record<number, { status: number; message: string }> = {
  20003: { status: 401, message: 'Authenticate' },
  20404: { status: 404, message: 'The requested resource was not found' },
  20429: { status: 429, message: 'Too Many Requests' },
  20500: { status: 500, message: 'An internal server error has occurred' },
  20503: { status: 503, message: 'Service unavailable' },
  20009: { status: 400, message: 'Cannot change a message that is not yet at its end' },
  21211: { status: 400, message: "The 'To' number is not a valid phone number." },
  21212: { status: 400, message: "The 'From' number is not a valid phone number." },
  21408: {
    status: 400,
    message: "Permission to send to this 'To' number's region is not enabled.",
  },
  21602: { status: 400, message: 'Message body is required.' },
  21603: { status: 400, message: "A 'From' phone number is required." },
  21604: { status: 400, message: "A 'To' phone number is required." },
  21606: { status: 400, message: "The 'From' number cannot send messages for this account." },
  21609: { status: 400, message: "The 'StatusCallback' URL is not a valid URL." },
  21610: { status: 400, message: 'Attempt to send to unsubscribed recipient' },
  21611: { status: 400, message: "This 'From' number has exceeded its queue of messages." },
  21612: { status: 400, message: "The 'To' number cannot be reached from this 'From' number." },
  21614: { status: 400, message: "The 'To' number is not a mobile number." },
  21617: { status: 400, message: 'The message body exceeds the 1600 character limit.' },
  21620: { status: 400, message: 'Invalid media URL.' },
  21623: { status: 400, message: 'Number of media files exceeds allowed limit.' },
  21701: { status: 400, message: 'The messaging service does not exist.' },
  30409: { status: 400, message: 'The message can no longer be canceled.' },
  35111: { status: 400, message: 'A SendAt time is required for a scheduled message.' },
  35114: { status: 400, message: 'SendAt must be between 5 minutes and 35 days ahead.' },
  35118: { status: 400, message: 'A MessagingServiceSid is required for a scheduled message.' },
  35126: { status: 400, message: 'ScheduleType must be fixed.' },
  90007: { status: 400, message: 'ValidityPeriod must be between 1 and 36000 seconds.' },
}

export function refusal(code: number, detail?: string): Refusal {
  const known = texts[code] ?? { status: 400, message: 'The request was refused' }
  return { status: known.status, code, message: detail ?? known.message }
}

/** What the carrier writes beside an error code of a message, in its own field. */
const asyncTexts: Record<number, string> = {
  14107: 'Reply rate limit hit',
  21610: 'Attempt to send to unsubscribed recipient',
  30001: 'Queue overflow',
  30003: 'Unreachable destination handset',
  30004: 'Message blocked',
  30005: 'Unknown destination handset',
  30006: 'Landline or unreachable carrier',
  30007: 'Message filtered',
  30008: 'Unknown error',
  30036: 'Validity period expired',
}

export function errorMessage(code: number | null): string | null {
  return code === null ? null : (asyncTexts[code] ?? 'Unknown error')
}
