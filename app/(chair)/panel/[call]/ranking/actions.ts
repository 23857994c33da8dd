'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { panelKeySchema } from '@/lib/domain/panels/schema'
import { freezeRanking } from '@/lib/domain/rankings/freezeRanking'
import { moveInRanking } from '@/lib/domain/rankings/moveInRanking'
import { moveLine } from '@/lib/domain/rankings/moveLine'
import { saveFormula } from '@/lib/domain/rankings/saveFormula'
import { formulaSchema, freezeSchema, lineSchema, moveSchema } from '@/lib/domain/rankings/schema'
import { startRanking } from '@/lib/domain/rankings/startRanking'

export const startRankingAction = defineAction({
  name: 'startRanking',
  schema: panelKeySchema,
  run: startRanking,
})

export const moveInRankingAction = defineAction({
  name: 'moveInRanking',
  schema: moveSchema,
  run: moveInRanking,
})

export const moveLineAction = defineAction({ name: 'moveLine', schema: lineSchema, run: moveLine })

export const freezeRankingAction = defineAction({
  name: 'freezeRanking',
  schema: freezeSchema,
  run: freezeRanking,
})

export const saveFormulaAction = defineAction({
  name: 'saveFormula',
  schema: formulaSchema,
  run: saveFormula,
  limit: { points: 60, seconds: 60 },
})
