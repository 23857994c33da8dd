import katex from 'katex'

export type SetFormula =
  | { ok: true; mathMl: string }
  /** What is wrong with it, in the words of the reader of TeX, one sentence without its prefix. */
  | { ok: false; problem: string }

const longestTex = 2000
const kept = new Map<string, SetFormula>()
const mostKept = 500

function set(tex: string, display: boolean): SetFormula {
  if (tex.trim() === '') return { ok: false, problem: 'The formula is empty.' }
  if (tex.length > longestTex)
    return { ok: false, problem: `A formula has at most ${longestTex} characters.` }
  try {
    const mathMl = katex.renderToString(tex, {
      output: 'mathml',
      displayMode: display,
      throwOnError: true,
      // No links, pictures or classes from TeX, no macro that never ends, no box of a mile.
      trust: false,
      strict: false,
      maxExpand: 300,
      maxSize: 20,
    })
    return { ok: true, mathMl }
  } catch (error) {
    const words = error instanceof Error ? error.message : ''
    const read = /^KaTeX parse error: (.+?)(?: at position \d+| at end of input|$)/.exec(words)?.[1]
    return { ok: false, problem: read ? `${read}.` : 'The formula cannot be read.' }
  }
}

/** A formula as MathML, which browsers set themselves: no styles, fonts or scripts come with it. */
export function mathMl(tex: string, display: boolean): SetFormula {
  const name = `${display ? 'd' : 'i'}${tex}`
  const known = kept.get(name)
  if (known) return known
  if (kept.size >= mostKept) kept.clear()
  const made = set(tex, display)
  kept.set(name, made)
  return made
}
