import { access } from '../auth/access.ts'

/** What of the access matrix is handed out as a file: every handler outside the API. */
const files = Object.keys(access.routes)
  .filter((name) => name.startsWith('GET /') && !name.startsWith('GET /api/'))
  .map((name) => name.slice(4))
  .map((path) => new RegExp(`^${path.replaceAll('.', '\\.').replace(/\[\w+\]/g, '[^/]+')}$`))

const shut = "base-uri 'none'; form-action 'none'; frame-ancestors 'self'"

/**
 * The content policy of a file, null for a page: nothing in it runs or loads. Letters are locked in besides; a PDF is
 * not, because browsers then refuse to show it at all. It is set by the proxy, whose headers come after a handler's.
 */
export function filePolicy(pathname: string): string | null {
  if (!files.some((file) => file.test(pathname))) return null
  const locked = pathname.endsWith('/html') ? 'sandbox; ' : ''
  return `${locked}default-src 'none'; style-src 'unsafe-inline'; ${shut}`
}
