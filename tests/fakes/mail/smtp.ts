import { simpleParser, type AddressObject } from 'mailparser'
import { SMTPServer } from 'smtp-server'
import { keepLetter, type Mailbox } from './mailbox'
import { recipientFate } from './recipient-fates'

/** An SMTP server without encryption or sign-in: it listens on loopback only. */
export function createSmtp(mailbox: Mailbox): SMTPServer {
  const triedOnce = new Set<string>()
  return new SMTPServer({
    disabledCommands: ['STARTTLS'],
    authOptional: true,
    // Any name and password will do; what matters is what comes after.
    onAuth: (auth, _session, done) => done(null, { user: auth.username }),
    onRcptTo(recipient, _session, done) {
      done(refusalFor(recipient.address, triedOnce))
    },
    onData(stream, session, done) {
      const to = session.envelope.rcptTo.map((recipient) => recipient.address)
      simpleParser(stream).then(
        (mail) => {
          keepLetter(mailbox, {
            receivedAt: new Date().toISOString(),
            messageId: mail.messageId ?? '',
            from: addressText(mail.from),
            to,
            subject: mail.subject ?? '',
            text: mail.text ?? '',
            html: mail.html || '',
          })
          done()
        },
        (error: Error) => done(error),
      )
    },
  })
}

function refusalFor(address: string, triedOnce: Set<string>): Error | null {
  const fate = recipientFate(address)
  if (fate === 'refuse') return smtpError(550, 'no such mailbox')
  if (fate === 'later') return smtpError(451, 'try again later')
  if (fate === 'later once' && !triedOnce.has(address)) {
    triedOnce.add(address)
    return smtpError(451, 'try again later')
  }
  return null
}

function smtpError(responseCode: number, words: string): Error {
  return Object.assign(new Error(words), { responseCode })
}

function addressText(address: AddressObject | undefined): string {
  return address?.text ?? ''
}
