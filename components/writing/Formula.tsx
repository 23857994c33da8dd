import { mathMl } from '@/lib/writing/mathMl'

export interface FormulaProps {
  tex: string
  display: boolean
}

/** A formula set by the browser; one that cannot be read stands as it was typed, with what is wrong. */
export function Formula({ tex, display }: FormulaProps) {
  const set = mathMl(tex, display)
  if (!set.ok)
    return (
      <span className="text-not-feasible">
        <code>{tex}</code> <span className="text-caption">({set.problem})</span>
      </span>
    )
  // The reader of TeX writes MathML and nothing else, every letter of the text escaped.
  return <span dangerouslySetInnerHTML={{ __html: set.mathMl }} />
}
