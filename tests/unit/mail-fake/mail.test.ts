import { createTransport } from 'nodemailer'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { startMail, type RunningMail } from '@/tests/fakes/mail/start'

describe('the mail fake', () => {
  let running: RunningMail
  beforeEach(async () => {
    running = await startMail({ smtpPort: 0, pagePort: 0 })
  })
  afterEach(() => running.close())

  const send = (to: string | string[], more: { subject?: string; text?: string } = {}) =>
    createTransport(running.smtpUrl).sendMail({
      from: 'Rillpost <desk@rillpost.example>',
      to,
      subject: 'পানি · agua',
      text: 'Sign in: http://127.0.0.1:3000/door?x=1\nNot this: http://desk.example/',
      messageId: '<outbox-1@desk>',
      ...more,
    })
  const messages = async () =>
    ((await (await fetch(`${running.origin}/messages`)).json()) as { messages: unknown[] }).messages

  it('keeps what came, decoded, and shows it', async () => {
    await send('ana@rillpost.example')
    expect(await messages()).toMatchObject([
      {
        id: 1,
        messageId: '<outbox-1@desk>',
        to: ['ana@rillpost.example'],
        subject: 'পানি · agua',
        text: expect.stringContaining('Sign in'),
      },
    ])
    const page = await (await fetch(running.origin)).text()
    expect(page).toContain('<a href="http://127.0.0.1:3000/door?x=1">')
    expect(page).not.toContain('<a href="http://desk.example')
  })

  it('shows markup of a letter as text', async () => {
    await send('ana@rillpost.example', { subject: '<script>', text: '<b>&' })
    const page = await (await fetch(running.origin)).text()
    expect(page).toContain('&lt;script&gt;')
    expect(page).toContain('&lt;b&gt;&amp;')
  })

  it('refuses some recipients for good and some for now, by their name', async () => {
    await expect(send('refuse@rillpost.example')).rejects.toMatchObject({ responseCode: 550 })
    await expect(send('refuse.2@rillpost.example')).rejects.toMatchObject({ responseCode: 550 })
    await expect(send('later@rillpost.example')).rejects.toMatchObject({ responseCode: 451 })
    await expect(send('later@rillpost.example')).rejects.toMatchObject({ responseCode: 451 })
    await expect(send('once@rillpost.example')).rejects.toMatchObject({ responseCode: 451 })
    await send('once@rillpost.example')
    await send('refusenik@rillpost.example')
    expect(await messages()).toHaveLength(2)
  })

  it('accepts a letter for those who can have it', async () => {
    const result = await send(['ana@rillpost.example', 'refuse@rillpost.example'])
    expect(result).toMatchObject({
      accepted: ['ana@rillpost.example'],
      rejected: ['refuse@rillpost.example'],
    })
    expect(await messages()).toMatchObject([{ to: ['ana@rillpost.example'] }])
  })

  it('forgets when told to', async () => {
    await send('ana@rillpost.example')
    await fetch(`${running.origin}/messages`, { method: 'DELETE' })
    expect(await messages()).toEqual([])
  })
})
