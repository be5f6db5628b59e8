import { mayText, type Consent, type PhoneState } from './consent'

/** Why nothing may be texted to a phone, in words for staff; null where something may. */
export function silenceWords(phone: {
  consent: Consent
  state: PhoneState
  stateWhy: string
  carrierBlocked: boolean
}): string | null {
  const allowed = mayText({ ...phone, phoneState: phone.state })
  if (allowed.ok) return null
  switch (allowed.reason) {
    case 'no consent':
      return 'no consent yet'
    case 'withdrawn':
      return 'opted out'
    case 'carrier blocked':
      return 'blocked by the carrier'
    case 'suspended':
      return phone.stateWhy ? `suspended: ${phone.stateWhy}` : 'suspended'
    case 'gone':
      return phone.stateWhy ? `number gone: ${phone.stateWhy}` : 'number gone'
  }
}
