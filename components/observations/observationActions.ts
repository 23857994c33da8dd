import type { z } from 'zod'
import type { ActionResult } from '@/lib/actions/result'
import type { addObservationSchema } from '@/lib/domain/observations/addObservation'
import type { removeObservationSchema } from '@/lib/domain/observations/removeObservation'
import type { saveAskedTimesSchema } from '@/lib/domain/observations/saveAskedTimes'
import type { saveConstraintSetSchema } from '@/lib/domain/observations/saveConstraintSet'
import type { saveObservationSchema } from '@/lib/domain/observations/saveObservation'
import type { ObservationRow } from '@/lib/domain/observations/schema'
import type { saveWishSchema } from '@/lib/domain/wishes/schema'
import type { ConstraintSet, Observation, ServiceWish } from '@/lib/domain/proposals/types'

type Action<S extends z.ZodType, R> = (input: z.input<S>) => Promise<ActionResult<R>>

/** The server actions of the observing page, as the page hands them down. */
export interface ObservationActions {
  add: Action<typeof addObservationSchema, Observation>
  save: Action<typeof saveObservationSchema, Observation>
  ask: Action<typeof saveAskedTimesSchema, { id: number; version: number; askedSeconds: number }[]>
  remove: Action<typeof removeObservationSchema, { row: ObservationRow }>
  saveWish: Action<typeof saveWishSchema, ServiceWish>
  saveConstraints: Action<typeof saveConstraintSetSchema, ConstraintSet>
}
