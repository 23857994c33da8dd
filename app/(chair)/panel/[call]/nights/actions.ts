'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveAward } from '@/lib/domain/decisions/saveAward'
import { awardSchema, planSchema } from '@/lib/domain/decisions/schema'
import { takePlan } from '@/lib/domain/decisions/takePlan'

export const saveAwardAction = defineAction({ name: 'saveAward', schema: awardSchema, run: saveAward })

export const takePlanAction = defineAction({ name: 'takePlan', schema: planSchema, run: takePlan })
