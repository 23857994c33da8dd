/** A run of words that stayed, went or came. */
export interface Difference {
  kind: 'same' | 'gone' | 'new'
  text: string
}

/** Two runs longer than this, in pairs of words, are shown whole, the one as gone and the other as new. */
const mostPairs = 4_000_000

/** Which of `before` and `after` belong together: the longest common subsequence, as pairs of places. */
function pairs(before: readonly string[], after: readonly string[]): [number, number][] {
  const [n, m] = [before.length, after.length]
  if (n * m > mostPairs) return []
  // lengths[i][j]: of the longest common subsequence of what follows places i and j.
  const lengths = Array.from({ length: n + 1 }, () => new Uint32Array(m + 1))
  const at = (i: number, j: number) => lengths[i]?.[j] ?? 0
  for (let i = n - 1; i >= 0; i -= 1) {
    const row = lengths[i]
    for (let j = m - 1; row && j >= 0; j -= 1)
      row[j] = before[i] === after[j] ? at(i + 1, j + 1) + 1 : Math.max(at(i + 1, j), at(i, j + 1))
  }
  const found: [number, number][] = []
  for (let i = 0, j = 0; i < n && j < m;) {
    if (before[i] === after[j]) found.push([i++, j++])
    else if (at(i + 1, j) >= at(i, j + 1)) i += 1
    else j += 1
  }
  return found
}

type Split = (text: string) => string[]
const lines: Split = (text) => text.split(/(?<=\n)/)
const words: Split = (text) => text.match(/\s+|[^\s]+/g) ?? []

function compare(before: string, after: string, split: Split, finer: Split | null): Difference[] {
  const [old, now] = [split(before), split(after)]
  const differences: Difference[] = []
  const add = (kind: Difference['kind'], text: string) => {
    const last = differences.at(-1)
    if (text === '') return
    if (last?.kind === kind) last.text += text
    else differences.push({ kind, text })
  }
  const between = (gone: string, came: string) => {
    if (finer && gone && came) for (const one of compare(gone, came, finer, null)) add(one.kind, one.text)
    else {
      add('gone', gone)
      add('new', came)
    }
  }
  let [i, j] = [0, 0]
  for (const [x, y] of [...pairs(old, now), [old.length, now.length] as const]) {
    between(old.slice(i, x).join(''), now.slice(j, y).join(''))
    add('same', old[x] ?? '')
    ;[i, j] = [x + 1, y + 1]
  }
  return differences
}

/** What went and what came from one text to another: by lines, and within lines that changed by words. */
export function compareTexts(before: string, after: string): Difference[] {
  return compare(before, after, lines, words)
}
