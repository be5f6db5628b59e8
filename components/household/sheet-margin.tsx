import { languageNamesInEnglish } from '@/lib/domain/language'
import type { HouseholdSheet } from '@/lib/schemas/household'
import { ButtonLink } from '../ui/button'
import { MarginBlock } from '../ui/margin-block'
import { PhoneBlock } from './phone-block'

/** Who lives there, as one speaks of it: `6 people, a child under five`. */
export function peopleWords(house: HouseholdSheet): string {
  const all = [
    `${house.people} ${house.people === 1 ? 'person' : 'people'}`,
    house.infant && 'a child under five',
    house.pregnant && 'somebody pregnant',
    house.elderly && 'somebody over 65',
    house.ill && 'somebody ill for long',
  ]
  return all.filter(Boolean).join(', ')
}

type SheetMarginProps = { sheet: HouseholdSheet; mayChange: boolean }

/** Beside the kit’s life: people, phones, consent. */
export function SheetMargin({ sheet, mayChange }: SheetMarginProps) {
  return (
    <>
      <MarginBlock title="In the house">
        <p>{peopleWords(sheet)}.</p>
        <p>Needs {sheet.litresPerDay.toFixed(0)} L a day.</p>
        <p>
          Reads {languageNamesInEnglish[sheet.language]}. Raw water {sheet.sourceClass}.
        </p>
        {sheet.movedOn && <p className="font-semibold">Moved away by {sheet.movedOn}.</p>}
        <p className="text-faint">Entered {sheet.enteredOn}.</p>
        {mayChange && (
          <ButtonLink href={`/households/${sheet.id}/change`} size="small" className="mt-2">
            Change
          </ButtonLink>
        )}
      </MarginBlock>
      {sheet.phones.map((phone) => (
        <PhoneBlock key={phone.id} phone={phone} />
      ))}
    </>
  )
}
