/**
 * Splits a position written in one piece, '00 50 27.83 −17 40 08.8' or '12.616, −17.669', into right ascension and
 * declination. Null when it is not two halves.
 */
export function splitPosition(text: string): { ra: string; dec: string } | null {
  const spelled = text.trim().replace(/\s+/g, ' ')
  const bySign = /^([^+\-\u2212\u2013]*[\dsm″"'°d])[\s,;]*([+\-\u2212\u2013].+)$/.exec(spelled)
  if (bySign?.[1] && bySign[2]) return { ra: bySign[1].trim(), dec: bySign[2].trim() }
  const byComma = /^([^,;]+)[,;]\s*([^,;]+)$/.exec(spelled)
  if (byComma?.[1] && byComma[2]) return { ra: byComma[1].trim(), dec: byComma[2].trim() }
  const parts = spelled.split(' ')
  if (parts.length === 2 || parts.length === 6) {
    const half = parts.length / 2
    return { ra: parts.slice(0, half).join(' '), dec: parts.slice(half).join(' ') }
  }
  return null
}
