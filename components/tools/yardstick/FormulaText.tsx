import { Fragment } from 'react'

/** A formula in a line of text, its indices set below: `D_L = (1 + z) D_M`. */
export function FormulaText({ children }: { children: string }) {
  return children
    .split(/(_[A-Za-z]+)/)
    .map((piece, index) =>
      piece.startsWith('_') ? (
        <sub key={index}>{piece.slice(1)}</sub>
      ) : (
        <Fragment key={index}>{piece}</Fragment>
      ),
    )
}
