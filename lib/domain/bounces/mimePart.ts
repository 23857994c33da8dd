/** A part of a message: its header fields by lower-case name, its media type, and its body or its own parts. */
export interface MimePart {
  /** Of several fields of one name, the first. */
  headers: ReadonlyMap<string, string>
  /** Lower case, without parameters; `text/plain` where none is said (RFC 2045, section 5.2). */
  mediaType: string
  body: string
  parts: readonly MimePart[]
}

const deepest = 6
const mostParts = 40

/** Header fields as written, unfolded (RFC 5322, section 2.2.3). */
export function headerFields(text: string): Map<string, string> {
  const fields = new Map<string, string>()
  for (const line of text.replace(/\r?\n[ \t]+/g, ' ').split(/\r?\n/)) {
    const colon = line.indexOf(':')
    if (colon <= 0) continue
    const name = line.slice(0, colon).trim().toLowerCase()
    if (!fields.has(name)) fields.set(name, line.slice(colon + 1).trim())
  }
  return fields
}

/** Where the empty line after a header stands: the header, and what follows. */
function halves(text: string): [header: string, body: string] {
  const found = /\r?\n\r?\n/.exec(text)
  if (text.startsWith('\n') || text.startsWith('\r\n')) return ['', text.replace(/^\r?\n/, '')]
  return found ? [text.slice(0, found.index), text.slice(found.index + found[0].length)] : [text, '']
}

const boundaryOf = (contentType: string): string | null =>
  /;\s*boundary\s*=\s*(?:"([^"]{1,70})"|([^\s;"]{1,70}))/i.exec(contentType)?.slice(1).find(Boolean) ?? null

/** What stands between the lines of a boundary (RFC 2046, section 5.1.1); a missing last line is let pass. */
function between(body: string, boundary: string): string[] {
  const parts: string[] = []
  let open: string[] | null = null
  for (const line of body.split(/\r?\n/)) {
    const bare = line.trimEnd()
    if (bare === `--${boundary}` || bare === `--${boundary}--`) {
      if (open) parts.push(open.join('\n'))
      open = bare.endsWith('--') && bare.length > boundary.length + 2 ? null : []
      if (parts.length >= mostParts) break
    } else open?.push(line)
  }
  if (open) parts.push(open.join('\n'))
  return parts
}

/** Takes a message apart. Nothing is decoded: what a delivery report needs is 7-bit text (RFC 3464, section 2.1). */
export function mimePart(text: string, depth = 0): MimePart {
  const [header, body] = halves(text)
  const headers = headerFields(header)
  const contentType = headers.get('content-type') ?? 'text/plain'
  const mediaType = contentType.split(';')[0]?.trim().toLowerCase() ?? ''
  const boundary = mediaType.startsWith('multipart/') && depth < deepest ? boundaryOf(contentType) : null
  const parts = boundary === null ? [] : between(body, boundary).map((part) => mimePart(part, depth + 1))
  return { headers, mediaType, body, parts }
}
