import { expect, test } from '@playwright/test'
import { bareCoordinator, bareDesk, type BareDesk } from './bare-desk'
import { enterArea, enterDepot, enterHousehold } from './forms'
import { phoneOf } from './phone'
import { signIn } from './staff'

const HOUSES = 12

let desk: BareDesk

test.beforeAll(async () => {
  test.setTimeout(300_000)
  desk = await bareDesk()
  await desk.start()
})

test.afterAll(async () => {
  await desk.stop()
})

const number = (index: number) => `+1202555${String(110 + index).padStart(4, '0')}`

test('a desk that is killed in the middle of a planning loses no prompt and sends none twice', async ({
  browser,
}) => {
  test.setTimeout(300_000)
  const page = await signIn(browser, desk.address, bareCoordinator)
  await enterDepot(page, 'Mill depot')
  await enterArea(page, { name: 'Mill Reach', depot: 'Mill depot' })
  const handedOverOn = new Date().toISOString().slice(0, 10)
  for (let index = 0; index < HOUSES; index++) {
    await enterHousehold(page, { name: `House ${index}`, number: number(index), handedOverOn })
  }
  // The welcome of each is due. The move plans and sends them one behind the other; the kill comes between.
  await page.goto('/practice')
  await page.getByRole('button', { name: 'An hour' }).click()
  const phones = Array.from({ length: HOUSES }, (_, index) => phoneOf(desk.carrier, number(index)))
  const counts = async () =>
    Promise.all(phones.map(async (phone) => (await phone.received()).length))
  await expect
    .poll(async () => (await counts()).some((count) => count > 0), { intervals: [20] })
    .toBe(true)
  await desk.kill()
  const atKill = await counts()
  expect(atKill.filter((count) => count === 0).length).toBeGreaterThan(0)

  await desk.start()
  await page.goto('/practice')
  await page.getByRole('button', { name: 'An hour' }).click()
  await expect.poll(counts, { timeout: 120_000 }).toEqual(phones.map(() => 1))
  // Long enough for a second copy to show, were there one.
  await page.getByRole('button', { name: 'An hour' }).click()
  await expect(page.getByRole('status')).toContainText(/./)
  expect(await counts()).toEqual(phones.map(() => 1))
})
