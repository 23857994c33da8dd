'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { closeCall } from '@/lib/domain/calls/closeCall'
import { feeScheduleSchema } from '@/lib/domain/calls/feeScheduleSchema'
import { correctCall } from '@/lib/domain/calls/correctCall'
import { correctCallSchema } from '@/lib/domain/calls/correctionSchema'
import { openCall } from '@/lib/domain/calls/openCall'
import { saveOfferSchema } from '@/lib/domain/calls/offerSchema'
import { saveDates } from '@/lib/domain/calls/saveDates'
import { saveFeeSchedule } from '@/lib/domain/calls/saveFeeSchedule'
import { saveOffer } from '@/lib/domain/calls/saveOffer'
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

export const correctCallAction = defineAction({
  name: 'correctCall',
  schema: correctCallSchema,
  run: correctCall,
  revalidate: (_, { slug }) => [paths.officeCall(slug), paths.call(slug)],
})

export const saveOfferAction = defineAction({
  name: 'saveOffer',
  schema: saveOfferSchema,
  run: saveOffer,
  revalidate: (_, { slug }) => [paths.officeCall(slug), paths.call(slug), paths.office('facility')],
})

export const saveFeeScheduleAction = defineAction({
  name: 'saveFeeSchedule',
  schema: feeScheduleSchema,
  run: saveFeeSchedule,
  revalidate: (_, { slug }) => [paths.officeCall(slug), paths.call(slug)],
})
