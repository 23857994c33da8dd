import { citationsOf } from '@/lib/writing/citations'
import { parseText } from '@/lib/writing/parseText'
import { placeFigures } from '@/lib/writing/placeFigures'
import { referenceLine } from '@/lib/writing/referenceLine'
import type { Reference } from '@/lib/writing/references'
import { Blocks } from './Blocks'
import { FigurePicture, type ShownFigure } from './FigurePicture'
import type { ReadAs } from './readAs'

export interface WrittenProps {
  text: string
  references?: readonly Reference[]
  figures?: readonly ShownFigure[]
}

/** A text written here as it will be read: figures after the paragraph that names them, references at the end. */
export function Written({ text, references = [], figures = [] }: WrittenProps) {
  const tree = parseText(text)
  const { numbers, cited } = citationsOf(tree, references)
  const as: ReadAs = {
    citations: numbers,
    figures: new Map(figures.map(({ label }, index) => [label, index + 1])),
  }
  return (
    <div className="written">
      {placeFigures(tree, figures).map((placed, index) =>
        placed.kind === 'block' ? (
          <Blocks key={index} blocks={[placed.block]} as={as} />
        ) : (
          <FigurePicture key={index} figure={placed.figure} number={placed.number} as={as} />
        ),
      )}
      {cited.length > 0 ? (
        <>
          <h3>References</h3>
          <ol className="plain-list text-table">
            {cited.map((reference, index) => (
              <li key={reference.key} className="mb-1 flex gap-2">
                <span className="text-muted">[{index + 1}]</span>
                <span>{referenceLine(reference)}</span>
              </li>
            ))}
          </ol>
        </>
      ) : null}
    </div>
  )
}
