import { areaEndpoints } from './area'
import { depotEndpoints } from './depot'
import type { Endpoint } from './endpoint'
import { holidayEndpoints } from './holiday'
import { householdEndpoints } from './household'
import { openEndpoints } from './open-endpoints'
import { practiceEndpoints } from './practice'
import { replyWordsEndpoints } from './reply-words'
import { roundsEndpoints } from './rounds'
import { settingsEndpoints } from './settings'
import { shiftEndpoints } from './shift'
import { ticketEndpoints } from './ticket-work'
import { wordingEndpoints } from './wording'

/** Every route under /api: what /api/openapi.json is made of, and what the access checks go through. */
export const endpoints: readonly Endpoint[] = [
  ...openEndpoints,
  ...shiftEndpoints,
  ...ticketEndpoints,
  ...householdEndpoints,
  ...areaEndpoints,
  ...holidayEndpoints,
  ...depotEndpoints,
  ...wordingEndpoints,
  ...replyWordsEndpoints,
  ...roundsEndpoints,
  ...settingsEndpoints,
  ...practiceEndpoints,
]
