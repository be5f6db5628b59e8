'use client'

import { useQuery } from '@tanstack/react-query'
import { Fragment } from 'react'
import type { WordingMatrix } from '@/lib/schemas/wording'
import { getJson } from '../api'
import { MatrixCell } from './matrix-cell'

type Row = WordingMatrix['groups'][number]['rows'][number]
type Languages = WordingMatrix['languages']

/** Moments down, languages across. On a phone each moment is a block with its languages one a line. */
export function Matrix({ initial }: { initial: WordingMatrix }) {
  const { data } = useQuery({
    queryKey: ['wordings'],
    queryFn: () => getJson<WordingMatrix>('/api/wordings'),
    initialData: initial,
  })
  return (
    <table className="w-full table-fixed border-collapse text-left text-sm max-md:block">
      <caption className="sr-only">Wordings by moment and language</caption>
      <thead className="max-md:sr-only">
        <tr>
          <th scope="col" className={`${columnName} w-[20%]`}>
            Moment
          </th>
          {data.languages.map(({ language, name }) => (
            <th key={language} scope="col" lang={language} className={columnName}>
              {name}
            </th>
          ))}
        </tr>
      </thead>
      {data.groups.map(({ name, rows }) => (
        <tbody key={name} className="max-md:block">
          <tr className="max-md:block">
            <th
              scope="rowgroup"
              colSpan={data.languages.length + 1}
              className="border-b border-ink px-3 pt-5.5 pb-2.5 font-title text-lg font-semibold max-md:block max-md:px-0"
            >
              {name}
            </th>
          </tr>
          {rows.map((row) => (
            <Fragment key={row.moment}>
              <MomentRow row={row} languages={data.languages} />
            </Fragment>
          ))}
        </tbody>
      ))}
    </table>
  )
}

const columnName = 'border-ink border-b-[1.5px] px-3 py-2 align-bottom font-semibold'

function MomentRow({ row, languages }: { row: Row; languages: Languages }) {
  return (
    <tr className="border-b border-rule max-md:grid max-md:grid-cols-2 max-md:py-2.5">
      <th
        scope="row"
        className="px-3 py-2.5 align-top font-semibold max-md:col-span-2 max-md:block max-md:p-0"
      >
        {row.name}
        {row.safety && (
          <span className="block text-xs font-semibold text-faint">two people approve</span>
        )}
      </th>
      {languages.map(({ language, name }) => {
        const cell = row.cells.find((one) => one.language === language)
        return (
          <td key={language} className="p-0 align-top">
            {cell && <MatrixCell cell={cell} row={row} languageName={name} />}
          </td>
        )
      })}
    </tr>
  )
}
