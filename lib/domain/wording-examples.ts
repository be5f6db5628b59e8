import type { Language } from './language'
import { renderWording, segmentsOf, type Values } from './wording'

/** Long rather than short, so that a count of parts made with them is not too kind. Invented. */
const examples: Values = {
  programme: 'Clear Water',
  house: 'Orellana',
  stage: 3,
  part: 'hollow-fibre stage',
  depot: 'Upper Ford',
  dueOn: '2026-09-24',
  minutes: 12,
  visitor: 'Amparo',
  visitOn: '2026-09-24',
  litres: 1.5,
}

/** A value for everything a wording may speak of; what is known takes the place of the example. */
export function exampleValues(known: Values = {}): Values {
  return { ...examples, ...known }
}

/** Parts that a wording costs with example values; 0 where it cannot be filled in. */
export function partsOf(body: string, language: Language, known: Values = {}): number {
  const rendered = renderWording(body, exampleValues(known), language)
  return rendered.ok ? segmentsOf(rendered.text).segments : 0
}
