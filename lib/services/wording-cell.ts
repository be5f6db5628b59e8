import { listTimeZones } from '@/db/queries/time-zone'
import {
  countTextsSince,
  findOwnWordingInUse,
  listEditions,
  type WordingWithPeople,
} from '@/db/queries/wording'
import { listHouseholdsToTry } from '@/db/queries/wording-values'
import type { Deps } from '@/lib/deps'
import { languageNames, languageNamesInEnglish, languages } from '@/lib/domain/language'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round-window'
import { dayWords } from '@/lib/domain/stamp'
import { partsOf } from '@/lib/domain/wording-examples'
import { lags } from '@/lib/domain/wording-life'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { WordingCell, WordingEdition } from '@/lib/schemas/wording'
import { settingsNow } from './settings-now'
import { placeOf, type Place, type PlaceName } from './wording-place'

const day = 86_400_000
const firstLanguage = languages[0] ?? 'en'

/** One moment in one language, with all that a person needs to write it anew and to judge it. */
export async function wordingCell(
  deps: Deps,
  actor: Actor,
  name: PlaceName,
): Promise<WordingCell | Refusal> {
  allow(actor, 'see wording')
  const place = placeOf(name)
  if (!place) return { ok: false, reason: 'not found' }
  const { db } = deps.store
  const since = deps.clock.now() - 30 * day
  const { programme } = await settingsNow(db)
  const timeZone = (await listTimeZones(db))[0] ?? 'UTC'
  const rows = await listEditions(db, place)
  const print = printerOf(programme.name, timeZone)
  const open = rows.find(({ wording }) => ['draft', 'approved'].includes(wording.state))
  const inUse = rows.find(({ wording }) => wording.state === 'in use')
  return {
    ...headOf(place),
    inUse: inUse ? print(inUse) : null,
    draft: open ? print(open) : null,
    approvedByMe: open?.wording.state === 'approved' && open.wording.approvedBy === actor.staffId,
    ...(await besideFirst(deps, place, { inUse, print })),
    editions: rows.map(print),
    month: await countTextsSince(db, { ...place, since }),
    pricePerSegment: programme.pricePerSegment,
    currency: programme.currency,
    households: await listHouseholdsToTry(db, place.language),
  }
}

function headOf({ info, language }: Place) {
  return {
    moment: info.moment,
    momentName: info.name,
    group: info.group,
    safety: info.safety,
    values: [...info.values],
    language,
    languageName: languageNames[language],
    languageNameInEnglish: languageNamesInEnglish[language],
  }
}

type Print = (row: WordingWithPeople) => WordingEdition

/** What the first language says here, and whether this language has fallen behind it. */
async function besideFirst(
  deps: Deps,
  place: Place,
  { inUse, print }: { inUse: WordingWithPeople | undefined; print: Print },
): Promise<Pick<WordingCell, 'first' | 'lags'>> {
  if (place.language === firstLanguage) return { first: null, lags: false }
  const first = await findOwnWordingInUse(deps.store.db, { ...place, language: firstLanguage })
  const nobody = { writtenByName: null, approvedByName: null, secondApprovedByName: null }
  return {
    first: first && print({ wording: first, ...nobody }),
    lags:
      inUse !== undefined &&
      lags({
        followsEdition: inUse.wording.firstLanguageEdition,
        firstEditionInUse: first?.edition ?? null,
      }),
  }
}

function printerOf(programme: string, timeZone: string): Print {
  const printDay = (at: number) => dayWords(localDay(at, timeZone))
  return ({ wording, writtenByName, approvedByName, secondApprovedByName }) => ({
    edition: wording.edition,
    body: wording.body,
    state: wording.state,
    note: wording.note,
    followsEdition: wording.firstLanguageEdition,
    writtenBy: writtenByName,
    writtenOn: printDay(wording.writtenAt),
    writtenAt: wording.writtenAt,
    approvedBy: approvedByName,
    secondApprovedBy: secondApprovedByName,
    inUseFrom: wording.inUseFrom === null ? null : printDay(wording.inUseFrom),
    parts: partsOf(wording.body, wording.language, { programme }),
  })
}
