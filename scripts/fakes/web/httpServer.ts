import { createServer, type IncomingMessage, type Server } from 'node:http'

export interface FakeRequest {
  method: string
  path: string
  query: URLSearchParams
  headers: IncomingMessage['headers']
  body: string
}

/** What a handler answers; `cut` drops the connection without a word. */
export interface FakeResponse {
  status: number
  headers?: Record<string, string>
  body?: string | Buffer
  cut?: boolean
}

export type Handler = (request: FakeRequest) => Promise<FakeResponse> | FakeResponse

const largestBody = 5 * 1024 * 1024

/** A loopback server for one handler. Other Host names are refused, so no web page can reach it by a trick of DNS. */
export function listenOnLoopback(port: number, handle: Handler): Promise<Server> {
  const server = createServer((incoming, outgoing) => {
    void answer(incoming, handle)
      .catch((error: unknown): FakeResponse => {
        console.error(error)
        return json(500, { error: error instanceof Error ? error.message : String(error) })
      })
      .then((response) => {
        if (response.cut) {
          incoming.socket.destroy()
          return
        }
        outgoing.writeHead(response.status, { 'cache-control': 'no-store', ...response.headers })
        outgoing.end(response.body ?? '')
      })
  })
  return new Promise((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', () => resolve(server))
  })
}

async function answer(incoming: IncomingMessage, handle: Handler): Promise<FakeResponse> {
  const host = (incoming.headers.host ?? '').replace(/:\d+$/, '')
  if (host !== '127.0.0.1' && host !== 'localhost')
    return json(421, { error: 'This service answers on loopback only.' })
  const url = new URL(incoming.url ?? '/', 'http://127.0.0.1')
  const chunks: Buffer[] = []
  let size = 0
  for await (const chunk of incoming) {
    const piece = Buffer.from(chunk)
    size += piece.length
    if (size > largestBody) return json(413, { error: 'The request is too large.' })
    chunks.push(piece)
  }
  return handle({
    method: incoming.method ?? 'GET',
    path: url.pathname,
    query: url.searchParams,
    headers: incoming.headers,
    body: Buffer.concat(chunks).toString('utf8'),
  })
}

export function json(status: number, value: unknown, headers: Record<string, string> = {}): FakeResponse {
  return {
    status,
    headers: { 'content-type': 'application/json; charset=utf-8', ...headers },
    body: JSON.stringify(value, null, 2),
  }
}

export function redirect(location: string): FakeResponse {
  return { status: 303, headers: { location } }
}
