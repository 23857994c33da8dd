'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveShareRule } from '@/lib/domain/sharing/saveShareRule'
import { shareRuleSchema } from '@/lib/domain/sharing/schema'

export const saveShareRuleAsOfficeAction = defineAction({
  name: 'saveShareRule',
  schema: shareRuleSchema,
  run: saveShareRule,
})
