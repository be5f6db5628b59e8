/** What was written in a field, without the blanks around it. */
export function textOf(form: FormData, name: string): string {
  const value = form.get(name)
  return typeof value === 'string' ? value.trim() : ''
}

/** The number in a field, with a point or a comma; undefined where there is none, so that the schema says so. */
export function numberOf(form: FormData, name: string): number | undefined {
  const text = textOf(form, name).replace(',', '.')
  if (text === '') return undefined
  const value = Number(text)
  return Number.isFinite(value) ? value : undefined
}

export function isTicked(form: FormData, name: string): boolean {
  return form.get(name) !== null
}

/** Each line that has something on it. */
export function linesOf(form: FormData, name: string): string[] {
  return textOf(form, name)
    .split('\n')
    .filter((line) => line.trim() !== '')
}
