import { create, parseDependencies, type MathJsInstance, type MathNode } from 'mathjs'

let kept: Pick<MathJsInstance, 'parse'> | null = null

/** The tree of a formula's text, or what its reader stumbled over. On an instance of our own that knows no function. */
export function parseText(text: string): { root: MathNode } | { why: string } {
  kept ??= create({ ...parseDependencies })
  try {
    return { root: kept.parse(text) }
  } catch {
    return { why: 'This cannot be read as a formula: look for a bracket left open or a sign too many.' }
  }
}
