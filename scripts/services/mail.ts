import { join } from 'node:path'
import { startChild, untilReady, type Child } from './child'
import { projectRoot, type DataFolder } from './folders'

/** The mail fake: takes letters by SMTP, shows them on a page. */
export async function startMail(folder: DataFolder, smtpPort: number, inboxPort: number): Promise<Child> {
  const child = startChild({
    name: 'the mail fake',
    command: process.execPath,
    args: ['--import', 'tsx', 'scripts/fakes/mail/main.ts'],
    cwd: projectRoot,
    env: { MAIL_FOLDER: folder.mail, SMTP_PORT: String(smtpPort), INBOX_PORT: String(inboxPort) },
    logFile: join(folder.logs, 'mail.log'),
  })
  const health = `http://127.0.0.1:${inboxPort}/api/health`
  await untilReady(child, async () => (await fetch(health, { signal: AbortSignal.timeout(2000) })).ok, 30)
  return child
}
