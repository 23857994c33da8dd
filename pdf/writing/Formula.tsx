import { Path, Svg } from '@react-pdf/renderer'
import { colour } from '../theme'
import type { FormulaShape } from './formulaShape'

/** Letters of formulas are a little smaller than those of the text at the same size. */
const grown = 1.05

interface FormulaProps {
  shape: FormulaShape
  /** Size of the text around it, points. */
  base: number
  /** The widest it may be, points; a wider one is drawn smaller. */
  room: number
  /** Distance from the foot of a line to its baseline, points; left out for one on its own line. */
  foot?: number
}

/** A formula as an outline, standing on the baseline of the line it is in. */
export function Formula({ shape, base, room, foot }: FormulaProps) {
  const { path, widthEm, heightEm, depthEm } = shape
  const em = base * grown * Math.min(1, room / (widthEm * base * grown))
  return (
    <Svg
      width={widthEm * em}
      height={(heightEm + depthEm) * em}
      viewBox={`0 ${-1000 * heightEm} ${1000 * widthEm} ${1000 * (heightEm + depthEm)}`}
      style={foot === undefined ? {} : { marginBottom: foot - depthEm * em }}
    >
      <Path d={path} fill={colour.ink} />
    </Svg>
  )
}
