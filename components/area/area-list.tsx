'use client'

import { useQuery } from '@tanstack/react-query'
import Link from 'next/link'
import { languageNamesInEnglish } from '@/lib/domain/language'
import type { Area, AreaList } from '@/lib/schemas/area'
import { getJson } from '../api'
import { ButtonLink } from '../ui/button'
import { EmptyState } from '../ui/empty-state'
import { RowTh, Table, Td, Th } from '../ui/table'

type AreasProps = { initialData: AreaList; mayChange: boolean }

function daysOff(area: Area): string {
  const named = area.holidays.length
  const days = [
    area.sundaysOff ? 'not on Sundays' : '',
    named > 0 ? `${named} named ${named === 1 ? 'day' : 'days'} off` : '',
  ]
  return days.filter(Boolean).join(', ') || 'every day'
}

function Row({ area, mayChange }: { area: Area; mayChange: boolean }) {
  return (
    <tr>
      <RowTh>
        {mayChange ? (
          <Link href={`/areas/${area.id}`} className="plain-link">
            {area.name}
          </Link>
        ) : (
          area.name
        )}
      </RowTh>
      <Td>
        <span className="font-mono">
          {area.windowOpens}–{area.windowCloses}
        </span>
        <span className="block text-faint">{daysOff(area)}</span>
      </Td>
      <Td>{area.timeZone.replaceAll('_', ' ')}</Td>
      <Td>{languageNamesInEnglish[area.language]}</Td>
      <Td>{area.depotName}</Td>
      <Td number>{area.households}</Td>
    </tr>
  )
}

/** Every area on one table. */
export function Areas({ initialData, mayChange }: AreasProps) {
  const { data } = useQuery({
    queryKey: ['areas'],
    queryFn: () => getJson<AreaList>('/api/areas'),
    initialData,
  })
  const enter = mayChange && (
    <ButtonLink href="/areas/new" kind="main">
      Enter an area
    </ButtonLink>
  )
  if (data.areas.length === 0) {
    return (
      <EmptyState title="No area yet" action={enter}>
        An area gives its households their hours, their language and their depot.
      </EmptyState>
    )
  }
  return (
    <>
      <Table caption="Areas" hideCaption>
        <thead>
          <tr>
            <Th>Area</Th>
            <Th>Texts go</Th>
            <Th>Time zone</Th>
            <Th>Language</Th>
            <Th>Depot</Th>
            <Th className="text-right">Households</Th>
          </tr>
        </thead>
        <tbody>
          {data.areas.map((area) => (
            <Row key={area.id} area={area} mayChange={mayChange} />
          ))}
        </tbody>
      </Table>
      {enter && <p className="mt-6">{enter}</p>}
    </>
  )
}
