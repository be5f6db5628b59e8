import type { Metadata } from 'next'
import { ReadingSheet } from '@/components/frame/sheets'
import { SettingsForm } from '@/components/settings/settings-form'
import { getDeps } from '@/lib/deps'
import { deskActor } from '@/lib/desk'
import { seeSettings } from '@/lib/services/change-settings'

export const metadata: Metadata = { title: 'Settings' }

export default async function SettingsPage() {
  const actor = await deskActor('change settings')
  const settings = await seeSettings(await getDeps(), actor)
  return (
    <ReadingSheet
      title="Settings"
      lead="The numbers that the desk reckons with. A change counts from now on: what is planned keeps its day, and what a reading was judged to be stays so."
    >
      <SettingsForm initial={settings} />
    </ReadingSheet>
  )
}
