'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { chooseNights } from '@/lib/domain/decisions/chooseNights'
import { holdHours } from '@/lib/domain/decisions/holdHours'
import { saveAward } from '@/lib/domain/decisions/saveAward'
import { awardSchema, choiceSchema, heldSchema, leastSchema, planSchema } from '@/lib/domain/decisions/schema'
import { setLeast } from '@/lib/domain/decisions/setLeast'
import { takePlan } from '@/lib/domain/decisions/takePlan'

export const saveAwardAction = defineAction({ name: 'saveAward', schema: awardSchema, run: saveAward })

export const takePlanAction = defineAction({ name: 'takePlan', schema: planSchema, run: takePlan })

export const chooseNightsAction = defineAction({
  name: 'chooseNights',
  schema: choiceSchema,
  run: chooseNights,
})

export const holdHoursAction = defineAction({ name: 'holdHours', schema: heldSchema, run: holdHours })

export const setLeastAction = defineAction({ name: 'setLeast', schema: leastSchema, run: setLeast })
