import type { z } from 'zod'
import type { ActionResult } from '@/lib/actions/result'
import type { addTargetSchema } from '@/lib/domain/targets/addTarget'
import type { saveAskedTimesSchema } from '@/lib/domain/observations/saveAskedTimes'
import type { ChangedTargets, changeTargetsSchema } from '@/lib/domain/targets/changeTargets'
import type { importTargetsSchema } from '@/lib/domain/targets/importTargets'
import type { removeTargetSchema } from '@/lib/domain/targets/removeTarget'
import type { reorderTargetsSchema } from '@/lib/domain/targets/reorderTargets'
import type { saveTargetSchema } from '@/lib/domain/targets/saveTarget'
import type { RemovedGroup, removeGroupSchema } from '@/lib/domain/targetGroups/removeGroup'
import type { SavedGroup, saveGroupSchema } from '@/lib/domain/targetGroups/saveGroup'
import type { Target } from '@/lib/domain/proposals/types'

type Action<S extends z.ZodType, R> = (input: z.input<S>) => Promise<ActionResult<R>>

/** The server actions of the targets page, as the page hands them down. */
export interface TargetActions {
  add: Action<typeof addTargetSchema, Target>
  save: Action<typeof saveTargetSchema, Target>
  change: Action<typeof changeTargetsSchema, ChangedTargets>
  remove: Action<typeof removeTargetSchema, { id: number; name: string }>
  restore: Action<typeof removeTargetSchema, { id: number }>
  reorder: Action<typeof reorderTargetsSchema, void>
  importRows: Action<typeof importTargetsSchema, { added: number; present: number }>
  saveGroup: Action<typeof saveGroupSchema, SavedGroup>
  removeGroup: Action<typeof removeGroupSchema, RemovedGroup>
  ask: Action<typeof saveAskedTimesSchema, { id: number; version: number; askedSeconds: number }[]>
}
