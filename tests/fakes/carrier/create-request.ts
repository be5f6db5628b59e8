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
  // An empty parameter counts as one that was not given.
  const given = (name: string) => form.get(name) || null
  return {
    to: given('To'),
    from: given('From'),
    messagingServiceSid: given('MessagingServiceSid'),
    body: given('Body'),
    mediaUrls: form.getAll('MediaUrl'),
    statusCallback: given('StatusCallback'),
    validityPeriod: given('ValidityPeriod'),
    scheduleType: given('ScheduleType'),
    sendAt: given('SendAt'),
  }
}
