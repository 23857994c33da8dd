import type { GroupRow } from '@/lib/domain/targetGroups/schema'
import type { TargetRow } from '@/lib/domain/targets/schema'

/** Something kept, with the version that a change made here gave it. */
export interface Versioned {
  id: number
  version: number
}

/** Rows of the table as they were, and rows that were added. */
export interface RowsStep {
  kind: 'rows'
  words: string
  rows: (Versioned & { before: TargetRow })[]
  added: Versioned[]
}

/** Hours asked for observations, as they were. */
export interface HoursStep {
  kind: 'hours'
  words: string
  asked: (Versioned & { hours: string })[]
}

/** A group as it was; null for one that was made. One that was taken out is made anew. */
export interface GroupStep {
  kind: 'group'
  words: string
  group: Versioned
  isGone: boolean
  before: GroupRow | null
  /** Targets that it took out of other groups, and which. */
  back: { targetId: number; groupId: number }[]
}

/** One change made here; `words` name it, after `Taken back:`. */
export type UndoStep = RowsStep | HoursStep | GroupStep

/** What taking a step back gave new versions, by the number each had before; a group made anew has another number. */
export interface Moved {
  targets: readonly Versioned[]
  observations: readonly Versioned[]
  group: { was: number; is: Versioned } | null
}

/** A step as it can be taken back after a later one was: with the versions that gave. */
export function rebased(step: UndoStep, moved: Moved): UndoStep {
  const over = (now: readonly Versioned[]) => {
    const versions = new Map(now.map(({ id, version }) => [id, version]))
    return <T extends Versioned>(one: T): T => ({ ...one, version: versions.get(one.id) ?? one.version })
  }
  const target = over(moved.targets)
  if (step.kind === 'rows') return { ...step, rows: step.rows.map(target), added: step.added.map(target) }
  if (step.kind === 'hours') return { ...step, asked: step.asked.map(over(moved.observations)) }
  const { group } = moved
  if (!group) return step
  const back = step.back.map((one) => (one.groupId === group.was ? { ...one, groupId: group.is.id } : one))
  return { ...step, back, group: step.group.id === group.was ? group.is : step.group }
}
