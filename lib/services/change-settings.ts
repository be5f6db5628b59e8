import type { Transaction } from '@/db/client'
import {
  deleteSettings,
  findLastSettingChange,
  lockSettings,
  upsertSetting,
} from '@/db/queries/setting'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import { settingPaths } from '@/lib/domain/setting-catalogue'
import { defaultSettings, valueAt, type SettingPath, type Settings } from '@/lib/domain/settings'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { KeptSettings, SettingsInput, SettingsView } from '@/lib/schemas/settings'
import { settingsNow } from './settings-now'
import { startingOdds } from './starting-odds'

const CHANGED_BY_OTHERS = 'Somebody has changed the settings since you opened this page.'

/** The settings as they are, for who may change them. */
export async function seeSettings(deps: Deps, actor: Actor): Promise<SettingsView> {
  allow(actor, 'change settings')
  const { db } = deps.store
  // Before the settings: a change in between makes this version too old, and is not overwritten unseen.
  const version = await findLastSettingChange(db)
  const settings = await settingsNow(db)
  return {
    version,
    settings,
    startingOdds: await startingOdds(db, { now: deps.clock.now(), settings }),
  }
}

type Change = { before: Settings; after: Settings; actor: Actor; at: number }

async function keepOne(
  tx: Transaction,
  path: SettingPath,
  { before, after, actor, at }: Change,
): Promise<void> {
  const value = valueAt(after, path)
  // A default that is chosen is not kept, so that it stays the default whatever that comes to be.
  if (value === valueAt(defaultSettings, path)) await deleteSettings(tx, [path])
  else await upsertSetting(tx, { key: path, value, setAt: at })
  await insertAudit(tx, {
    staffId: actor.staffId,
    act: 'change setting',
    subject: 'setting',
    subjectId: path,
    detail: { from: valueAt(before, path), to: value },
    at,
  })
}

/** Keeps what is set anew. What is planned keeps its day, and verdicts that were given stay as they were. */
export async function changeSettings(
  deps: Deps,
  actor: Actor,
  { version, settings: after }: SettingsInput,
): Promise<KeptSettings | Refusal> {
  allow(actor, 'change settings')
  const at = deps.clock.now()
  return deps.store.transaction(async (tx) => {
    await lockSettings(tx)
    if ((await findLastSettingChange(tx)) !== version)
      return { ok: false, reason: CHANGED_BY_OTHERS }
    const before = await settingsNow(tx)
    const changed = settingPaths.filter((path) => valueAt(before, path) !== valueAt(after, path))
    for (const path of changed) await keepOne(tx, path, { before, after, actor, at })
    return { ok: true, version: await findLastSettingChange(tx), changed: changed.length }
  })
}
