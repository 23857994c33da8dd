'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { bringTogether } from '@/lib/domain/sharing/bringTogether'
import { freezeMerged } from '@/lib/domain/sharing/freezeMerged'
import { moveInMerged } from '@/lib/domain/sharing/moveInMerged'
import { saveShareRule } from '@/lib/domain/sharing/saveShareRule'
import {
  bringTogetherSchema,
  mergedKeySchema,
  mergeMoveSchema,
  shareRuleSchema,
} from '@/lib/domain/sharing/schema'

export const saveShareRuleAction = defineAction({
  name: 'saveShareRule',
  schema: shareRuleSchema,
  run: saveShareRule,
})

export const bringTogetherAction = defineAction({
  name: 'bringTogether',
  schema: bringTogetherSchema,
  run: bringTogether,
})

export const moveInMergedAction = defineAction({
  name: 'moveInMerged',
  schema: mergeMoveSchema,
  run: moveInMerged,
})

export const freezeMergedAction = defineAction({
  name: 'freezeMerged',
  schema: mergedKeySchema,
  run: freezeMerged,
})
