import type { Handle } from '@/db/client'
import { findWordingInUse } from '@/db/queries/wording'
import { languages, type Language } from '@/lib/domain/language'
import { momentInfo, type Moment } from '@/lib/domain/moments'
import { renderWording, type Values } from '@/lib/domain/wording'
import { settingsNow } from './settings-now'
import { wordingValues } from './wording-values'

type Reader = { id: string; name: string; language: Language }

type Worded =
  | {
      ok: true
      text: string
      /** Which wording it is, and its language: the first one where the household's has none. */
      wording: { id: string; language: Language }
    }
  | { ok: false; reason: string }

/** What a text of a moment says to a household, by the wording in use. */
export async function wordText(
  db: Handle,
  {
    moment,
    household,
    values,
    language = household.language,
  }: { moment: Moment; household: Reader; values?: Values; language?: Language },
): Promise<Worded> {
  const wording = await findWordingInUse(db, moment, language)
  if (!wording) return { ok: false, reason: `no wording in use for ${moment}` }
  const { programme } = await settingsNow(db)
  const known = { programme: programme.name, house: household.name, ...values }
  const rendered = renderWording(wording.body, known, wording.language)
  if (!rendered.ok) {
    return { ok: false, reason: `${moment}: ${rendered.reason}, ${rendered.detail}` }
  }
  return { ok: true, text: rendered.text, wording }
}

/** The same in the staff's language; null where the household's is that one. */
export async function wordForStaff(
  db: Handle,
  text: { moment: Moment; household: Reader; values?: Values },
): Promise<string | null> {
  const first = languages[0] ?? 'en'
  if (text.household.language === first) return null
  const worded = await wordText(db, { ...text, language: first })
  return worded.ok ? worded.text : null
}

/**
 * A step's text as it would go to this household now. The ticket sheet shows it and the sending takes it
 * from here, so that what an agent reads is what goes out.
 */
export async function stepText(
  db: Handle,
  { moment, household }: { moment: Moment; household: Reader },
): Promise<{ values: Values; worded: Worded; staffText: string | null }> {
  const info = momentInfo(moment)
  const values = (info && (await wordingValues(db, info, household.id))) ?? {}
  const worded = await wordText(db, { moment, household, values })
  const isFirst = worded.ok && worded.wording.language === (languages[0] ?? 'en')
  const staffText = isFirst ? null : await wordForStaff(db, { moment, household, values })
  return { values, worded, staffText }
}
