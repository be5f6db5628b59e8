import { createTransport } from 'nodemailer'

export type Mail = {
  send(letter: { to: string; subject: string; body: string; messageId: string }): Promise<void>
}

/** Mail through SMTP. A stable message id lets the far end see a letter that was sent twice. */
export function smtpMail(settings: { smtpUrl: string; from: string }): Mail {
  const transport = createTransport({
    url: settings.smtpUrl,
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 20_000,
  })
  return {
    async send({ to, subject, body, messageId }) {
      await transport.sendMail({ from: settings.from, to, subject, text: body, messageId })
    },
  }
}

/** Where no mail is set up a letter is lost on purpose, and `told` hears of it. */
export function noMail(told: (subject: string) => void): Mail {
  return {
    send: ({ subject }) => {
      told(subject)
      return Promise.resolve()
    },
  }
}
