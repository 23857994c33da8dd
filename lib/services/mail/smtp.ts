import nodemailer from 'nodemailer'
import { step } from '../step'
import type { Mail } from './Mail'
import { refusalOf } from './refusalOf'

/** Mail by SMTP; the local inbox and a real server differ by address alone. */
export function smtpMail(settings: { url: string; from: string }): Mail {
  const transport = nodemailer.createTransport({
    url: settings.url,
    pool: true,
    maxConnections: 2,
    connectionTimeout: 5_000,
    greetingTimeout: 5_000,
    socketTimeout: 10_000,
  })
  return {
    send: (letter) =>
      step('mail:send', async () => {
        const sending = transport.sendMail({
          messageId: letter.messageId,
          from: settings.from,
          to: { address: letter.to.email, name: letter.to.name },
          subject: letter.subject,
          text: letter.text,
          html: letter.html,
          attachments: (letter.attachments ?? []).map(({ fileName, bytes }) => ({
            filename: fileName,
            content: Buffer.from(bytes),
            contentType: 'application/pdf',
          })),
          // Whoever fails to deliver it later names it so (RFC 3461), where the server can.
          dsn: {
            id: letter.messageId.replace(/[<>]/g, ''),
            return: 'headers',
            notify: ['failure', 'delay'],
          },
          headers: { 'Auto-Submitted': 'auto-generated' },
          disableFileAccess: true,
          disableUrlAccess: true,
        })
        await sending.catch((error: unknown) => {
          throw refusalOf(error) ?? error
        })
      }),
    isUp: async () => {
      try {
        await step('mail:verify', () => transport.verify())
        return true
      } catch {
        return false
      }
    },
  }
}
