import { readFileSync } from 'node:fs'
import path from 'node:path'
import { AxeBuilder } from '@axe-core/playwright'
import { expect, test, type Page } from '@playwright/test'
import { phoneOf, type Phone } from './phone'
import { startProgramme, type Programme } from './programme'
import { agent, coordinator, expectQuietConsole, moveClock, signIn } from './staff'

type Family = { number: string; label: string; language: string }

const NEW_WORDS = 'hoy toca lavar la etapa larga'

let programme: Programme

test.beforeAll(async () => {
  test.setTimeout(600_000)
  programme = await startProgramme()
})

test.afterAll(async () => {
  await programme.stop()
})

function families(): Family[] {
  const file = path.join(programme.folder, 'demo', 'phones.json')
  return JSON.parse(readFileSync(file, 'utf8')) as Family[]
}

const nameOf = ({ label }: Family) => label.replace(/ house,.*/, '')

/** Moves the clock day by day until another Spanish-speaking family has the new words on its phone. */
async function nextAsked(page: Page, seen: Set<string>): Promise<{ family: Family; phone: Phone }> {
  for (let day = 0; day < 5; day++) {
    for (const family of families().filter(({ language }) => language === 'es')) {
      const phone = phoneOf(programme.phones, family.number)
      const has = (await phone.received()).some(({ body }) => body.includes(NEW_WORDS))
      if (!has || seen.has(family.number)) continue
      seen.add(family.number)
      return { family, phone }
    }
    await moveClock(page, /^A day$/)
  }
  throw new Error('No Spanish-speaking family was asked to wash within five days.')
}

/** Opens a family's ticket from the shift and takes it. */
async function takeFromShift(page: Page, family: Family): Promise<void> {
  await page.goto('/shift')
  await page.getByRole('link', { name: new RegExp(`${nameOf(family)} house`) }).click()
  await page.getByRole('button', { name: 'Take it' }).click()
  await expect(page.getByText('You have it')).toBeVisible()
}

async function openHousehold(page: Page, family: Family): Promise<void> {
  await page.goto(`/households?q=${encodeURIComponent(nameOf(family))}`)
  await page
    .getByRole('link', { name: nameOf(family), exact: true })
    .first()
    .click()
  await expect(page.getByRole('heading', { level: 1 })).toContainText(nameOf(family))
}

/** What is planned on a kit's life line, with how far away it is. */
function plannedRow(page: Page, what: string) {
  const title = page.getByText(what, { exact: true }).last()
  return title.locator('xpath=ancestor::*[contains(., "in ")][1]')
}

