import { mkdtempSync, rmSync } from 'node:fs'
import { request, type Server } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createTransport, type Transporter } from 'nodemailer'
import type { SMTPServer } from 'smtp-server'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { startInbox } from '@/scripts/fakes/mail/inbox'
import { Letterbox, type Letter } from '@/scripts/fakes/mail/letterbox'
import { MailFault } from '@/scripts/fakes/mail/MailFault'
import { startSmtp } from '@/scripts/fakes/mail/smtp'
import { anyFreePorts } from '@/scripts/services/ports'

let folder: string
let smtp: SMTPServer
let inbox: Server
let base: string
let transport: Transporter

beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'mail-fake-'))
  const [smtpPort = 0, inboxPort = 0] = await anyFreePorts(2)
  const letterbox = new Letterbox(folder)
  const fault = new MailFault()
  smtp = await startSmtp(smtpPort, letterbox, fault)
  inbox = await startInbox(inboxPort, letterbox, fault)
  base = `http://127.0.0.1:${inboxPort}`
  transport = createTransport({ host: '127.0.0.1', port: smtpPort, secure: false })
})

afterEach(async () => {
  transport.close()
  inbox.closeAllConnections()
  await Promise.all([
    new Promise((resolve) => inbox.close(resolve)),
    new Promise<void>((resolve) => smtp.close(() => resolve())),
  ])
  rmSync(folder, { recursive: true })
})

function send(subject: string, to = 'ines@harrow.example') {
  return transport.sendMail({
    from: 'Office <office@quillon.example>',
    to,
    subject,
    text: 'Open http://127.0.0.1:3000/reset-password/abc within ten minutes.',
    html: '<p>Open <a href="http://127.0.0.1:3000/reset-password/abc">this page</a>.</p><script>alert(1)</script>',
  })
}

async function letters(to = ''): Promise<Letter[]> {
  return (await fetch(`${base}/api/messages?to=${encodeURIComponent(to)}`)).json()
}

function fault(mode: string, times?: number) {
  return fetch(`${base}/faults`, { method: 'POST', body: JSON.stringify({ mode, times }) })
}

// Seen to fail with the list oldest first, without the sandbox header, and with faults that are never counted down.
describe('the mail fake', () => {
  it('keeps letters, newest first, and finds those of one person', async () => {
    await send('First')
    await send('Second', 'Tom@harrow.example')
    expect((await letters()).map((letter) => letter.subject)).toEqual(['Second', 'First'])
    expect((await letters('tom@harrow.example')).map((letter) => letter.subject)).toEqual(['Second'])
    expect((await letters('ines@harrow.example'))[0]?.text).toContain('/reset-password/abc')
  })

  it('still has them after a restart, until they are cleared', async () => {
    await send('Kept')
    expect(new Letterbox(folder).list().map((letter) => letter.subject)).toEqual(['Kept'])
    await fetch(`${base}/api/messages`, { method: 'DELETE' })
    expect(await letters()).toEqual([])
    expect(new Letterbox(folder).list()).toEqual([])
  })

  it("shows a page with links one can follow, and locks the letter's own HTML in", async () => {
    await send('A <b>title</b>')
    const list = await (await fetch(base)).text()
    expect(list).toContain('A &lt;b&gt;title&lt;/b&gt;')
    const page = await (await fetch(`${base}/messages/000001`)).text()
    expect(page).toContain('<a href="http://127.0.0.1:3000/reset-password/abc"')
    const html = await fetch(`${base}/messages/000001/html`)
    expect(html.headers.get('content-security-policy')).toMatch(
      /^sandbox(?!.*allow-scripts).*default-src 'none'/,
    )
  })

  it.each([
    ['4xx', 451],
    ['5xx', 554],
  ])('refuses with %s as often as asked', async (mode, code) => {
    await fault(mode, 1)
    await expect(send('Refused')).rejects.toMatchObject({ responseCode: code })
    await send('Taken')
    expect((await letters()).map((letter) => letter.subject)).toEqual(['Taken'])
  })

  it('is down until it is told to be well again', async () => {
    await fault('down')
    await expect(send('Lost')).rejects.toThrow()
    await fault('ok')
    await send('Taken')
    expect(await letters()).toHaveLength(1)
  })

  it('keeps a letter whose sender never hears so', async () => {
    await fault('cut-after-data', 1)
    await expect(send('Unsure')).rejects.toThrow()
    expect((await letters()).map((letter) => letter.subject)).toEqual(['Unsure'])
  })

  it('answers loopback names only', async () => {
    const status = await new Promise((resolve, reject) => {
      request(base, { headers: { host: 'evil.example' } }, (response) => resolve(response.statusCode))
        .once('error', reject)
        .end()
    })
    expect(status).toBe(421)
  })
})
