import { expect, type Browser, type BrowserContextOptions, type Page } from '@playwright/test'

const PASSWORD = 'water runs downhill'

export type Who = { email: string; password?: string }

export const coordinator: Who = { email: 'tomas@rillpost.example' }
export const agent: Who = { email: 'ana@rillpost.example' }

const problems = new WeakMap<Page, string[]>()

/** Remembers what a page complains of in its console. */
export function watchConsole(page: Page): void {
  const heard: string[] = []
  problems.set(page, heard)
  page.on('console', (message) => {
    if (message.type() === 'error') heard.push(`${page.url()}: ${message.text()}`)
  })
  page.on('pageerror', (error) => heard.push(`${page.url()}: ${error.message}`))
}

/** Fails if the console of a page has complained: a broken page is not a passed one. */
export function expectQuietConsole(...pages: Page[]): void {
  expect(pages.flatMap((page) => problems.get(page) ?? [])).toEqual([])
}

/** A browser of their own in which a person of staff has signed in. */
export async function signIn(
  browser: Browser,
  desk: string,
  { as = {}, ...who }: Who & { as?: BrowserContextOptions },
): Promise<Page> {
  const context = await browser.newContext({ baseURL: desk, ...as })
  const page = await context.newPage()
  watchConsole(page)
  await page.goto('/')
  await page.getByLabel('E-mail').fill(who.email)
  await page.getByLabel('Password').fill(who.password ?? PASSWORD)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('link', { name: 'Shift' })).toBeVisible()
  return page
}

/** Moves the practice clock by one of its buttons and waits until that is done. */
export async function moveClock(page: Page, by: RegExp): Promise<void> {
  await page.goto('/practice')
  await page.getByRole('button', { name: by }).click()
  await expect(page.getByRole('status')).toContainText(/prompt|text|nothing/i, { timeout: 60_000 })
}
