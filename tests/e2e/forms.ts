import { expect, type Page } from '@playwright/test'

/** Enters a depot with a few of each part. */
export async function enterDepot(page: Page, name: string): Promise<void> {
  await page.goto('/depots/new')
  await page.getByLabel('Name').fill(name)
  for (const part of ['Cloth', 'Carbon', 'Fibre']) {
    const field = page.getByLabel(part, { exact: true })
    if (await field.count()) await field.fill('5')
  }
  await page.getByRole('button', { name: /Enter|Save|Keep/ }).click()
  await page.waitForURL(/\/depots$/)
  await expect(page.getByText(name).first()).toBeVisible()
}

/** Enters an area whose window is always open, so that the test may run at any hour. */
export async function enterArea(
  page: Page,
  { name, depot }: { name: string; depot: string },
): Promise<void> {
  await page.goto('/areas/new')
  await page.getByLabel('Name').fill(name)
  await page.getByLabel('Time zone').selectOption('Africa/Abidjan')
  await page.getByLabel('Metres above the sea').fill('600')
  await page.getByLabel('Language most speak').selectOption('en')
  await page.getByLabel('Depot that its parts come from').selectOption({ label: depot })
  await page.getByLabel('From', { exact: true }).fill('00:00')
  await page.getByLabel('Until', { exact: true }).fill('24:00')
  for (const month of await page.getByLabel(/, °C$/).all()) await month.fill('20')
  const sundays = page.getByLabel('Not on Sundays')
  if (await sundays.isChecked()) await sundays.uncheck()
  await page.getByRole('button', { name: /Enter|Save|Keep/ }).click()
  await page.waitForURL(/\/areas$/)
  await expect(page.getByText(name).first()).toBeVisible()
}

/** Enters a household whose kit was handed over on a day, with a first litre in 3 minutes. */
export async function enterHousehold(
  page: Page,
  house: { name: string; number: string; handedOverOn: string },
): Promise<void> {
  await page.goto('/households/new')
  await page.getByLabel('Name of the house').fill(house.name)
  await page.getByLabel('People who drink from the filter').fill('5')
  await page.getByRole('radio', { name: /^cloudy/ }).check()
  await page.getByLabel('Phone number', { exact: true }).fill(house.number)
  await page.getByLabel('Yes, they said so').check()
  await page.getByLabel('Who gave it').fill('the mother')
  await page.getByLabel('Handed over on').fill(house.handedOverOn)
  await page.getByLabel(/^Minutes to fill/).fill('3')
  await page.getByRole('button', { name: /Enter|Save|Keep/ }).click()
  await expect(page.getByRole('heading', { name: /^Entered/ })).toBeVisible()
}
