import { json, listenOnLoopback, type FakeRequest, type FakeResponse } from '../web/httpServer'
import { fontFile, fontPath } from '../web/page'
import { inboxPage, letterHtml, letterPage } from './inboxPages'
import type { Letterbox } from './letterbox'
import { mailFaultModes, type MailFault } from './MailFault'

/** The inbox in the browser, and the same letters as JSON for tests. */
export function startInbox(port: number, letterbox: Letterbox, fault: MailFault) {
  return listenOnLoopback(port, (request) => route(request, letterbox, fault))
}

function route(request: FakeRequest, letterbox: Letterbox, fault: MailFault): FakeResponse {
  const to = request.query.get('to') ?? ''
  const name = `${request.method} ${request.path}`
  if (name === 'GET /') return inboxPage(letterbox.list(to), to, fault.mode)
  if (name === `GET ${fontPath}`) return fontFile()
  if (name === 'GET /api/health') return json(200, { ok: true, fault: fault.mode })
  if (name === 'GET /api/messages') return json(200, letterbox.list(to))
  if (name === 'DELETE /api/messages') {
    letterbox.empty()
    return { status: 204 }
  }
  if (name === 'POST /faults') return setFault(request.body, fault)
  return request.method === 'GET'
    ? oneLetter(request.path, letterbox)
    : json(405, { error: 'Not offered here.' })
}

function oneLetter(path: string, letterbox: Letterbox): FakeResponse {
  const [, prefix, id = '', view = ''] =
    /^\/(api\/messages|messages)\/(\d+)(?:\/(html|raw))?$/.exec(path) ?? []
  const letter = letterbox.find(id)
  if (!prefix || !letter) return json(404, { error: 'There is no such letter.' })
  if (prefix === 'api/messages') return json(200, letter)
  if (view === 'html') return letterHtml(letter)
  if (view === 'raw') {
    return { status: 200, headers: { 'content-type': 'text/plain; charset=utf-8' }, body: letterbox.raw(id) }
  }
  return letterPage(letter)
}

function setFault(body: string, fault: MailFault): FakeResponse {
  const wish: { mode?: string; times?: number } = JSON.parse(body || '{}')
  const mode = mailFaultModes.find((known) => known === wish.mode)
  if (!mode) return json(400, { error: `mode is one of ${mailFaultModes.join(', ')}.` })
  fault.set(mode, wish.times)
  return json(200, { mode: fault.mode })
}
