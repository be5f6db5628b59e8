import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'
import { emptyState, type CarrierState } from './state'

const debounceMilliseconds = 400

/** What was kept from the last run, or a fresh state. A file that cannot be read stops the start: better than losing it. */
export function loadState(file: string): CarrierState {
  if (file === '' || !existsSync(file)) return emptyState()
  try {
    return { ...emptyState(), ...(JSON.parse(readFileSync(file, 'utf8')) as Partial<CarrierState>) }
  } catch (cause) {
    throw new Error(`FAKE_STORE_FILE cannot be read: ${file}`, { cause })
  }
}

export type Keeper = { changed(): void; saveNow(): void }

/** Saves shortly after a change, through a second file, so that a crash leaves the old or the new one whole. */
export function createKeeper(file: string, state: CarrierState): Keeper {
  let timer: NodeJS.Timeout | null = null
  function saveNow(): void {
    if (timer) clearTimeout(timer)
    timer = null
    if (file === '') return
    mkdirSync(dirname(file), { recursive: true })
    writeFileSync(`${file}.new`, JSON.stringify(state))
    renameSync(`${file}.new`, file)
  }
  return {
    changed() {
      if (file === '' || timer) return
      timer = setTimeout(saveNow, debounceMilliseconds)
    },
    saveNow,
  }
}
