'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { assignReviewers } from '@/lib/domain/assignments/assignReviewers'
import { changeSeat } from '@/lib/domain/assignments/changeSeat'
import { moveReader } from '@/lib/domain/assignments/moveReader'
import { replaceReviewer } from '@/lib/domain/assignments/replaceReviewer'
import {
  assignSchema,
  moveSchema,
  replaceSchema,
  seatSchema,
  startReviewSchema,
  suggestSchema,
  takeOffSchema,
} from '@/lib/domain/assignments/schema'
import { startReview } from '@/lib/domain/assignments/startReview'
import { suggestForPanel } from '@/lib/domain/assignments/suggestForPanel'
import { takeOff } from '@/lib/domain/assignments/takeOff'

export const startReviewAction = defineAction({
  name: 'startReview',
  schema: startReviewSchema,
  run: startReview,
})

export const assignReviewersAction = defineAction({
  name: 'assignReviewers',
  schema: assignSchema,
  run: assignReviewers,
})

export const takeOffAction = defineAction({ name: 'takeOffReviewers', schema: takeOffSchema, run: takeOff })

export const changeSeatAction = defineAction({ name: 'changeSeat', schema: seatSchema, run: changeSeat })

export const moveReaderAction = defineAction({ name: 'moveReader', schema: moveSchema, run: moveReader })

export const replaceReviewerAction = defineAction({
  name: 'replaceReviewer',
  schema: replaceSchema,
  run: replaceReviewer,
})

export const suggestAction = defineAction({
  name: 'suggestAssignments',
  schema: suggestSchema,
  run: (ctx, input) => suggestForPanel(ctx, input),
  limit: { points: 60, seconds: 60 },
})
