// The mail fake as a program: settings come from the environment, letters stay in MAIL_FOLDER.
import { startInbox } from './inbox'
import { Letterbox } from './letterbox'
import { MailFault } from './MailFault'
import { startSmtp } from './smtp'

const letterbox = new Letterbox(process.env.MAIL_FOLDER ?? '.data/mail')
const fault = new MailFault()
await startSmtp(Number(process.env.SMTP_PORT ?? 2525), letterbox, fault)
await startInbox(Number(process.env.INBOX_PORT ?? 8025), letterbox, fault)
console.log('The mail fake is ready.')
