import { formulasIn } from '@/lib/writing/formulasIn'
import { parseText } from '@/lib/writing/parseText'
import { formulaKey, type FormulaShape, type FormulaShapes } from './formulaShape'
import { typesetFormula } from './typesetFormula'
import type { WrittenData } from './writtenData'

/** Sets every formula of a text and of its captions once, before the pages are drawn. */
export async function shapesOf({ text, figures }: WrittenData): Promise<FormulaShapes> {
  const shapes = new Map<string, FormulaShape | null>()
  for (const source of [text, ...figures.map(({ caption }) => caption)])
    for (const { tex, display } of formulasIn(parseText(source))) {
      const key = formulaKey(tex, display)
      if (!shapes.has(key)) shapes.set(key, await typesetFormula(tex, display))
    }
  return shapes
}
