'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { addObservation, addObservationSchema } from '@/lib/domain/observations/addObservation'
import { removeObservation, removeObservationSchema } from '@/lib/domain/observations/removeObservation'
import { saveAskedTimes, saveAskedTimesSchema } from '@/lib/domain/observations/saveAskedTimes'
import { saveConstraintSet, saveConstraintSetSchema } from '@/lib/domain/observations/saveConstraintSet'
import { saveObservation, saveObservationSchema } from '@/lib/domain/observations/saveObservation'
import { saveWish } from '@/lib/domain/wishes/saveWish'
import { saveWishSchema } from '@/lib/domain/wishes/schema'
import { paths } from '@/lib/paths'

const page = (_: unknown, { reference }: { reference: string }) =>
  paths.proposalSection(reference, 'observing')

export const addObservationAction = defineAction({
  name: 'addObservation',
  schema: addObservationSchema,
  run: addObservation,
  revalidate: page,
})

export const saveObservationAction = defineAction({
  name: 'saveObservation',
  schema: saveObservationSchema,
  run: saveObservation,
  revalidate: page,
})

export const askForAction = defineAction({
  name: 'saveAskedTimes',
  schema: saveAskedTimesSchema,
  run: saveAskedTimes,
  revalidate: page,
})

export const removeObservationAction = defineAction({
  name: 'removeObservation',
  schema: removeObservationSchema,
  run: removeObservation,
  revalidate: page,
})

export const saveConstraintSetAction = defineAction({
  name: 'saveConstraintSet',
  schema: saveConstraintSetSchema,
  run: saveConstraintSet,
  revalidate: page,
})

export const saveWishAction = defineAction({
  name: 'saveWish',
  schema: saveWishSchema,
  run: saveWish,
  revalidate: page,
})