test('one household’s trouble, from a prompt in new words to water that runs, and another’s to a new part', async ({
  browser,
}) => {
  test.setTimeout(600_000)
  const seen = new Set<string>()
  const desk = await signIn(browser, programme.desk, coordinator)
  const shift = await signIn(browser, programme.desk, agent)

  await test.step('the coordinator changes the Spanish wording of "wash due" and approves it', async () => {
    await desk.goto('/wording/wash-due/es')
    const words = desk.getByLabel('What the text says')
    await words.fill(`{house}: ${NEW_WORDS}. ¿Ya? Escriba LISTO. ¿Sale lento? Escriba LENTO.`)
    await desk.getByRole('button', { name: 'Save draft' }).click()
    await expect(desk.getByText(/Draft saved/)).toBeVisible()
    await desk.getByRole('button', { name: 'Approve' }).click()
    await expect(desk.getByText(/in use/i).first()).toBeVisible()
  })

  await moveClock(desk, /^A day$/)
  const first = await nextAsked(desk, seen)

  await test.step('the prompt is on a practice phone, and the family answers there', async () => {
    const page = await (await browser.newContext()).newPage()
    await page.goto(`${programme.phones}/?open=${encodeURIComponent(first.family.number)}`)
    const held = page.getByRole('article', { name: first.family.label })
    await expect(held.getByText(NEW_WORDS)).toBeVisible()
    await held.getByRole('textbox', { name: /^Text from/ }).fill('sale poca agua')
    await held.getByRole('button', { name: 'Send' }).click()
    await expect(held.getByText('sale poca agua')).toBeVisible()
    await page.context().close()
  })

  await test.step('the ticket stands in the shift with its sentence of harm; the agent takes it and sends the step', async () => {
    await expect(async () => {
      await shift.goto('/shift')
      await expect(shift.getByText('sale poca agua').first()).toBeVisible({ timeout: 2000 })
    }).toPass({ timeout: 30_000 })
    const row = shift.getByRole('link', { name: new RegExp(`${nameOf(first.family)} house`) })
    await expect(row).toHaveAccessibleName(/\d+ people/)
    await takeFromShift(shift, first.family)
    const before = (await first.phone.received()).length
    await shift.getByRole('button', { name: /^Send( again)?$/ }).click()
    await first.phone.receives(/minutos/, before)
  })

  await test.step('12 minutes, a wash, 4 minutes: the ticket flows and the wash clock starts anew', async () => {
    await first.phone.write('12')
    await expect(shift.getByRole('heading', { name: /wash the fibre/i })).toBeVisible({
      timeout: 30_000,
    })
    const before = (await first.phone.received()).length
    await shift.getByRole('button', { name: 'Send', exact: true }).click()
    await first.phone.receives(/etapa larga/, before)
    await first.phone.write('4')
    await expect(shift.getByRole('heading', { name: /^Flowing/ })).toBeVisible({ timeout: 30_000 })
    await openHousehold(desk, first.family)
    await expect(desk.getByText('measured after it').last()).toBeVisible()
    await expect(plannedRow(desk, 'Wash')).toContainText(/in (9|14|30) days/)
  })

  await test.step('another family answers 12, 12 and 11 by itself: the fibre stage is spent and a part is promised', async () => {
    const second = await nextAsked(desk, seen)
    let count = (await second.phone.received()).length
    await second.phone.write('sale poca agua')
    for (const minutes of ['12', '12', '11']) {
      await second.phone.receives(/1 litro/, count)
      count = (await second.phone.received()).length
      await second.phone.write(minutes)
    }
    await second.phone.receives(/consigue una nueva/i, count)
    await takeFromShift(shift, second.family)
    await expect(
      shift.getByRole('heading', { name: /part for the fibre stage is promised/ }),
    ).toBeVisible()
    await shift.getByRole('button', { name: 'Hand over' }).click()
    await expect(shift.getByText(/Handed over|new part/i).first()).toBeVisible()
    await openHousehold(desk, second.family)
    await expect(desk.getByText('New fibre fitted')).toBeVisible()
    await expect(plannedRow(desk, 'Change of fibre')).toContainText(/in 36[56] days/)
  })

  await test.step('STOP ends prompts with one confirmation; "it stopped dripping" does not', async () => {
    const [stops, drips] = families().filter(({ language }) => language === 'en')
    if (!stops || !drips) throw new Error('Two English-speaking families are wanted.')
    const phone = phoneOf(programme.phones, stops.number)
    const before = (await phone.received()).length
    await phone.write('STOP')
    await expect.poll(async () => (await phone.received()).length).toBe(before + 1)
    await phoneOf(programme.phones, drips.number).write('it stopped dripping')
    await openHousehold(desk, stops)
    await expect(desk.getByText(/asked for no more texts|opted out/i).first()).toBeVisible()
    await openHousehold(desk, drips)
    await expect(desk.getByText(/asked for no more texts|opted out/i)).toHaveCount(0)
    await moveClock(desk, /^A week$/)
    expect(await phone.received()).toHaveLength(before + 1)
  })

  await test.step('an ill child is at the top with the fixed answer; a wrong number is suspended and shown', async () => {
    const [, , ill, wrong] = families().filter(({ language }) => language === 'en')
    if (!ill || !wrong) throw new Error('Two more English-speaking families are wanted.')
    const phone = phoneOf(programme.phones, ill.number)
    const before = (await phone.received()).length
    await phone.write('my son has diarrhoea')
    await phone.receives(/health worker/, before)
    await expect(async () => {
      await shift.goto('/shift')
      const top = shift.getByRole('region', { name: /Unwell/ })
      await expect(top.getByRole('link', { name: new RegExp(`${nameOf(ill)} house`) })).toBeVisible(
        { timeout: 2000 },
      )
    }).toPass({ timeout: 30_000 })
    await phoneOf(programme.phones, wrong.number).write('wrong number')
    await expect(async () => {
      await openHousehold(desk, wrong)
      await expect(desk.getByText(/wrong number/i).first()).toBeVisible({ timeout: 2000 })
    }).toPass({ timeout: 30_000 })
  })

  expectQuietConsole(desk, shift)
})

const pages = [
  '/shift',
  '/households',
  '/households/new',
  '/wording',
  '/wording/wash-due/es',
  '/reply-words',
  '/rounds',
  '/areas',
  '/settings',
  '/areas/new',
  '/depots',
  '/depots/new',
  '/practice',
]

/** The three that the studies of the look show are tried in both themes at both widths, the rest once each. */
const looks = [
  { width: 1280, colorScheme: 'light', addresses: pages },
  { width: 375, colorScheme: 'dark', addresses: pages },
  { width: 1280, colorScheme: 'dark', addresses: ['/shift', '/wording', '/wording/wash-due/es'] },
  { width: 375, colorScheme: 'light', addresses: ['/shift', '/wording', '/wording/wash-due/es'] },
] as const

for (const { width, colorScheme, addresses } of looks) {
  test(`axe finds nothing at ${width} px, ${colorScheme}, and nothing hangs over the side`, async ({
    browser,
  }) => {
    test.setTimeout(300_000)
    const page = await signIn(browser, programme.desk, {
      ...coordinator,
      as: { colorScheme, viewport: { width, height: 900 } },
    })
    const household = await firstHref(page, '/households', '/households/')
    const sheet = await firstHref(page, '/shift', '/tickets/')
    for (const address of [...addresses, sheet, household]) {
      await page.goto(address)
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
      const found = await new AxeBuilder({ page }).analyze()
      const violations = found.violations.map(({ id, nodes }) => `${id} ${nodes[0]?.html}`)
      const over = await page.evaluate(
        () => document.documentElement.scrollWidth - window.innerWidth,
      )
      expect({ address, violations, over: Math.max(0, over) }).toEqual({
        address,
        violations: [],
        over: 0,
      })
    }
    await page.context().close()
  })
}

/** The first link of a list that leads into it, not to its form. */
async function firstHref(page: Page, list: string, into: string): Promise<string> {
  await page.goto(list)
  const links = page.locator(`main a[href^="${into}"]:not([href$="/new"])`)
  await expect(links.first()).toBeVisible()
  return (await links.first().getAttribute('href')) ?? list
}
