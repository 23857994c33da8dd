'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveAskedTimes, saveAskedTimesSchema } from '@/lib/domain/observations/saveAskedTimes'
import { removeGroup, removeGroupSchema } from '@/lib/domain/targetGroups/removeGroup'
import { saveGroup, saveGroupSchema } from '@/lib/domain/targetGroups/saveGroup'
import { addTarget, addTargetSchema } from '@/lib/domain/targets/addTarget'
import { changeTargets, changeTargetsSchema } from '@/lib/domain/targets/changeTargets'
import { importTargets, importTargetsSchema } from '@/lib/domain/targets/importTargets'
import { removeTarget, removeTargetSchema } from '@/lib/domain/targets/removeTarget'
import { reorderTargets, reorderTargetsSchema } from '@/lib/domain/targets/reorderTargets'
import { restoreTarget } from '@/lib/domain/targets/restoreTarget'
import { saveTarget, saveTargetSchema } from '@/lib/domain/targets/saveTarget'
import { paths } from '@/lib/paths'

const page = (_: unknown, { reference }: { reference: string }) => paths.proposalSection(reference, 'targets')

export const addTargetAction = defineAction({
  name: 'addTarget',
  schema: addTargetSchema,
  run: addTarget,
  revalidate: page,
})

export const saveTargetAction = defineAction({
  name: 'saveTarget',
  schema: saveTargetSchema,
  run: saveTarget,
  revalidate: page,
})

export const changeTargetsAction = defineAction({
  name: 'changeTargets',
  schema: changeTargetsSchema,
  run: changeTargets,
  revalidate: page,
})

export const removeTargetAction = defineAction({
  name: 'removeTarget',
  schema: removeTargetSchema,
  run: removeTarget,
  revalidate: page,
})

export const restoreTargetAction = defineAction({
  name: 'restoreTarget',
  schema: removeTargetSchema,
  run: restoreTarget,
  revalidate: page,
})

export const reorderTargetsAction = defineAction({
  name: 'reorderTargets',
  schema: reorderTargetsSchema,
  run: reorderTargets,
  revalidate: page,
})

export const importTargetsAction = defineAction({
  name: 'importTargets',
  schema: importTargetsSchema,
  run: importTargets,
  revalidate: page,
  limit: { points: 60, seconds: 3600 },
})

export const askTimesAction = defineAction({
  name: 'saveAskedTimes',
  schema: saveAskedTimesSchema,
  run: saveAskedTimes,
  revalidate: page,
})

export const saveGroupAction = defineAction({
  name: 'saveGroup',
  schema: saveGroupSchema,
  run: saveGroup,
  revalidate: page,
})

export const removeGroupAction = defineAction({
  name: 'removeGroup',
  schema: removeGroupSchema,
  run: removeGroup,
  revalidate: page,
})
