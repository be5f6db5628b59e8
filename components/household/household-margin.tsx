import Form from 'next/form'
import { Button, ButtonLink } from '../ui/button'
import { TextField } from '../ui/field'
import { MarginFigure } from '../ui/margin-block'

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
      <div className="mt-4.5 flex flex-wrap items-center gap-x-4 gap-y-1 border-t border-rule pt-3 first:mt-0 first:border-0 first:pt-0">
        {!isEmpty && mayEnter && (
          <ButtonLink href="/households/new" size="small">
            Enter a household
          </ButtonLink>
        )}
        <ButtonLink href="/areas" kind="quiet" size="small">
          Areas
        </ButtonLink>
      </div>
    </>
  )
}
