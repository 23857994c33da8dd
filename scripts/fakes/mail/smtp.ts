import type { Socket } from 'node:net'
import { SMTPServer, type SMTPServerSession } from 'smtp-server'
import type { Letterbox } from './letterbox'
import type { MailFault } from './MailFault'

class SmtpRefusal extends Error {
  constructor(
    readonly responseCode: number,
    message: string,
  ) {
    super(message)
  }
}

/** Takes every letter on loopback and forwards none. */
export function startSmtp(port: number, letterbox: Letterbox, fault: MailFault): Promise<SMTPServer> {
  const sockets = new Map<number, Socket>()
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: 30 * 1024 * 1024,
    onMailFrom(_address, _session, callback) {
      if (fault.strikes('4xx')) callback(new SmtpRefusal(451, 'Try again later (fault switched on)'))
      else if (fault.strikes('5xx')) callback(new SmtpRefusal(554, 'Refused for good (fault switched on)'))
      else callback()
    },
    onRcptTo({ address }, _session, callback) {
      // Besides the switch, so that one bad address among good ones can be tried.
      if (fault.strikes('no-mailbox') || address.startsWith('no-such-mailbox'))
        callback(new SmtpRefusal(550, 'No such mailbox here'))
      else callback()
    },
    onData(stream, session, callback) {
      const chunks: Buffer[] = []
      stream.on('data', (chunk: Buffer) => chunks.push(chunk))
      stream.once('end', () => {
        store(letterbox, Buffer.concat(chunks), session).then(
          () => {
            // The letter is kept but its sender never hears so: the case that tempts a sender to send twice.
            if (fault.strikes('cut-after-data')) sockets.get(session.remotePort)?.destroy()
            else callback()
          },
          (error: unknown) => callback(error instanceof Error ? error : new Error(String(error))),
        )
      })
    },
  })
  server.on('error', (error) => console.error(error.message))
  server.server.prependListener('connection', (socket: Socket) => {
    if (fault.strikes('down')) {
      socket.destroy()
      return
    }
    const remotePort = socket.remotePort ?? 0
    sockets.set(remotePort, socket)
    socket.once('close', () => sockets.delete(remotePort))
  })
  return new Promise((resolve, reject) => {
    server.server.once('error', reject)
    server.listen(port, '127.0.0.1', () => resolve(server))
  })
}

async function store(letterbox: Letterbox, raw: Buffer, session: SMTPServerSession): Promise<void> {
  const from = session.envelope.mailFrom === false ? '' : session.envelope.mailFrom.address
  const to = session.envelope.rcptTo.map((recipient) => recipient.address)
  const letter = await letterbox.deliver(raw, from, to)
  console.log(`${letter.receivedAt} letter ${letter.id} kept`)
}
