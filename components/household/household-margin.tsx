import Form from 'next/form'
import { Button, ButtonLink } from '../ui/button'
import { TextField } from '../ui/field'
import { MarginBlock, MarginFigure } from '../ui/margin-block'

type HouseholdsMarginProps = { total: number; search: string; mayEnter: boolean }

function Finder({ total, search }: { total: number; search: string }) {
  return (
    <>
      <MarginFigure figure={total}>
        {search ? `found for “${search}”` : `kit${total === 1 ? '' : 's'} in households’ hands`}
      </MarginFigure>
      <search>
        <Form action="/households" className="grid gap-2">
          <TextField
            key={search}
            label="Find"
            hint="Name, area, phone or kit number"
            name="q"
            type="search"
            required={false}
            defaultValue={search}
          />
          <div className="flex flex-wrap gap-2">
            <Button type="submit" size="small">
              Find
            </Button>
            {search && (
              <ButtonLink href="/households" kind="quiet" size="small">
                Show all
              </ButtonLink>
            )}
          </div>
        </Form>
      </search>
    </>
  )
}

/** Beside the list: how many, find, enter. */
export function HouseholdsMargin({ total, search, mayEnter }: HouseholdsMarginProps) {
  const isEmpty = total === 0 && search === ''
  return (
    <>
      {!isEmpty && <Finder total={total} search={search} />}
      {!isEmpty && mayEnter && (
        <MarginBlock title="A new house">
          <ButtonLink href="/households/new" size="small" className="mt-1">
            Enter a household
          </ButtonLink>
        </MarginBlock>
      )}
      <MarginBlock title="Areas">
        <ButtonLink href="/areas" kind="quiet" size="small" className="-ml-1">
          Hours, languages, depots
        </ButtonLink>
      </MarginBlock>
    </>
  )
}
