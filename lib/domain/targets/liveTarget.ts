import type { Target } from '../proposals/types'
import { targetRowSchema, type TargetRow } from './schema'

const awaited = ['event', 'trigger', 'reaction', 'triggers']

/**
 * A row as it is being typed, for computing while one types: cells that cannot be read yet count as empty.
 * The first argument gives the key, the place and the version.
 */
export function liveTarget(
  { id, position, version }: Pick<Target, 'id' | 'position' | 'version'>,
  row: TargetRow,
): Target | null {
  const seat = { id, position, version }
  const first = targetRowSchema.safeParse(row)
  if (first.success) return { ...first.data, ...seat }
  const emptied: TargetRow = { ...row, name: row.name.trim() || '–' }
  for (const issue of first.error.issues) {
    const cell = issue.path[0]
    if (cell === 'band') emptied.magnitude = ''
    else if (cell === 'lineValue') Object.assign(emptied, { lineName: '', lineValue: '' })
    else if (cell === 'effectiveRadius') emptied.geometry = 'point'
    else if (cell === 'spectralIndex' || cell === 'temperature' || cell === 'spectrumTable')
      Object.assign(emptied, { spectrum: 'flat', [cell]: '' })
    else if (awaited.includes(String(cell)))
      Object.assign(emptied, { event: '', trigger: '', reaction: '', triggers: '' })
    else if (cell === 'ra' || cell === 'dec') Object.assign(emptied, { ra: '', dec: '' })
    else if (typeof cell === 'string' && cell in emptied && cell !== 'name')
      Object.assign(emptied, { [cell]: '' })
  }
  const second = targetRowSchema.safeParse(emptied)
  return second.success ? { ...second.data, ...seat } : null
}
