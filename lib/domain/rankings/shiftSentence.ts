import { countInWords, formatList, formatNumber, formatSigned } from '@/lib/format'

export interface ShiftFacts {
  /** Merit less raw mean, points. */
  shift: number
  error: number
  corrected: boolean
  readers: readonly { number: number; points: number; error: number }[]
}

/** One sentence on why merit differs from the raw mean, with reviewers by number. */
export function shiftSentence({ shift, error, corrected, readers }: ShiftFacts): string {
  const result = `${formatSigned(shift, 1)}, ± ${formatNumber(error, 1)}.`
  const apart = readers.filter(
    (reader) => Math.abs(reader.points) > reader.error && Math.sign(reader.points) === -Math.sign(shift),
  )
  if (!corrected || apart.length === 0)
    return `Drawn towards the mean of all proposals, as ${countInWords(readers.length, 'review leaves', 'reviews leave')} it uncertain: ${result}`
  const mean = apart.reduce((sum, reader) => sum + reader.points, 0) / apart.length
  const names = formatList(apart.map((reader) => String(reader.number)).sort((a, b) => Number(a) - Number(b)))
  const who = `${countInWords(apart.length, 'of its', 'of its', true)} ${countInWords(readers.length, 'reviewer', 'reviewers')}, ${names},`
  const verb = apart.length === 1 ? 'scores' : 'score'
  return `${who} ${verb} ${formatNumber(Math.abs(mean), 1)} ${mean > 0 ? 'above' : 'below'} colleagues on shared proposals: ${result}`
}
