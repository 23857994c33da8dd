'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveStatement } from '@/lib/domain/decisions/saveStatement'
import { discussNow } from '@/lib/domain/discussions/discussNow'
import { discussSchema, presenceSchema } from '@/lib/domain/discussions/schema'
import { leaveTable } from '@/lib/domain/recusals/leaveTable'
import { leaveTableSchema } from '@/lib/domain/recusals/schema'
import { scoreAgain } from '@/lib/domain/discussions/scoreAgain'
import { setPresence } from '@/lib/domain/discussions/setPresence'
import { consensusSchema, setAsideSchema } from '@/lib/domain/rankings/schema'
import { saveScoreSchema } from '@/lib/domain/reviews/schema'
import { setAside } from '@/lib/domain/rankings/setAside'

export const saveConsensusAction = defineAction({
  name: 'saveConsensus',
  schema: consensusSchema,
  run: saveStatement,
})

export const setAsideAction = defineAction({ name: 'setAside', schema: setAsideSchema, run: setAside })

export const discussNowAction = defineAction({
  name: 'discussNow',
  schema: discussSchema,
  run: discussNow,
})

export const notePresenceAction = defineAction({
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
