import { inlinesIn } from './inlinesIn'
import type { Block, Written } from './tree'

export type Placed<Figure> =
  | { kind: 'block'; block: Block }
  /** `number` counts from 1 in the order of the list. */
  | { kind: 'figure'; figure: Figure; number: number }

const namedIn = (block: Block): string[] =>
  inlinesIn([block]).flatMap((one) => (one.kind === 'figure' ? [one.label] : []))

/** A text with its figures, each after the paragraph that first names it; those nobody names follow at the end. */
export function placeFigures<Figure extends { label: string }>(
  written: Written,
  figures: readonly Figure[],
): Placed<Figure>[] {
  const left = new Map(figures.map((figure, index) => [figure.label, { figure, number: index + 1 }]))
  const placed: Placed<Figure>[] = []
  const put = (label: string) => {
    const found = left.get(label)
    if (found) placed.push({ kind: 'figure', ...found })
    left.delete(label)
  }
  let waiting: string[] = []
  for (const [index, block] of written.entries()) {
    placed.push({ kind: 'block', block })
    waiting.push(...namedIn(block))
    // A formula on its own line belongs to the sentence before it.
    if (written[index + 1]?.kind === 'formula') continue
    waiting.forEach(put)
    waiting = []
  }
  for (const { label } of figures) put(label)
  return placed
}
