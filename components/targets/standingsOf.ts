import type { Target } from '@/lib/domain/proposals/types'
import { nameKey, saysTheSame, type ImportedRow } from '@/lib/domain/targets/rules'
import { targetRowSchema } from '@/lib/domain/targets/schema'

export type Standing = 'new' | 'same' | 'clash' | 'wrong'

/** Whether each row says what a target here or a row before it says already, or clashes with one. */
export function standingsOf(rows: readonly ImportedRow[], targets: readonly Target[]): Standing[] {
  const known = new Map<string, Parameters<typeof saysTheSame>[0]>(
    targets.map((target) => [nameKey(target.name), target]),
  )
  return rows.map(({ row, errors }) => {
    if (Object.keys(errors).length > 0) return 'wrong'
    const values = targetRowSchema.parse(row)
    const key = nameKey(values.name)
    const same = known.get(key)
    if (same) return saysTheSame(same, values) ? 'same' : 'clash'
    known.set(key, values)
    return 'new'
  })
}
