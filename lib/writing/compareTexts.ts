import { commonPairs } from './commonPairs'

/** A run of words that stayed, went or came. */
export interface Difference {
  kind: 'same' | 'gone' | 'new'
  text: string
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
  for (const [x, y] of [...commonPairs(old, now), [old.length, now.length] as const]) {
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
