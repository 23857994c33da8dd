import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { SMTPServer } from 'smtp-server'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { LetterRefused } from '@/lib/services/mail/LetterRefused'
import { refusalOf } from '@/lib/services/mail/refusalOf'
import { smtpMail } from '@/lib/services/mail/smtp'
import { Letterbox } from '@/scripts/fakes/mail/letterbox'
import { MailFault } from '@/scripts/fakes/mail/MailFault'
import { startSmtp } from '@/scripts/fakes/mail/smtp'
import { anyFreePorts } from '@/scripts/services/ports'

let folder: string
let server: SMTPServer
let fault: MailFault
let letterbox: Letterbox
let port: number

const send = (email: string) =>
  smtpMail({ url: `smtp://127.0.0.1:${port}`, from: 'Office <office@quillonridge.example>' })
    .send({ messageId: '<one@test>', to: { email, name: 'Ines' }, subject: 'A', text: 'B', html: '<p>B</p>' })
    .then(
      () => 'taken',
      (error: unknown) => (error instanceof LetterRefused ? error.because : 'may pass'),
    )

beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'smtp-'))
  ;[port = 0] = await anyFreePorts(1)
  letterbox = new Letterbox(folder)
  fault = new MailFault()
  server = await startSmtp(port, letterbox, fault)
})

afterEach(async () => {
  // The client keeps its connections; it is told that they are over.
  for (const connection of (server as unknown as { connections: Set<{ close(): void }> }).connections)
    connection.close()
  await new Promise<void>((resolve) => server.close(() => resolve()))
  rmSync(folder, { recursive: true })
})

// Seen to fail: with every 5xx taken for a refused address, and with no name in the envelope.
describe('mail by SMTP', () => {
  it('knows an address that is refused for good, by its mailbox or by the switch', async () => {
    expect(await send('no-such-mailbox@harrow.example')).toBe('address')
    fault.set('no-mailbox', 1)
    expect(await send('ines@harrow.example')).toBe('address')
    expect(await send('ines@harrow.example')).toBe('taken')
    expect(letterbox.list()).toHaveLength(1)
  })

  it.each(['4xx', '5xx'] as const)('blames nobody for %s before the address was named', async (mode) => {
    fault.set(mode, 1)
    expect(await send('ines@harrow.example')).toBe('may pass')
  })

  it('names the letter in the envelope, for whoever sends it back later', async () => {
    const seen: unknown[] = []
    // A server with the extension of RFC 3461; to one without it nothing is said.
    server.options.hideDSN = false
    server.onData = (stream, session, done) => {
      const { dsn } = session.envelope as { dsn?: { envid: string; ret: string } }
      const rcpt = session.envelope.rcptTo[0] as { dsn?: { notify: string[] } } | undefined
      seen.push(dsn?.envid, dsn?.ret, rcpt?.dsn?.notify)
      stream.resume().once('end', () => done())
    }
    expect(await send('ines@harrow.example')).toBe('taken')
    expect(seen).toEqual(['one@test', 'HDRS', ['FAILURE', 'DELAY']])
  })

  it('tells a letter that was not wanted from an address', () => {
    const at = (command: string, responseCode: number) =>
      refusalOf(Object.assign(new Error('no'), { command, responseCode, response: `${responseCode} no` }))
    expect(at('DATA', 554)?.because).toBe('letter')
    expect(at('RCPT TO', 550)?.message).toBe('550 no')
    expect(at('RCPT TO', 450)).toBeNull()
    expect(at('AUTH PLAIN', 535)).toBeNull()
  })
})
