'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { createInstrument } from '@/lib/domain/facility/createInstrument'
import { createMode } from '@/lib/domain/facility/createMode'
import { createSite } from '@/lib/domain/facility/createSite'
import { createTelescope } from '@/lib/domain/facility/createTelescope'
import { newInstrumentSchema } from '@/lib/domain/facility/instrumentSchema'
import { keepInService } from '@/lib/domain/facility/keepInService'
import { modeRecordSchema, newModeSchema } from '@/lib/domain/facility/modeSchema'
import { retire } from '@/lib/domain/facility/retire'
import { keepSchema, retireSchema } from '@/lib/domain/facility/retireSchema'
import { saveModeRecord } from '@/lib/domain/facility/saveModeRecord'
import { saveSiteRecord } from '@/lib/domain/facility/saveSiteRecord'
import { saveTelescopeRecord } from '@/lib/domain/facility/saveTelescopeRecord'
import { newSiteSchema, siteRecordSchema } from '@/lib/domain/facility/siteSchema'
import { newTelescopeSchema, telescopeRecordSchema } from '@/lib/domain/facility/telescopeSchema'
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

export const createSiteAction = defineAction({
  name: 'createSite',
  schema: newSiteSchema,
  run: createSite,
  revalidate: () => paths.office('facility'),
  redirectTo: ({ slug }) => paths.facilityRecord('sites', slug),
})

export const createTelescopeAction = defineAction({
  name: 'createTelescope',
  schema: newTelescopeSchema,
  run: createTelescope,
  revalidate: () => paths.office('facility'),
  redirectTo: ({ slug }) => paths.facilityRecord('telescopes', slug),
})

export const createInstrumentAction = defineAction({
  name: 'createInstrument',
  schema: newInstrumentSchema,
  run: createInstrument,
  revalidate: () => paths.office('facility'),
  redirectTo: () => paths.office('facility'),
})

export const createModeAction = defineAction({
  name: 'createMode',
  schema: newModeSchema,
  run: createMode,
  revalidate: () => [paths.office('facility'), paths.ownInstruments()],
  redirectTo: ({ slug }) => paths.facilityRecord('modes', slug),
})

export const retireAction = defineAction({
  name: 'retire',
  schema: retireSchema,
  run: retire,
  revalidate: (_, { kind, slug }) => [paths.office('facility'), paths.retirement(kind, slug)],
})

export const keepInServiceAction = defineAction({
  name: 'keepInService',
  schema: keepSchema,
  run: keepInService,
  revalidate: (_, { kind, slug }) => [paths.office('facility'), paths.retirement(kind, slug)],
})
