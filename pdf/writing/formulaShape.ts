/** A formula as one outline. Lengths in em of the text around it; y grows downwards, 0 on the baseline. */
export interface FormulaShape {
  /** Path data in thousandths of an em. */
  path: string
  widthEm: number
  heightEm: number
  depthEm: number
}

/** Shapes by `formulaKey`; null where the formula could not be set, and its TeX is printed instead. */
export type FormulaShapes = ReadonlyMap<string, FormulaShape | null>

export const formulaKey = (tex: string, display: boolean) => `${display ? 'd' : 'i'}${tex}`
