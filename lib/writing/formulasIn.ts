import { blocksIn } from './blocksIn'
import { inlinesIn } from './inlinesIn'
import type { Written } from './tree'

export interface FormulaIn {
  tex: string
  display: boolean
  line: number
}

/** Every formula of a text with its line, from 1. */
export function formulasIn(written: Written): FormulaIn[] {
  const own = blocksIn(written).flatMap((one) =>
    one.kind === 'formula' ? [{ tex: one.tex, display: true, line: one.line }] : [],
  )
  const inside = inlinesIn(written).flatMap((one) =>
    one.kind === 'formula' ? [{ tex: one.tex, display: false, line: one.line }] : [],
  )
  return [...own, ...inside].sort((a, b) => a.line - b.line)
}
