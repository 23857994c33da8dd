'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { closeCall } from '@/lib/domain/calls/closeCall'
import { openCall } from '@/lib/domain/calls/openCall'
import { saveDates } from '@/lib/domain/calls/saveDates'
import { callStepSchema, saveDatesSchema } from '@/lib/domain/calls/schema'
import { paths } from '@/lib/paths'

export const openCallAction = defineAction({
  name: 'openCall',
  schema: callStepSchema,
  run: openCall,
  revalidate: (_, { slug }) => paths.officeCall(slug),
})

export const closeCallAction = defineAction({
  name: 'closeCall',
  schema: callStepSchema,
  run: closeCall,
  revalidate: (_, { slug }) => paths.officeCall(slug),
})

export const saveDatesAction = defineAction({
  name: 'saveCallDates',
  schema: saveDatesSchema,
  run: saveDates,
  revalidate: (_, { slug }) => paths.officeCall(slug),
})
