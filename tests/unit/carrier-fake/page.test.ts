import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { phone, startRig, type Rig } from './rig'

describe('the page of the practice phones', () => {
  let rig: Rig
  let folder: string
  beforeAll(async () => {
    folder = mkdtempSync(path.join(tmpdir(), 'phones-'))
    const phonesFile = path.join(folder, 'phones.json')
    const phones = [
      { number: phone, label: 'Ana & <Berta> house', language: 'es', timeZone: 'America/Lima' },
      { number: '+12125550101', label: 'Sarkar house', language: 'bn' },
    ]
    writeFileSync(phonesFile, JSON.stringify(phones))
    rig = await startRig({ phonesFile })
  })
  afterAll(async () => {
    await rig.close()
    rmSync(folder, { recursive: true })
  })

  const page = async (query = '') => (await fetch(`${rig.running.origin}/${query}`)).text()
  const opened = `?open=${encodeURIComponent(phone)}`

  it('shows the shelf with nothing open', async () => {
    const html = await page()
    expect(html).toContain('Ana &amp; &lt;Berta&gt; house')
    expect(html).toContain('2 phones')
    expect(html).not.toContain('<article')
  })

  it('shows texts oldest to newest, in the zone of the phone, with the carrier’s own marked', async () => {
    await rig.send({ Body: 'Lave el <filtro>' })
    await rig.forward(5_000)
    await rig.practice('POST', '/inbound', { from: phone, body: 'STOP' })
    const html = await page(opened)
    const received = html.indexOf('Lave el &lt;filtro&gt;')
    const written = html.indexOf('<p>STOP</p>')
    const carrier = html.indexOf('the carrier 01:00')
    expect(received).toBeGreaterThan(0)
    expect(written).toBeGreaterThan(received)
    expect(carrier).toBeGreaterThan(written)
    expect(html).toContain('The carrier blocks texts to this phone')
  })

  it('labels each phone for those who do not see it', async () => {
    const html = await page(opened)
    expect(html).toContain('Text from Ana &amp; &lt;Berta&gt; house</label>')
    expect(html).toMatch(/<textarea[^>]* lang="es"/)
  })

  it('opens any number a phone could have, and says so of any other', async () => {
    expect(await page('?open=+1 (305) 555-0142')).toContain('id="phone-13055550142"')
    const refused = await page('?open=12')
    expect(refused).toContain('No phone can have the number 12')
    expect(refused).not.toContain('<article')
  })

  it('finds phones by name, number and language', async () => {
    expect(await page('?find=bengali')).toContain('1 phone<')
    expect(await page('?find=555-0101')).toContain('1 phone<')
    expect(await page('?find=nobody')).toContain('0 phones<')
  })

  it('sends without a script and comes back to the same phones', async () => {
    const body = new URLSearchParams({ from: '+12125550101', body: 'পানি আসে না' })
    body.append('open', '+12125550101')
    const answer = await fetch(`${rig.running.origin}/write`, {
      method: 'POST',
      body,
      redirect: 'manual',
    })
    expect(answer.status).toBe(303)
    expect(answer.headers.get('location')).toBe('/?open=%2B12125550101#phone-12125550101')
    expect(await page('?open=%2B12125550101')).toContain('পানি আসে না')
  })

  it('serves its own style, script and letters', async () => {
    const names = ['style.css', 'script.js', 'icon.svg', 'fonts/bengali.woff2']
    const answers = await Promise.all(names.map((name) => fetch(`${rig.running.origin}/${name}`)))
    expect(answers.map((answer) => answer.status)).toEqual([200, 200, 200, 200])
    expect((await fetch(`${rig.running.origin}/fonts/other.woff2`)).status).toBe(404)
  })

  it('counts its version up when something happens, and not otherwise', async () => {
    const version = async () =>
      ((await (await fetch(`${rig.running.origin}/version`)).json()) as { version: number }).version
    const before = await version()
    expect(await version()).toBe(before)
    await rig.practice('POST', '/inbound', { from: phone, body: 'hello' })
    expect(await version()).toBeGreaterThan(before)
  })
})
