/** Length of the quoted text that begins at `start`; the rest of the text when it is never closed. */
function quotedLength(text: string, start: number): number {
  const quote = text.charAt(start)
  let i = start + 1
  while (i < text.length) {
    if (quote === '"' && text.charAt(i) === '\\') i += 2
    else if (text.charAt(i) !== quote) i += 1
    else if (quote === "'" && text.charAt(i + 1) === quote) i += 2
    else return i + 1 - start
  }
  return text.length - start
}

/** Splits the inside of a flow mapping at the commas that lie in no quotes and no brackets. */
function pieces(inside: string): string[] {
  const found: string[] = []
  let depth = 0
  let begin = 0
  for (let i = 0; i < inside.length; i += 1) {
    const c = inside.charAt(i)
    const opens = /[\s,:[{]/.test(inside.charAt(i - 1) || ' ')
    if ((c === '"' || c === "'") && opens) i += quotedLength(inside, i) - 1
    else if (c === '{' || c === '[') depth += 1
    else if (c === '}' || c === ']') depth -= 1
    else if (c === ',' && depth === 0) {
      found.push(inside.slice(begin, i))
      begin = i + 1
    }
  }
  return [...found, inside.slice(begin)]
}

const pair = (text: string): [string, string] | null => {
  const found = /^\s*(\w+):(?:\s+(.*))?$/s.exec(text)
  return found?.[1] ? [found[1], (found[2] ?? '').trim()] : null
}

/** Lines folded into one, as YAML folds a long scalar. */
const folded = (lines: readonly string[]) =>
  lines
    .map((line) => line.trim())
    .reduce((whole, line) =>
      whole.endsWith('\\') ? whole.slice(0, -1) + line.replace(/^\\ /, ' ') : `${whole} ${line}`,
    )

/** Lines of each key of a mapping with one key a line. */
function entryLines(lines: readonly string[]): string[][] {
  const entries: string[][] = []
  for (const line of lines) {
    if (/^\w+:/.test(line)) entries.push([line])
    else entries.at(-1)?.push(line)
  }
  return entries
}

/**
 * Keys and written values of one mapping, in braces or one key a line. It reads what writers of ECSV put in a column's
 * entry; a value that is a mapping or a list itself stays as it is written.
 */
export function yamlEntries(lines: readonly string[]): Map<string, string> {
  const whole = folded(lines).trim()
  const written = whole.startsWith('{')
    ? pieces(whole.slice(1, whole.lastIndexOf('}')))
    : entryLines(lines).map(folded)
  const pairs = written.map(pair).filter((one) => one !== null)
  return new Map(pairs)
}
