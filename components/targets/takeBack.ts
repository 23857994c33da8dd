import type { ActionResult } from '@/lib/actions/result'
import type { Target } from '@/lib/domain/proposals/types'
import type { TargetActions } from './targetActions'
import type { GroupStep, HoursStep, Moved, RowsStep, UndoStep } from './undoSteps'

/** What was taken back: the versions it gave, and rows of the table as they stand again. */
export interface TakenBack extends Moved {
  changed: Target[]
  removed: number[]
}

const nothing: TakenBack = { targets: [], observations: [], group: null, changed: [], removed: [] }

type Actions = Pick<TargetActions, 'change' | 'ask' | 'saveGroup' | 'removeGroup'>

async function takeBackRows(actions: Actions, reference: string, step: RowsStep) {
  const changed = step.rows.map(({ id, version, before }) => ({ id, version, row: before }))
  const result = await actions.change({ reference, changed, added: [], removed: step.added })
  if (!result.ok) return result
  const removed = step.added.map(({ id }) => id)
  const back = { ...nothing, targets: result.data.changed, changed: result.data.changed, removed }
  return { ok: true as const, data: back }
}

async function takeBackHours(actions: Actions, reference: string, step: HoursStep) {
  const asked = step.asked.map(({ id, version, hours }) => ({ id, version, askedHours: hours }))
  const result = await actions.ask({ reference, asked })
  return result.ok ? { ok: true as const, data: { ...nothing, observations: result.data } } : result
}

async function takeBackGroup(
  actions: Actions,
  reference: string,
  { group, before, isGone, back }: GroupStep,
) {
  const { id, version } = group
  if (before === null) {
    const result = await actions.removeGroup({ reference, id, version, back })
    return result.ok ? { ok: true as const, data: { ...nothing, targets: result.data.moved } } : result
  }
  const over = isGone ? { id: null, version: 0 } : { id, version }
  const result = await actions.saveGroup({ reference, ...over, group: before, back })
  if (!result.ok) return result
  const { moved, ...is } = result.data
  return { ok: true as const, data: { ...nothing, targets: moved, group: { was: id, is } } }
}

/** Puts back what a step changed; refused whole where somebody changed any of it since. */
export function takeBack(
  actions: Actions,
  reference: string,
  step: UndoStep,
): Promise<ActionResult<TakenBack>> {
  if (step.kind === 'rows') return takeBackRows(actions, reference, step)
  if (step.kind === 'hours') return takeBackHours(actions, reference, step)
  return takeBackGroup(actions, reference, step)
}
