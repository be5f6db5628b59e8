'use client'

import { useQuery } from '@tanstack/react-query'
import type { HouseholdSheet as Sheet } from '@/lib/schemas/household'
import { getJson } from '../api'
import { LineSheet } from '../frame/sheets'
import { ButtonLink } from '../ui/button'
import { Notice } from '../ui/notice'
import { KitSection } from './kit-section'
import { Suspended } from './reinstate'
import { SheetMargin } from './sheet-margin'
import { TextHistory } from './text-history'

type HouseholdSheetProps = { initialData: Sheet; mayChange: boolean }

function Warnings({ sheet, mayChange }: { sheet: Sheet; mayChange: boolean }) {
  const suspended = sheet.phones.filter(({ state }) => state !== 'active')
  return (
    <div className="pl-lead">
      {sheet.ticket && (
        <Notice tone="danger" title={`In trouble: ${sheet.ticket.words}`} className="my-4">
          <ButtonLink href={`/tickets/${sheet.ticket.id}`} size="small" className="mt-2">
            Open the ticket
          </ButtonLink>
        </Notice>
      )}
      {suspended.map((phone) => (
        <Suspended key={phone.id} phone={phone} householdId={sheet.id} mayChange={mayChange} />
      ))}
    </div>
  )
}

/** All that is known of a household: its people and phones, its kit’s life, its water, its texts. */
export function HouseholdSheet({ initialData, mayChange }: HouseholdSheetProps) {
  const { data: sheet } = useQuery({
    queryKey: ['household', initialData.id],
    queryFn: () => getJson<Sheet>(`/api/households/${initialData.id}`),
    initialData,
  })
  return (
    <LineSheet
      title={sheet.name}
      lead={[sheet.area.name, sheet.place].filter(Boolean).join(' · ')}
      margin={<SheetMargin sheet={sheet} mayChange={mayChange} />}
    >
      <Warnings sheet={sheet} mayChange={mayChange} />
      {sheet.kits.map((kit) => (
        <KitSection key={kit.id} kit={kit} today={sheet.today} timeZone={sheet.area.timeZone} />
      ))}
      <section aria-label="Texts" className="mt-9 pl-lead">
        <h2 className="mb-2 font-title text-lg font-semibold">Texts</h2>
        <TextHistory householdId={sheet.id} first={sheet.slips} />
      </section>
    </LineSheet>
  )
}
