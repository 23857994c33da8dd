import { commonPairs } from './commonPairs'

/** A run of lines that needs no asking, or one that both changed, each in their own way. */
export type Passage = { kind: 'settled'; text: string } | { kind: 'both'; theirs: string; mine: string }

const lines = (text: string) => text.split(/(?<=\n)/)

/**
 * Two versions of a text that were made from the same one, laid together by lines: what only one of the two changed
 * is taken from that one, what both changed is left to be chosen. Joining the passages, whichever is chosen, gives
 * back the version chosen everywhere.
 */
export function mergeTexts(base: string, theirs: string, mine: string): Passage[] {
  const [old, a, b] = [lines(base), lines(theirs), lines(mine)]
  const inMine = new Map(commonPairs(old, b))
  const stable = commonPairs(old, a).flatMap(([o, at]) => {
    const own = inMine.get(o)
    return own === undefined ? [] : [[o, at, own] as const]
  })
  const passages: Passage[] = []
  const settle = (text: string) => {
    const last = passages.at(-1)
    if (text === '') return
    if (last?.kind === 'settled') last.text += text
    else passages.push({ kind: 'settled', text })
  }
  let [i, j, k] = [0, 0, 0]
  for (const [o, at, own] of [...stable, [old.length, a.length, b.length] as const]) {
    const [was, his, my] = [old.slice(i, o), a.slice(j, at), b.slice(k, own)].map((run) => run.join(''))
    if (his === was || his === my) settle(my ?? '')
    else if (my === was) settle(his ?? '')
    else passages.push({ kind: 'both', theirs: his ?? '', mine: my ?? '' })
    settle(old[o] ?? '')
    ;[i, j, k] = [o + 1, at + 1, own + 1]
  }
  return passages
}
