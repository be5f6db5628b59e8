'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { grouped, pathsOf, settingGroups, settingInfos } from '@/lib/domain/setting-catalogue'
import {
  defaultSettings,
  valueAt,
  type SettingPath,
  type Settings,
  type SettingValue,
} from '@/lib/domain/settings'
import type { KeptSettings, SettingsView } from '@/lib/schemas/settings'
import { sendJson } from '../api'
import { EntryForm, EntryPart } from '../entry/entry-form'
import { isTicked, numberOf, textOf } from '../entry/form-values'
import { useEntry, type EntryState } from '../entry/use-entry'
import { SettingField } from './setting-field'
import { StartingOdds } from './starting-odds'

const groups = Object.keys(settingGroups) as (keyof Settings)[]

function valueIn(form: FormData, path: SettingPath): SettingValue | undefined {
  const info = settingInfos[path]
  if (info.kind === 'switch') return isTicked(form, path)
  if (info.kind === 'text') return textOf(form, path)
  const number = numberOf(form, path)
  return info.kind === 'share' && number !== undefined ? number / 100 : number
}

/** What is written in the fields, in the groups of the settings. A hole is refused at its own place. */
function settingsIn(form: FormData) {
  return grouped((path) => valueIn(form, path))
}

function Group({
  group,
  settings,
  wrong,
}: { group: keyof Settings; settings: Settings } & Pick<EntryState, 'wrong'>) {
  return (
    <EntryPart {...settingGroups[group]}>
      <div className="grid gap-x-6 gap-y-5 sm:grid-cols-2">
        {pathsOf(group).map((path) => (
          <SettingField
            key={path}
            path={path}
            info={settingInfos[path]}
            value={valueAt(settings, path)}
            standard={valueAt(defaultSettings, path)}
            error={wrong(`settings.${path}`)}
          />
        ))}
      </div>
    </EntryPart>
  )
}

function keptWords(changed: number): string {
  if (changed === 0) return 'Nothing was changed.'
  return `Kept: ${changed} ${changed === 1 ? 'change' : 'changes'}.`
}

/** All that a coordinator can set, group by group. */
export function SettingsForm({ initial }: { initial: SettingsView }) {
  const router = useRouter()
  // The version goes with the fields: what a colleague changes meanwhile must not be overwritten.
  const [kept, setKept] = useState<KeptSettings | null>(null)
  const version = kept?.version ?? initial.version
  const entry = useEntry<KeptSettings>({
    send: (form) => sendJson('put', '/api/settings', { version, settings: settingsIn(form) }),
    onKept: (result) => {
      setKept(result)
      router.refresh()
    },
  })
  return (
    <EntryForm
      entry={entry}
      keep="Keep the settings"
      beside={
        <p role="status" className="font-semibold">
          {kept && !entry.busy && entry.reason === null && keptWords(kept.changed)}
        </p>
      }
    >
      {groups.map((group) => (
        <Group key={group} group={group} settings={initial.settings} wrong={entry.wrong} />
      ))}
      <StartingOdds rows={initial.startingOdds} areOn={initial.settings.walks.fromClosedTickets} />
    </EntryForm>
  )
}
