const words: Readonly<Record<string, string>> = { 'instrument-scientist': 'instrument scientist' }

/** `reviewer, call 13`, `instrument scientist, EMBER`. */
export function roleInWords(role: { role: string; call: number | null; instrument: string | null }): string {
  const where = role.instrument ?? (role.call === null ? null : `call ${role.call}`)
  const name = words[role.role] ?? role.role
  return where ? `${name}, ${where}` : name
}
