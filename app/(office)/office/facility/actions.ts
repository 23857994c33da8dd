'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { modeRecordSchema } from '@/lib/domain/facility/modeSchema'
import { saveModeRecord } from '@/lib/domain/facility/saveModeRecord'
import { saveSiteRecord } from '@/lib/domain/facility/saveSiteRecord'
import { saveTelescopeRecord } from '@/lib/domain/facility/saveTelescopeRecord'
import { siteRecordSchema } from '@/lib/domain/facility/siteSchema'
import { telescopeRecordSchema } from '@/lib/domain/facility/telescopeSchema'
import { paths } from '@/lib/paths'

export const saveSiteRecordAction = defineAction({
  name: 'saveSiteRecord',
  schema: siteRecordSchema,
  run: saveSiteRecord,
  revalidate: (_, { slug }) => [paths.office('facility'), paths.facilityRecord('sites', slug)],
})

export const saveTelescopeRecordAction = defineAction({
  name: 'saveTelescopeRecord',
  schema: telescopeRecordSchema,
  run: saveTelescopeRecord,
  revalidate: (_, { slug }) => [paths.office('facility'), paths.facilityRecord('telescopes', slug)],
})

export const saveModeRecordAction = defineAction({
  name: 'saveModeRecord',
  schema: modeRecordSchema,
  run: saveModeRecord,
  revalidate: (_, { slug }) => [
    paths.office('facility'),
    paths.facilityRecord('modes', slug),
    paths.ownInstruments(),
    paths.ownMode(slug),
  ],
})
