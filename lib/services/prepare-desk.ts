import { insertReferenceData } from '@/db/queries/reference'
import { insertFirstEditions } from '@/db/queries/wording'
import type { Deps } from '@/lib/deps'
import { bn } from '@/lib/domain/first-wordings/bn'
import { en } from '@/lib/domain/first-wordings/en'
import { es } from '@/lib/domain/first-wordings/es'
import { fr } from '@/lib/domain/first-wordings/fr'
import { languages } from '@/lib/domain/language'
import { keepSuppressions } from './suppress-number'

const first = { en, es, fr, bn }
const toCheck = 'Draft of a first edition: to be checked by a native speaker.'

/**
 * What a desk cannot work without: a kit model with its parts, and a wording for every moment. Called at
 * each start; whatever the programme has made its own is left alone.
 */
export async function prepareDesk(deps: Deps): Promise<void> {
  await deps.store.transaction(async (tx) => {
    await insertReferenceData(tx)
    const editions = languages.flatMap((language) =>
      first[language].map(({ moment, body }) => ({
        moment,
        language,
        body,
        note: language === languages[0] ? '' : toCheck,
      })),
    )
    await insertFirstEditions(tx, editions, deps.clock.now())
    await keepSuppressions(tx, deps)
  })
}
