'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { presenceSchema } from '@/lib/domain/discussions/schema'
import { scoreAgain } from '@/lib/domain/discussions/scoreAgain'
import { setPresence } from '@/lib/domain/discussions/setPresence'
import { leaveTable } from '@/lib/domain/recusals/leaveTable'
import { leaveTableSchema } from '@/lib/domain/recusals/schema'
import { saveScoreSchema } from '@/lib/domain/reviews/schema'

export const setPresenceAction = defineAction({
  name: 'setPresence',
  schema: presenceSchema,
  run: setPresence,
})

export const scoreAgainAction = defineAction({
  name: 'scoreAgain',
  schema: saveScoreSchema,
  run: scoreAgain,
  limit: { points: 240, seconds: 60 },
})

export const leaveTableAction = defineAction({
  name: 'leaveTable',
  schema: leaveTableSchema,
  run: leaveTable,
})
