import { readNumber } from '@/lib/science/redshift'
import type { TargetColumn } from '../targetColumn'
import { columnUnits } from './columnUnits'
import { readUnit } from './readUnit'
import { sameDimensions } from './sameDimensions'
import type { TableColumn } from './types'

export interface CellReader {
  /** What is wrong with every cell of the column that is not empty. */
  problem: string | null
  /** The factor from the file's unit to the target's; 1 where text is taken as it stands. */
  factor: number
  /** The cell in the target's unit, and what is wrong with it. */
  read: (text: string) => { text: string; problem: string | null }
}

const missing = /^(nan|--|null|n\/a|masked)$/i
const inHours = /^h(r|ours?)?$/i
const sexagesimal = /^["']?(h|hh|d|dd|deg):(m|mm|min|arcmin):(s|ss|sec|arcsec).*$/i
/** ICRS and, to some milliarcseconds, FK5 of J2000. */
const icrs = /^$|icrs|fk5/i

const asItStands = (text: string) => ({ text, problem: null })
const always = (problem: string): CellReader => ({
  problem,
  factor: 1,
  read: (text) => ({ text, problem: text === '' ? null : problem }),
})

function converted(column: TargetColumn, unit: string, factor: number): CellReader['read'] {
  const isHours = column === 'ra' && Math.abs(factor - 15) < 1e-9
  const isDegrees = column === 'dec' && Math.abs(factor - 1) < 1e-9
  return (text) => {
    const value = readNumber(text)
    if (value !== null)
      return asItStands(
        Math.abs(factor - 1) < 1e-12 ? text : String(Number((value * factor).toPrecision(15))),
      )
    const isAngle = column === 'ra' || column === 'dec'
    const problem =
      isAngle && text !== '' && !isHours && !isDegrees
        ? `This is no number of ${unit}, the unit of its column.`
        : null
    return { text, problem }
  }
}

/** How the cells of a column are read: in the unit the file gives it, turned into the one a target keeps. */
export function cellReader(column: TargetColumn, file: TableColumn): CellReader {
  const own = columnUnits.get(column)
  const isPosition = column === 'ra' || column === 'dec' || column === 'position'
  if (isPosition && !icrs.test(file.system))
    return always(`The file gives positions in ${file.system}; give them in ICRS.`)
  if (own === undefined) return { problem: null, factor: 1, read: asItStands }
  const given = inHours.test(file.unit) && column === 'ra' ? 'hourangle' : file.unit
  const whenThere =
    (read: CellReader['read']): CellReader['read'] =>
    (text) =>
      missing.test(text) ? asItStands('') : read(text)
  if (given === '' || (isPosition && sexagesimal.test(given)))
    return { problem: null, factor: 1, read: whenThere(asItStands) }
  const unit = readUnit(given)
  if (!unit) return always(`The unit “${file.unit}” is not known here.`)
  const wanted = readUnit(own)
  if (!wanted || !sameDimensions(unit, wanted))
    return always(
      own
        ? `${file.unit} cannot be turned into ${own}.`
        : `This is in ${file.unit}, and should have no unit.`,
    )
  const factor = unit.factor / wanted.factor
  return { problem: null, factor, read: whenThere(converted(column, file.unit, factor)) }
}
