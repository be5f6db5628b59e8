import { listLivingWordings, type WordingWithPeople } from '@/db/queries/wording'
import type { Deps } from '@/lib/deps'
import { languageNames, languages, type Language } from '@/lib/domain/language'
import { moments, type MomentInfo } from '@/lib/domain/moments'
import { allow, type Actor } from '@/lib/domain/role'
import { partsOf } from '@/lib/domain/wording-examples'
import { lags } from '@/lib/domain/wording-life'
import type { WordingMatrix, WordingMatrixCell } from '@/lib/schemas/wording'
import { settingsNow } from './settings-now'

const firstLanguage = languages[0]

/** Every moment in every language: what is in use, what lags behind the first language, what is a draft. */
export async function wordingMatrix(deps: Deps, actor: Actor): Promise<WordingMatrix> {
  allow(actor, 'see wording')
  const living = await listLivingWordings(deps.store.db)
  const { programme } = await settingsNow(deps.store.db)
  const names = [...new Set(moments.map(({ group }) => group))]
  return {
    languages: languages.map((language) => ({ language, name: languageNames[language] })),
    groups: names.map((name) => ({
      name,
      rows: moments
        .filter(({ group }) => group === name)
        .map((info) => ({
          moment: info.moment,
          name: info.name,
          safety: info.safety,
          cells: cellsOf(info, living, programme.name),
        })),
    })),
  }
}

function cellsOf(
  info: MomentInfo,
  living: readonly WordingWithPeople[],
  programme: string,
): WordingMatrixCell[] {
  const here = living.filter(({ wording }) => wording.moment === info.moment)
  const inUseIn = (language: Language | undefined) =>
    here.find(({ wording }) => wording.language === language && wording.state === 'in use')
  const first = inUseIn(firstLanguage)?.wording.edition ?? null
  return languages.map((language) => {
    const inUse = inUseIn(language)
    const open = here.find(
      ({ wording }) => wording.language === language && wording.state !== 'in use',
    )
    const shown = inUse ?? open
    return {
      language,
      parts: shown ? partsOf(shown.wording.body, language, { programme }) : 0,
      edition: inUse?.wording.edition ?? null,
      lags:
        language !== firstLanguage &&
        inUse !== undefined &&
        lags({
          followsEdition: inUse.wording.firstLanguageEdition,
          firstEditionInUse: first,
        }),
      draft: open ? draftOf(open) : null,
    }
  })
}

function draftOf({ wording, writtenByName }: WordingWithPeople): WordingMatrixCell['draft'] {
  return {
    state: wording.state === 'approved' ? 'approved' : 'draft',
    edition: wording.edition,
    writtenBy: writtenByName,
  }
}
