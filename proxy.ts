import { NextResponse, type NextRequest } from 'next/server'
import { filePolicy } from '@/lib/http/filePolicy'

/**
 * Headers for every page: a fresh nonce for the content policy, a request id, the address of the connection
 * and the path asked for. It guards nothing: pages, actions and handlers check the session themselves.
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString('base64')
  const isDevelopment = process.env.NODE_ENV === 'development'
  const page = [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${isDevelopment ? " 'unsafe-eval'" : ''}`,
    `style-src 'self' ${isDevelopment ? "'unsafe-inline'" : `'nonce-${nonce}'`}`,
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    `connect-src 'self'${isDevelopment ? ' ws:' : ''}`,
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-src 'self'",
    "worker-src 'self'",
    "frame-ancestors 'self'",
  ].join('; ')
  const policy = filePolicy(request.nextUrl.pathname) ?? page

  const forwarded = new Headers(request.headers)
  forwarded.set('x-nonce', nonce)
  forwarded.set('content-security-policy', policy)
  forwarded.set('x-request-id', crypto.randomUUID())
  // What a client claims in this header is overwritten; a trusted reverse proxy sets x-forwarded-for last.
  forwarded.set('x-noctuary-address', request.headers.get('x-forwarded-for')?.split(',').at(-1)?.trim() ?? '')
  forwarded.set('x-noctuary-path', `${request.nextUrl.pathname}${request.nextUrl.search}`)

  const response = NextResponse.next({ request: { headers: forwarded } })
  response.headers.set('content-security-policy', policy)
  return response
}

export const config = {
  matcher: [{ source: '/((?!_next/static|_next/image|favicon|marks/).*)' }],
}
