import type { Inline } from './tree'

const mark = /\[@[^\]\s][^\]\n]{0,400}\]/gu
const key = /^@[^\s,;@{}[\]]{1,100}$/u

function read(found: string, line: number): Inline | null {
  const parts = found
    .slice(1, -1)
    .split(/[;,]/)
    .map((part) => part.trim())
    .filter(Boolean)
  if (!parts.every((part) => key.test(part))) return null
  const keys = parts.map((part) => part.slice(1))
  const [first] = keys
  if (keys.length === 1 && first?.startsWith('fig:')) return { kind: 'figure', label: first.slice(4), line }
  return keys.some((one) => one.startsWith('fig:')) ? null : { kind: 'cite', keys, line }
}

/** Plain words cut at their marks: `[@key]` cites, `[@fig:label]` points to a figure. `line` is that of the first word. */
export function marksIn(text: string, line: number): Inline[] {
  const parts: Inline[] = []
  let from = 0
  const words = (to: number) => {
    if (to > from) parts.push({ kind: 'text', text: text.slice(from, to) })
  }
  for (const found of text.matchAll(mark)) {
    const made = read(found[0], line + (text.slice(0, found.index).match(/\n/g)?.length ?? 0))
    if (!made) continue
    words(found.index)
    parts.push(made)
    from = found.index + found[0].length
  }
  words(text.length)
  return parts
}
