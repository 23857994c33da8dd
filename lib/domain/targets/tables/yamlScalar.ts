const escapes: Readonly<Record<string, string>> = { n: '\n', t: '\t', r: '\r', '0': '\0', e: '\u001B' }

function unescaped(inside: string): string {
  return inside.replace(
    /\\(?:x([0-9a-f]{2})|u([0-9a-f]{4})|U([0-9a-f]{8})|(.))/gi,
    (_, x?: string, u?: string, U?: string, single = '') => {
      const code = Number.parseInt(x ?? u ?? U ?? '', 16)
      if (Number.isNaN(code)) return escapes[single] ?? single
      return code <= 0x10ffff ? String.fromCodePoint(code) : '\uFFFD'
    },
  )
}

/** The text of one scalar of YAML 1.1 on one line: plain, in single or in double quotes; null and ~ are empty. */
export function yamlScalar(written: string): string {
  const text = written.trim()
  if (/^'.*'$/.test(text)) return text.slice(1, -1).replaceAll("''", "'")
  if (/^".*"$/.test(text)) return unescaped(text.slice(1, -1))
  return text === '~' || text === 'null' ? '' : text
}
