/** What one asks for with `POST …/Messages.json`; unknown parameters are ignored, as the carrier does. */
export type CreateRequest = {
  to: string | null
  from: string | null
  messagingServiceSid: string | null
  body: string | null
  mediaUrls: string[]
  statusCallback: string | null
  validityPeriod: string | null
  scheduleType: string | null
  sendAt: string | null
}

export function readCreateRequest(form: URLSearchParams): CreateRequest {
  return {
    to: form.get('To'),
    from: form.get('From'),
    messagingServiceSid: form.get('MessagingServiceSid'),
    body: form.get('Body'),
    mediaUrls: form.getAll('MediaUrl'),
    statusCallback: form.get('StatusCallback'),
    validityPeriod: form.get('ValidityPeriod'),
    scheduleType: form.get('ScheduleType'),
    sendAt: form.get('SendAt'),
  }
}
