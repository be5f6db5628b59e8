import { expect, test } from '@playwright/test'
import { bareCoordinator, bareDesk, type BareDesk } from './bare-desk'
import { enterArea, enterDepot, enterHousehold } from './forms'
import { phoneOf } from './phone'
import { expectQuietConsole, moveClock, signIn } from './staff'

let desk: BareDesk

test.beforeAll(async () => {
  test.setTimeout(300_000)
  desk = await bareDesk()
  await desk.start()
})

test.afterAll(async () => {
  await desk.stop()
})

const daysAgo = (days: number) =>
  new Date(Date.now() - days * 86_400_000).toISOString().slice(0, 10)

test('a desk without the demo: from the first account to the first ticket', async ({ browser }) => {
  test.setTimeout(300_000)
  const page = await signIn(browser, desk.address, bareCoordinator)
  await enterDepot(page, 'Mill depot')
  await enterArea(page, { name: 'Mill Reach', depot: 'Mill depot' })
  const first = { name: 'Alder', number: '+1 202 555 0101', handedOverOn: daysAgo(13) }
  await enterHousehold(page, first)
  await enterHousehold(page, { name: 'Birch', number: '+1 202 555 0102', handedOverOn: daysAgo(0) })

  const phone = phoneOf(desk.carrier, '+12025550101')
  await moveClock(page, /^An hour$/)
  await phone.receives(/STOP/)
  const before = (await phone.received()).length
  await moveClock(page, /^A day$/)
  await phone.receives(/time to wash/, before)
  await phone.write('the water is slow')

  await expect(async () => {
    await page.goto('/shift')
    await expect(page.getByRole('button', { name: 'Take the next' })).toBeEnabled({ timeout: 2000 })
  }).toPass({ timeout: 30_000 })
  await page.getByRole('button', { name: 'Take the next' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Alder')
  await expect(page.getByText('You have it')).toBeVisible()
  expectQuietConsole(page)
})
