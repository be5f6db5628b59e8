import { format, isValid, parseISO } from 'date-fns'
import { bn } from 'date-fns/locale/bn'
import { enGB } from 'date-fns/locale/en-GB'
import { es } from 'date-fns/locale/es'
import { fr } from 'date-fns/locale/fr'
import { IntlMessageFormat } from 'intl-messageformat'
import type { Language } from './language'
import type { ValueName } from './moments'

export { costOf, offendingCharacters, segmentsOf, unitsPerPart } from './wording-size'

export type Values = Partial<Record<ValueName, string | number>>

export type Rendered =
  | { ok: true; text: string }
  | { ok: false; reason: 'unknown value' | 'missing value' | 'bad message'; detail: string }

const valueNames: ReadonlySet<string> = new Set<ValueName>([
  'programme',
  'house',
  'stage',
  'part',
  'depot',
  'dueOn',
  'minutes',
  'visitor',
  'visitOn',
  'litres',
])

const dayValues: ReadonlySet<string> = new Set<ValueName>(['dueOn', 'visitOn'])
const dayLocales = { en: enGB, es, fr, bn }
const dayPatterns = { en: 'd MMMM', es: "d 'de' MMMM", fr: 'd MMMM', bn: 'd MMMM' }

type Parsed = { ok: true; message: IntlMessageFormat; names: string[] } | { ok: false; why: string }

function parseBody(body: string, language: Language): Parsed {
  try {
    const message = new IntlMessageFormat(body, language, undefined, { ignoreTag: true })
    return { ok: true, message, names: [...new Set(message.getAst().flatMap(namesIn))] }
  } catch (error) {
    return { ok: false, why: error instanceof Error ? error.message : String(error) }
  }
}

type Node = ReturnType<IntlMessageFormat['getAst']>[number]

function namesIn(node: Node): string[] {
  // 0 is plain text and 7 the `#` of a plural: neither names a value.
  if (node.type === 0 || node.type === 7 || !('value' in node)) return []
  const inner = 'options' in node ? Object.values(node.options) : []
  return [String(node.value), ...inner.flatMap((option) => option.value.flatMap(namesIn))]
}

function hasBrace(node: Node): boolean {
  if (node.type === 0) return /[{}]/.test(node.value)
  return 'options' in node
    ? Object.values(node.options).some((option) => option.value.some(hasBrace))
    : false
}

/** Names of the values a wording speaks of, known or not; none for a body that cannot be read. */
export function valuesIn(body: string, language: Language): string[] {
  const parsed = parseBody(body, language)
  return parsed.ok ? parsed.names : []
}

/**
 * The text that a wording (an ICU message) becomes. Refuses values that no moment has, values
 * that were not given, and bodies that ICU cannot read or that would leave a brace in the text:
 * a curly brace in a household's text is always a quoting slip (`l'{part}` quotes the brace).
 */
export function renderWording(body: string, values: Values, language: Language): Rendered {
  const parsed = parseBody(body, language)
  if (!parsed.ok) return { ok: false, reason: 'bad message', detail: parsed.why }
  if (parsed.message.getAst().some(hasBrace)) {
    return { ok: false, reason: 'bad message', detail: 'a brace is left in the text' }
  }
  const unknown = parsed.names.find((name) => !valueNames.has(name))
  if (unknown !== undefined) return { ok: false, reason: 'unknown value', detail: unknown }
  const given: Record<string, string | number | undefined> = values
  const missing = parsed.names.find((name) => given[name] === undefined || given[name] === '')
  if (missing !== undefined) return { ok: false, reason: 'missing value', detail: missing }
  try {
    return { ok: true, text: String(parsed.message.format(writtenOut(values, language))) }
  } catch (error) {
    const detail = error instanceof Error ? error.message : String(error)
    return { ok: false, reason: 'bad message', detail }
  }
}

function writtenOut(values: Values, language: Language): Record<string, string | number> {
  const entries = Object.entries(values).map(([name, value]): [string, string | number] => [
    name,
    dayValues.has(name) && typeof value === 'string' ? dayInWords(value, language) : value,
  ])
  return Object.fromEntries(entries)
}

/**
 * A day as a household reads it: 3 March, 3 de marzo, 3 mars, 3 মার্চ. The year is left out: all
 * that is texted lies within months. Anything that is no ISO day is left as it is.
 * "Août" loses its circumflex (the 1990 spelling rules allow it): û would halve the room of a text.
 */
function dayInWords(day: string, language: Language): string {
  const at = parseISO(day)
  if (!/^\d{4}-\d{2}-\d{2}$/.test(day) || !isValid(at)) return day
  return format(at, dayPatterns[language], { locale: dayLocales[language] }).replace('û', 'u')
}
